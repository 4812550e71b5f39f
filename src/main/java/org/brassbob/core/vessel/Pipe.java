// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.vessel;

/**
 * A straight sounding pipe, parallel to the ship's z axis.
 *
 * @param x m forward of the aft perpendicular
 * @param y m to starboard of the centreline
 * @param footZ height of its foot (the striking plate) above the baseline (m)
 * @param length reference height painted on the plate: from foot to rim (m)
 */
public record Pipe(double x, double y, double footZ, double length) {
    /** The ullage that belongs to a sounding, or the sounding that belongs to an ullage (m). */
    public double complement(double reading) {
        return length - reading;
    }
}
