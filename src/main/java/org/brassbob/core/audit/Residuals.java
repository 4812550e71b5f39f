// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import java.util.Arrays;

/** The differences between a column and its reference, and which of them stand out. */
final class Residuals {
    /** A column that nine in ten times keeps within half a unit of its last decimal was rounded from the reference. */
    private static final double USUAL_SHARE = 0.9;

    private static final double ROUNDED = 0.505;

    /** How far beyond the usual difference of a rough table a cell stands out. */
    private static final double OUTSTANDING = 4;

    private final double[] differences;
    private final double limit;
    private final double usual;

    private Residuals(double[] differences, double limit, double usual) {
        this.differences = differences;
        this.limit = limit;
        this.usual = usual;
    }

    /**
     * Of a column and its reference.
     *
     * @param slack what the reference itself may be off by beyond rounding, in each cell
     */
    static Residuals of(double[] column, double[] reference, double slack) {
        double unit = Precision.of(column);
        double[] differences = new double[column.length];
        double[] sizes = new double[column.length];
        for (int i = 0; i < column.length; i++) {
            differences[i] = column[i] - reference[i];
            sizes[i] = Math.abs(differences[i]);
        }
        Arrays.sort(sizes);
        double usual = sizes.length == 0 ? 0 : sizes[(int) (USUAL_SHARE * (sizes.length - 1))];
        double limit = usual <= ROUNDED * unit + slack ? ROUNDED * unit + slack : OUTSTANDING * usual;
        return new Residuals(differences, limit, usual);
    }

    boolean standsOut(int i) {
        return Math.abs(differences[i]) > limit;
    }

    /** What nine in ten differences stay within. */
    double usual() {
        return usual;
    }
}
