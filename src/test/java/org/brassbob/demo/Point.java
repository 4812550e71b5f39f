// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

/**
 * A corner of a cross-section.
 *
 * @param y m from the centreline, starboard positive
 * @param z m above the baseline
 */
record Point(double y, double z) {
    /** The point a share of the way to another. */
    Point towards(Point other, double share) {
        return new Point(y + (other.y - y) * share, z + (other.z - z) * share);
    }

    Point mirrored() {
        return new Point(0.0 - y, z);
    }
}
