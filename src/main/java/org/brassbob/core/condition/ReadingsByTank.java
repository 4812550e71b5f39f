// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import java.time.OffsetDateTime;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import org.brassbob.core.round.Reading;
import org.brassbob.core.round.ReadingKind;
import org.brassbob.core.round.SoundingRound;
import org.jspecify.annotations.Nullable;

/** The reading that counts for each tank: the latest that states a level. */
final class ReadingsByTank {
    private final Map<String, Reading> latest = new HashMap<>();
    private @Nullable OffsetDateTime last;

    ReadingsByTank(SoundingRound round) {
        for (Reading reading : round.readings()) {
            OffsetDateTime sofar = last;
            if (sofar == null || reading.at().isAfter(sofar)) {
                last = reading.at();
            }
            if (reading.kind() != ReadingKind.NOT_TAKEN) {
                latest.merge(reading.tank(), reading, (a, b) -> b.at().isBefore(a.at()) ? a : b);
            }
        }
    }

    @Nullable
    Reading of(String tank) {
        return latest.get(tank);
    }

    /** When the last reading of the round was taken. */
    Optional<OffsetDateTime> last() {
        return Optional.ofNullable(last);
    }
}
