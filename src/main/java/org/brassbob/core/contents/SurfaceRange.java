// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.contents;

import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.LiquidSurface;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.table.VolumeTable;

/** The greatest transverse second moment that a free surface reaches between two volumes. */
final class SurfaceRange {
    /** Where between two corner heights the surface is taken: inside the ends, where a flat of the skin may make it jump. */
    private static final double[] NODES = {0.03, 0.25, 0.5, 0.75, 0.97};

    private static final int STEPS = 32;

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
     * From a shape, at an attitude without heel. Between the heights at which the surface passes corners of the skin, its outline
     * moves evenly: area, first and second moment are polynomials of the height, of the second, third and fourth degree. Five
     * surfaces give all three of them, and with them the second moment at any height between.
     */
    static double greatest(NetShape shape, Attitude attitude, double low, double high) {
        double from = shape.heightFor(attitude, low);
        double to = shape.heightFor(attitude, high);
        double greatest = Math.max(
                shape.below(attitude, from).surface().transverse(),
                shape.below(attitude, to).surface().transverse());
        double start = from;
        for (double corner : shape.solid().cornerHeights(attitude)) {
            double end = Math.min(corner, to);
            if (end > start) {
                greatest = within(shape, attitude, start, end, greatest);
                start = end;
            }
        }
        return greatest;
    }

    /** The greater of a moment already known and the greatest in the stretch. */
    private static double within(NetShape shape, Attitude attitude, double start, double end, double known) {
        double[] area = new double[NODES.length];
        double[] first = new double[NODES.length];
        double[] second = new double[NODES.length];
        for (int i = 0; i < NODES.length; i++) {
            LiquidSurface surface =
                    shape.below(attitude, start + NODES[i] * (end - start)).surface();
            if (surface.area() > 0) {
                area[i] = surface.area();
                first[i] = surface.area() * surface.y();
                second[i] = surface.transverse() + first[i] * surface.y();
            }
        }
        return greatest(
                Quartic.through(NODES, area), Quartic.through(NODES, first), Quartic.through(NODES, second), known);
    }

    /** Looks along the stretch and, where it comes near what is known, refines the best place by ever smaller steps. */
    private static double greatest(Quartic area, Quartic first, Quartic second, double known) {
        double best = Double.NEGATIVE_INFINITY;
        double at = 0;
        double centre = 0.5;
        for (double width = 1; width > 1e-6 && (width == 1 || best > 0.9 * known); width *= 4.0 / STEPS) {
            for (int i = 0; i <= STEPS; i++) {
                double s = Math.min(1, Math.max(0, centre + width * ((double) i / STEPS - 0.5)));
                double a = area.at(s);
                double m = first.at(s);
                double moment = a > 0 ? second.at(s) - m * m / a : 0;
                if (moment > best) {
                    best = moment;
                    at = s;
                }
            }
            centre = at;
        }
        return Math.max(known, best);
    }
}
