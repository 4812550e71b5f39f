// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

/**
 * A smooth curve through given points that runs level at a peak and never overshoots: piecewise cubic with the slopes of Fritsch and
 * Carlson, "Monotone piecewise cubic interpolation", SIAM J. Numer. Anal. 17 (1980), as harmonic means.
 */
final class Curve {
    private final double[] x;
    private final double[] y;
    private final double[] slope;

    private Curve(double[] x, double[] y) {
        this.x = x;
        this.y = y;
        this.slope = new double[x.length];
        for (int i = 1; i + 1 < x.length; i++) {
            double before = secant(i - 1);
            double after = secant(i);
            slope[i] = before * after <= 0 ? 0 : 2 * before * after / (before + after);
        }
        slope[0] = secant(0);
        slope[x.length - 1] = secant(x.length - 2);
    }

    /** Through points given as x, y, x, y, … by ascending x. */
    static Curve through(double... pairs) {
        double[] x = new double[pairs.length / 2];
        double[] y = new double[x.length];
        for (int i = 0; i < x.length; i++) {
            x[i] = pairs[2 * i];
            y[i] = pairs[2 * i + 1];
        }
        return new Curve(x, y);
    }

    private double secant(int i) {
        return (y[i + 1] - y[i]) / (x[i + 1] - x[i]);
    }

    double at(double place) {
        int i = 0;
        while (i + 2 < x.length && place >= x[i + 1]) {
            i++;
        }
        double h = x[i + 1] - x[i];
        double t = (place - x[i]) / h;
        double u = 1 - t;
        return u * u * (1 + 2 * t) * y[i]
                + t * t * (1 + 2 * u) * y[i + 1]
                + h * t * u * (u * slope[i] - t * slope[i + 1]);
    }
}
