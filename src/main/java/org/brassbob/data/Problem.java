// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.Comparator;

/**
 * A fault in a file.
 *
 * @param file path relative to the vessel folder, or of the round as given
 * @param line from 1
 * @param message what is wrong, and what was expected
 */
public record Problem(String file, int line, String message) implements Comparable<Problem> {
    private static final Comparator<Problem> ORDER = Comparator.comparing((Problem p) -> !p.file.equals("vessel.json"))
            .thenComparing(Problem::file)
            .thenComparingInt(Problem::line)
            .thenComparing(Problem::message);

    @Override
    public int compareTo(Problem other) {
        return ORDER.compare(this, other);
    }

    /** {@code FILE:LINE: message}. */
    @Override
    public String toString() {
        return file + ":" + line + ": " + message;
    }
}
