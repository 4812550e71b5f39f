// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

import java.time.OffsetDateTime;
import java.time.format.DateTimeFormatter;
import java.util.Locale;

/** Times as printed. */
final class Times {
    private static final DateTimeFormatter PLAIN = DateTimeFormatter.ofPattern("d MMM yyyy HH:mm xxx", Locale.ENGLISH);

    private Times() {}

    /** ISO 8601 with offset, seconds always there. */
    static String iso(OffsetDateTime time) {
        return DateTimeFormatter.ISO_OFFSET_DATE_TIME.format(time);
    }

    /** For people. */
    static String plain(OffsetDateTime time) {
        return PLAIN.format(time);
    }
}
