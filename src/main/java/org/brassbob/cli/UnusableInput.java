// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

import java.nio.file.Path;
import java.util.List;
import org.brassbob.data.Problem;

/** The input can't be used: one line for each fault. */
final class UnusableInput extends Exception {
    private static final long serialVersionUID = 1L;

    private final transient List<String> lines;

    private UnusableInput(List<String> lines) {
        super(lines.isEmpty() ? "" : lines.get(0));
        this.lines = lines;
    }

    static UnusableInput of(String line) {
        return new UnusableInput(List.of(line));
    }

    /** The faults of files in a folder. */
    static UnusableInput in(Path folder, List<Problem> problems) {
        return new UnusableInput(problems.stream()
                .map(p -> folder.resolve(p.file()) + ":" + p.line() + ": " + p.message())
                .toList());
    }

    /** The faults of a file whose name is complete. */
    static UnusableInput of(List<Problem> problems) {
        return new UnusableInput(problems.stream().map(Problem::toString).toList());
    }

    List<String> lines() {
        return lines;
    }
}
