// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.Immersed;
import org.brassbob.core.geometry.Solid;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.CrossCurves;
import org.brassbob.core.table.Origin;

/**
 * Righting-lever cross curves of a hull, free to trim: at each heel the surface is the one with the displacement's volume below it and
 * the centre of buoyancy as far forward as on even keel and upright, so that heeling brings no trimming moment.
 *
 * <p>KN is the distance, square to the upright and to the fore-and-aft line in the surface, from the keel point under that centre to
 * the vertical through the centre of buoyancy B. With the surface's slopes p (trim) and q = tan φ, and c² = 1/(1 + p²), that is
 * {@code KN = (yB + c²·q·zB)/√(1 + c²·q²)}; without trim, {@code yB·cos φ + zB·sin φ}.
 */
public final class CrossCurveMaker {
    /** Beyond any trim: with the surface all but athwart, the centre of buoyancy is as far aft, or forward, as it can be. */
    private static final double STEEPEST_TRIM = 1000;

    private static final double SETTLED = 1e-9;

    private final Solid hull;
    private final double density;

    /**
     * For a hull.
     *
     * @param hull both sides of it, up to the deck that counts as watertight
     * @param density of the water (t/m3)
     */
    public CrossCurveMaker(Solid hull, double density) {
        this.hull = hull;
        this.density = density;
    }

    /**
     * The curves.
     *
     * @param displacements t
     * @param heels °, above 0 and below 90
     */
    public CrossCurves curves(Axis displacements, Axis heels) {
        List<CrossCurves.Row> rows = new ArrayList<>();
        for (int d = 0; d < displacements.size(); d++) {
            List<Double> kn = new ArrayList<>();
            for (int h = 0; h < heels.size(); h++) {
                kn.add(kn(displacements.value(d), heels.value(h)));
            }
            rows.add(new CrossCurves.Row(displacements.value(d), kn, null, null, null));
        }
        return CrossCurves.of(heels, rows, Origin.computed("tabulated from the hull"));
    }

    /** KN (m) at a displacement (t) and heel (°). */
    public double kn(double displacement, double heelDeg) {
        double volume = displacement / density;
        double lcb = at(volume, Attitude.UPRIGHT).lcg();
        double q = Math.tan(Math.toRadians(heelDeg));
        double p = balancingTrim(volume, lcb, q);
        Immersed below = at(volume, new Attitude(p, q));
        double c2q = q / (1 + p * p);
        return (below.tcg() + c2q * below.vcg()) / Math.sqrt(1 + c2q * q);
    }

    /** The trim slope that keeps the centre of buoyancy in its place lengthwise: it moves aft as the stern goes down. */
    private double balancingTrim(double volume, double lcb, double heelSlope) {
        double low = -STEEPEST_TRIM;
        double high = STEEPEST_TRIM;
        double p = 0;
        double error = lcb(volume, p, heelSlope) - lcb;
        double nextP = 0.001;
        for (int i = 0; i < 200 && Math.abs(error) > SETTLED && high - low > 1e-15; i++) {
            if (error > 0) {
                low = p;
            } else {
                high = p;
            }
            if (!(nextP > low && nextP < high)) {
                nextP = (low + high) / 2;
            }
            double nextError = lcb(volume, nextP, heelSlope) - lcb;
            double secant = nextP - nextError * (nextP - p) / (nextError - error);
            p = nextP;
            error = nextError;
            nextP = secant;
        }
        return p;
    }

    private double lcb(double volume, double trimSlope, double heelSlope) {
        return at(volume, new Attitude(trimSlope, heelSlope)).lcg();
    }

    private Immersed at(double volume, Attitude attitude) {
        return hull.below(attitude, hull.heightFor(attitude, volume));
    }
}
