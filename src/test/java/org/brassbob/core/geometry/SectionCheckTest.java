// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import static org.brassbob.core.geometry.Shapes.loop;
import static org.brassbob.core.geometry.Shapes.rectangle;
import static org.brassbob.core.geometry.Shapes.shape;
import static org.brassbob.core.geometry.Shapes.solid;
import static org.brassbob.core.geometry.Shapes.station;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.brassbob.core.geometry.SpaceShape.Loop;
import org.brassbob.core.geometry.SpaceShape.Station;
import org.junit.jupiter.api.Test;

/** What is no solid is refused, with the station where it shows and the reason. */
class SectionCheckTest {
    private static final Loop SQUARE = rectangle(1, 0, 1, 0, 1);

    private static void refused(int station, String message, Station... stations) {
        ShapeException e = assertThrows(ShapeException.class, () -> Solid.of(shape(stations)));
        assertEquals(message, e.getMessage());
        assertEquals(station, e.station());
    }

    /** The same section at two stations. */
    private static void refusedBoth(int station, String message, Loop... loops) {
        refused(station, message, station(0, loops), station(2, loops));
    }

    @Test
    void aSingleStationIsNoSolid() {
        refused(0, "one station only; expected two or more", station(0, SQUARE));
    }

    @Test
    void noStationAtAllIsNoSolid() {
        refused(0, "one station only; expected two or more");
    }

    @Test
    void aStationNeedsALoop() {
        refused(1, "no loop at x = 2.0; expected one or more", station(0, SQUARE), station(2), station(3, SQUARE));
    }

    @Test
    void aLoopNumberStandsOnceAtAStation() {
        refusedBoth(0, "loop 1 at x = 0.0 is given twice; expected it once", SQUARE, rectangle(1, 4, 5, 0, 1));
    }

    @Test
    void twoPointsAreNoLoop() {
        refusedBoth(0, "loop 1 at x = 0.0 has 2 points; expected 3 or more", loop(1, 0, 0, 1, 1));
    }

    @Test
    void aLoopMayNotCrossItself() {
        refusedBoth(0, "loop 1 at x = 0.0 crosses itself; expected a simple outline", loop(1, 0, 0, 2, 2, 2, 0, 0, 1));
    }

    @Test
    void theLastEdgeMayNotCrossEither() {
        refusedBoth(
                0,
                "loop 1 at x = 0.0 crosses itself; expected a simple outline",
                loop(1, 0, 0, 4, 0, 4, 4, 2, -1, 0, 4, 0, 3, 3, 3.5));
    }

    @Test
    void xMustAscend() {
        refused(1, "x = 1.0 after 2.0; expected ascending x", station(2, SQUARE), station(1, SQUARE));
    }

    @Test
    void noJumpAtTheFirstStation() {
        refused(
                1,
                "two stations at the end x = 0.0; expected one",
                station(0, SQUARE),
                station(0, SQUARE),
                station(2, SQUARE));
    }

    @Test
    void noJumpAtTheLastStation() {
        refused(
                2,
                "two stations at the end x = 2.0; expected one",
                station(0, SQUARE),
                station(2, SQUARE),
                station(2, SQUARE));
    }

    @Test
    void noThreeStationsAtOnePlace() {
        refused(
                3,
                "three stations at x = 1.0; expected two at the most",
                station(0, SQUARE),
                station(1, SQUARE),
                station(1, SQUARE),
                station(1, SQUARE),
                station(2, SQUARE));
    }

    @Test
    void aLoopNeedsItsNumberNextDoor() {
        refused(
                0,
                "loop 7 at x = 0.0 joins no loop 7 at a neighbouring station: open",
                station(0, SQUARE, rectangle(7, 4, 5, 0, 1)),
                station(2, SQUARE));
        refused(
                1,
                "loop 7 at x = 2.0 joins no loop 7 at a neighbouring station: open",
                station(0, SQUARE),
                station(2, SQUARE, rectangle(7, 4, 5, 0, 1)));
    }

    @Test
    void aSheetAtAJumpIsOpen() {
        refused(
                1,
                "loop 7 at x = 1.0 joins no loop 7 at a neighbouring station: open",
                station(0, SQUARE),
                station(1, SQUARE, rectangle(7, 4, 5, 0, 1)),
                station(1, SQUARE, rectangle(7, 4, 5, 0, 1)),
                station(2, SQUARE));
    }

    @Test
    void aLoopMayEndAtABulkhead() {
        Loop side = rectangle(2, 4, 5, 0, 1);
        Solid solid = solid(station(0, SQUARE, side), station(2, SQUARE, side), station(5, SQUARE));
        assertEquals(5 + 2, solid.volume(), 1e-14);
    }

    @Test
    void stationsThatNothingJoinsAreTwoParts() {
        refused(
                2,
                "no loop at x = 2.0 joins one at x = 1.0: the shape is in two parts",
                station(0, SQUARE),
                station(1, SQUARE),
                station(2, rectangle(2, 0, 1, 0, 1)),
                station(3, rectangle(2, 0, 1, 0, 1)));
    }

    @Test
    void loopsMayNotCross() {
        refusedBoth(
                0,
                "loop 1 at x = 0.0 crosses loop 2; expected loops apart or one inside the other",
                SQUARE,
                rectangle(2, 0.5, 1.5, 0.5, 1.5));
    }

    @Test
    void aHoleMayNotStickOut() {
        refusedBoth(
                0,
                "loop 1 at x = 0.0 crosses loop 5; expected loops apart or one inside the other",
                rectangle(1, 0, 4, 0, 4),
                rectangle(5, 3, 5, 1, 2));
    }

    @Test
    void joinedLoopsHaveAsManyPoints() {
        refused(
                1,
                "loop 1 at x = 2.0 has 3 points; expected 4 as at the station before",
                station(0, SQUARE),
                station(2, loop(1, 0, 0, 1, 0, 0, 1)));
    }

    @Test
    void noThicknessIsDegenerate() {
        refusedBoth(
                1,
                "loop 1 at x = 2.0 has no area here nor at the station before: degenerate",
                loop(1, 0, 0, 1, 1, 2, 2));
        refusedBoth(
                1,
                "loop 1 at x = 2.0 has no area here nor at the station before: degenerate",
                loop(1, 3, 3, 3, 3, 3, 3));
    }

    @Test
    void joinedLoopsRunTheSameWay() {
        refused(
                1,
                "loop 1 at x = 2.0 runs the other way round than at the station before",
                station(0, SQUARE),
                station(2, loop(1, 0, 0, 0, 1, 1, 1, 1, 0)));
    }

    @Test
    void aShapeThatIsNotANumberHoldsNoVolume() {
        ShapeException e = assertThrows(
                ShapeException.class,
                () -> Solid.of(
                        shape(station(0, loop(1, 0, 0, 1, 0, 0, 1)), station(1, loop(1, 0, 0, 1, 0, 0, Double.NaN)))));
        assertEquals("the shape holds no volume; expected a closed solid", e.getMessage());
    }

    @Test
    void aLoopThatGoesThroughItsOwnCornerIsRefused() {
        // A figure of eight whose halves meet in a corner that is given: no two edges cross, yet one half would count
        // negative.
        refusedBoth(
                0,
                "loop 1 at x = 0.0 runs over or through itself; expected a simple outline",
                loop(1, 0, 0, 1, 1, 3, 3, 3, 0, 1, 1, 0, 2));
    }

    @Test
    void aLoopGoneRoundTwiceIsRefused() {
        refusedBoth(
                0,
                "loop 1 at x = 0.0 runs over or through itself; expected a simple outline",
                loop(1, 0, 0, 1, 0, 1, 1, 0, 1, 0, 0, 1, 0, 1, 1, 0, 1));
    }

    @Test
    void aLoopThatOnlyTouchesItselfIsTaken() {
        // Two triangles that share a corner, both run the same way; a spike gone out and back; doubled points; points
        // in line.
        assertEquals(
                2,
                Shapes.prism(0, 1, loop(1, 0, 0, 1, 1, 2, 0, 2, 2, 1, 1, 0, 2)).volume(),
                1e-14);
        assertEquals(
                1,
                Shapes.prism(0, 1, loop(1, 0, 0, 1, 0, 1, 1, 2, 3, 1, 1, 0, 1)).volume(),
                1e-14);
        assertEquals(
                1,
                Shapes.prism(0, 1, loop(1, 0, 0, 0, 0, 1, 0, 1, 1, 1, 1, 0, 1)).volume(),
                1e-14);
        assertEquals(
                1,
                Shapes.prism(0, 1, loop(1, 0, 0, 0.3, 0, 1, 0, 1, 0.2, 1, 1, 0, 1))
                        .volume(),
                1e-14);
    }

    @Test
    void theSameLoopTwiceIsRefused() {
        refusedBoth(
                0,
                "loops at x = 0.0 overlap; expected loops apart or one inside the other",
                SQUARE,
                rectangle(2, 0, 1, 0, 1));
    }

    @Test
    void loopsThatCrossAtCornersAreRefused() {
        // A lozenge whose corners lie on the edges' middles is inside; one that pokes through the corners of a square
        // is not.
        refusedBoth(
                0,
                "loops at x = 0.0 overlap; expected loops apart or one inside the other",
                rectangle(1, 0, 2, 0, 2),
                loop(2, 0, 0, 2, 0, 3, 1, 2, 2, 0, 2, 1, 1));
    }

    @Test
    void aHoleMayTouchTheOutside() {
        Loop outer = rectangle(1, 0, 4, 0, 4);
        assertEquals(
                16 - 8,
                Shapes.prism(0, 1, outer, loop(2, 2, 0, 4, 2, 2, 4, 0, 2)).volume(),
                1e-14);
        assertEquals(
                16 - 4.5, Shapes.prism(0, 1, outer, loop(2, 0, 0, 3, 0, 0, 3)).volume(), 1e-14);
        assertEquals(16 - 1, Shapes.prism(0, 1, outer, rectangle(2, 0, 1, 0, 1)).volume(), 1e-14);
    }

    @Test
    void loopsThatChangePlacesAreRefused() {
        refused(
                1,
                "loops overlap between x = 0.0 and x = 2.0; expected loops apart or one inside the other",
                station(0, SQUARE, rectangle(2, 4, 5, 0, 1)),
                station(2, rectangle(1, 4, 5, 0, 1), rectangle(2, 0, 1, 0, 1)));
    }

    @Test
    void loopsThatCrossOnlyNearOneStationAreRefused() {
        // Apart at both stations and half way; the second slips past a corner of the first soon after the first
        // station.
        refused(
                1,
                "loop 1 and loop 2 cross between x = 0.0 and x = 2.0; expected loops apart or one inside the other",
                station(0, SQUARE, rectangle(2, -1.2, -0.2, 0.3, 1.3)),
                station(2, SQUARE, rectangle(2, 6, 7, 9.3, 10.3)));
    }

    @Test
    void aHoleThatLeavesItsTankIsRefused() {
        refused(
                1,
                "loop 1 and loop 2 cross between x = 0.0 and x = 2.0; expected loops apart or one inside the other",
                station(0, rectangle(1, 0, 4, 0, 4), rectangle(2, 1, 2, 1, 2)),
                station(2, rectangle(1, 0, 4, 0, 4), rectangle(2, 7, 8, 1, 2)));
    }

    @Test
    void aSkinThatTurnsByTwoRightAnglesIsRefused() {
        refused(
                1,
                "loop 1 at x = 2.0 does not match the station before point by point: the skin crosses itself between them",
                station(0, SQUARE),
                station(2, loop(1, 1, 1, 0, 1, 0, 0, 1, 0)));
    }

    @Test
    void aLoopThatStartsAtAnotherCornerIsRefused() {
        // Taken point by point the section would turn a quarter on the way and lose a third of its volume.
        refused(
                1,
                "loop 1 at x = 2.0 starts at another corner than at the station before; expected matching points in the same order",
                station(0, SQUARE),
                station(2, loop(1, 1, 0, 1, 1, 0, 1, 0, 0)));
    }

    @Test
    void aLoopThatTurnsALittleIsTaken() {
        // 40° of 90°: as near to its own corner as to the next, so nothing says that it is wrong.
        double c = Math.cos(Math.toRadians(40));
        double s = Math.sin(Math.toRadians(40));
        Solid solid =
                solid(station(0, loop(1, 1, 0, 0, 1, -1, 0, 0, -1)), station(1, loop(1, c, s, -s, c, -c, -s, s, -c)));
        // Simpson's rule is exact; half way the corners are at cos 20° from the axis.
        assertEquals((2 + 8 * Math.pow(Math.cos(Math.toRadians(20)), 2) + 2) / 6, solid.volume(), 1e-14);
    }

    @Test
    void anArmThatSweepsThroughTheOtherIsRefused() {
        // Sound at both stations; on the way the left arm of a U swings through the right one before that has come
        // down.
        refused(
                1,
                "loop 1 at x = 2.0 does not match the station before point by point: the skin crosses itself between them",
                station(0, loop(1, 0, 0, 6, 0, 6, 9, 5, 9, 5, 1, 1, 1, 1, 5, 0, 5)),
                station(2, loop(1, 0, 0, 6, 0, 6, 1.5, 5, 1.5, 5, 1, 1, 1, 60, 30, 59, 90)));
    }
}
