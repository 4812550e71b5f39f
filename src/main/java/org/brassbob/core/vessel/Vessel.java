// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.vessel;

import java.util.List;
import java.util.Optional;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.table.CrossCurves;
import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.table.LimitCurve;
import org.jspecify.annotations.Nullable;

/**
 * One ship, as her vessel folder describes her.
 *
 * @param id short id
 * @param name her name
 * @param particulars main dimensions
 * @param lightship light ship
 * @param seaDensity the density (t/m3) that the hydrostatic table is made for
 * @param draughtMarks the marks, aft to forward
 * @param policy the ship's own limits
 * @param sources where each table came from
 * @param hydrostatics hydrostatic particulars; may be missing where the hull shape is given
 * @param limitCurves required GM or permissible KG, the first being the one in force where none is named
 * @param crossCurves KN, where given
 * @param weights cargo, stores, constant
 * @param liquids all liquids
 * @param tanks all spaces, in the order of the walk
 * @param hull the moulded half hull (y at or above 0, to be mirrored), where given
 * @param dataSha256 SHA-256 over the folder's files, in lower-case hexadecimal
 */
public record Vessel(
        String id,
        String name,
        Particulars particulars,
        MassPoint lightship,
        double seaDensity,
        List<DraughtMark> draughtMarks,
        Policy policy,
        List<String> sources,
        @Nullable HydrostaticTable hydrostatics,
        List<LimitCurve> limitCurves,
        @Nullable CrossCurves crossCurves,
        List<Weight> weights,
        List<Liquid> liquids,
        List<Tank> tanks,
        @Nullable SpaceShape hull,
        String dataSha256) {
    public Vessel {
        draughtMarks = List.copyOf(draughtMarks);
        sources = List.copyOf(sources);
        limitCurves = List.copyOf(limitCurves);
        weights = List.copyOf(weights);
        liquids = List.copyOf(liquids);
        tanks = List.copyOf(tanks);
    }

    public Optional<Tank> tank(String tankId) {
        return tanks.stream().filter(t -> t.id().equals(tankId)).findFirst();
    }

    public Optional<LimitCurve> limitCurve(String curveName) {
        return limitCurves.stream().filter(c -> c.name().equals(curveName)).findFirst();
    }
}
