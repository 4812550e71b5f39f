// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import org.brassbob.core.contents.TankState;
import org.brassbob.core.table.VolumeTable;
import org.brassbob.core.vessel.Tank;

/**
 * One of the levels that a tank might stand at, and what it would add to the ship.
 *
 * @param volume m3
 * @param part its mass, moments and free-surface moments
 */
record Level(double volume, Totals part) {
    /** Evenly spread levels that are looked at. */
    static final int SPREAD = 64;

    /** What a tank would add with a volume (m3) in it. */
    static Level of(TankLoad load, double volume, double trim) {
        load.fill(volume, trim);
        Totals part = new Totals();
        part.add(load, 1);
        return new Level(volume, part);
    }

    /** An interval has two ends. A tank without a reading has levels: evenly spread, those of its table, and just short of full. */
    static Level[] allOf(TankLoad load, double trim) {
        double low = load.range().low();
        double high = load.range().high();
        if (!load.isOpen()) {
            return new Level[] {of(load, low, trim), of(load, high, trim)};
        }
        Tank tank = load.tank();
        VolumeTable table = tank.volumes();
        int rows = table == null ? 0 : table.volumes().size();
        Level[] levels = new Level[SPREAD + 2 + rows];
        for (int i = 0; i <= SPREAD; i++) {
            levels[i] = of(load, low + (high - low) * i / SPREAD, trim);
        }
        double nearlyFull = TankState.FULL_SHARE * tank.capacity() * (1 - 1e-9);
        levels[SPREAD + 1] = of(load, Math.min(high, Math.max(low, nearlyFull)), trim);
        for (int i = 0; i < rows && table != null; i++) {
            double row = Math.min(high, Math.max(low, table.volumes().value(i)));
            levels[SPREAD + 2 + i] = of(load, row, trim);
        }
        return levels;
    }

    /** The level that a tank stands at, and evenly spread ones up to a distance (m3) to either side; for an interval that level alone. */
    static Level[] about(TankLoad load, double distance, double trim) {
        double found = load.volume();
        if (!load.isOpen()) {
            return new Level[] {of(load, found, trim)};
        }
        double low = Math.max(load.range().low(), found - distance);
        double high = Math.min(load.range().high(), found + distance);
        Level[] levels = new Level[SPREAD + 2];
        levels[0] = of(load, found, trim);
        for (int i = 0; i <= SPREAD; i++) {
            levels[1 + i] = of(load, low + (high - low) * i / SPREAD, trim);
        }
        return levels;
    }
}
