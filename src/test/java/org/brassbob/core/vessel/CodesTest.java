// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.vessel;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import org.brassbob.core.condition.Margin;
import org.brassbob.core.contents.TankState;
import org.brassbob.core.round.ReadingKind;
import org.brassbob.core.vessel.Policy.MassIn;
import org.brassbob.fixture.Liquids;
import org.brassbob.fixture.ShipBuilder;
import org.brassbob.fixture.Tables;
import org.brassbob.fixture.TankBuilder;
import org.junit.jupiter.api.Test;

/** The words of the vessel folder, of rounds and of output are the contract's, and the small look-ups of a ship. */
class CodesTest {
    private static <E extends Enum<E>> List<String> codes(E[] values, Function<E, String> code) {
        return Arrays.stream(values).map(code).toList();
    }

    @Test
    void wordsOfTheVesselFolder() {
        assertEquals(List.of("sounding", "ullage", "remote"), codes(Gauge.values(), Gauge::code));
        assertEquals(List.of("fixed", "consumable"), codes(Use.values(), Use::code));
        assertEquals(List.of("tank", "void"), codes(SpaceKind.values(), SpaceKind::code));
        assertEquals(List.of("vacuum", "air"), codes(MassIn.values(), MassIn::code));
        assertEquals(
                List.of(
                        "sea-water",
                        "fresh-water",
                        "fuel-oil",
                        "gas-oil",
                        "lube-oil",
                        "hydraulic-oil",
                        "grey-water",
                        "black-water",
                        "oily-water",
                        "urea",
                        "cargo",
                        "none"),
                codes(LiquidClass.values(), LiquidClass::code));
    }

    @Test
    void wordsOfRoundsAndOutput() {
        assertEquals(
                List.of("sounding", "ullage", "volume", "percent", "mass", "empty", "full", "not-taken"),
                codes(ReadingKind.values(), ReadingKind::code));
        assertEquals(List.of("empty", "slack", "full", "unknown"), codes(TankState.values(), TankState::code));
        assertEquals(List.of("clear", "caution", "below"), codes(Margin.State.values(), Margin.State::code));
    }

    @Test
    void tanksAndCurvesAreFoundByName() {
        Vessel vessel = ShipBuilder.ship()
                .tanks(TankBuilder.tabled("t", Tables.constant(10, 50, 0, 1, 1)))
                .gmRequired(0.2)
                .build();
        assertEquals("t", vessel.tank("t").orElseThrow().id());
        assertTrue(vessel.tank("u").isEmpty());
        assertEquals("intact", vessel.limitCurve("intact").orElseThrow().name());
        assertTrue(vessel.limitCurve("timber").isEmpty());
    }

    @Test
    void ageLimitsGoFromTheKindToTheDefaultToADay() {
        Tank fresh = TankBuilder.tabled("t", Tables.constant(10, 50, 0, 1, 1))
                .liquid(Liquids.FRESH_WATER)
                .build();
        assertEquals(24, policy(Map.of()).staleAfterHours(fresh), 0);
        assertEquals(36, policy(Map.of("default", 36.0)).staleAfterHours(fresh), 0);
        assertEquals(12, policy(Map.of("default", 36.0, "fresh-water", 12.0)).staleAfterHours(fresh), 0);
    }

    private static Policy policy(Map<String, Double> staleAfter) {
        return new Policy(0.1, null, null, null, staleAfter, MassIn.VACUUM);
    }
}
