// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

/**
 * The hull of the demo tender as a formula. A waterline is a trapezoid aft, a rectangle amidships and a parabola forward, whose
 * breadth grows towards the deck and whose stem rakes; every integral over it is of a polynomial.
 */
final class TenderHull {
    static final double LENGTH = 38;
    static final double BREADTH = 9.2;
    static final double DEPTH = 3.6;

    private static final double DENSITY = 1.025;
    private static final double RUN = 4;
    private static final double SHOULDER = 26;
    private static final double STERN_SHARE = 0.6;
    private static final double FORWARD_AT_KEEL = 9.2;
    private static final double FINENESS = 0.35;

    /** Gauss's points and weights on 0 to 1: five of them, exact for polynomials to the ninth degree. */
    private static final double[][] GAUSS = {
        {0.046910077030668, 0.118463442528095},
        {0.230765344947158, 0.239314335249683},
        {0.5, 0.284444444444444},
        {0.769234655052842, 0.239314335249683},
        {0.953089922969332, 0.118463442528095}
    };

    private TenderHull() {}

    /** A waterline's area (m2), its moment about the aft perpendicular (m3), and its second moments along and across (m4). */
    private record Waterline(double area, double moment, double along, double across) {}

    private interface HalfBreadth {
        double at(double x);
    }

    /** hydrostatics.csv. */
    static CsvOut hydrostatics() {
        CsvOut out = CsvOut.table("draught_m,displacement_t,lcb_m,lcf_m,kmt_m,mct_tm_per_cm,tpc_t_per_cm,kb_m");
        for (int step = 4; step <= 17; step++) {
            out.numbers(row(0.2 * step));
        }
        return out;
    }

    /** KM (m) at a draught. */
    static double km(double draught) {
        return row(draught)[4];
    }

    /** Displacement (t) at a draught. */
    static double displacement(double draught) {
        return row(draught)[1];
    }

    private static double[] row(double draught) {
        double volume = 0;
        double momentX = 0;
        double momentZ = 0;
        for (double[] gauss : GAUSS) {
            double z = draught * gauss[0];
            Waterline at = waterline(z);
            volume += draught * gauss[1] * at.area;
            momentX += draught * gauss[1] * at.moment;
            momentZ += draught * gauss[1] * at.area * z;
        }
        Waterline top = waterline(draught);
        double lcf = top.moment / top.area;
        double along = top.along - top.area * lcf * lcf;
        double kb = momentZ / volume;
        return new double[] {
            draught,
            DENSITY * volume,
            momentX / volume,
            lcf,
            kb + top.across / volume,
            DENSITY * along / (100 * LENGTH),
            DENSITY * top.area / 100,
            kb
        };
    }

    private static Waterline waterline(double z) {
        double up = 1 - z / DEPTH;
        double half = BREADTH / 2 * (1 - FINENESS * up * up * up);
        double bow = FORWARD_AT_KEEL + z;
        Waterline aft = part(0, RUN, x -> half * (STERN_SHARE + (1 - STERN_SHARE) * x / RUN));
        Waterline middle = part(RUN, SHOULDER, x -> half);
        Waterline forward = part(SHOULDER, SHOULDER + bow, x -> half * (1 - Math.pow((x - SHOULDER) / bow, 2)));
        return new Waterline(
                aft.area + middle.area + forward.area,
                aft.moment + middle.moment + forward.moment,
                aft.along + middle.along + forward.along,
                aft.across + middle.across + forward.across);
    }

    private static Waterline part(double from, double to, HalfBreadth breadth) {
        double area = 0;
        double moment = 0;
        double along = 0;
        double across = 0;
        for (double[] gauss : GAUSS) {
            double x = from + (to - from) * gauss[0];
            double weight = (to - from) * gauss[1];
            double half = breadth.at(x);
            area += weight * 2 * half;
            moment += weight * 2 * half * x;
            along += weight * 2 * half * x * x;
            across += weight * 2 * half * half * half / 3;
        }
        return new Waterline(area, moment, along, across);
    }
}
