// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.contents;

import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.table.VolumeTable;

/** The greatest transverse second moment that a free surface reaches between two volumes. */
final class SurfaceRange {
    /** Samples between two corner heights; between them the second moment has at the most a few turns. */
    private static final int SAMPLES = 4;

    private static final double GOLDEN = (Math.sqrt(5) - 1) / 2;

    private SurfaceRange() {}

    /** From a table, which is linear between its rows: the greatest is at a row or at an end of the range. */
    static double greatest(VolumeTable table, double low, double high) {
        double greatest = Math.max(table.at(low).secondMoment(), table.at(high).secondMoment());
        for (int i = 0; i < table.volumes().size(); i++) {
            double v = table.volumes().value(i);
            if (v > low && v < high) {
                greatest = Math.max(greatest, table.row(i).secondMoment());
            }
        }
        return greatest;
    }

    /**
     * From a shape, at an attitude: between the heights at which the surface passes corners of the skin, its outline moves evenly and
     * the second moment is smooth; each such stretch is sampled and the best sample refined by golden section.
     */
    static double greatest(NetShape shape, Attitude attitude, double low, double high) {
        double from = shape.heightFor(attitude, low);
        double to = shape.heightFor(attitude, high);
        double greatest = Math.max(at(shape, attitude, from), at(shape, attitude, to));
        double start = from;
        for (double corner : shape.solid().cornerHeights(attitude)) {
            if (corner > start) {
                double end = Math.min(corner, to);
                greatest = Math.max(greatest, within(shape, attitude, start, end));
                start = end;
            }
            if (corner >= to) {
                break;
            }
        }
        return greatest;
    }

    private static double within(NetShape shape, Attitude attitude, double start, double end) {
        double step = (end - start) / SAMPLES;
        double best = Double.NEGATIVE_INFINITY;
        double at = start;
        for (int i = 0; i <= SAMPLES; i++) {
            // Just inside the ends, where a flat of the skin may make the surface jump.
            double height = Math.min(Math.max(start + i * step, start + 1e-9), end - 1e-9);
            double moment = at(shape, attitude, height);
            if (moment > best) {
                best = moment;
                at = height;
            }
        }
        return Math.max(best, refined(shape, attitude, Math.max(start, at - step), Math.min(end, at + step)));
    }

    private static double refined(NetShape shape, Attitude attitude, double start, double end) {
        double a = start;
        double b = end;
        double best = Double.NEGATIVE_INFINITY;
        while (b - a > 1e-4) {
            double left = b - GOLDEN * (b - a);
            double right = a + GOLDEN * (b - a);
            double atLeft = at(shape, attitude, left);
            double atRight = at(shape, attitude, right);
            best = Math.max(best, Math.max(atLeft, atRight));
            if (atLeft > atRight) {
                b = right;
            } else {
                a = left;
            }
        }
        return best;
    }

    private static double at(NetShape shape, Attitude attitude, double height) {
        return shape.below(attitude, height).surface().transverse();
    }
}
