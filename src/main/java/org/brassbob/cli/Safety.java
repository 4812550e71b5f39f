// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

/** The words that stand under every result. */
final class Safety {
    static final String WORDS =
            "An aid, not an approval: the approved stability booklet, the class-approved instrument where one is carried,"
                    + System.lineSeparator()
                    + "local rules and the master's judgement stand above it. Longitudinal strength, damage stability, grain and"
                    + System.lineSeparator()
                    + "dynamic effects are not covered.";

    private Safety() {}
}
