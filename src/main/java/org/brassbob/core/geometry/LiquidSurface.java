// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

/**
 * The free surface of a liquid, in its own plane. Where something stands in the surface (a tank inside the tank, a hole) it is left
 * out, and the moments are about the common centroid of what remains, by parallel axes.
 *
 * @param area m2, in the plane of the surface
 * @param x of its centroid (m forward of the aft perpendicular)
 * @param y of its centroid (m to starboard of the centreline)
 * @param transverse second moment about the fore-and-aft axis through the centroid, in the surface (m4)
 * @param longitudinal second moment about the athwartships axis through the centroid, in the surface (m4)
 */
public record LiquidSurface(double area, double x, double y, double transverse, double longitudinal) {
    /** No surface at all: an empty space, or one pressed up. Its centroid is NaN. */
    public static final LiquidSurface NONE = new LiquidSurface(0, Double.NaN, Double.NaN, 0, 0);

    /** An area that is less than this share of what cancelled to leave it is rounding, no surface. */
    private static final double NO_AREA = 1e-12;

    /**
     * From integrals over the projection of the surface on the ship's xy plane, about any origin.
     *
     * <p>A point of the surface is {@code x·(1, 0, −p) + y·(0, 1, q)} with slopes p (trim) and q (heel). Taking the fore-and-aft axis along
     * (1, 0, −p) and the other square to it in the surface, the distances become {@code b = y·J·c} and {@code a = x/c − c·p·q·y} with
     * {@code J = √(1 + p² + q²)} (the stretch of area) and {@code c = 1/√(1 + p²)}.
     */
    static LiquidSurface of(Attitude attitude, double originX, double originY, Moments m) {
        if (!(m.area > NO_AREA * m.gross)) {
            return NONE;
        }
        double meanX = m.x / m.area;
        double meanY = m.y / m.area;
        double xx = m.xx - m.x * meanX;
        double xy = m.xy - m.x * meanY;
        double yy = m.yy - m.y * meanY;
        double p = attitude.trimSlope();
        double q = attitude.heelSlope();
        double c2 = 1 / (1 + p * p);
        double j2 = 1 + p * p + q * q;
        double j = Math.sqrt(j2);
        double longitudinal = xx / c2 - 2 * p * q * xy + c2 * p * p * q * q * yy;
        return new LiquidSurface(
                m.area * j,
                originX + meanX,
                originY + meanY,
                Math.max(0, yy * j2 * c2 * j),
                Math.max(0, longitudinal * j));
    }
}
