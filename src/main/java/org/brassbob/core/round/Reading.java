// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.round;

import java.time.OffsetDateTime;
import org.brassbob.core.table.Origin;
import org.jspecify.annotations.Nullable;

/**
 * One reading of one tank.
 *
 * @param tank id of the tank
 * @param at when it was taken
 * @param kind what it states
 * @param value in the unit of its kind; NaN where the kind has none
 * @param temperatureC of the liquid (°C), where taken
 * @param density t/m3 of the liquid, where it differs from the ship's data (at 15 °C for a petroleum liquid)
 * @param waterSounding depth of free water found at the bottom (m), where looked for
 * @param note the officer's remark, or the reason where nothing was taken
 * @param origin the file and line
 */
public record Reading(
        String tank,
        OffsetDateTime at,
        ReadingKind kind,
        double value,
        @Nullable Double temperatureC,
        @Nullable Double density,
        @Nullable Double waterSounding,
        String note,
        Origin origin) {}
