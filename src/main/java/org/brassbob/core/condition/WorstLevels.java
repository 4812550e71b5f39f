// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import java.util.List;
import org.brassbob.core.contents.TankState;
import org.brassbob.core.table.VolumeTable;
import org.brassbob.core.vessel.Tank;

/**
 * Chooses, where readings leave a choice, the volumes that give the lowest corrected GM. It looks at many levels of one tank while the
 * others stand still, refines the best, and goes round the tanks until none can be made worse; once from all at their least and once
 * from all at their greatest, and keeps the worse outcome.
 */
final class WorstLevels {
    private static final int LEVELS = 64;
    private static final int ROUNDS = 12;
    private static final double GOLDEN = (Math.sqrt(5) - 1) / 2;

    /** The corrected GM of a set of sums. */
    interface Gm {
        double of(Totals totals);
    }

    private final List<TankLoad> open;
    private final Totals totals;
    private final Gm gm;
    private final double trim;

    private WorstLevels(List<TankLoad> open, Totals totals, Gm gm, double trim) {
        this.open = open;
        this.totals = totals;
        this.gm = gm;
        this.trim = trim;
    }

    /**
     * Fills the tanks that have a choice.
     *
     * @param open those tanks, already part of the sums
     * @param totals sums of the whole ship; kept up to date
     */
    static void choose(List<TankLoad> open, Totals totals, Gm gm, double trim) {
        new WorstLevels(open, totals, gm, trim).choose();
    }

    private void choose() {
        double fromLeast = settle();
        double[] chosen = open.stream().mapToDouble(TankLoad::volume).toArray();
        for (TankLoad load : open) {
            put(load, load.range().high());
        }
        if (settle() > fromLeast) {
            for (int i = 0; i < chosen.length; i++) {
                put(open.get(i), chosen[i]);
            }
        }
    }

    private double settle() {
        double lowest = gm.of(totals);
        for (int round = 0; round < ROUNDS; round++) {
            double before = lowest;
            for (TankLoad load : open) {
                lowest = Math.min(lowest, worsen(load));
            }
            if (before - lowest < 1e-9) {
                break;
            }
        }
        return lowest;
    }

    /** Puts the worst volume in one tank and returns the corrected GM with it. */
    private double worsen(TankLoad load) {
        double best = load.volume();
        double lowest = gm.of(totals);
        for (double candidate : candidates(load)) {
            double value = with(load, candidate);
            if (value < lowest) {
                lowest = value;
                best = candidate;
            }
        }
        if (load.isOpen()) {
            best = refined(load, best);
        }
        return with(load, best);
    }

    private double with(TankLoad load, double volume) {
        put(load, volume);
        return gm.of(totals);
    }

    private void put(TankLoad load, double volume) {
        totals.add(load, -1);
        load.fill(volume, trim);
        totals.add(load, 1);
    }

    /** An interval has two ends. A tank without a reading has levels: evenly spread, those of its table, and just short of full. */
    private static double[] candidates(TankLoad load) {
        double low = load.range().low();
        double high = load.range().high();
        if (!load.isOpen()) {
            return new double[] {low, high};
        }
        Tank tank = load.tank();
        double nearlyFull = TankState.FULL_SHARE * tank.capacity() * (1 - 1e-9);
        VolumeTable table = tank.volumes();
        int rows = table == null ? 0 : table.volumes().size();
        double[] levels = new double[LEVELS + 2 + rows];
        for (int i = 0; i <= LEVELS; i++) {
            levels[i] = low + (high - low) * i / LEVELS;
        }
        levels[LEVELS + 1] = Math.min(high, Math.max(low, nearlyFull));
        for (int i = 0; i < rows && table != null; i++) {
            levels[LEVELS + 2 + i] =
                    Math.min(high, Math.max(low, table.volumes().value(i)));
        }
        return levels;
    }

    /** Golden section about the best level found, within the spacing of the levels looked at. */
    private double refined(TankLoad load, double best) {
        double spacing = (load.range().high() - load.range().low()) / LEVELS;
        double a = Math.max(load.range().low(), best - spacing);
        double b = Math.min(load.range().high(), best + spacing);
        double lowest = with(load, best);
        double found = best;
        while (b - a > 1e-6 * load.tank().capacity()) {
            double left = b - GOLDEN * (b - a);
            double right = a + GOLDEN * (b - a);
            double atLeft = with(load, left);
            double atRight = with(load, right);
            if (Math.min(atLeft, atRight) < lowest) {
                lowest = Math.min(atLeft, atRight);
                found = atLeft < atRight ? left : right;
            }
            if (atLeft < atRight) {
                b = right;
            } else {
                a = left;
            }
        }
        return found;
    }
}
