// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

/** List and loll of a ship taken as wall-sided about the waterline. */
final class Heel {
    private Heel() {}

    /**
     * Angle of loll (°): {@code tan φ = √(−2·GM/BM)}.
     *
     * @return 0 where GM is not negative; NaN where BM is unknown
     */
    static double lollDeg(double gm, double bm) {
        return gm >= 0 ? 0 : Math.toDegrees(Math.atan(Math.sqrt(-2 * gm / bm)));
    }

    /**
     * List (°): {@code tan φ = TCG/GM} where GM is positive. Otherwise the angle at which the wall-sided lever
     * {@code (GM + ½·BM·tan²φ)·sin φ} carries {@code TCG·cos φ}, on the side of TCG, to starboard where that is 0.
     *
     * @return NaN where GM is not positive and BM is unknown
     */
    static double listDeg(double tcg, double gm, double bm) {
        if (gm > 0) {
            return Math.toDegrees(Math.atan(tcg / gm));
        }
        if (!(bm > 0)) {
            return Double.NaN;
        }
        double side = tcg < 0 ? -1 : 1;
        return side * Math.toDegrees(Math.atan(outermostRoot(Math.abs(tcg), gm, bm)));
    }

    /** The greatest t with {@code ½·BM·t³ + GM·t = tcg}, for GM at or below 0 and tcg at or above 0: Newton's steps from beyond it. */
    private static double outermostRoot(double tcg, double gm, double bm) {
        double t = Math.sqrt(-2 * gm / bm) + Math.cbrt(2 * tcg / bm) + 1e-9;
        for (int i = 0; i < 100; i++) {
            double value = 0.5 * bm * t * t * t + gm * t - tcg;
            double slope = 1.5 * bm * t * t + gm;
            double next = t - value / slope;
            if (!(next < t)) {
                return t;
            }
            t = next;
        }
        return t;
    }
}
