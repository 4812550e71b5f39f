// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import java.util.TreeSet;
import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.Immersed;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.Origin;
import org.brassbob.core.table.VolumeTable;

/**
 * Makes a tank's volume table from its shape, upright. Rows stand where the surface passes a corner of the shape, on both sides of it
 * where the surface jumps there, and are halved in between until linear reading is near enough: within 2 mm of a centroid and half a
 * per cent of the greatest second moment, as judged halfway. Rows stand no closer than a four-hundredth of the capacity, so that near
 * a point at the bottom, where the centroid runs ahead of the volume, its moment is near and the centroid itself may be off by centimetres.
 *
 * <p>The first and the last row hold what the figures tend to as the tank runs dry and fills up, where there still is a surface; a tank
 * that is full has none.
 */
public final class VolumeTableMaker {
    /** Linear reading is near enough within this of a centroid (m). */
    private static final double CENTROID_TOLERANCE = 0.002;

    /** Linear reading is near enough within this share of the greatest second moment. */
    private static final double MOMENT_TOLERANCE = 0.005;

    /** Either side of a corner (m). */
    private static final double NEAR = 1e-6;

    private static final int FIRST_ROWS = 8;
    private static final int DEEPEST = 5;

    /** The step of a volume in the file (m3): rows stand on it and at least two of it apart. */
    private static final double VOLUME_STEP = 0.001;

    private final NetShape shape;
    private final double scale;
    private final TreeSet<Double> volumes = new TreeSet<>();

    private VolumeTableMaker(NetShape shape) {
        this.shape = shape;
        double greatest = 0;
        for (int i = 1; i < 20; i++) {
            greatest =
                    Math.max(greatest, at(shape.capacity() * i / 20).surface().transverse());
        }
        this.scale = greatest;
    }

    /** The table of a shape. */
    public static VolumeTable of(NetShape shape, String name) {
        return new VolumeTableMaker(shape).table(name);
    }

    private VolumeTable table(String name) {
        addFirstRows();
        Double[] first = volumes.toArray(new Double[0]);
        for (int i = 0; i + 1 < first.length; i++) {
            refine(first[i], first[i + 1], 0);
        }
        double[] rows = volumes.stream().mapToDouble(v -> v).toArray();
        int n = rows.length;
        double[] lcg = new double[n];
        double[] tcg = new double[n];
        double[] vcg = new double[n];
        double[] second = new double[n];
        for (int i = 0; i < n; i++) {
            Immersed held = at(rows[i]);
            lcg[i] = held.lcg();
            tcg[i] = held.tcg();
            vcg[i] = held.vcg();
            second[i] = held.surface().transverse();
        }
        return VolumeTable.of(Axis.of(rows), lcg, tcg, vcg, second, Origin.computed("tabulated from " + name));
    }

    private void addFirstRows() {
        double capacity = shape.capacity();
        add(0);
        add(capacity);
        double[] corners = shape.solid().cornerHeights(Attitude.UPRIGHT);
        for (double height : corners) {
            if (jumpsAt(height)) {
                addBesideJump(shape.volumeBelow(Attitude.UPRIGHT, height));
            }
        }
        for (double height : corners) {
            add(shape.volumeBelow(Attitude.UPRIGHT, height));
        }
        for (int i = 1; i < FIRST_ROWS; i++) {
            add(capacity * i / FIRST_ROWS);
        }
    }

    private boolean jumpsAt(double height) {
        double below = shape.below(Attitude.UPRIGHT, height - NEAR).surface().transverse();
        double above = shape.below(Attitude.UPRIGHT, height + NEAR).surface().transverse();
        return Math.abs(above - below) > MOMENT_TOLERANCE * scale;
    }

    /** Rounding must not carry a row over to the other side of the jump: the next steps of volume but one, down and up. */
    private void addBesideJump(double volume) {
        double step = volume / VOLUME_STEP;
        if (volume > 0 && volume < shape.capacity()) {
            add((Math.ceil(step - 1e-6) - 2) * VOLUME_STEP);
            add((Math.floor(step + 1e-6) + 2) * VOLUME_STEP);
        }
    }

    private void refine(double low, double high, int depth) {
        double middle = onStep((low + high) / 2);
        if (depth == DEEPEST || high - low < Math.max(8 * VOLUME_STEP, shape.capacity() / 400)) {
            return;
        }
        Immersed a = at(low);
        Immersed b = at(high);
        Immersed m = at(middle);
        boolean near = Math.abs(m.lcg() - (a.lcg() + b.lcg()) / 2) <= CENTROID_TOLERANCE
                && Math.abs(m.tcg() - (a.tcg() + b.tcg()) / 2) <= CENTROID_TOLERANCE
                && Math.abs(m.vcg() - (a.vcg() + b.vcg()) / 2) <= CENTROID_TOLERANCE
                && Math.abs(m.surface().transverse()
                                - (a.surface().transverse() + b.surface().transverse()) / 2)
                        <= MOMENT_TOLERANCE * scale;
        if (!near) {
            add(middle);
            refine(low, middle, depth + 1);
            refine(middle, high, depth + 1);
        }
    }

    private void add(double volume) {
        double rounded = onStep(Math.max(0, Math.min(volume, shape.capacity())));
        Double before = volumes.floor(rounded);
        Double after = volumes.ceiling(rounded);
        boolean apart = (before == null || rounded - before > 2.5 * VOLUME_STEP)
                && (after == null || after - rounded > 2.5 * VOLUME_STEP);
        if (apart) {
            volumes.add(rounded);
        }
    }

    private static double onStep(double volume) {
        return Math.rint(volume / VOLUME_STEP) / Math.rint(1 / VOLUME_STEP);
    }

    /** What a volume makes; next to nothing and next to full stand for the limits, where the surface still is one. */
    private Immersed at(double volume) {
        double least = 1e-6 * shape.capacity();
        return shape.holding(Attitude.UPRIGHT, Math.min(Math.max(volume, least), shape.capacity() - least));
    }
}
