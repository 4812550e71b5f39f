// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.brassbob.core.contents.TankState;
import org.brassbob.core.notice.Notice;
import org.brassbob.core.notice.NoticeCode;
import org.brassbob.core.notice.Severity;
import org.brassbob.core.working.Working;
import org.brassbob.fixture.Liquids;
import org.brassbob.fixture.RoundBuilder;
import org.brassbob.fixture.Shapes;
import org.brassbob.fixture.ShipBuilder;
import org.brassbob.fixture.Tables;
import org.brassbob.fixture.TankBuilder;
import org.junit.jupiter.api.Test;

/** What counts as empty, slack, full, unknown, stale, dry, and what is told about it (product.md rule 2). */
class StatesAndNoticesTest {
    private static TankBuilder ballast() {
        return TankBuilder.box("wb", 40, 50, -5, 5, 0, 5).residue(5).fillLimitPct(99);
    }

    private static ShipBuilder ship(TankBuilder... tanks) {
        return ShipBuilder.ship().gmRequired(0.15).tanks(tanks);
    }

    private static TankFigures figures(TankBuilder tank, RoundBuilder round) {
        return ship(tank).assess(round.build()).tanks().get(0);
    }

    private static List<NoticeCode> codes(List<Notice> notices) {
        return notices.stream().map(Notice::code).toList();
    }

    @Test
    void emptyAndFullHaveNoFreeSurface() {
        for (TankBuilder tank : List.of(ballast(), ballast().consumable())) {
            for (double volume : new double[] {0, 5, 490, 495}) {
                TankFigures figures = figures(tank, RoundBuilder.upright().volume("wb", volume));
                assertEquals(volume <= 5 ? TankState.EMPTY : TankState.FULL, figures.state());
                assertEquals(0, figures.fsmAsSounded(), 0);
                assertEquals(0, figures.fsmByCode(), 0);
                assertEquals(0, figures.gmLoss(), 0);
                assertEquals(0, figures.rank());
                assertFalse(figures.negligible());
                assertEquals(volume * 1.025, figures.mass(), 1e-9);
            }
        }
    }

    @Test
    void justShortOfFullTheWholeSurfaceCounts() {
        TankFigures figures = figures(ballast(), RoundBuilder.upright().percent("wb", 97.99));
        assertEquals(TankState.SLACK, figures.state());
        assertEquals(1.025 * 10 * 1000 / 12, figures.fsmByCode(), 1e-6);
    }

    @Test
    void fixedTankAtItsLevelConsumableAtItsGreatest() {
        // A hopper that broadens from 4 to 16 m: at 1 m of 6 it is 6 m wide; the greatest is at 98 % (closed forms,
        // trapezoid).
        TankBuilder hopper = TankBuilder.shaped("t", Shapes.prism(40, 50, -2, 0, 2, 0, 8, 6, -8, 6))
                .pipe(45, 0, 0, 6)
                .liquid(Liquids.FRESH_WATER);
        TankFigures fixed = figures(hopper, RoundBuilder.upright().sounding("t", 1));
        assertEquals(10 * 216 / 12.0, fixed.fsmAsSounded(), 1e-7);
        assertEquals(fixed.fsmAsSounded(), fixed.fsmByCode(), 0);
        // Volume below z is 10·(4z + z²): 98 % of 600 m3 is at z = −2 + √62.8.
        double breadth = 4 + 2 * (-2 + Math.sqrt(62.8));
        TankFigures consumable =
                figures(hopper.consumable(), RoundBuilder.upright().sounding("t", 1));
        assertEquals(fixed.fsmAsSounded(), consumable.fsmAsSounded(), 1e-9);
        assertEquals(10 * Math.pow(breadth, 3) / 12, consumable.fsmByCode(), 1e-6);
        // With a fill limit of 70 % it is that level's: z = −2 + √46.
        double limited = 4 + 2 * (-2 + Math.sqrt(46));
        TankFigures below =
                figures(hopper.fillLimitPct(70), RoundBuilder.upright().sounding("t", 1));
        assertEquals(10 * Math.pow(limited, 3) / 12, below.fsmByCode(), 1e-6);
    }

    @Test
    void losesAndSharesAddUpAndRankByMoment() {
        Assessment assessment = ship(
                        TankBuilder.box("small", 10, 20, -2, 2, 0, 5),
                        TankBuilder.box("large", 20, 30, -8, 8, 0, 5),
                        TankBuilder.box("pressed", 30, 40, -8, 8, 0, 5),
                        TankBuilder.box("twin a", 50, 60, 0, 4, 0, 5),
                        TankBuilder.box("twin b", 60, 70, 0, 4, 0, 5))
                .assess(RoundBuilder.upright()
                        .sounding("small", 1)
                        .sounding("large", 1)
                        .full("pressed")
                        .sounding("twin a", 2)
                        .sounding("twin b", 3)
                        .build());
        List<String> order =
                assessment.slackest().stream().map(t -> t.tank().id()).toList();
        assertEquals(4, order.size());
        assertEquals("large", order.get(0));
        double loss =
                assessment.tanks().stream().mapToDouble(TankFigures::gmLoss).sum();
        assertEquals(assessment.condition().fsByCode(), loss, 1e-12);
        double share =
                assessment.tanks().stream().mapToDouble(TankFigures::sharePct).sum();
        assertEquals(100, share, 1e-9);
        // 4³ against 16³: 1/64 each of the large one's.
        TankFigures large = assessment.tank("large").orElseThrow();
        assertEquals(
                64, large.sharePct() / assessment.tank("small").orElseThrow().sharePct(), 1e-6);
        assertEquals(large.fsmByCode() / assessment.condition().displacement(), large.gmLoss(), 0);
    }

    @Test
    void equalMomentsRankInTheOrderOfTheWalk() {
        Assessment assessment = ship(
                        TankBuilder.tabled("first", Tables.constant(100, 50, 0, 1, 40)),
                        TankBuilder.tabled("second", Tables.constant(100, 50, 0, 1, 40)))
                .assess(RoundBuilder.upright()
                        .volume("first", 50)
                        .volume("second", 50)
                        .build());
        assertEquals(1, assessment.tank("first").orElseThrow().rank());
        assertEquals(2, assessment.tank("second").orElseThrow().rank());
    }

    @Test
    void aVoidNobodySoundedIsTakenAsDryAndHoldsTheStateAtCaution() {
        TankBuilder cofferdam = TankBuilder.box("void", 40, 42, -5, 5, 0, 5).asVoid();
        Assessment unread = ship(cofferdam).assess(RoundBuilder.upright().build());
        assertEquals(0, unread.tanks().get(0).volume(), 0);
        assertEquals(TankState.UNKNOWN, unread.tanks().get(0).state());
        assertEquals(List.of(NoticeCode.VOID_NOT_READ), codes(unread.notices()));
        assertEquals(Margin.State.CAUTION, unread.margin().state());
        Assessment dry = ship(cofferdam)
                .assess(RoundBuilder.upright().sounding("void", 0).build());
        assertEquals(TankState.EMPTY, dry.tanks().get(0).state());
        assertEquals(List.of(), dry.notices());
        assertEquals(Margin.State.CLEAR, dry.margin().state());
    }

    @Test
    void aVoidWithWaterInItStopsEverything() {
        TankBuilder cofferdam =
                TankBuilder.box("void", 40, 42, -5, 5, 0, 5).asVoid().fillLimitPct(0);
        Assessment wet = ship(cofferdam)
                .assess(RoundBuilder.upright().sounding("void", 0.2).build());
        assertEquals(4, wet.tanks().get(0).volume(), 1e-9);
        assertEquals(List.of(NoticeCode.VOID_NOT_DRY), codes(wet.notices()));
        assertEquals(Severity.STOP, wet.notices().get(0).severity());
        assertEquals(Margin.State.CAUTION, wet.margin().state());
        assertTrue(wet.tanks().get(0).fsmByCode() > 0);
    }

    @Test
    void stalenessGoesByKind() {
        ShipBuilder ship = ship(
                        ballast(),
                        TankBuilder.box("fw", 60, 64, 0, 3, 0, 3).liquid(Liquids.FRESH_WATER),
                        TankBuilder.box("void", 70, 71, 0, 3, 0, 3).asVoid())
                .staleAfter("default", 24)
                .staleAfter("fresh-water", 12)
                .staleAfter("void", 48);
        RoundBuilder round =
                RoundBuilder.upright().sounding("wb", 1).sounding("fw", 1).sounding("void", 0);
        assertEquals(List.of(), stale(ship.assess(round.build())));
        Assessor assessor = ship.assessor();
        assertEquals(List.of(), stale(at(assessor, round, 12)));
        assertEquals(List.of("fw"), stale(at(assessor, round, 12.01)));
        assertEquals(List.of("fw"), stale(at(assessor, round, 24)));
        assertEquals(List.of("wb", "fw"), stale(at(assessor, round, 24.01)));
        Assessment old = at(assessor, round, 49);
        assertEquals(List.of("wb", "fw", "void"), stale(old));
        assertEquals(Margin.State.CAUTION, old.margin().state());
        assertEquals(49, old.tanks().get(0).ageHours(), 1e-9);
        assertEquals(
                3,
                old.notices().stream()
                        .filter(n -> n.code() == NoticeCode.READING_STALE)
                        .count());
        // The last value stays.
        assertEquals(100, old.tanks().get(0).volume(), 1e-9);
        assertEquals(ship.assess(round.build()).condition(), old.condition());
    }

    private static Assessment at(Assessor assessor, RoundBuilder round, double hours) {
        return assessor.assess(round.build(), RoundBuilder.NOON.plusSeconds(Math.round(hours * 3600)), Working.OFF);
    }

    private static List<String> stale(Assessment assessment) {
        return assessment.tanks().stream()
                .filter(TankFigures::stale)
                .map(t -> t.tank().id())
                .toList();
    }

    @Test
    void agesCountToTheLastReadingUnlessToldOtherwise() {
        TankBuilder other = TankBuilder.box("fw", 60, 64, 0, 3, 0, 3);
        RoundBuilder round = RoundBuilder.upright().sounding("wb", 1).at(30).sounding("fw", 1);
        Assessment assessment = ship(ballast(), other).assess(round.build());
        assertEquals(30, assessment.tanks().get(0).ageHours(), 1e-9);
        assertTrue(assessment.tanks().get(0).stale());
        assertEquals(0, assessment.tanks().get(1).ageHours(), 0);
        // A tank that could not be read still says how late it is.
        RoundBuilder late = RoundBuilder.upright().sounding("wb", 1).at(26).notTaken("fw");
        assertEquals(
                26, ship(ballast(), other).assess(late.build()).tanks().get(0).ageHours(), 1e-9);
        // A reading from after the time asked for is new, not of a negative age.
        assertEquals(
                0,
                at(ship(ballast()).assessor(), RoundBuilder.upright().sounding("wb", 1), -5)
                        .tanks()
                        .get(0)
                        .ageHours(),
                0);
    }

    @Test
    void theLatestReadingThatStatesALevelCounts() {
        RoundBuilder round = RoundBuilder.upright()
                .at(2)
                .sounding("wb", 2)
                .at(1)
                .sounding("wb", 1)
                .at(3)
                .notTaken("wb");
        TankFigures figures = figures(ballast(), round);
        assertEquals(200, figures.volume(), 1e-9);
        assertEquals(1, figures.ageHours(), 1e-9);
        assertEquals(TankState.SLACK, figures.state());
        // Of two at one time the later in the round counts, as a correction written below.
        assertEquals(
                300,
                figures(ballast(), RoundBuilder.upright().sounding("wb", 2).sounding("wb", 3))
                        .volume(),
                1e-9);
    }

    @Test
    void onlyNotTakenIsUnknown() {
        TankFigures figures = figures(ballast(), RoundBuilder.upright().notTaken("wb"));
        assertEquals(TankState.UNKNOWN, figures.state());
        assertEquals(List.of(NoticeCode.READING_MISSING), codes(figures.notes()));
        assertEquals(Double.NaN, figures.ageHours());
        assertTrue(figures.fsmByCode() > 0);
    }

    @Test
    void aboveTheFillLimit() {
        TankBuilder tank = ballast().fillLimitPct(90);
        assertEquals(
                List.of(),
                codes(figures(tank, RoundBuilder.upright().percent("wb", 90)).notes()));
        assertEquals(
                List.of(NoticeCode.ABOVE_FILL_LIMIT),
                codes(figures(tank, RoundBuilder.upright().percent("wb", 90.1)).notes()));
    }

    @Test
    void freeWaterUnderOil() {
        // 10 × 10 m, 3 m of which the lowest 0.5 m is water: 50 m3 at the sea's density, oil above, and the interface
        // as a second surface.
        TankBuilder tank = TankBuilder.box("fo", 40, 50, -5, 5, 1, 6).liquid(Liquids.ofDensity(0.9));
        RoundBuilder round = RoundBuilder.upright().seaDensity(1.02).water(0.5).sounding("fo", 3);
        Assessment assessment = ship(tank).assess(round.build());
        TankFigures figures = assessment.tanks().get(0);
        double oil = 250 * 0.9;
        double water = 50 * 1.02;
        assertEquals(300, figures.volume(), 1e-9);
        assertEquals(oil + water, figures.mass(), 1e-9);
        double vcg = (oil * (1 + 1.75) + water * (1 + 0.25)) / (oil + water);
        assertEquals(vcg, figures.vcg(), 1e-9);
        assertEquals(
                (5000 * 6 + figures.mass() * vcg) / (5000 + figures.mass()),
                assessment.condition().kg(),
                1e-12);
        double surface = 10 * 1000 / 12.0;
        assertEquals(0.9 * surface + 0.12 * surface, figures.fsmAsSounded(), 1e-6);
        assertEquals(figures.fsmAsSounded(), figures.fsmByCode(), 1e-9);
        assertEquals(List.of(NoticeCode.FREE_WATER), codes(figures.notes()));
    }

    @Test
    void moreWaterThanLiquidIsAllWater() {
        TankBuilder tank = TankBuilder.box("fo", 40, 50, -5, 5, 1, 6).liquid(Liquids.ofDensity(0.9));
        TankFigures figures = figures(tank, RoundBuilder.upright().water(4).sounding("fo", 3));
        assertEquals(300 * 1.025, figures.mass(), 1e-9);
        assertEquals(1.025 * 10 * 1000 / 12.0, figures.fsmAsSounded(), 1e-6);
    }

    @Test
    void waterUnderALiquidHeavierThanItMakesNoSecondSurface() {
        TankBuilder tank = TankBuilder.box("c", 40, 50, -5, 5, 1, 6).liquid(Liquids.ofDensity(1.3));
        TankFigures figures = figures(tank, RoundBuilder.upright().water(0.5).sounding("c", 3));
        assertEquals(1.3 * 10 * 1000 / 12.0, figures.fsmAsSounded(), 1e-6);
    }

    @Test
    void freeWaterIsOnlyLookedForWithATape() {
        TankBuilder tank =
                TankBuilder.tabled("fo", Tables.constant(100, 50, 0, 1, 40)).liquid(Liquids.ofDensity(0.9));
        assertEquals(
                45,
                figures(tank, RoundBuilder.upright().water(0.5).volume("fo", 50))
                        .mass(),
                1e-9);
        assertEquals(
                45,
                figures(tank, RoundBuilder.upright().water(0).volume("fo", 50)).mass(),
                1e-9);
    }

    @Test
    void remarksOnTheLiquidComeWithItsTankOnlyWhereThereIsAny() {
        TankBuilder tank = TankBuilder.box("fo", 40, 50, -5, 5, 0, 5).liquid(Liquids.fuelOil(0.95));
        assertEquals(
                List.of(NoticeCode.NO_TEMPERATURE),
                codes(figures(tank, RoundBuilder.upright().sounding("fo", 1)).notes()));
        assertEquals(
                List.of(),
                codes(figures(tank, RoundBuilder.upright().empty("fo")).notes()));
    }

    @Test
    void theGravestNoticesComeFirst() {
        Assessment assessment = ship(
                        TankBuilder.box("fo", 40, 50, -5, 5, 0, 5).liquid(Liquids.fuelOil(0.95)),
                        TankBuilder.box("wb", 50, 60, -5, 5, 0, 5),
                        TankBuilder.box("void", 70, 71, 0, 3, 0, 3).asVoid())
                .assess(RoundBuilder.upright()
                        .sounding("fo", 1)
                        .sounding("void", 1)
                        .build());
        List<Severity> severities =
                assessment.notices().stream().map(Notice::severity).toList();
        assertEquals(List.of(Severity.STOP, Severity.CAUTION, Severity.NOTE), severities);
        assertTrue(assessment.tank("nowhere").isEmpty());
    }
}
