// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.table;

import java.util.Arrays;

/**
 * The ascending values along one side of a table. A value outside is taken at the nearest end: whoever reads a table asks
 * {@link #covers} first and says so.
 */
public final class Axis {
    private final double[] values;

    private Axis(double[] values) {
        this.values = values;
    }

    /**
     * From columns already read.
     *
     * @param values one or more finite values, strictly ascending
     * @throws IllegalArgumentException if there is none, or they do not ascend
     */
    public static Axis of(double... values) {
        if (values.length == 0) {
            throw new IllegalArgumentException("an axis needs at least one value");
        }
        for (int i = 0; i < values.length; i++) {
            if (!Double.isFinite(values[i]) || (i > 0 && values[i] <= values[i - 1])) {
                throw new IllegalArgumentException("axis values must ascend, found " + Arrays.toString(values));
            }
        }
        return new Axis(values.clone());
    }

    public int size() {
        return values.length;
    }

    public double value(int i) {
        return values[i];
    }

    public double first() {
        return values[0];
    }

    public double last() {
        return values[values.length - 1];
    }

    /** Whether {@code x} lies within the table, its ends included. */
    public boolean covers(double x) {
        return x >= first() && x <= last();
    }

    /** The index of the row at or below {@code x}, such that the row above exists too where there is more than one. */
    public int cell(double x) {
        int low = 0;
        int high = Math.max(0, values.length - 2);
        while (low < high) {
            int mid = (low + high + 1) >>> 1;
            if (values[mid] <= x) {
                low = mid;
            } else {
                high = mid - 1;
            }
        }
        return low;
    }

    /** How far {@code x} is from row {@code cell} to the next, 0 to 1; an end's value outside the table. */
    public double fraction(double x, int cell) {
        if (values.length == 1) {
            return 0;
        }
        double f = (x - values[cell]) / (values[cell + 1] - values[cell]);
        return Math.min(1, Math.max(0, f));
    }

    /** The index of the row above {@code cell}, or {@code cell} itself in a table of one row. */
    int above(int cell) {
        return Math.min(cell + 1, values.length - 1);
    }

    /** Linear reading of a column that belongs to this axis; the end's value outside. */
    double read(double[] column, double x) {
        int cell = cell(x);
        return lerp(column[cell], column[above(cell)], fraction(x, cell));
    }

    static double lerp(double a, double b, double f) {
        return a + (b - a) * f;
    }
}
