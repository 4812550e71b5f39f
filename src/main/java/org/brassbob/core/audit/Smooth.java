// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import java.util.Arrays;

/**
 * Finds single mistyped values in a column that is smooth, as hydrostatics are: each value is held against the cubic through its
 * neighbours, and is suspect where it misses that by far more than values some rows away miss theirs.
 */
final class Smooth {
    private static final int LEAST_ROWS = 9;
    private static final double OUTSTANDING = 8;

    /** The first and last rows are held against a cubic that only reaches them from one side. */
    private static final double OUTSTANDING_AT_ENDS = 40;

    private static final double LEAST_UNITS = 1.5;

    private final double[] x;
    private final double[] y;
    private final double[] misses;

    private Smooth(double[] x, double[] y) {
        this.x = x;
        this.y = y;
        misses = new double[x.length];
        for (int i = 0; i < x.length; i++) {
            misses[i] = y[i] - fromNeighbours(x, y, i);
        }
    }

    /**
     * The size of the error at each row that is suspect; 0 where it isn't.
     *
     * @param unit the unit of the column's last decimal
     */
    static double[] errors(double[] x, double[] y, double unit) {
        double[] errors = new double[x.length];
        if (x.length < LEAST_ROWS) {
            return errors;
        }
        Smooth smooth = new Smooth(x, y);
        for (int i = 0; i < x.length; i++) {
            double factor = i < 2 || i >= x.length - 2 ? OUTSTANDING_AT_ENDS : OUTSTANDING;
            double miss = Math.abs(smooth.misses[i]);
            if (miss > factor * smooth.usualAwayFrom(i) + LEAST_UNITS * unit && smooth.isCulprit(i)) {
                errors[i] = smooth.misses[i];
            }
        }
        return errors;
    }

    /** Whether putting the value right would settle its neighbours too, and better than putting any of them right would. */
    private boolean isCulprit(int i) {
        double left = energyWithout(i);
        for (int k = Math.max(0, i - 2); k <= Math.min(misses.length - 1, i + 2); k++) {
            if (k != i && energyWithout(k) < left) {
                return false;
            }
        }
        return true;
    }

    /** What the rows about a place would still miss by, squared and summed, if the value there were the one of its cubic. */
    private double energyWithout(int i) {
        double[] mended = y.clone();
        mended[i] -= misses[i];
        double energy = 0;
        for (int k = Math.max(0, i - 4); k <= Math.min(misses.length - 1, i + 4); k++) {
            double miss = mended[k] - fromNeighbours(x, mended, k);
            energy += miss * miss;
        }
        return energy;
    }

    /** The middle of what values near, but not so near that an error here would show in them, miss by. */
    private double usualAwayFrom(int i) {
        double[] away = new double[misses.length];
        int n = 0;
        for (int distance = 3; distance < misses.length && n < 6; distance++) {
            for (int k : new int[] {i - distance, i + distance}) {
                if (k >= 2 && k < misses.length - 2) {
                    away[n++] = Math.abs(misses[k]);
                }
            }
        }
        double[] sorted = Arrays.copyOf(away, n);
        Arrays.sort(sorted);
        return n == 0 ? Double.POSITIVE_INFINITY : sorted[n - 1 - n / 4];
    }

    /** The cubic through the four nearest other rows, at row i (Lagrange). */
    private static double fromNeighbours(double[] x, double[] y, int i) {
        int first = Math.min(Math.max(0, i - 2), x.length - 5);
        double value = 0;
        for (int k = first; k < first + 5; k++) {
            if (k == i) {
                continue;
            }
            double weight = 1;
            for (int m = first; m < first + 5; m++) {
                if (m != i && m != k) {
                    weight *= (x[i] - x[m]) / (x[k] - x[m]);
                }
            }
            value += weight * y[k];
        }
        return value;
    }
}
