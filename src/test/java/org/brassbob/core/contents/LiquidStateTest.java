// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.contents;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;

import org.brassbob.core.notice.NoticeCode;
import org.brassbob.core.round.Reading;
import org.brassbob.core.vessel.Liquid;
import org.brassbob.core.vessel.Policy.MassIn;
import org.brassbob.core.vessel.Tank;
import org.brassbob.fixture.Liquids;
import org.brassbob.fixture.RoundBuilder;
import org.brassbob.fixture.Tables;
import org.brassbob.fixture.TankBuilder;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;

class LiquidStateTest {
    private static LiquidState of(Liquid liquid, @Nullable RoundBuilder round, MassIn massIn) {
        Tank tank = TankBuilder.tabled("t", Tables.constant(10, 50, 0, 1, 1))
                .liquid(liquid)
                .build();
        Reading reading =
                round == null ? null : round.volume("t", 5).build().readings().get(0);
        return LiquidState.of(tank, reading, massIn);
    }

    private static NoticeCode code(LiquidState state) {
        assertNotNull(state.notice());
        return state.notice().code();
    }

    @Test
    void waterKeepsItsDensityWhateverItsTemperature() {
        LiquidState state = of(Liquids.SEA_WATER, RoundBuilder.round().temperature(30), MassIn.VACUUM);
        assertEquals(1.025, state.density(), 0);
        assertNull(state.notice());
        assertEquals(1.025 - 0.0011, of(Liquids.SEA_WATER, null, MassIn.AIR).density(), 1e-15);
    }

    @Test
    void densityOfTheReadingGoesBeforeTheShips() {
        assertEquals(
                1.012,
                of(Liquids.SEA_WATER, RoundBuilder.round().density(1.012), MassIn.VACUUM)
                        .density(),
                0);
    }

    @Test
    void petroleumExpands() {
        // 0.991 at 15 °C, 60 °C: the factor 0.96909 (see the examples of the factor).
        LiquidState hot =
                of(Liquids.fuelOil(0.95), RoundBuilder.round().density(0.991).temperature(60), MassIn.VACUUM);
        assertEquals(0.991 * 0.96909, hot.density(), 1e-5);
        assertNull(hot.notice());
        LiquidState air = of(Liquids.fuelOil(0.991), RoundBuilder.round().temperature(60), MassIn.AIR);
        assertEquals((0.991 - 0.0011) * 0.96909, air.density(), 1e-5);
        LiquidState lube = of(Liquids.lubeOil(0.890), RoundBuilder.round().temperature(50), MassIn.VACUUM);
        assertEquals(0.890 * 0.975138, lube.density(), 1e-6);
    }

    @Test
    void withoutATemperatureTheDensityAtFifteenDegreesIsToldOf() {
        LiquidState state = of(Liquids.fuelOil(0.95), RoundBuilder.round(), MassIn.VACUUM);
        assertEquals(0.95, state.density(), 0);
        assertEquals(NoticeCode.NO_TEMPERATURE, code(state));
        assertNull(of(Liquids.fuelOil(0.95), null, MassIn.VACUUM).notice());
    }

    @Test
    void densityOfNoProductGroupIsNotCorrected() {
        LiquidState state =
                of(Liquids.fuelOil(0.95), RoundBuilder.round().density(1.2).temperature(60), MassIn.VACUUM);
        assertEquals(1.2, state.density(), 0);
        assertEquals(NoticeCode.DENSITY_OUT_OF_RANGE, code(state));
        LiquidState lube = of(Liquids.lubeOil(0.7), RoundBuilder.round().temperature(60), MassIn.VACUUM);
        assertEquals(NoticeCode.DENSITY_OUT_OF_RANGE, code(lube));
    }
}
