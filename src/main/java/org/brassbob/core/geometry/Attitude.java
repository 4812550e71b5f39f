// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

/**
 * How a level liquid surface lies in the ship's frame: the slopes of the plane
 * {@code z = z0 − x·trimSlope + y·heelSlope}.
 *
 * @param trimSlope trim / length between perpendiculars, by the stern positive
 * @param heelSlope tangent of the heel, to starboard positive
 */
public record Attitude(double trimSlope, double heelSlope) {
    /**
     * Any slopes that are numbers.
     *
     * @throws IllegalArgumentException if either is not finite
     */
    public Attitude {
        if (!Double.isFinite(trimSlope) || !Double.isFinite(heelSlope)) {
            throw new IllegalArgumentException("no attitude with slopes " + trimSlope + " and " + heelSlope);
        }
    }

    /** On even keel and upright. */
    public static final Attitude UPRIGHT = new Attitude(0, 0);

    /**
     * The attitude of a trimmed and heeled ship.
     *
     * @param trim draught aft minus draught forward (m)
     * @param lbp length between perpendiculars (m)
     * @param heelDeg to starboard positive, between -90 and 90 exclusive (°)
     * @throws IllegalArgumentException outside those ranges
     */
    public static Attitude of(double trim, double lbp, double heelDeg) {
        if (!(lbp > 0) || !(Math.abs(heelDeg) < 90) || !Double.isFinite(trim)) {
            throw new IllegalArgumentException(
                    "no attitude for trim " + trim + " m over " + lbp + " m and heel " + heelDeg + "°");
        }
        return new Attitude(trim / lbp, Math.tan(Math.toRadians(heelDeg)));
    }

    /** The height z0 (at x = y = 0) of the surface with this attitude through a point. */
    public double heightThrough(double x, double y, double z) {
        return z + x * trimSlope - y * heelSlope;
    }

    /** The height (m above the baseline) at (x, y) of the surface whose height at x = y = 0 is z0. */
    public double heightAt(double z0, double x, double y) {
        return z0 - x * trimSlope + y * heelSlope;
    }
}
