// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import java.util.Comparator;

/**
 * Something that an audit found.
 *
 * @param severity whether the data can be used in spite of it
 * @param file relative to the vessel folder
 * @param line from 1
 * @param what is wrong
 * @param figure the figure as it stands
 * @param expected what was expected of it
 */
public record Finding(Severity severity, String file, int line, String what, String figure, String expected)
        implements Comparable<Finding> {
    /** How grave a finding is. */
    public enum Severity {
        ERROR("error"),
        WARNING("warning");

        private final String code;

        Severity(String code) {
            this.code = code;
        }

        /** The word used in output. */
        public String code() {
            return code;
        }
    }

    private static final Comparator<Finding> ORDER = Comparator.comparing(Finding::file)
            .thenComparingInt(Finding::line)
            .thenComparing(Finding::severity)
            .thenComparing(Finding::what)
            .thenComparing(Finding::figure);

    @Override
    public int compareTo(Finding other) {
        return ORDER.compare(this, other);
    }

    /** The finding in a line: {@code FILE:LINE: severity: what: figure; expected …}. */
    public String text() {
        return file + ":" + line + ": " + severity.code() + ": " + what + ": " + figure + "; expected " + expected;
    }
}
