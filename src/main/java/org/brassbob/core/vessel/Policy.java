// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.vessel;

import java.util.Map;
import org.jspecify.annotations.Nullable;

/**
 * The ship's own limits and allowances.
 *
 * @param gmAllowance the ship's cautionary margin above the required GM (m)
 * @param listLimitDeg greatest list in service, where given
 * @param trimMin least trim in service (m), where given
 * @param trimMax greatest trim in service (m), where given
 * @param staleAfterHours how old a reading may get: by {@code void}, liquid class code, and {@code default}
 * @param massIn whether masses are stated in vacuum or in air
 */
public record Policy(
        double gmAllowance,
        @Nullable Double listLimitDeg,
        @Nullable Double trimMin,
        @Nullable Double trimMax,
        Map<String, Double> staleAfterHours,
        MassIn massIn) {
    /** Where vessel.json gives no limit for the age of a reading: a day (common practice: daily soundings at least). */
    public static final double DEFAULT_STALE_AFTER_HOURS = 24;

    public Policy {
        staleAfterHours = Map.copyOf(staleAfterHours);
    }

    /** The age (hours) beyond which a reading of this space is stale: void or class first, then the default. */
    public double staleAfterHours(Tank tank) {
        String kind = tank.isVoid() ? "void" : tank.liquid().liquidClass().code();
        Double own = staleAfterHours.get(kind);
        return own != null ? own : staleAfterHours.getOrDefault("default", DEFAULT_STALE_AFTER_HOURS);
    }

    /** The convention in which masses are stated. */
    public enum MassIn {
        VACUUM("vacuum"),
        /** 0.0011 t/m3 taken off the density (API MPMS 11.1 practice). */
        AIR("air");

        private final String code;

        MassIn(String code) {
            this.code = code;
        }

        /** The word used in files. */
        public String code() {
            return code;
        }
    }
}
