// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.contents;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.stream.Stream;
import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.fixture.Shapes;
import org.brassbob.fixture.Tables;
import org.brassbob.fixture.TankBuilder;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** The greatest second moment of a consumable tank's surface between residue and the lesser of fill limit and 98 %. */
class GreatestSurfaceTest {
    private static final int SCAN = 2_000;

    static Stream<Arguments> shapes() {
        NetShape wing = Shapes.net(Shapes.ruledWing(20, 9, 5, 1));
        NetShape withIsland = new NetShape(
                Shapes.solid(Shapes.box(10, 20, -6, 6, 0, 5)).minus(Shapes.solid(Shapes.box(13, 17, -1, 4, 1, 3))), 2);
        return Stream.of(
                Arguments.of("box", Shapes.net(Shapes.box(10, 20, -6, 6, 0, 5))),
                Arguments.of("hopper", Shapes.net(Shapes.prism(10, 20, 0, 0, 2, 0, 7, 4, 7, 6, 0, 6))),
                Arguments.of(
                        "upper hopper, widest below", Shapes.net(Shapes.prism(10, 20, 0, 0, 7, 0, 7, 2, 3, 6, 0, 6))),
                Arguments.of("wedge", Shapes.net(wedge())),
                Arguments.of("wing", wing),
                Arguments.of("ledge", Shapes.net(Shapes.prism(10, 20, 0, 0, 8, 0, 8, 1, 3, 1, 3, 6, 0, 6))),
                Arguments.of("waist", Shapes.net(Shapes.prism(10, 20, -5, 0, 5, 0, 1, 3, 5, 6, -5, 6, -1, 3))),
                Arguments.of("across and along", Shapes.net(tetrahedral())),
                Arguments.of("with an island", withIsland));
    }

    /** Triangular in profile: as deep as wide aft, nothing forward. */
    private static SpaceShape wedge() {
        return Shapes.of(
                Shapes.station(10, -4, 0, 4, 0, 4, 5, -4, 5), Shapes.station(20, -4, 4.9, 4, 4.9, 4, 5, -4, 5));
    }

    /** A long keel below and a broad ridge above: length shrinks as breadth grows, so the greatest lies between. */
    private static SpaceShape tetrahedral() {
        return Shapes.of(
                Shapes.station(10, -0.01, 0, 0.01, 0, 0.01, 0.02, -0.01, 0.02),
                Shapes.station(15, -0.01, 0, 0.01, 0, 5, 6, -5, 6),
                Shapes.station(20, -0.01, 0, 0.01, 0, 0.01, 0.02, -0.01, 0.02));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("shapes")
    void noLevelIsWorseThanTheGreatest(String name, NetShape shape) {
        for (double trim : new double[] {0, 1.3, -0.7}) {
            for (double[] limits : new double[][] {{0, 98}, {2, 98}, {30, 60}, {0, 1}, {97, 98}}) {
                check(shape, trim, limits[0] / 100 * shape.capacity(), limits[1]);
            }
        }
    }

    /** Against a scan of the levels. The scan can miss the top by the width of its step, so it bounds from below only. */
    private static void check(NetShape shape, double trim, double residue, double fillLimitPct) {
        TankModel model = new TankModel(
                TankBuilder.tank("t")
                        .capacity(shape.capacity())
                        .residue(residue)
                        .fillLimitPct(fillLimitPct)
                        .consumable()
                        .build(),
                shape,
                TankBuilder.LBP);
        Attitude attitude = Attitude.of(trim, TankBuilder.LBP, 0);
        double low = shape.heightFor(attitude, residue);
        double high = shape.heightFor(attitude, fillLimitPct / 100 * shape.capacity());
        double scanned = 0;
        for (int i = 0; i <= SCAN; i++) {
            double height = low + (high - low) * i / SCAN;
            scanned = Math.max(scanned, shape.below(attitude, height).surface().transverse());
        }
        double found = model.greatestSecondMoment(trim);
        assertTrue(found >= scanned * (1 - 1e-9), () -> "trim " + trim + ", found " + found);
        assertEquals(scanned, found, 5e-3 * scanned + 1e-9, () -> "trim " + trim + " from " + residue);
    }

    @Test
    void closedForms() {
        // A box: l·b³/12 at every level.
        TankModel box = TankBuilder.box("b", 10, 20, -6, 6, 0, 5).consumable().model();
        assertEquals(10 * 12 * 12 * 12 / 12.0, box.greatestSecondMoment(0), 1e-7);
        // A ridge that falls away to both ends: its waterplane is a rectangle of l·(1 − s) by b·s at the height s, and
        // l·b³·s³·(1 − s)/12 is greatest at s = 3/4: 27/256·l·b³/12.
        double l = 12;
        double b = 9;
        SpaceShape ridge = Shapes.of(
                Shapes.station(-l / 2, -1e-6, 0, 1e-6, 0, 1e-6, 1e-6, -1e-6, 1e-6),
                Shapes.station(0, -1e-6, 0, 1e-6, 0, b / 2, 4, -b / 2, 4),
                Shapes.station(l / 2, -1e-6, 0, 1e-6, 0, 1e-6, 1e-6, -1e-6, 1e-6));
        TankModel model = TankBuilder.shaped("x", ridge).consumable().model();
        double greatest = 27.0 / 256 * l * b * b * b / 12;
        assertEquals(greatest, model.greatestSecondMoment(0), 1e-5 * greatest);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("shapes")
    void betweenTheTrimsWorkedOutItIsReadLinearly(String name, NetShape shape) {
        TankModel model = new TankModel(
                TankBuilder.tank("t").capacity(shape.capacity()).consumable().build(), shape, TankBuilder.LBP);
        for (double trim : new double[] {0.63, -0.021, 1.7777}) {
            Attitude attitude = Attitude.of(trim, TankBuilder.LBP, 0);
            double exact = SurfaceRange.greatest(shape, attitude, 0, 0.98 * shape.capacity());
            assertEquals(exact, model.greatestSecondMoment(trim), 1e-3 * exact);
        }
    }

    @Test
    void tableIsTakenAtItsRowsAndAtTheEndsOfTheRange() {
        double[] volumes = {0, 10, 20, 30, 40};
        double[] same = {1, 1, 1, 1, 1};
        double[] moments = {0, 100, 400, 50, 600};
        TankBuilder tank = TankBuilder.tabled("t", Tables.volumes(volumes, same, same, same, moments))
                .consumable();
        // 98 % of 40 m3 is 39.2 m3: 50 + 550·0.92.
        assertEquals(556, tank.model().greatestSecondMoment(0), 1e-9);
        assertEquals(400, tank.fillLimitPct(60).model().greatestSecondMoment(0), 1e-9);
        assertEquals(225, tank.residue(25).fillLimitPct(70).model().greatestSecondMoment(0), 1e-9);
    }

    @Test
    void levelNowNeverCountsLessThanItIs() {
        // Above the fill limit the surface is broader than anything below it.
        TankModel model = TankBuilder.shaped("t", Shapes.prism(10, 20, 0, 0, 2, 0, 8, 5, 0, 5))
                .fillLimitPct(50)
                .consumable()
                .model();
        double own = model.contents(0.9 * model.tank().capacity(), 0).secondMoment();
        assertTrue(own > model.greatestSecondMoment(0));
        assertEquals(own, model.secondMomentByCode(own, 0), 0);
        assertEquals(model.greatestSecondMoment(0), model.secondMomentByCode(0, 0), 0);
    }

    @Test
    void fixedTankCountsAtItsLevel() {
        TankModel model = TankBuilder.shaped("t", Shapes.prism(10, 20, 0, 0, 2, 0, 8, 5, 0, 5))
                .model();
        assertEquals(1.5, model.secondMomentByCode(1.5, 0), 0);
    }
}
