// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.util.List;
import org.brassbob.core.round.Reading;
import org.jspecify.annotations.Nullable;

/**
 * A reading about to be accepted.
 *
 * @param reading as the core takes it; for a tank gauged several times its value is the mean
 * @param gaugings the single values of a repeat gauging, in the unit of the reading; empty for one gauging
 * @param question the odd-reading question that was asked and answered with 'accept'; null where none was asked
 * @param who entered it
 */
public record ReadingDraft(Reading reading, List<Double> gaugings, @Nullable String question, String who) {
    public ReadingDraft {
        gaugings = List.copyOf(gaugings);
    }

    /** A plain reading, gauged once, that raised no question. */
    public static ReadingDraft plain(Reading reading, String who) {
        return new ReadingDraft(reading, List.of(), null, who);
    }
}
