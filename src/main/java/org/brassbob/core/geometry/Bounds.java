// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

/**
 * The box around a solid, parallel to the ship's axes (m).
 *
 * @param minX aft end
 * @param maxX forward end
 * @param minY port side
 * @param maxY starboard side
 * @param minZ bottom
 * @param maxZ top
 */
public record Bounds(double minX, double maxX, double minY, double maxY, double minZ, double maxZ) {
    /** Whether another box lies within this one, to a tolerance (m). */
    public boolean encloses(Bounds other, double tolerance) {
        return other.minX >= minX - tolerance
                && other.maxX <= maxX + tolerance
                && other.minY >= minY - tolerance
                && other.maxY <= maxY + tolerance
                && other.minZ >= minZ - tolerance
                && other.maxZ <= maxZ + tolerance;
    }

    /** Whether a point lies in the box, to a tolerance (m). */
    public boolean contains(double x, double y, double z, double tolerance) {
        return encloses(new Bounds(x, x, y, y, z, z), tolerance);
    }
}
