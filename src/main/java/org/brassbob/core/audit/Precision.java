// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

/** How finely a column is written. */
final class Precision {
    private static final int MOST_DECIMALS = 6;

    private Precision() {}

    /** The unit of the last decimal that any value of a column uses. */
    static double of(double[] values) {
        double unit = 1;
        for (int decimals = 0; decimals < MOST_DECIMALS; decimals++) {
            if (allOn(values, unit)) {
                return unit;
            }
            unit /= 10;
        }
        return unit;
    }

    private static boolean allOn(double[] values, double unit) {
        for (double value : values) {
            double steps = value / unit;
            if (Math.abs(steps - Math.rint(steps)) > 1e-9 * Math.max(1, Math.abs(steps))) {
                return false;
            }
        }
        return true;
    }
}
