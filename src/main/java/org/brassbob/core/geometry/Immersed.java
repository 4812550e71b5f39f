// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

/**
 * The part of a solid below a surface.
 *
 * @param volume m3
 * @param lcg its centroid, m forward of the aft perpendicular; NaN where there is no volume
 * @param tcg its centroid, m to starboard of the centreline; NaN where there is no volume
 * @param vcg its centroid, m above the baseline; NaN where there is no volume
 * @param surface the surface itself
 */
public record Immersed(double volume, double lcg, double tcg, double vcg, LiquidSurface surface) {
    /** Nothing at all below the surface. */
    public static final Immersed NOTHING = new Immersed(0, Double.NaN, Double.NaN, Double.NaN, LiquidSurface.NONE);
}
