// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.vessel;

import java.util.List;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.table.Origin;
import org.brassbob.core.table.SoundingTable;
import org.brassbob.core.table.VolumeTable;
import org.jspecify.annotations.Nullable;

/**
 * One row of tanks.csv with the tables and the shape that belong to it.
 *
 * @param id short id, unique
 * @param name as painted on the sounding pipe cap
 * @param liquid what it normally holds
 * @param mayHold other liquids it may hold
 * @param walk its place in the order of the round
 * @param gauge how it is usually read
 * @param pipe its sounding pipe, where it has one
 * @param capacity 100 % volume (m3), net of structure and of enclosed tanks
 * @param fillLimitPct the most it may be filled in service, per cent of capacity
 * @param residue what stripping leaves (m3): at or under it the tank counts as empty
 * @param use fixed or consumable
 * @param pair id of its mirror tank, where it has one
 * @param encloses ids of tanks that stand inside this one
 * @param steelPct structure inside the shape, per cent of its gross volume
 * @param rateM3PerHour usual pumping rate, where given
 * @param space tank or void
 * @param soundings calibration by sounding or ullage, where given
 * @param volumes centroid and free surface by volume, where given
 * @param shape its shape, where given
 * @param origin the file and line of its row
 */
public record Tank(
        String id,
        String name,
        Liquid liquid,
        List<Liquid> mayHold,
        int walk,
        Gauge gauge,
        @Nullable Pipe pipe,
        double capacity,
        double fillLimitPct,
        double residue,
        Use use,
        @Nullable String pair,
        List<String> encloses,
        double steelPct,
        @Nullable Double rateM3PerHour,
        SpaceKind space,
        @Nullable SoundingTable soundings,
        @Nullable VolumeTable volumes,
        @Nullable SpaceShape shape,
        Origin origin) {
    public Tank {
        mayHold = List.copyOf(mayHold);
        encloses = List.copyOf(encloses);
    }

    public boolean isVoid() {
        return space == SpaceKind.VOID;
    }

    /** The greatest volume allowed in service (m3). */
    public double fillLimit() {
        return capacity * fillLimitPct / 100;
    }
}
