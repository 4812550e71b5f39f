// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.brassbob.core.round.Reading;
import org.brassbob.core.round.SoundingRound;
import org.brassbob.core.working.Working;
import org.brassbob.fixture.Hydrostatics;
import org.brassbob.fixture.Liquids;
import org.brassbob.fixture.RoundBuilder;
import org.brassbob.fixture.Shapes;
import org.brassbob.fixture.ShipBuilder;
import org.brassbob.fixture.Tables;
import org.brassbob.fixture.TankBuilder;

/** What must hold for any ship and any round: conservation, symmetry, and that knowing less never looks better. */
class ConditionProperties {
    private static final String SEED = "1852";

    /** A random tank, its mirror image where the side is turned; tables or shape, sounded with a pipe near an end. */
    private static TankBuilder tank(int i, long seed, int side) {
        Random random = new Random(seed * 31 + i);
        double x0 = 5 + 80 * random.nextDouble();
        double length = 4 + 10 * random.nextDouble();
        double inner = 0.5 + 2 * random.nextDouble();
        double outer = inner + 1 + 4 * random.nextDouble();
        double bottom = 5 * random.nextDouble();
        double height = 1 + 4 * random.nextDouble();
        double[] section = {
            side * inner,
            bottom,
            side * (inner + outer) / 2,
            bottom,
            side * outer,
            bottom + height,
            side * inner,
            bottom + height
        };
        TankBuilder tank = TankBuilder.shaped("t" + i, Shapes.prism(x0, x0 + length, section))
                .pipe(x0 + length * random.nextDouble(), side * (inner + 0.2), bottom, height)
                .residue(random.nextInt(3))
                .fillLimitPct(90 + random.nextInt(11))
                .liquid(Liquids.ofDensity(0.8 + 0.3 * random.nextDouble()));
        if (random.nextBoolean()) {
            tank.volumes(Tables.volumesOf(Shapes.net(Shapes.prism(x0, x0 + length, section)), 15));
        }
        return random.nextBoolean() ? tank.consumable() : tank;
    }

    private static ShipBuilder ship(long seed, int tanks, int side) {
        Random random = new Random(seed);
        ShipBuilder ship = ShipBuilder.ship()
                .hydrostatics(Hydrostatics.boxes(100, 16, 1, 9, 33))
                .lightship(
                        2500 + 1500 * random.nextDouble(),
                        46 + 6 * random.nextDouble(),
                        side * 0.1 * random.nextDouble(),
                        4.5);
        for (int i = 0; i < tanks; i++) {
            ship.tanks(tank(i, seed, side));
        }
        return ship;
    }

    private static RoundBuilder readings(long seed, int tanks, RoundBuilder round) {
        for (int i = 0; i < tanks; i++) {
            Random random = new Random(seed * 17 + i);
            double height = 1 + 4 * nth(new Random(seed * 31 + i), 5);
            if (random.nextInt(4) == 0) {
                round.percent("t" + i, 100 * random.nextDouble());
            } else {
                round.sounding("t" + i, height * random.nextDouble());
            }
        }
        return round;
    }

    /** The value that {@link #tank} drew after so many others. */
    private static double nth(Random random, int skip) {
        for (int i = 0; i < skip; i++) {
            random.nextDouble();
        }
        return random.nextDouble();
    }

    @Property(tries = 100, seed = SEED)
    void aMirroredShipListsToTheOtherSide(@ForAll long seed) {
        Assessment ship =
                ship(seed, 6, 1).assess(readings(seed, 6, RoundBuilder.round()).build());
        Assessment mirror =
                ship(seed, 6, -1).assess(readings(seed, 6, RoundBuilder.round()).build());
        assertEquals(ship.condition().listDeg(), -mirror.condition().listDeg(), 1e-6);
        assertEquals(ship.condition().gm(), mirror.condition().gm(), 1e-7);
        assertEquals(ship.condition().trim(), mirror.condition().trim(), 1e-7);
        assertEquals(ship.margin().state(), mirror.margin().state());
    }

    @Property(tries = 60, seed = SEED)
    void contentsOfATankCountLikeAWeightButForTheirSurface(@ForAll long seed) {
        SoundingRound round =
                readings(seed, 6, RoundBuilder.round().trim(0.3).list(0.5)).build();
        Assessment withTanks = ship(seed, 6, 1).assess(round);
        ShipBuilder solid = ship(seed, 0, 1);
        for (TankFigures t : withTanks.tanks()) {
            solid.weight(t.tank().id(), t.mass(), t.lcg(), t.tcg(), t.vcg());
        }
        Condition weighed = solid.assess(RoundBuilder.upright().build()).condition();
        assertEquals(withTanks.condition().displacement(), weighed.displacement(), 1e-8);
        assertEquals(withTanks.condition().gmSolid(), weighed.gmSolid(), 1e-9);
        assertEquals(withTanks.condition().trim(), weighed.trim(), 1e-9);
        assertEquals(withTanks.condition().tcg(), weighed.tcg(), 1e-9);
        assertEquals(0, weighed.fsByCode(), 0);
    }

    @Property(tries = 60, seed = SEED)
    void surfacesAddUpAndTheCodeNeverCountsLess(@ForAll long seed) {
        Assessment a =
                ship(seed, 8, 1).assess(readings(seed, 8, RoundBuilder.round()).build());
        Condition c = a.condition();
        assertTrue(c.gm() <= c.gmAsSounded() && c.gmAsSounded() <= c.gmSolid());
        double loss = a.tanks().stream().mapToDouble(TankFigures::gmLoss).sum();
        assertEquals(c.fsByCode(), loss, 1e-12);
        for (TankFigures t : a.tanks()) {
            assertTrue(t.fsmByCode() >= t.fsmAsSounded() - 1e-12);
            assertEquals(t.fsmByCode() > 0, t.rank() > 0);
        }
        List<TankFigures> ranked = a.slackest();
        for (int i = 1; i < ranked.size(); i++) {
            assertTrue(ranked.get(i - 1).gmLoss() >= ranked.get(i).gmLoss());
        }
    }

    @Property(tries = 60, seed = SEED)
    void theOrderOfTheReadingsDoesNotMatter(@ForAll long seed) {
        SoundingRound round = readings(seed, 6, RoundBuilder.round()).build();
        List<Reading> shuffled = new ArrayList<>(round.readings());
        Collections.shuffle(shuffled, new Random(seed));
        Assessor assessor = ship(seed, 6, 1).assessor();
        Assessment other = assessor.assess(new SoundingRound(round.name(), round.observed(), null, shuffled));
        assertEquals(assessor.assess(round).condition(), other.condition());
    }

    @Property(tries = 40, seed = SEED)
    void knowingLessNeverLooksBetter(@ForAll long seed) {
        int tanks = 5;
        RoundBuilder observed = RoundBuilder.round().trim(0.4).list(0.3);
        knowingLess(seed, tanks, observed, 1e-6);
    }

    @Property(tries = 40, seed = SEED)
    void knowingLessNeverLooksBetterThoughTrimAndListFollow(@ForAll long seed) {
        // She settles with 33 levels of the tank; what lies between them may cost a little more.
        knowingLess(seed, 5, RoundBuilder.round(), 5e-4);
    }

    /** One tank loses its reading; against every reading that it could have had. */
    private static void knowingLess(long seed, int tanks, RoundBuilder round, double tolerance) {
        Assessor assessor = ship(seed, tanks, 1).assessor();
        String last = "t" + (tanks - 1);
        Assessment unread = assessor.assess(readings(seed, tanks - 1, round).build());
        TankFigures open = unread.tank(last).orElseThrow();
        for (int i = 0; i <= 40; i++) {
            double low = open.tank().residue();
            double volume = low + (open.tank().fillLimit() - low) * i / 40;
            Assessment read = assessor.assess(round.volume(last, volume).build());
            assertTrue(
                    unread.margin().margin() <= read.margin().margin() + tolerance,
                    () -> unread.margin().margin() + " unread, " + read.margin().margin() + " with " + volume + " m3");
        }
    }

    @Property(tries = 30, seed = SEED)
    void growingOldNeverLooksBetter(@ForAll long seed) {
        SoundingRound round = readings(seed, 4, RoundBuilder.round()).build();
        Assessor assessor = ship(seed, 4, 1).assessor();
        Assessment fresh = assessor.assess(round);
        Assessment old = assessor.assess(round, RoundBuilder.NOON.plusDays(2), Working.OFF);
        assertEquals(fresh.condition(), old.condition());
        assertTrue(old.margin().margin() <= fresh.margin().margin());
        assertTrue(old.margin().state() != Margin.State.CLEAR);
        assertTrue(old.margin().state().compareTo(fresh.margin().state()) >= 0);
    }
}
