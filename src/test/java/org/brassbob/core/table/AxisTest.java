// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.table;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class AxisTest {
    private final Axis axis = Axis.of(1, 2, 4, 8);
    private final double[] column = {10, 30, 20, 60};

    @ParameterizedTest
    @CsvSource({
        // outside and at the lower end
        "-5, 0, 1, 0, 10",
        "0.999999, 0, 1, 0, 10",
        "1, 0, 1, 0, 10",
        // within the first cell, and its end, which is the next cell's beginning
        "1.25, 0, 1, 0.25, 15",
        "1.999999, 0, 1, 0.999999, 29.99998",
        "2, 1, 2, 0, 30",
        // the middle cell
        "3, 1, 2, 0.5, 25",
        "4, 2, 3, 0, 20",
        // the last cell serves the last row too, and what is beyond
        "7, 2, 3, 0.75, 50",
        "8, 2, 3, 1, 60",
        "8.000001, 2, 3, 1, 60",
        "1000, 2, 3, 1, 60"
    })
    void cellFractionAndReading(double x, int cell, int above, double fraction, double reading) {
        assertEquals(cell, axis.cell(x));
        assertEquals(above, axis.above(cell));
        assertEquals(fraction, axis.fraction(x, cell), 1e-12);
        assertEquals(reading, axis.read(column, x), 1e-9);
    }

    @ParameterizedTest
    @CsvSource({"0.999999, false", "1, true", "1.5, true", "8, true", "8.000001, false", "NaN, false"})
    void coversItsEnds(double x, boolean covered) {
        assertEquals(covered, axis.covers(x));
    }

    @Test
    void aSingleRowHoldsEverywhere() {
        Axis one = Axis.of(3);
        for (double x : new double[] {-1, 3, 9}) {
            assertEquals(0, one.cell(x));
            assertEquals(0, one.above(0));
            assertEquals(0, one.fraction(x, 0), 0);
            assertEquals(7, one.read(new double[] {7}, x), 0);
        }
        assertTrue(one.covers(3));
        assertFalse(one.covers(2.999999));
        assertFalse(one.covers(3.000001));
        assertEquals(3, one.first(), 0);
        assertEquals(3, one.last(), 0);
    }

    @Test
    void twoRowsAreOneCell() {
        Axis two = Axis.of(-1, 1);
        assertEquals(0, two.cell(-1));
        assertEquals(0, two.cell(1));
        assertEquals(5, two.read(new double[] {0, 10}, 0), 1e-15);
    }

    @Test
    void everyNodeReadsAsItStands() {
        double[] values = new double[101];
        double[] squares = new double[101];
        for (int i = 0; i < values.length; i++) {
            values[i] = i * 0.1;
            squares[i] = i * i * 0.37;
        }
        Axis fine = Axis.of(values);
        assertEquals(101, fine.size());
        for (int i = 0; i < values.length; i++) {
            assertEquals(squares[i], fine.read(squares, fine.value(i)), 1e-12);
            assertEquals(Math.min(i, 99), fine.cell(values[i]));
        }
    }

    @Test
    void ownCopy() {
        double[] values = {1, 2};
        Axis own = Axis.of(values);
        values[0] = 99;
        assertEquals(1, own.first(), 0);
        assertEquals(2, own.last(), 0);
    }

    @Test
    void refusals() {
        assertRefused("an axis needs at least one value");
        assertRefused("axis values must ascend, found [1.0, 1.0]", 1, 1);
        assertRefused("axis values must ascend, found [2.0, 1.0]", 2, 1);
        assertRefused("axis values must ascend, found [0.0, 1.0, 0.5]", 0, 1, 0.5);
        assertRefused("axis values must ascend, found [NaN]", Double.NaN);
        assertRefused("axis values must ascend, found [1.0, Infinity]", 1, Double.POSITIVE_INFINITY);
        assertRefused("axis values must ascend, found [-Infinity, 1.0]", Double.NEGATIVE_INFINITY, 1);
        assertRefused("axis values must ascend, found [1.0, NaN]", 1, Double.NaN);
    }

    private static void assertRefused(String message, double... values) {
        IllegalArgumentException e = assertThrows(IllegalArgumentException.class, () -> Axis.of(values));
        assertEquals(message, e.getMessage());
    }
}
