// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.contents;

import org.brassbob.core.notice.Notice;
import org.brassbob.core.notice.NoticeCode;
import org.brassbob.core.round.Reading;
import org.brassbob.core.vessel.Expansion;
import org.brassbob.core.vessel.Liquid;
import org.brassbob.core.vessel.Policy.MassIn;
import org.brassbob.core.vessel.Tank;
import org.jspecify.annotations.Nullable;

/**
 * The density that turns a tank's volume into mass.
 *
 * @param density t/m3 at the liquid's temperature, in vacuum or air as the ship states her masses
 * @param notice what must be told about it
 */
public record LiquidState(double density, @Nullable Notice notice) {
    /** What air takes off a density at 15 °C when masses are stated in air (t/m3; API MPMS 11.1 practice, from memory). */
    public static final double AIR_BUOYANCY = 0.0011;

    /** The liquid in a tank, as the reading states it or as the ship's data do. */
    public static LiquidState of(Tank tank, @Nullable Reading reading, MassIn massIn) {
        Liquid liquid = tank.liquid();
        Double stated = reading == null ? null : reading.density();
        Double temperature = reading == null ? null : reading.temperatureC();
        double given = stated == null ? liquid.density() : stated;
        double density = massIn == MassIn.AIR ? given - AIR_BUOYANCY : given;
        Notice notice = null;
        if (liquid.expansion() != Expansion.NONE) {
            if (temperature == null) {
                notice = reading == null ? null : Notice.of(NoticeCode.NO_TEMPERATURE, tank.id());
            } else {
                double factor = factor(liquid.expansion(), given, temperature);
                if (Double.isNaN(factor)) {
                    notice = Notice.of(NoticeCode.DENSITY_OUT_OF_RANGE, tank.id(), given);
                } else {
                    density *= factor;
                }
            }
        }
        return new LiquidState(density, notice);
    }

    private static double factor(Expansion expansion, double density15, double temperatureC) {
        return expansion == Expansion.PETROLEUM_LUBRICANT
                ? PetroleumFactor.ofLubricant(density15, temperatureC)
                : PetroleumFactor.of(density15, temperatureC);
    }
}
