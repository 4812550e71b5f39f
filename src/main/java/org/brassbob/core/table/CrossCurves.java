// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.table;

import java.util.List;
import org.jspecify.annotations.Nullable;

/** Righting-lever cross curves (KN, about the keel) by displacement, and what the same table says of flooding and wind. */
public final class CrossCurves {
    private final Axis displacements;
    private final Axis heels;
    private final List<Row> rows;
    private final Origin origin;

    private CrossCurves(Axis displacements, Axis heels, List<Row> rows, Origin origin) {
        this.displacements = displacements;
        this.heels = heels;
        this.rows = rows;
        this.origin = origin;
    }

    /**
     * From columns already read.
     *
     * @param heels heel angles of the KN columns (°)
     * @param rows by rising displacement
     * @throws IllegalArgumentException if a row has not one KN for each heel, or displacements do not ascend
     */
    public static CrossCurves of(Axis heels, List<Row> rows, Origin origin) {
        if (rows.stream().anyMatch(r -> r.kn().size() != heels.size())) {
            throw new IllegalArgumentException("each row of " + origin + " needs a KN for each heel");
        }
        Axis displacements =
                Axis.of(rows.stream().mapToDouble(Row::displacement).toArray());
        return new CrossCurves(displacements, heels, List.copyOf(rows), origin);
    }

    public Axis displacements() {
        return displacements;
    }

    public Axis heels() {
        return heels;
    }

    public List<Row> rows() {
        return rows;
    }

    public Origin origin() {
        return origin;
    }

    /** KN (m) at a displacement (t) for the heel column {@code heel}; the end's value outside. */
    public double kn(double displacement, int heel) {
        int i = displacements.cell(displacement);
        double low = rows.get(i).kn().get(heel);
        double high = rows.get(displacements.above(i)).kn().get(heel);
        return Axis.lerp(low, high, displacements.fraction(displacement, i));
    }

    /**
     * One row.
     *
     * @param displacement t
     * @param kn m, one for each heel
     * @param floodingDeg angle of down-flooding (°), where given
     * @param windArea lateral area above water (m2), where given
     * @param windLever lever of the wind's force (m), where given
     */
    public record Row(
            double displacement,
            List<Double> kn,
            @Nullable Double floodingDeg,
            @Nullable Double windArea,
            @Nullable Double windLever) {
        public Row {
            kn = List.copyOf(kn);
        }
    }
}
