// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import java.util.Arrays;

/**
 * A closed solid as a skin of triangles, and what lies in it below an inclined surface: volume, centroid, area and second moments,
 * exactly for the skin, facet by facet, with no slicing (see {@link Moments}).
 *
 * <p>Between two stations the skin is made of the quads that join the edges of a loop. A flat quad is two triangles. A warped one is
 * four triangles about the mean of its corners, which lies on the ruled surface of the quad and encloses the same volume as it; a
 * split along either diagonal would not, and would make port and starboard differ.
 *
 * <p>Facets parallel to z are left out: they have no part in any of the integrals.
 */
public final class Solid {
    private final double originX;
    private final double originY;
    private final Skin skin;
    private final Bounds bounds;
    private final Immersed whole;

    Solid(double originX, double originY, Skin skin, Bounds bounds) {
        this.originX = originX;
        this.originY = originY;
        this.skin = skin;
        this.bounds = bounds;
        Moments m = new Moments();
        skin.cut(heights(Attitude.UPRIGHT, bounds.maxZ())).sum(skin.facets(), m);
        this.whole = immersed(Attitude.UPRIGHT, bounds.maxZ(), m, LiquidSurface.NONE);
    }

    /**
     * The solid that the sections describe.
     *
     * @throws ShapeException if they describe no solid: too few stations or points, loops that cross or overlap themselves or each
     *     other at a station or on the way to the next, that turn over, begin at another corner, have no thickness, or join nothing
     */
    public static Solid of(SpaceShape shape) throws ShapeException {
        return new SkinBuilder(SectionCheck.check(shape)).solid();
    }

    /** The whole of which this is the starboard half. */
    public Solid mirroredBothSides() {
        double reach = Math.max(Math.abs(bounds.minY()), Math.abs(bounds.maxY()));
        Bounds both = new Bounds(bounds.minX(), bounds.maxX(), -reach, reach, bounds.minZ(), bounds.maxZ());
        return new Solid(originX, originY, skin.and(skin.mirrored(-2 * originY)), both);
    }

    /** This solid less another that stands wholly inside it. */
    public Solid minus(Solid inner) {
        Skin taken = inner.skin.insideOut(inner.originX - originX, inner.originY - originY);
        return new Solid(originX, originY, skin.and(taken), bounds);
    }

    /** The box around it. */
    public Bounds bounds() {
        return bounds;
    }

    /** Its whole volume (m3). */
    public double volume() {
        return whole.volume();
    }

    /** The lowest height z0 of a surface with this attitude that touches the solid. */
    public double lowest(Attitude attitude) {
        return least(cornerHeightsAsGiven(attitude));
    }

    /** The highest height z0 of a surface with this attitude that touches the solid. */
    public double highest(Attitude attitude) {
        return greatest(cornerHeightsAsGiven(attitude));
    }

    /** The heights z0, ascending and each once, at which a surface with this attitude passes a corner of the skin. */
    public double[] cornerHeights(Attitude attitude) {
        return Arrays.stream(cornerHeightsAsGiven(attitude)).sorted().distinct().toArray();
    }

    private double[] cornerHeightsAsGiven(Attitude attitude) {
        double[] heights = new double[skin.size()];
        for (int i = 0; i < heights.length; i++) {
            heights[i] = attitude.heightThrough(originX + skin.x(i), originY + skin.y(i), skin.z(i));
        }
        return heights;
    }

    /**
     * What lies below a surface.
     *
     * <p>At the lowest corner and under it there is nothing, at the highest and above it the whole solid; both have no surface
     * ({@link LiquidSurface#NONE}). Where the surface lies in a flat part of the skin between them, its area jumps, and the area
     * just below is taken.
     *
     * @param attitude its slopes
     * @param z0 its height at x = y = 0 (m above the baseline)
     */
    public Immersed below(Attitude attitude, double z0) {
        double[] heights = heights(attitude, z0);
        double low = least(heights);
        double high = greatest(heights);
        double rounding = rounding(attitude, z0, high - low);
        if (high <= rounding) {
            return whole;
        }
        if (low >= -rounding) {
            return Immersed.NOTHING;
        }
        Moments m = new Moments();
        skin.cut(heights).sum(skin.facets(), m);
        return immersed(attitude, z0, m, LiquidSurface.of(attitude, originX, originY, m));
    }

    private Immersed immersed(Attitude attitude, double z0, Moments m, LiquidSurface surface) {
        if (!(m.volume > 0)) {
            return Immersed.NOTHING;
        }
        double x = originX + m.volumeX / m.volume;
        double y = originY + m.volumeY / m.volume;
        double z = attitude.heightAt(z0, x, y) + m.volumeH / m.volume;
        return new Immersed(m.volume, x, y, z, surface);
    }

    /** The volume (m3) below a surface. */
    public double volumeBelow(Attitude attitude, double z0) {
        double[] heights = heights(attitude, z0);
        return greatest(heights) <= 0 ? whole.volume() : Math.max(0, volume(heights).volume);
    }

    /**
     * The height z0 of the surface below which lies a given volume, to 1e-12 of the whole.
     *
     * @param target m3; at or below 0 the lowest height, at or above the whole volume the highest
     * @throws IllegalArgumentException if the target is not a number
     */
    public double heightFor(Attitude attitude, double target) {
        if (Double.isNaN(target)) {
            throw new IllegalArgumentException("no height for a volume that is not a number");
        }
        double low = lowest(attitude);
        double high = highest(attitude);
        if (target <= 0) {
            return low;
        }
        return target >= volume() ? high : between(attitude, target, low, high);
    }

    /** Newton's step with the surface as the slope, kept inside a bracket that only ever shrinks. */
    private double between(Attitude attitude, double target, double lowest, double highest) {
        double low = lowest;
        double high = highest;
        double z = low + (high - low) * target / volume();
        while (true) {
            VolumeSum sum = volume(heights(attitude, z));
            double error = sum.volume - target;
            if (Math.abs(error) <= 1e-12 * volume()) {
                return z;
            }
            if (error > 0) {
                high = z;
            } else {
                low = z;
            }
            double step = z - error / sum.area;
            double next = step > low && step < high ? step : low + (high - low) / 2;
            if (next == low || next == high) {
                return z;
            }
            z = next;
        }
    }

    private VolumeSum volume(double[] heights) {
        VolumeSum sum = new VolumeSum();
        skin.cut(heights).sum(skin.facets(), sum);
        return sum;
    }

    /** The height of each corner above a surface; seen from the local origin h = z + x·p − y·q − base. */
    private double[] heights(Attitude attitude, double z0) {
        return skin.heights(attitude, attitude.heightAt(z0, originX, originY));
    }

    /** How far a corner that lies in a surface may seem to be off it. */
    private double rounding(Attitude attitude, double z0, double depth) {
        double greatest = Math.abs(z0)
                + Math.abs(originX * attitude.trimSlope())
                + Math.abs(originY * attitude.heelSlope())
                + depth;
        return 8 * Math.ulp(greatest);
    }

    private static double least(double[] values) {
        double least = Double.POSITIVE_INFINITY;
        for (double value : values) {
            least = value < least ? value : least;
        }
        return least;
    }

    private static double greatest(double[] values) {
        double greatest = Double.NEGATIVE_INFINITY;
        for (double value : values) {
            greatest = value > greatest ? value : greatest;
        }
        return greatest;
    }
}
