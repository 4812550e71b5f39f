// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * Files that look like one of the vessel folder's with a slip in the name. A file that may be missing would otherwise be missed without
 * a word, and the ship sail without her cargo.
 */
final class Misnamed {
    private static final List<String> MAY_BE_MISSING =
            List.of("weights.csv", "hydrostatics.csv", "hull.shape.csv", "kn.csv");

    private Misnamed() {}

    /** The file that a path was most likely meant to be. */
    static Optional<String> meant(String path) {
        return MAY_BE_MISSING.stream()
                .filter(name -> !name.equals(path)
                        && distance(name, path.toLowerCase(Locale.ROOT)) <= (name.length() > 6 ? 2 : 1))
                .findFirst();
    }

    /** Levenshtein's distance: how many letters must be put in, taken out or changed. */
    private static int distance(String a, String b) {
        if (Math.abs(a.length() - b.length()) > 2) {
            return Integer.MAX_VALUE;
        }
        int[] before = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            before[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            int[] now = new int[b.length() + 1];
            now[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                int change = before[j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                now[j] = Math.min(change, 1 + Math.min(before[j], now[j - 1]));
            }
            before = now;
        }
        return before[b.length()];
    }
}
