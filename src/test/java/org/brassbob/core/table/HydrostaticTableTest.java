// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.table;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.brassbob.core.table.HydrostaticTable.Entry;
import org.brassbob.core.table.HydrostaticTable.Rows;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class HydrostaticTableTest {
    private static final Origin ORIGIN = Origin.of("hydrostatics.csv", 2, 3, 4);
    private static final Entry LIGHT = new Entry(2, 1000, 40, 41, 9, 30, 6, 1.1);
    private static final Entry MIDDLE = new Entry(3, 1800, 39, 40, 8, 34, 7, 1.6);
    private static final Entry DEEP = new Entry(5, 3400, 37, 38, 7, 40, 9, 2.6);
    private static final Entry BY_STERN_LIGHT = new Entry(2.2, 1100, 38, 40, 9.4, 32, 6.2, 1.2);
    private static final Entry BY_STERN_DEEP = new Entry(5.2, 3500, 35, 37, 7.4, 42, 9.2, 2.7);

    private final Rows evenKeelRows = Rows.of(List.of(LIGHT, MIDDLE, DEEP), ORIGIN);
    private final HydrostaticTable evenKeel = HydrostaticTable.of(Axis.of(0), List.of(evenKeelRows));
    private final HydrostaticTable trimmed = HydrostaticTable.of(
            Axis.of(0, 2), List.of(evenKeelRows, Rows.of(List.of(BY_STERN_LIGHT, BY_STERN_DEEP), ORIGIN)));

    private static void assertEntry(Entry expected, Entry actual) {
        assertEquals(expected.draught(), actual.draught(), 1e-12);
        assertEquals(expected.displacement(), actual.displacement(), 1e-9);
        assertEquals(expected.lcb(), actual.lcb(), 1e-12);
        assertEquals(expected.lcf(), actual.lcf(), 1e-12);
        assertEquals(expected.kmt(), actual.kmt(), 1e-12);
        assertEquals(expected.mct(), actual.mct(), 1e-12);
        assertEquals(expected.tpc(), actual.tpc(), 1e-12);
        assertEquals(expected.kb(), actual.kb(), 1e-12);
    }

    @Test
    void everyNodeAndBothEnds() {
        for (double trim : new double[] {-1, 0, 2}) {
            assertEntry(LIGHT, evenKeel.at(1000, trim));
            assertEntry(LIGHT, evenKeel.at(999, trim));
            assertEntry(MIDDLE, evenKeel.at(1800, trim));
            assertEntry(DEEP, evenKeel.at(3400, trim));
            assertEntry(DEEP, evenKeel.at(3401, trim));
        }
        assertEntry(BY_STERN_LIGHT, trimmed.at(1100, 2));
        assertEntry(BY_STERN_DEEP, trimmed.at(3500, 2));
        assertEntry(BY_STERN_DEEP, trimmed.at(3500, 2.5));
        assertEntry(MIDDLE, trimmed.at(1800, -0.5));
    }

    @Test
    void midCellByHand() {
        // A quarter of the way from 1000 to 1800 t; half way from 1800 to 3400 t.
        assertEntry(new Entry(2.25, 1200, 39.75, 40.75, 8.75, 31, 6.25, 1.225), evenKeel.at(1200, 0));
        assertEntry(new Entry(4, 2600, 38, 39, 7.5, 37, 8, 2.1), evenKeel.at(2600, 0));
    }

    @Test
    void betweenTrimsByHand() {
        // At 2600 t by the stern: 1500/2400 = 0.625 of the way: draught 4.075, LCB 36.125, LCF 38.125, KMT 8.15, MCT
        // 38.25, TPC 8.075,
        // KB 2.1375; half way from the even-keel row above.
        assertEntry(new Entry(4.0375, 2600, 37.0625, 38.5625, 7.825, 37.625, 8.0375, 2.11875), trimmed.at(2600, 1));
    }

    @Test
    void withoutKbTheRestIsRead() {
        HydrostaticTable table = HydrostaticTable.of(
                Axis.of(0),
                List.of(Rows.of(
                        List.of(
                                new Entry(2, 1000, 40, 41, 9, 30, 6, Double.NaN),
                                new Entry(3, 2000, 40, 41, 7, 30, 6, Double.NaN)),
                        ORIGIN)));
        assertEquals(8, table.at(1500, 0).kmt(), 1e-12);
        assertTrue(Double.isNaN(table.at(1500, 0).kb()));
    }

    @ParameterizedTest
    @CsvSource({
        "999, 0, false",
        "1000, 0, true",
        "1000, 0.001, false",
        "1100, 0.001, true",
        "3400, 0, true",
        "3401, 0, false",
        "3400, 1, true",
        "3401, 1, false",
        "3401, 1.999, false",
        "3401, 2, true",
        "3500, 2, true",
        "3501, 2, false",
        "2000, -0.001, false",
        "2000, 2.001, false",
        "1100, 1, true",
        "1099, 2, false"
    })
    void coversWhatEachTrimThatIsReadReaches(double displacement, double trim, boolean covered) {
        assertEquals(covered, trimmed.covers(displacement, trim));
    }

    @ParameterizedTest
    @CsvSource({"999, 0, false", "1000, 0, true", "3400, 0, true", "3401, 0, false", "2000, 0.5, false"})
    void evenKeelCovers(double displacement, double trim, boolean covered) {
        assertEquals(covered, evenKeel.covers(displacement, trim));
    }

    @Test
    void rowsAsGiven() {
        assertSame(evenKeelRows, trimmed.rows(0));
        assertEquals(2, trimmed.trims().size());
        assertEquals(3, evenKeelRows.draughts().value(1), 0);
        assertEquals(1800, evenKeelRows.displacements().value(1), 0);
        assertEquals(List.of(LIGHT, MIDDLE, DEEP), evenKeelRows.entries());
        assertEquals("hydrostatics.csv:3", evenKeelRows.origin().at(1));
    }

    @Test
    void refusals() {
        IllegalArgumentException e = assertThrows(
                IllegalArgumentException.class, () -> HydrostaticTable.of(Axis.of(0, 1), List.of(evenKeelRows)));
        assertEquals("a set of rows is needed for each trim", e.getMessage());
        assertThrows(IllegalArgumentException.class, () -> Rows.of(List.of(MIDDLE, LIGHT), ORIGIN));
        assertThrows(IllegalArgumentException.class, () -> Rows.of(List.of(), ORIGIN));
    }
}
