// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.brassbob.core.notice.Notice;
import org.brassbob.core.notice.NoticeCode;
import org.brassbob.core.table.HydrostaticTable.Entry;
import org.brassbob.fixture.Hydrostatics;
import org.brassbob.fixture.RoundBuilder;
import org.brassbob.fixture.ShipBuilder;
import org.brassbob.fixture.TankBuilder;
import org.junit.jupiter.api.Test;

/** Trim and list that nobody observed are those that the readings themselves make (product.md rule 1). */
class SettlingTest {
    private static ShipBuilder ship() {
        return ShipBuilder.ship()
                .hydrostatics(Hydrostatics.boxes(100, 16, 1, 9, 33))
                .lightship(3000, 47, 0.05, 5.5)
                .tanks(
                        TankBuilder.box("aft-s", 5, 25, 0, 7, 0, 6).pipe(6, 6.5, 0, 6),
                        TankBuilder.box("aft-p", 5, 25, -7, 0, 0, 6).pipe(6, -6.5, 0, 6),
                        TankBuilder.box("fore", 70, 95, -6, 6, 0, 5).pipe(72, 0, 0, 5));
    }

    private static RoundBuilder readings(RoundBuilder round) {
        return round.sounding("aft-s", 2.6).sounding("aft-p", 2.2).sounding("fore", 2);
    }

    private static boolean told(Assessment assessment, NoticeCode code) {
        return assessment.notices().stream().map(Notice::code).anyMatch(code::equals);
    }

    @Test
    void theTrimAndListFoundGiveTheSameAgainWhenObserved() {
        Assessment found = ship().assess(readings(RoundBuilder.round()).build());
        assertFalse(told(found, NoticeCode.NOT_SETTLED));
        double trim = found.condition().trim();
        double list = found.condition().listDeg();
        assertTrue(Math.abs(trim) > 0.3 && Math.abs(list) > 0.3, () -> "too easy: " + trim + " m, " + list + "°");
        Assessment again = ship().assess(
                        readings(RoundBuilder.round().trim(trim).list(list)).build());
        assertEquals(trim, again.condition().trim(), 1e-4);
        assertEquals(list, again.condition().listDeg(), 1e-4);
        assertEquals(found.condition().gm(), again.condition().gm(), 1e-6);
    }

    @Test
    void oneObservedTheOtherIsFound() {
        Assessment byTrim =
                ship().assess(readings(RoundBuilder.round().trim(0.4)).build());
        double list = byTrim.condition().listDeg();
        Assessment both = ship().assess(
                        readings(RoundBuilder.round().trim(0.4).list(list)).build());
        assertEquals(list, both.condition().listDeg(), 1e-4);
        Assessment byList =
                ship().assess(readings(RoundBuilder.round().list(0.4)).build());
        double trim = byList.condition().trim();
        assertEquals(
                trim,
                ship().assess(readings(RoundBuilder.round().trim(trim).list(0.4))
                                .build())
                        .condition()
                        .trim(),
                1e-4);
    }

    @Test
    void weightToStarboardListsToStarboardAndThePipeThereReadsDeeper() {
        ShipBuilder ship = ShipBuilder.ship()
                .lightship(3000, 6)
                .weight("w", 60, 50, 5, 6)
                .tanks(TankBuilder.box("s", 40, 60, 0, 7, 0, 6).pipe(50, 6.5, 0, 6));
        Assessment assessment =
                ship.assess(RoundBuilder.round().sounding("s", 3).build());
        assertTrue(assessment.condition().listDeg() > 0);
        // 3 m under the pipe near the ship's side is less than 3 m on average.
        assertTrue(assessment.tanks().get(0).volume() < 20 * 7 * 3);
        ShipBuilder toPort = ShipBuilder.ship().lightship(3000, 6).weight("w", 60, 50, -5, 6);
        assertTrue(toPort.assess(RoundBuilder.round().build()).condition().listDeg() < 0);
    }

    @Test
    void weightAftTrimsByTheSternAndThePipeAftReadsDeeper() {
        ShipBuilder ship = ShipBuilder.ship()
                .lightship(3000, 6)
                .weight("w", 60, 5, 0, 6)
                .tanks(TankBuilder.box("t", 40, 60, -4, 4, 0, 6).pipe(41, 0, 0, 6));
        Assessment assessment =
                ship.assess(RoundBuilder.round().sounding("t", 3).build());
        assertTrue(assessment.condition().trim() > 0);
        assertTrue(assessment.condition().draughtAft() > assessment.condition().draughtForward());
        assertTrue(assessment.tanks().get(0).volume() < 20 * 8 * 3);
    }

    @Test
    void draughtsAtTheMarksMakeTheTrim() {
        // Marks 4 m and 94 m from aft: 0.9 m over 90 m is 1.0 m over 100 m.
        ShipBuilder ship = ShipBuilder.ship()
                .mark("forward", 94)
                .mark("midships", 50)
                .mark("aft", 4)
                .tanks(TankBuilder.box("t", 40, 60, -4, 4, 0, 6).pipe(40, 0, 0, 6));
        double byMarks = ship.assess(RoundBuilder.round()
                        .list(0)
                        .draughts(5.9, 5.0)
                        .sounding("t", 3)
                        .build())
                .tanks()
                .get(0)
                .volume();
        double byTrim = ship.assess(
                        RoundBuilder.round().list(0).trim(1).sounding("t", 3).build())
                .tanks()
                .get(0)
                .volume();
        assertEquals(byTrim, byMarks, 1e-9);
        assertEquals(20 * 8 * (3 - 0.1), byMarks, 1e-9);
        // A stated trim goes before draughts; one draught alone makes no trim; without marks they are at the
        // perpendiculars.
        double stated = ship.assess(RoundBuilder.round()
                        .list(0)
                        .trim(1)
                        .draughts(5.9, 5.9)
                        .sounding("t", 3)
                        .build())
                .tanks()
                .get(0)
                .volume();
        assertEquals(byTrim, stated, 0);
        for (RoundBuilder half : List.of(
                RoundBuilder.round().draughts(5.9, null), RoundBuilder.round().draughts(null, 5.0))) {
            Assessment one = ship.assess(half.list(0).sounding("t", 3).build());
            assertEquals(one.condition().trim(), 0, 1e-3);
        }
        ShipBuilder unmarked = ShipBuilder.ship()
                .tanks(TankBuilder.box("t", 40, 60, -4, 4, 0, 6).pipe(40, 0, 0, 6));
        double atPerpendiculars = unmarked.assess(RoundBuilder.round()
                        .list(0)
                        .draughts(5.9, 4.9)
                        .sounding("t", 3)
                        .build())
                .tanks()
                .get(0)
                .volume();
        assertEquals(byTrim, atPerpendiculars, 1e-9);
    }

    @Test
    void slowPassesStillReachTheFixedPoint() {
        // A great tank with its pipe at the far end: each pass undoes much of the one before.
        ShipBuilder ship = ShipBuilder.ship()
                .hydrostatics(Hydrostatics.boxes(100, 16, 1, 9, 33))
                .lightship(2600, 50, 0, 4)
                .weight("w", 80, 20, 0.3, 4)
                .tanks(TankBuilder.box("hold", 10, 45, -7.5, 7.5, 0, 8).pipe(44, 7.4, 0, 8));
        Assessment found = ship.assess(RoundBuilder.round().sounding("hold", 3).build());
        assertFalse(told(found, NoticeCode.NOT_SETTLED));
        RoundBuilder observed = RoundBuilder.round()
                .trim(found.condition().trim())
                .list(found.condition().listDeg())
                .sounding("hold", 3);
        Condition again = ship.assess(observed.build()).condition();
        assertEquals(found.condition().trim(), again.trim(), 1e-3);
        assertEquals(found.condition().listDeg(), again.listDeg(), 1e-2);
    }

    @Test
    void passesThatNeverAgreeAreTold() {
        // By the stern the pipe is full and the tank takes all; by the head it takes less. MCT is tiny: every pass
        // throws her over.
        ShipBuilder ship = ShipBuilder.ship()
                .hydrostatics(Hydrostatics.evenKeel(
                        new Entry(1, 1000, 50, 50, 8, 0.5, 20, 1), new Entry(9, 9000, 50, 50, 8, 2, 20, 1)))
                .lightship(3000, 48, 0, 6)
                .tanks(TankBuilder.box("t", 70, 90, -4, 4, 0, 6).pipe(89, 0, 0, 6));
        Assessment wild = ship.assess(RoundBuilder.round().sounding("t", 3).build());
        assertTrue(told(wild, NoticeCode.NOT_SETTLED));
        assertEquals(Margin.State.CAUTION, wild.margin().state());
        assertTrue(Double.isFinite(wild.condition().gm()));
    }

    @Test
    void lollingShipTakesItsReadingsWithinReason() {
        // GM negative: the list that the readings are taken at is held within bounds and everything stays finite.
        for (double kb : new double[] {3, Double.NaN}) {
            Assessment loll = ShipBuilder.ship()
                    .km(8, kb)
                    .lightship(5000, 50, 0.2, 8.4)
                    .tanks(TankBuilder.box("t", 40, 60, 0, 4, 0, 6).pipe(50, 3, 0, 6))
                    .assess(RoundBuilder.round().sounding("t", 3).build());
            assertTrue(loll.condition().gm() < 0);
            assertTrue(told(loll, NoticeCode.NEGATIVE_GM));
            assertEquals(Double.isNaN(kb), told(loll, NoticeCode.LOLL_UNKNOWN));
            assertEquals(Double.isNaN(kb), Double.isNaN(loll.condition().listDeg()));
            assertEquals(Margin.State.BELOW, loll.margin().state());
            assertTrue(Double.isFinite(loll.tanks().get(0).volume()));
        }
    }
}
