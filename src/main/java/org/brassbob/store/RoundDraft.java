// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.time.OffsetDateTime;
import org.brassbob.core.round.SoundingRound.Observed;
import org.jspecify.annotations.Nullable;

/**
 * A round about to be started.
 *
 * @param vesselId id of the ship
 * @param dataSha256 fingerprint of the ship's data that it is worked out with
 * @param name for the list of rounds
 * @param officer who sounds
 * @param startedAt with its offset
 * @param sight what was observed of the ship, the conditions and the curve
 */
public record RoundDraft(
        String vesselId, String dataSha256, String name, String officer, OffsetDateTime startedAt, Sight sight) {
    /**
     * What is seen of the ship as a whole during a round; may change until it is finished.
     *
     * @param observed trim, list, draughts, sea density
     * @param conditions how quiet she lies
     * @param curve the limit curve chosen, where any
     */
    public record Sight(Observed observed, Conditions conditions, @Nullable String curve) {}
}
