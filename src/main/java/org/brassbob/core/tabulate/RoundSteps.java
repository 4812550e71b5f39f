// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import java.math.BigDecimal;

/** Steps that people use in tables: 1, 2, 2.5 or 5 times a power of ten. */
final class RoundSteps {
    private static final double[] MANTISSAS = {1, 2, 2.5, 5, 10};

    private RoundSteps() {}

    /** The least such step that is not below a size. */
    static double atLeast(double size) {
        double power = Math.pow(10, Math.floor(Math.log10(size)));
        for (double mantissa : MANTISSAS) {
            double step = round(mantissa * power);
            if (step >= size * (1 - 1e-9)) {
                return step;
            }
        }
        return round(10 * power);
    }

    /** A multiple of a step without the dust of binary fractions. */
    static double multiple(int times, double step) {
        return BigDecimal.valueOf(step).multiply(BigDecimal.valueOf(times)).doubleValue();
    }

    private static double round(double value) {
        return new BigDecimal(value).round(new java.math.MathContext(6)).doubleValue();
    }
}
