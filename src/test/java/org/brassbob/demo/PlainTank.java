// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

/** A tank of so plain a form that its contents follow from a formula. */
interface PlainTank {
    /** Lowest point (m above the baseline). */
    double bottom();

    /** Highest point (m above the baseline). */
    double top();

    /** What it holds up to a level between bottom and top (m above the baseline), upright. */
    Contents upTo(double level);

    /** The whole volume (m3). */
    default double capacity() {
        return upTo(top()).volume();
    }
}
