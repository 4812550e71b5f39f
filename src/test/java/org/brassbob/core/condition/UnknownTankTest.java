// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Stream;
import org.brassbob.core.contents.TankState;
import org.brassbob.core.notice.NoticeCode;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.vessel.Tank;
import org.brassbob.fixture.Hydrostatics;
import org.brassbob.fixture.Liquids;
import org.brassbob.fixture.RoundBuilder;
import org.brassbob.fixture.Shapes;
import org.brassbob.fixture.ShipBuilder;
import org.brassbob.fixture.Tables;
import org.brassbob.fixture.TankBuilder;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * A tank that nobody read takes the level with the lowest corrected GM (product.md rule 2): no reading between residue and fill limit
 * may give a lower one, and one of them gives it. Checked by giving it every level of a fine grid as a reading.
 */
class UnknownTankTest {
    /** GM with the level found may be above the lowest of the grid by no more than this (m). */
    private static final double NO_BETTER = 1e-6;

    private static TankBuilder tall() {
        return TankBuilder.box("tall", 40, 48, -5, 5, 0.5, 12).residue(3).fillLimitPct(97);
    }

    private static TankBuilder doubleBottom() {
        return TankBuilder.box("db", 20, 60, -7, 7, 0, 1.4).residue(5).fillLimitPct(100);
    }

    private static TankBuilder hopper() {
        return TankBuilder.shaped("hopper", Shapes.prism(30, 50, 2, 0, 4, 0, 8, 4, 8, 9, 6, 9, 2, 2))
                .fillLimitPct(98);
    }

    private static TankBuilder ledge() {
        return TankBuilder.shaped("ledge", Shapes.prism(30, 50, 0, 0, 8, 0, 8, 1.03, 3, 1.03, 3, 6, 0, 6));
    }

    private static TankBuilder tabled() {
        return TankBuilder.tabled("tabled", Tables.volumesOf(Shapes.net(Shapes.ruledWing(20, 20, 5, 1)), 12))
                .residue(1)
                .fillLimitPct(99);
    }

    private static TankBuilder spiky() {
        // A table with a peak of the second moment between two even rows, and a centroid that falls again near the top.
        return TankBuilder.tabled(
                "spiky",
                Tables.volumes(
                        new double[] {0, 101, 103, 300},
                        new double[] {50, 50, 50, 50},
                        new double[] {2, 2, 2, 2},
                        new double[] {0, 3, 3.1, 6},
                        new double[] {100, 200, 3000, 150}));
    }

    private static TankBuilder fuel() {
        return TankBuilder.box("fuel", 10, 20, -3, 3, 4, 9)
                .residue(2)
                .fillLimitPct(95)
                .consumable()
                .liquid(Liquids.fuelOil(0.96));
    }

    static Stream<Arguments> ships() {
        return Stream.of(
                        tall(),
                        doubleBottom(),
                        hopper(),
                        ledge(),
                        tabled(),
                        spiky(),
                        fuel(),
                        tall().consumable(),
                        fuel().fillLimitPct(99))
                .flatMap(tank -> Stream.of(
                        Arguments.of("constant KM", tank, ShipBuilder.ship().lightship(3000, 50, 0.02, 6.5)),
                        Arguments.of("box", tank, box()),
                        Arguments.of("trims", tank, withTrims())));
    }

    /** KM falls quickly as she sinks. */
    private static ShipBuilder box() {
        return ShipBuilder.ship()
                .hydrostatics(Hydrostatics.boxes(100, 16, 1, 9, 33))
                .lightship(2500, 48, 0.01, 6.0);
    }

    /** KM depends on trim, and the readings of another tank on the trim that they themselves make. */
    private static ShipBuilder withTrims() {
        HydrostaticTable even = Hydrostatics.boxes(100, 16, 1, 9, 33);
        HydrostaticTable.Entry[] trimmed = even.rows(0).entries().stream()
                .map(e -> new HydrostaticTable.Entry(
                        e.draught(),
                        e.displacement(),
                        e.lcb() - 1,
                        e.lcf() - 1,
                        e.kmt() + 0.4,
                        e.mct(),
                        e.tpc(),
                        e.kb()))
                .toArray(HydrostaticTable.Entry[]::new);
        HydrostaticTable table = HydrostaticTable.of(Axis.of(-2, 2), List.of(even.rows(0), Hydrostatics.rows(trimmed)));
        return ShipBuilder.ship().hydrostatics(table).lightship(2500, 48, 0.01, 6.0);
    }

    private static double[] grid(Tank tank, int steps) {
        double low = tank.residue();
        double high = tank.fillLimit();
        double[] levels = new double[steps + 4];
        for (int i = 0; i <= steps; i++) {
            levels[i] = low + (high - low) * i / steps;
        }
        levels[steps + 1] = Math.min(high, 0.98 * tank.capacity() - 1e-6);
        levels[steps + 2] = Math.min(high, low + 1e-6);
        levels[steps + 3] = Math.min(high, 0.98 * tank.capacity());
        return levels;
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("ships")
    void noLevelOfOneTankIsWorse(String name, TankBuilder builder, ShipBuilder ship) {
        Tank tank = builder.build();
        Assessor assessor = ship.tanks(tank).assessor();
        for (RoundBuilder round : List.of(RoundBuilder.upright(), RoundBuilder.round())) {
            Assessment unknown = assessor.assess(round.build());
            double lowest = Double.POSITIVE_INFINITY;
            for (double level : grid(tank, 1000)) {
                RoundBuilder read = round.volume(tank.id(), level);
                lowest = Math.min(
                        lowest, assessor.assess(read.build()).condition().gm());
            }
            assertTrue(
                    unknown.condition().gm() <= lowest + NO_BETTER,
                    () -> "GM " + unknown.condition().gm());
            assertEquals(lowest, unknown.condition().gm(), 5e-3, "the level found is one that she could have");
            TankFigures figures = unknown.tanks().get(0);
            assertEquals(TankState.UNKNOWN, figures.state());
            assertEquals(NoticeCode.READING_MISSING, figures.notes().get(0).code());
            assertTrue(figures.volume() >= tank.residue() && figures.volume() <= tank.fillLimit() + 1e-9);
        }
    }

    static Stream<List<TankBuilder>> pairs() {
        return Stream.of(
                List.of(tall(), doubleBottom()),
                List.of(doubleBottom(), hopper()),
                List.of(ledge(), fuel()),
                List.of(tabled(), spiky()),
                List.of(tall().consumable(), TankBuilder.box("tall2", 48, 56, -5, 5, 0.5, 12)));
    }

    @ParameterizedTest
    @MethodSource("pairs")
    void noPairOfLevelsIsWorse(List<TankBuilder> pair) {
        for (ShipBuilder ship : List.of(ShipBuilder.ship().lightship(3000, 6.5), box(), withTrims())) {
            check(ship, pair, 60);
        }
    }

    @Test
    void noThreeLevelsAreWorse() {
        check(box(), List.of(tall(), doubleBottom(), hopper()), 16);
        check(ShipBuilder.ship().lightship(1500, 7.5), List.of(tall(), doubleBottom(), tabled()), 16);
    }

    private static void check(ShipBuilder ship, List<TankBuilder> builders, int steps) {
        List<Tank> tanks = builders.stream().map(TankBuilder::build).toList();
        tanks.forEach(ship::tanks);
        Assessor assessor = ship.assessor();
        double unknown =
                assessor.assess(RoundBuilder.upright().build()).condition().gm();
        double lowest = lowest(assessor, tanks, 0, new double[tanks.size()], steps);
        assertTrue(unknown <= lowest + NO_BETTER, () -> unknown + " against " + lowest + " looking everywhere");
        assertEquals(lowest, unknown, 2e-2, "the levels found are some that she could have");
    }

    private static double lowest(Assessor assessor, List<Tank> tanks, int n, double[] levels, int steps) {
        if (n == tanks.size()) {
            RoundBuilder round = RoundBuilder.upright();
            for (int i = 0; i < n; i++) {
                round.volume(tanks.get(i).id(), levels[i]);
            }
            return assessor.assess(round.build()).condition().gm();
        }
        double lowest = Double.POSITIVE_INFINITY;
        for (double level : grid(tanks.get(n), steps)) {
            levels[n] = level;
            lowest = Math.min(lowest, lowest(assessor, tanks, n + 1, levels, steps));
        }
        return lowest;
    }

    @Test
    void twoThatAreWorseOnlyTogether() {
        // Either tank alone, filled, makes her better; both together make her worse still: KM falls away beyond a
        // displacement
        // that neither reaches alone.
        HydrostaticTable cliff = Hydrostatics.evenKeel(
                new HydrostaticTable.Entry(1, 1000, 50, 50, 8.0, 100, 20, 1),
                new HydrostaticTable.Entry(2, 3000, 50, 50, 8.0, 100, 20, 1),
                new HydrostaticTable.Entry(3, 3600, 50, 50, 8.0, 100, 20, 1),
                new HydrostaticTable.Entry(4, 4000, 50, 50, 6.0, 100, 20, 1));
        ShipBuilder ship = ShipBuilder.ship().hydrostatics(cliff).lightship(3000, 6.0);
        TankBuilder a =
                TankBuilder.tabled("a", Tables.constant(500, 50, 0, 5.5, 0)).liquid(Liquids.FRESH_WATER);
        TankBuilder b =
                TankBuilder.tabled("b", Tables.constant(500, 50, 0, 5.5, 0)).liquid(Liquids.FRESH_WATER);
        check(ship, List.of(a, b), 50);
    }

    @Test
    void levelIsJudgedAtTheTrimThatItMakes() {
        // Low and far aft: filling it lowers KG, yet the trim that it makes costs more KM than that.
        HydrostaticTable steep = HydrostaticTable.of(
                Axis.of(0, 2),
                List.of(
                        Hydrostatics.rows(
                                new HydrostaticTable.Entry(1, 1000, 50, 50, 8, 100, 20, 1),
                                new HydrostaticTable.Entry(9, 9000, 50, 50, 8, 100, 20, 1)),
                        Hydrostatics.rows(
                                new HydrostaticTable.Entry(1, 1000, 50, 50, 6, 100, 20, 1),
                                new HydrostaticTable.Entry(9, 9000, 50, 50, 6, 100, 20, 1))));
        ShipBuilder ship = ShipBuilder.ship().hydrostatics(steep).lightship(4000, 6.0);
        check(ship, List.of(TankBuilder.box("afterpeak", 0, 8, -4, 4, 0, 4)), 400);
    }

    @Test
    void levelThatMakesAnotherTankSlackByItsTrimIsFound() {
        // The wide tank reads just over 98 % on even keel and counts as full. The unread tank is low: filling it alone
        // makes her
        // stiffer. But it is far aft, and by the stern the same reading in the after pipe means a slack wide tank.
        ShipBuilder ship = ShipBuilder.ship()
                .lightship(4000, 53.2226, 0, 6)
                .tanks(
                        TankBuilder.box("wide", 30, 50, -8, 8, 0, 4).pipe(30, 0, 0, 4),
                        TankBuilder.box("aft", 2, 12, -1, 1, 0, 4));
        Assessor assessor = ship.assessor();
        RoundBuilder round = RoundBuilder.round().sounding("wide", 3.93);
        Assessment unread = assessor.assess(round.build());
        Assessment full = assessor.assess(round.volume("aft", 80).build());
        Assessment empty = assessor.assess(round.volume("aft", 0).build());
        assertEquals(TankState.FULL, empty.tanks().get(0).state());
        assertEquals(TankState.SLACK, full.tanks().get(0).state());
        assertTrue(full.condition().gm() < empty.condition().gm() - 0.5, "the trim costs her a great deal");
        assertTrue(unread.condition().gm() <= full.condition().gm() + NO_BETTER);
    }

    @Test
    void fillLimitBelowTheResidueLeavesOneLevel() {
        Tank tank = doubleBottom().residue(20).fillLimitPct(1).build();
        Assessment assessment =
                ShipBuilder.ship().tanks(tank).assess(RoundBuilder.upright().build());
        assertEquals(tank.fillLimit(), assessment.tanks().get(0).volume(), 1e-9);
    }
}
