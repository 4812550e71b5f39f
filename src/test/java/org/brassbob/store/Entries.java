// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.time.OffsetDateTime;
import java.util.List;
import org.brassbob.core.round.Reading;
import org.brassbob.core.round.ReadingKind;
import org.brassbob.core.round.SoundingRound.Observed;
import org.brassbob.core.table.Origin;

/** Invented entries. */
final class Entries {
    static final OffsetDateTime START = OffsetDateTime.parse("2026-05-01T06:00:00+02:00");
    static final RoundDraft ROUND = new RoundDraft(
            "barge",
            "abc",
            "morning",
            "A. Teal",
            START,
            new RoundDraft.Sight(new Observed(0.1, 0.5, 1.02, null, null), Conditions.AT_SEA, "intact"));

    static final Origin NOWHERE = Origin.computed("test");

    private Entries() {}

    static ReadingDraft sounding(String tank, double metres, OffsetDateTime at) {
        return ReadingDraft.plain(
                new Reading(tank, at, ReadingKind.SOUNDING, metres, null, null, null, "", Origin.computed("test")),
                "A. Teal");
    }

    /** Everything that a reading can have, all of it following from a number. */
    static ReadingDraft numbered(int n) {
        Reading reading = new Reading(
                "tank-" + n % 7,
                START.plusSeconds(n),
                ReadingKind.SOUNDING,
                n / 1000.0,
                20.5,
                0.95,
                0.01,
                "note, \"" + n + "\"",
                Origin.computed("test"));
        return new ReadingDraft(
                reading, List.of(n / 1000.0 - 0.001, n / 1000.0, n / 1000.0 + 0.001), "twin tank", "A. Teal");
    }

    /** Whether a stored reading is the one of a number, in every part but the origin. */
    static boolean same(ReadingDraft expected, ReadingDraft actual) {
        Reading e = expected.reading();
        Reading a = actual.reading();
        Reading moved = new Reading(
                a.tank(),
                a.at(),
                a.kind(),
                a.value(),
                a.temperatureC(),
                a.density(),
                a.waterSounding(),
                a.note(),
                e.origin());
        return expected.equals(new ReadingDraft(moved, actual.gaugings(), actual.question(), actual.who()));
    }
}
