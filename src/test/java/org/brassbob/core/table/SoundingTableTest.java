// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.table;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.brassbob.core.table.SoundingTable.Argument;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SoundingTableTest {
    private static final Origin ORIGIN = Origin.of("tanks/A.sounding.csv", 2, 3, 4, 5, 6, 7, 8, 9);
    private static final Axis NONE = Axis.of(0);

    /** A grid of 2 soundings × 2 trims × 2 heels, each node with a figure of its own. */
    private final SoundingTable cube = SoundingTable.of(
            Argument.SOUNDING,
            Axis.of(1, 2),
            Axis.of(-1, 3),
            Axis.of(-5, 5),
            new double[] {10, 20, 11, 24, 13, 29, 17, 40},
            ORIGIN);

    @Test
    void aBunkerTableReadBetweenTwoRows() {
        // "Bunker calculation on board" (P. K. Tyagi, 2010), worked example: corrected sounding 3.27 m between 3.20 m =
        // 157.20 m³ and
        // 3.30 m = 163.60 m³ gives 161.68 m³.
        SoundingTable table = SoundingTable.of(
                Argument.SOUNDING, Axis.of(3.20, 3.30), NONE, NONE, new double[] {157.20, 163.60}, ORIGIN);
        assertEquals(161.68, table.volume(3.27, 0, 0), 1e-9);
    }

    @ParameterizedTest
    @CsvSource({
        // Worked by hand, the trim read first: 52.0 − 0.7·1.6 = 50.88 and 63.0 − 0.7·1.4 = 62.02; then 50.88 +
        // 0.65·11.14 = 58.121.
        // The sounding first: 52 + 0.65·11 = 59.15 and 50.4 + 0.65·11.2 = 57.68; then 59.15 − 0.7·1.47 = 58.121.
        "1.13, 0.7, 58.121",
        "1.00, 0, 52.0",
        "1.00, 1, 50.4",
        "1.00, 2, 48.8",
        "1.20, 0, 63.0",
        "1.20, 1, 61.6",
        "1.20, 2, 60.2",
        "1.10, 1.5, 55.25",
        // Held at the edges.
        "0.99, 0, 52.0",
        "1.21, 0, 63.0",
        "1.00, -0.01, 52.0",
        "1.00, 2.01, 48.8",
        "9, 9, 60.2"
    })
    void soundingAndTrim(double sounding, double trim, double volume) {
        SoundingTable table = SoundingTable.of(
                Argument.SOUNDING,
                Axis.of(1.00, 1.20),
                Axis.of(0, 1, 2),
                NONE,
                new double[] {52.0, 63.0, 50.4, 61.6, 48.8, 60.2},
                ORIGIN);
        assertEquals(volume, table.volume(sounding, trim, 0), 1e-9);
        assertEquals(volume, table.volume(sounding, trim, 33), 1e-9);
    }

    @ParameterizedTest
    @CsvSource({
        "1, -1, -5, 10",
        "2, -1, -5, 20",
        "1, -1, 5, 11",
        "2, -1, 5, 24",
        "1, 3, -5, 13",
        "2, 3, -5, 29",
        "1, 3, 5, 17",
        "2, 3, 5, 40",
        // middles of edges
        "1.5, -1, -5, 15",
        "1, 1, -5, 11.5",
        "1, -1, 0, 10.5",
        // the middle of the cell is the mean of its eight corners
        "1.5, 1, 0, 20.5",
        // just outside
        "0.9, -1.1, -5.1, 10",
        "2.1, 3.1, 5.1, 40"
    })
    void soundingTrimAndHeel(double sounding, double trim, double heel, double volume) {
        assertEquals(volume, cube.volume(sounding, trim, heel), 1e-12);
    }

    @ParameterizedTest
    @CsvSource({
        "-1, -5, true",
        "3, 5, true",
        "0, 0, true",
        "-1.001, 0, false",
        "3.001, 0, false",
        "0, -5.001, false",
        "0, 5.001, false"
    })
    void covers(double trim, double heel, boolean covered) {
        assertEquals(covered, cube.covers(trim, heel));
    }

    @Test
    void anUllageTableRunsTheOtherWay() {
        SoundingTable table =
                SoundingTable.of(Argument.ULLAGE, Axis.of(0, 1, 2), NONE, NONE, new double[] {30, 18, 0}, ORIGIN);
        assertEquals(30, table.volume(-0.1, 0, 0), 0);
        assertEquals(30, table.volume(0, 0, 0), 0);
        assertEquals(24, table.volume(0.5, 0, 0), 1e-12);
        assertEquals(9, table.volume(1.5, 0, 0), 1e-12);
        assertEquals(0, table.volume(2, 0, 0), 0);
        assertEquals(0, table.volume(2.5, 0, 0), 0);
        assertSame(Argument.ULLAGE, table.argument());
    }

    @Test
    void nodesAndTheirLines() {
        int node = 0;
        for (int trim = 0; trim < 2; trim++) {
            for (int heel = 0; heel < 2; heel++) {
                for (int reading = 0; reading < 2; reading++) {
                    assertEquals(node, cube.node(reading, trim, heel));
                    assertEquals(
                            cube.volume(
                                    cube.readings().value(reading),
                                    cube.trims().value(trim),
                                    cube.heels().value(heel)),
                            cube.volume(node),
                            0);
                    node++;
                }
            }
        }
        assertEquals("tanks/A.sounding.csv:9", cube.origin().at(cube.node(1, 1, 1)));
    }

    @Test
    void aSingleReadingHolds() {
        SoundingTable one =
                SoundingTable.of(Argument.SOUNDING, Axis.of(1), Axis.of(0, 2), NONE, new double[] {5, 7}, ORIGIN);
        assertEquals(6, one.volume(0.3, 1, 0), 1e-15);
        assertEquals(7, one.volume(3, 2, 0), 1e-15);
    }

    @Test
    void theGridMustBeFull() {
        IllegalArgumentException e = assertThrows(
                IllegalArgumentException.class,
                () -> SoundingTable.of(Argument.SOUNDING, Axis.of(1, 2), NONE, NONE, new double[] {1}, ORIGIN));
        assertEquals("the grid of tanks/A.sounding.csv is not full", e.getMessage());
    }

    @Test
    void ownCopy() {
        double[] volumes = {1, 2};
        SoundingTable table = SoundingTable.of(Argument.SOUNDING, Axis.of(0, 1), NONE, NONE, volumes, ORIGIN);
        volumes[0] = 9;
        assertEquals(1, table.volume(0), 0);
    }
}
