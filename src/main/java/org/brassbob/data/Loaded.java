// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * What a reading of files gave: a value where there was no fault, and the faults otherwise.
 *
 * @param value null where there is any fault
 * @param problems every fault, by file and line
 */
public record Loaded<T>(@Nullable T value, List<Problem> problems) {
    public Loaded {
        problems = List.copyOf(problems);
    }

    /**
     * The value of a reading without faults.
     *
     * @throws IllegalStateException if there are any
     */
    public T orElseThrow() {
        T present = value;
        if (present == null) {
            throw new IllegalStateException(
                    problems.isEmpty() ? "nothing was read" : problems.get(0).toString());
        }
        return present;
    }
}
