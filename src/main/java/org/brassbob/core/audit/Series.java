// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import java.util.Arrays;

/**
 * Finds a single mistyped value in a column that has no reference. An error e at one row bends the line before it by e/h, at it by −e(1/h
 * + 1/h'), after it by e/h': the slopes swing to and fro. A corner of a tank bends the line once, a jump twice. So e is read from all
 * three bends, and only where they agree in sign and stand out from the bends around is the row suspect.
 */
final class Series {
    private static final int WINDOW = 5;
    private static final double OUTSTANDING = 4;
    private static final double LEAST_UNITS = 3;

    /** Millimetres and litres: a column that happens to hold whole numbers is not therefore written to the metre. */
    private static final double FINEST = 0.001;

    private final double[] x;
    private final double[] bends;
    private final double unit;

    private Series(double[] x, double[] y, double unit) {
        this.x = x;
        this.unit = unit;
        this.bends = new double[x.length];
        for (int i = 1; i + 1 < x.length; i++) {
            bends[i] = (y[i + 1] - y[i]) / (x[i + 1] - x[i]) - (y[i] - y[i - 1]) / (x[i] - x[i - 1]);
        }
    }

    /** The size of the error at each row that is suspect; 0 where it isn't. */
    static double[] errors(double[] x, double[] y) {
        double[] errors = new double[x.length];
        if (x.length < 6) {
            return errors;
        }
        Series series = new Series(x, y, Math.min(FINEST, Precision.of(y)));
        for (int i = 2; i + 2 < x.length; i++) {
            errors[i] = series.errorAt(i);
        }
        for (int i = 2; i + 2 < x.length; i++) {
            // The neighbours of an error look like smaller ones.
            boolean neighbourIsWorse =
                    Math.abs(errors[i - 1]) > Math.abs(errors[i]) || Math.abs(errors[i + 1]) > Math.abs(errors[i]);
            if (neighbourIsWorse) {
                errors[i] = 0;
            }
        }
        return errors;
    }

    private double errorAt(int i) {
        double before = x[i] - x[i - 1];
        double after = x[i + 1] - x[i];
        double trend = trend(i);
        double e1 = (bends[i - 1] - trend) * before;
        double e2 = -(bends[i] - trend) / (1 / before + 1 / after);
        double e3 = (bends[i + 1] - trend) * after;
        boolean agree = Math.signum(e1) == Math.signum(e2) && Math.signum(e2) == Math.signum(e3);
        double size = Math.min(Math.abs(e1), Math.min(Math.abs(e2), Math.abs(e3)));
        double noise = spread(i, trend) * Math.min(before, after);
        return agree && size > LEAST_UNITS * unit && size > OUTSTANDING * noise ? Math.copySign(size, e2) : 0;
    }

    private double trend(int i) {
        return median(around(i));
    }

    /** How much the bends around usually differ from their trend: the greater of the two sides' middles. */
    private double spread(int i, double trend) {
        double[] away = Arrays.stream(around(i)).map(b -> Math.abs(b - trend)).toArray();
        Arrays.sort(away);
        return away.length == 0 ? Double.POSITIVE_INFINITY : away[(3 * (away.length - 1)) / 4];
    }

    /** The bends on both sides, without the three that an error at i would make. */
    private double[] around(int i) {
        double[] around = new double[2 * WINDOW];
        int n = 0;
        for (int k = Math.max(1, i - WINDOW - 1); k <= Math.min(x.length - 2, i + WINDOW + 1); k++) {
            if (Math.abs(k - i) > 1) {
                around[n++] = bends[k];
            }
        }
        return Arrays.copyOf(around, n);
    }

    private static double median(double[] values) {
        double[] sorted = values.clone();
        Arrays.sort(sorted);
        return sorted.length == 0 ? 0 : sorted[sorted.length / 2];
    }
}
