// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.round;

import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * A round: what was observed of the ship, and the readings.
 *
 * @param name the file it came from, or another name for it
 * @param observed trim, list, draughts and sea density as observed
 * @param curve the limit curve that the officer chose, where named
 * @param readings in the order given; where a tank has several, the latest that states a level counts
 */
public record SoundingRound(String name, Observed observed, @Nullable String curve, List<Reading> readings) {
    public SoundingRound {
        readings = List.copyOf(readings);
    }

    /**
     * What was observed of the ship herself; each may be missing.
     *
     * @param trim draught aft minus draught forward between perpendiculars (m)
     * @param listDeg °, starboard positive
     * @param seaDensity t/m3
     * @param draughtAft read at the aft marks (m)
     * @param draughtForward read at the forward marks (m)
     */
    public record Observed(
            @Nullable Double trim,
            @Nullable Double listDeg,
            @Nullable Double seaDensity,
            @Nullable Double draughtAft,
            @Nullable Double draughtForward) {
        /** Nothing observed. */
        public static final Observed NOTHING = new Observed(null, null, null, null, null);
    }
}
