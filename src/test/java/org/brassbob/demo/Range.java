// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

/** From one plane to another, in m along one of the ship's axes. */
record Range(double from, double to) {
    static Range of(double from, double to) {
        return new Range(from, to);
    }
}
