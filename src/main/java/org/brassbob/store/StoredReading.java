// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import org.jspecify.annotations.Nullable;

/**
 * A reading as stored.
 *
 * @param id its number
 * @param roundId the round that it belongs to
 * @param draft what was accepted
 * @param corrects the reading that it corrects; null for a first entry
 * @param correctedBy the reading that corrects it; null where it counts
 */
public record StoredReading(
        long id, long roundId, ReadingDraft draft, @Nullable Long corrects, @Nullable Long correctedBy) {
    /** Whether it counts: no later entry corrects it. */
    public boolean counts() {
        return correctedBy == null;
    }
}
