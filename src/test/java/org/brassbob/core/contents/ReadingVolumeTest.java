// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.contents;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.notice.Notice;
import org.brassbob.core.notice.NoticeCode;
import org.brassbob.core.round.Reading;
import org.brassbob.core.round.ReadingKind;
import org.brassbob.core.table.SoundingTable.Argument;
import org.brassbob.fixture.RoundBuilder;
import org.brassbob.fixture.Shapes;
import org.brassbob.fixture.Tables;
import org.brassbob.fixture.TankBuilder;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ReadingVolumeTest {
    private static final double LBP = TankBuilder.LBP;

    private static Reading reading(ReadingKind kind, double value) {
        return RoundBuilder.round().reading("t", kind, value).build().readings().get(0);
    }

    private static VolumeRange of(TankBuilder tank, ReadingKind kind, double value, double trim, double list) {
        return ReadingVolume.of(tank.model(), reading(kind, value), trim, list, 0.9);
    }

    private static List<NoticeCode> codes(VolumeRange range) {
        return range.notices().stream().map(Notice::code).toList();
    }

    private static void assertVolume(double expected, VolumeRange range) {
        assertEquals(expected, range.low(), 1e-9);
        assertEquals(expected, range.high(), 1e-9);
        assertFalse(range.isInterval());
        assertEquals(List.of(), range.notices());
    }

    /** 10 × 12 × 5 m with the pipe at its after starboard corner. */
    private static TankBuilder box() {
        return TankBuilder.box("t", 40, 50, -6, 6, 1, 6).pipe(40, 6, 1, 5);
    }

    @Test
    void statedVolumes() {
        assertVolume(250, of(box(), ReadingKind.VOLUME, 250, 1, 2));
        assertVolume(150, of(box(), ReadingKind.PERCENT, 25, 1, 2));
        assertVolume(100, of(box(), ReadingKind.MASS, 90, 1, 2));
        assertVolume(0, of(box(), ReadingKind.EMPTY, Double.NaN, 1, 2));
        assertVolume(600, of(box(), ReadingKind.FULL, Double.NaN, 1, 2));
        assertVolume(600, of(box(), ReadingKind.PERCENT, 100, 1, 2));
    }

    @Test
    void moreThanTheTankHoldsIsFull() {
        for (VolumeRange range : List.of(
                of(box(), ReadingKind.VOLUME, 601, 0, 0),
                of(box(), ReadingKind.PERCENT, 100.2, 0, 0),
                of(box(), ReadingKind.MASS, 541, 0, 0))) {
            assertEquals(600, range.low(), 1e-9);
            assertEquals(600, range.high(), 1e-9);
            assertEquals(List.of(NoticeCode.ABOVE_CAPACITY), codes(range));
        }
    }

    @Test
    void notTakenStatesNothing() {
        assertThrows(IllegalArgumentException.class, () -> of(box(), ReadingKind.NOT_TAKEN, Double.NaN, 0, 0));
    }

    /**
     * In closed form: as long as the surface of a box cuts its four walls, the volume is that below the height of the surface in the
     * middle. From the pipe at the after starboard corner, the middle is 5 m forward and 6 m to port.
     */
    @ParameterizedTest
    @CsvSource({"2.5, 0, 0", "2.5, 2, 0", "2.5, -2, 0", "2.5, 0, 3", "2.5, 0, -3", "2.2, 1.5, 2"})
    void shapeUnderTrimAndList(double sounding, double trim, double list) {
        double middle = sounding - 5 * trim / LBP - 6 * Math.tan(Math.toRadians(list));
        assertVolume(120 * middle, of(box(), ReadingKind.SOUNDING, sounding, trim, list));
        assertVolume(120 * middle, of(box(), ReadingKind.ULLAGE, 5 - sounding, trim, list));
    }

    @Test
    void pipeOnTheLowSideReadsDeeper() {
        // The same sounding at the after starboard corner means less liquid by the stern or with a list to starboard.
        double upright = of(box(), ReadingKind.SOUNDING, 2.5, 0, 0).low();
        assertTrue(of(box(), ReadingKind.SOUNDING, 2.5, 1, 0).low() < upright);
        assertTrue(of(box(), ReadingKind.SOUNDING, 2.5, 0, 1).low() < upright);
        TankBuilder foreport = box().pipe(50, -6, 1, 5);
        assertTrue(of(foreport, ReadingKind.SOUNDING, 2.5, 1, 0).low() > upright);
        assertTrue(of(foreport, ReadingKind.SOUNDING, 2.5, 0, 1).low() > upright);
    }

    @Test
    void dryPipeOnTheHighSideIsAnInterval() {
        // By the head the liquid runs away from the pipe: a wedge under the plane through its foot, l·h/2·b.
        VolumeRange range = of(box(), ReadingKind.SOUNDING, 0, -2, 0);
        assertEquals(0, range.low(), 0);
        assertEquals(10 * 0.2 / 2 * 12, range.high(), 1e-9);
        assertTrue(range.isInterval());
        assertFalse(of(box(), ReadingKind.SOUNDING, 0, 2, 0).isInterval());
        assertTrue(of(box(), ReadingKind.SOUNDING, 0, 0, -2).isInterval());
        assertFalse(of(box(), ReadingKind.SOUNDING, 0, 0, 2).isInterval());
        assertTrue(of(box(), ReadingKind.ULLAGE, 5, 0, -2).isInterval());
        assertFalse(of(box(), ReadingKind.SOUNDING, 0, 0, 0).isInterval());
    }

    @Test
    void brimFullPipeOnTheLowSideIsAnInterval() {
        VolumeRange range = of(box(), ReadingKind.SOUNDING, 5, 2, 0);
        assertEquals(600 - 10 * 0.2 / 2 * 12, range.low(), 1e-9);
        assertEquals(600, range.high(), 0);
        assertTrue(of(box(), ReadingKind.ULLAGE, 0, 0, 2).isInterval());
        assertFalse(of(box(), ReadingKind.SOUNDING, 5, -2, 0).isInterval());
        assertFalse(of(box(), ReadingKind.ULLAGE, 0, 0, -2).isInterval());
    }

    @Test
    void readingLongerThanThePipeIsNoMoreThanBrimFull() {
        VolumeRange range = of(box(), ReadingKind.SOUNDING, 6, 2, 0);
        assertEquals(List.of(NoticeCode.LONGER_THAN_PIPE), codes(range));
        assertEquals(600 - 12, range.low(), 1e-9);
        assertEquals(600, range.high(), 0);
        VolumeRange below = of(box(), ReadingKind.ULLAGE, 5.4, -2, 0);
        assertEquals(List.of(NoticeCode.LONGER_THAN_PIPE), codes(below));
        assertEquals(0, below.low(), 0);
        assertEquals(12, below.high(), 1e-9);
    }

    /** Soundings 0 to 4 m at trims 0 and 2 m; no shape. */
    private static TankBuilder tabled() {
        return TankBuilder.tabled("t", Tables.constant(400, 50, 0, 3, 10))
                .soundings(Tables.soundings(
                        Argument.SOUNDING,
                        new double[] {0, 2, 4},
                        new double[] {0, 2},
                        new double[] {-1, 1},
                        new double[] {0, 200, 400, 0, 200, 400, 20, 210, 390, 10, 190, 380}));
    }

    @Test
    void tableIsReadLinearlyInAllThree() {
        // Worked by hand: at trim 1.5 m, 1 m of sounding, list 0.5° (a quarter from the starboard column).
        double trim0 = 100;
        double trim2 = 0.25 * 115 + 0.75 * 100;
        assertVolume(0.25 * trim0 + 0.75 * trim2, of(tabled(), ReadingKind.SOUNDING, 1, 1.5, 0.5));
    }

    @Test
    void outsideItsTableTheNearestEdgeServesAndIsTold() {
        for (double[] attitude : new double[][] {{3, 0}, {-1, 0}, {0, 2}, {0, -2}}) {
            VolumeRange range = of(tabled(), ReadingKind.SOUNDING, 1, attitude[0], attitude[1]);
            assertEquals(List.of(NoticeCode.OUTSIDE_TABLE_EDGE), codes(range));
            double trim = Math.max(0, Math.min(2, attitude[0]));
            double list = Math.max(-1, Math.min(1, attitude[1]));
            assertEquals(of(tabled(), ReadingKind.SOUNDING, 1, trim, list).low(), range.low(), 0);
        }
    }

    @Test
    void outsideItsTableTheShapeServesAndIsTold() {
        TankBuilder both =
                box().capacity(600).soundings(Tables.soundings(new double[] {0, 2.5, 5}, new double[] {0, 303, 600}));
        assertVolume(303, of(both, ReadingKind.SOUNDING, 2.5, 0, 0));
        VolumeRange trimmed = of(both, ReadingKind.SOUNDING, 2.5, 2, 0);
        assertEquals(120 * (2.5 - 0.1), trimmed.low(), 1e-9);
        assertEquals(List.of(NoticeCode.OUTSIDE_TABLE_SHAPE), codes(trimmed));
    }

    @Test
    void tableThatStopsShortOfTheBrim() {
        // Beyond the last row nobody knows how much: from there to full.
        VolumeRange range = of(tabled().capacity(410), ReadingKind.SOUNDING, 4.5, 0, 0);
        assertEquals(400, range.low(), 0);
        assertEquals(410, range.high(), 0);
        assertEquals(List.of(NoticeCode.OUTSIDE_TABLE_EDGE), codes(range));
    }

    @Test
    void pressedUpToTheEndOfTheTableNeedsNoNotice() {
        assertVolume(400, of(tabled(), ReadingKind.SOUNDING, 4, 0, 0));
        assertVolume(400, of(tabled(), ReadingKind.SOUNDING, 4.2, 0, 0));
    }

    /** By ullage, with a pipe of 4 m: 0 m is full. */
    private static TankBuilder byUllage() {
        return TankBuilder.tabled("t", Tables.constant(400, 50, 0, 3, 10))
                .soundings(Tables.soundings(Argument.ULLAGE, new double[] {0, 1, 4}, new double[] {400, 330, 0}));
    }

    @Test
    void eitherReadingServesEitherTable() {
        TankBuilder ullages = byUllage().pipe(50, 0, 0, 4);
        assertVolume(330, of(ullages, ReadingKind.ULLAGE, 1, 0, 0));
        assertVolume(330, of(ullages, ReadingKind.SOUNDING, 3, 0, 0));
        assertVolume(220, of(ullages, ReadingKind.SOUNDING, 2, 0, 0));
        TankBuilder soundings = tabled().pipe(50, 0, 0, 4);
        assertVolume(100, of(soundings, ReadingKind.SOUNDING, 1, 0, 0));
        assertVolume(100, of(soundings, ReadingKind.ULLAGE, 3, 0, 0));
    }

    @Test
    void ullageTableServesWithoutAPipe() {
        assertVolume(330, of(byUllage(), ReadingKind.ULLAGE, 1, 0, 0));
        assertVolume(400, of(byUllage(), ReadingKind.ULLAGE, 0, 0, 0));
        assertVolume(0, of(byUllage(), ReadingKind.ULLAGE, 4, 0, 0));
        VolumeRange beyond = of(byUllage(), ReadingKind.ULLAGE, 4.2, 0, 0);
        assertEquals(0, beyond.high(), 0);
        assertEquals(List.of(NoticeCode.OUTSIDE_TABLE_EDGE), codes(beyond));
    }

    @Test
    void roundingNeverPutsAReadingOutsideItsTable() {
        // 12.35 − (12.35 − 0.1) is a little less than 0.1.
        TankBuilder tank = TankBuilder.tabled("t", Tables.constant(400, 50, 0, 3, 10))
                .pipe(50, 0, 0, 12.35)
                .soundings(Tables.soundings(Argument.ULLAGE, new double[] {0.1, 12.35}, new double[] {400, 0}));
        assertVolume(400, of(tank, ReadingKind.ULLAGE, 0.1, 0, 0));
        assertVolume(0, of(tank, ReadingKind.ULLAGE, 12.35, 0, 0));
    }

    @Test
    void readingThatNothingCanTurnIntoAVolumeIsRefused() {
        assertThrows(IllegalStateException.class, () -> of(byUllage(), ReadingKind.SOUNDING, 1, 0, 0));
        assertThrows(IllegalStateException.class, () -> of(tabled(), ReadingKind.ULLAGE, 1, 0, 0));
        assertThrows(IllegalStateException.class, () -> of(box().withoutPipe(), ReadingKind.SOUNDING, 1, 0, 0));
        TankBuilder remote = TankBuilder.tabled("t", Tables.constant(400, 50, 0, 3, 10));
        assertThrows(IllegalStateException.class, () -> of(remote, ReadingKind.ULLAGE, 1, 0, 0));
    }

    @Test
    void tankInsideATankAndStructureAreTakenOff() {
        // 10 × 12 m less 4 × 5 m from 2 m up, less 2 %.
        TankModel model = new TankModel(
                box().capacity(0.98 * (600 - 4 * 5 * 2)).build(),
                new NetShape(
                        Shapes.solid(Shapes.box(40, 50, -6, 6, 1, 6))
                                .minus(Shapes.solid(Shapes.box(43, 47, -2, 3, 3, 5))),
                        2),
                LBP);
        double at3 = ReadingVolume.of(model, reading(ReadingKind.SOUNDING, 3), 0, 0, 1)
                .low();
        assertEquals(0.98 * (120 * 3 - 20 * 1), at3, 1e-9);
    }
}
