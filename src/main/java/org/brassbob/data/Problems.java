// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.List;
import java.util.TreeSet;

/** Collects faults while files are read; each once, in the order of files and lines. */
final class Problems {
    private final TreeSet<Problem> found = new TreeSet<>();

    void add(String file, int line, String message) {
        found.add(new Problem(file, line, message));
    }

    boolean isEmpty() {
        return found.isEmpty();
    }

    int count() {
        return found.size();
    }

    List<Problem> list() {
        return List.copyOf(found);
    }
}
