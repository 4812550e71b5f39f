// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import java.util.List;
import org.brassbob.core.contents.TankState;
import org.brassbob.core.notice.Notice;
import org.brassbob.core.round.Reading;
import org.brassbob.core.vessel.Tank;
import org.jspecify.annotations.Nullable;

/**
 * What is in one tank and what its free surface takes.
 *
 * @param tank the tank
 * @param reading the reading that counts, where there is one
 * @param ageHours its age, NaN without a reading
 * @param volume m3
 * @param fillPct per cent of capacity
 * @param density t/m3 at the liquid's temperature
 * @param mass t, free water included
 * @param lcg m forward of the aft perpendicular
 * @param tcg m to starboard of the centreline
 * @param vcg m above the baseline
 * @param state empty, slack, full or unknown
 * @param stale whether the reading is older than the ship's limit for its kind
 * @param fsmAsSounded free-surface moment at its level (t·m)
 * @param fsmByCode free-surface moment by 2008 IS Code part B 3.1 (t·m)
 * @param gmLoss what it takes from GM by the code (m)
 * @param sharePct its share of the whole correction (per cent)
 * @param rank 1 for the largest loss; 0 where it takes nothing
 * @param negligible whether the code would let it be left out (part B 3.1.12); it is counted all the same
 * @param notes what must be told about it
 */
public record TankFigures(
        Tank tank,
        @Nullable Reading reading,
        double ageHours,
        double volume,
        double fillPct,
        double density,
        double mass,
        double lcg,
        double tcg,
        double vcg,
        TankState state,
        boolean stale,
        double fsmAsSounded,
        double fsmByCode,
        double gmLoss,
        double sharePct,
        int rank,
        boolean negligible,
        List<Notice> notes) {
    public TankFigures {
        notes = List.copyOf(notes);
    }
}
