// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import static org.brassbob.core.audit.Findings.show;

import java.util.Arrays;
import java.util.function.ToDoubleFunction;
import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.Bounds;
import org.brassbob.core.geometry.Immersed;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.table.VolumeTable;
import org.brassbob.core.table.VolumeTable.Entry;
import org.brassbob.core.vessel.Tank;
import org.jspecify.annotations.Nullable;

/** Holds a volume table against the shape; without one, against itself. Either way its layers must lie where liquid can. */
final class VolumeCheck {
    private static final double NEXT_TO_NOTHING = 1e-6;

    /** What a cell may be off by because volumes are rounded too: the shape's own change over half a unit of volume. */
    private static final double HALF = 0.505;

    /** MSC.1/Circ.1229 section 4: centroids of compartments within 5 cm, free-surface moments within 2 %. */
    private static final double CENTROID_TOLERANCE = 0.05;

    private static final double MOMENT_TOLERANCE = 0.02;

    private final Tank tank;
    private final VolumeTable table;
    private final Findings findings;
    private final double[] volumes;

    private VolumeCheck(Tank tank, VolumeTable table, Findings findings) {
        this.tank = tank;
        this.table = table;
        this.findings = findings;
        this.volumes = new double[table.volumes().size()];
        for (int i = 0; i < volumes.length; i++) {
            volumes[i] = table.volumes().value(i);
        }
    }

    static void check(Tank tank, @Nullable NetShape shape, Findings findings) {
        VolumeTable table = tank.volumes();
        if (table == null) {
            return;
        }
        VolumeCheck check = new VolumeCheck(tank, table, findings);
        check.layersRise();
        if (shape != null) {
            check.againstShape(shape);
            check.againstBox(shape.solid().bounds());
        } else {
            check.againstItself();
        }
    }

    private double[] column(ToDoubleFunction<Entry> part) {
        double[] column = new double[volumes.length];
        for (int i = 0; i < column.length; i++) {
            column[i] = part.applyAsDouble(table.row(i));
        }
        return column;
    }

    private void againstShape(NetShape shape) {
        Immersed[] held = new Immersed[volumes.length];
        double least = NEXT_TO_NOTHING * shape.capacity();
        for (int i = 0; i < held.length; i++) {
            double volume = Math.min(Math.max(volumes[i], least), shape.capacity() - least);
            held[i] = shape.holding(Attitude.UPRIGHT, volume);
        }
        compare("lcg_m", column(Entry::lcg), held, Immersed::lcg);
        compare("tcg_m", column(Entry::tcg), held, Immersed::tcg);
        compare("vcg_m", column(Entry::vcg), held, Immersed::vcg);
        compare("fs_m4", column(Entry::secondMoment), held, i -> i.surface().transverse());
    }

    private void compare(String name, double[] column, Immersed[] held, ToDoubleFunction<Immersed> part) {
        double[] reference = new double[column.length];
        for (int i = 0; i < reference.length; i++) {
            reference[i] = part.applyAsDouble(held[i]);
        }
        Residuals residuals = Residuals.of(column, reference, 1e-9);
        for (int i = 0; i < column.length; i++) {
            if (residuals.standsOut(i)) {
                report(i, name + " against the shape, at " + show(volumes[i]) + " m3", column[i], show(reference[i]));
            }
        }
    }

    private void againstBox(Bounds box) {
        double length = box.maxX() - box.minX();
        double breadth = box.maxY() - box.minY();
        double most = length * breadth * breadth * breadth / 12;
        for (int i = 0; i < volumes.length; i++) {
            double moment = table.row(i).secondMoment();
            if (moment > most * 1.001 + HALF) {
                report(i, "fs_m4", moment, "at the most l·b³/12 = " + show(most) + " of the tank's box");
            }
        }
    }

    /** V·vcg rises from row to row by the height of the layer between; each layer lies above the one before. */
    private void layersRise() {
        double unit = Precision.of(column(Entry::vcg));
        double before = Double.NEGATIVE_INFINITY;
        for (int i = 1; i < volumes.length; i++) {
            Entry low = table.row(i - 1);
            Entry high = table.row(i);
            double layer = volumes[i] - volumes[i - 1];
            double height = (volumes[i] * high.vcg() - volumes[i - 1] * low.vcg()) / layer;
            double rounding = HALF * unit * (volumes[i] + volumes[i - 1]) / layer;
            if (height + rounding < before) {
                report(
                        i,
                        "vcg_m: the layer between this row and the one before lies lower than the layer under it",
                        high.vcg(),
                        "a layer above " + show(before) + " m, found " + show(height) + " m");
            }
            before = height - rounding;
        }
    }

    private void againstItself() {
        series("lcg_m", column(Entry::lcg), CENTROID_TOLERANCE);
        series("tcg_m", column(Entry::tcg), CENTROID_TOLERANCE);
        series("vcg_m", column(Entry::vcg), CENTROID_TOLERANCE);
        double[] moments = column(Entry::secondMoment);
        series("fs_m4", moments, MOMENT_TOLERANCE * Arrays.stream(moments).max().orElse(0));
    }

    private void series(String name, double[] column, double tolerance) {
        double[] errors = Series.errors(volumes, column);
        for (int i = 0; i < errors.length; i++) {
            if (errors[i] != 0) {
                findings.doubt(
                        Math.abs(errors[i]) > tolerance,
                        table.origin(),
                        i,
                        name + " out of line with its neighbours in " + tank.id(),
                        show(column[i]),
                        "about " + show(column[i] - errors[i]));
            }
        }
    }

    private void report(int row, String what, double figure, String expected) {
        findings.error(table.origin(), row, what + " in " + tank.id(), show(figure), expected);
    }
}
