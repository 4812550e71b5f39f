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
    private static final int CORNERS = 9;

    private final double originX;
    private final double originY;
    /** x, y (from the origin) and z of the three corners of each facet in turn. */
    private final double[] facets;

    private final Bounds bounds;
    private final double volume;

    Solid(double originX, double originY, double[] facets, Bounds bounds) {
        this.originX = originX;
        this.originY = originY;
        this.facets = facets;
        this.bounds = bounds;
        this.volume = below(Attitude.UPRIGHT, bounds.maxZ() + 1).volume();
    }

    /**
     * The solid that the sections describe.
     *
     * @throws ShapeException if they describe no solid: too few stations or points, a loop that crosses itself or another, that turns
     *     over, that has no thickness, or that joins nothing
     */
    public static Solid of(SpaceShape shape) throws ShapeException {
        return new SkinBuilder(SectionCheck.check(shape)).solid();
    }

    /** The whole of which this is the starboard half. */
    public Solid mirroredBothSides() {
        double[] both = Arrays.copyOf(facets, 2 * facets.length);
        for (int i = 0; i < facets.length; i += CORNERS) {
            for (int corner = 0; corner < 3; corner++) {
                int from = i + 3 * corner;
                int to = facets.length + i + 3 * (2 - corner);
                both[to] = facets[from];
                both[to + 1] = -2 * originY - facets[from + 1];
                both[to + 2] = facets[from + 2];
            }
        }
        double reach = Math.max(Math.abs(bounds.minY()), Math.abs(bounds.maxY()));
        Bounds whole = new Bounds(bounds.minX(), bounds.maxX(), -reach, reach, bounds.minZ(), bounds.maxZ());
        return new Solid(originX, originY, both, whole);
    }

    /** This solid less another that stands wholly inside it. */
    public Solid minus(Solid inner) {
        int n = facets.length;
        double[] all = Arrays.copyOf(facets, n + inner.facets.length);
        for (int i = 0; i < inner.facets.length; i += CORNERS) {
            for (int corner = 0; corner < 3; corner++) {
                int from = i + 3 * corner;
                int to = n + i + 3 * (2 - corner);
                all[to] = inner.facets[from] + inner.originX - originX;
                all[to + 1] = inner.facets[from + 1] + inner.originY - originY;
                all[to + 2] = inner.facets[from + 2];
            }
        }
        return new Solid(originX, originY, all, bounds);
    }

    /** The box around it. */
    public Bounds bounds() {
        return bounds;
    }

    /** Its whole volume (m3). */
    public double volume() {
        return volume;
    }

    /** The lowest height z0 of a surface with this attitude that touches the solid. */
    public double lowest(Attitude attitude) {
        double low = Double.POSITIVE_INFINITY;
        for (int i = 0; i < facets.length; i += 3) {
            low = Math.min(low, cornerHeight(attitude, i));
        }
        return low;
    }

    /** The highest height z0 of a surface with this attitude that touches the solid. */
    public double highest(Attitude attitude) {
        double high = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < facets.length; i += 3) {
            high = Math.max(high, cornerHeight(attitude, i));
        }
        return high;
    }

    /** The heights z0, ascending and each once, at which a surface with this attitude passes a corner of the skin. */
    public double[] cornerHeights(Attitude attitude) {
        double[] heights = new double[facets.length / 3];
        for (int i = 0; i < heights.length; i++) {
            heights[i] = cornerHeight(attitude, 3 * i);
        }
        return Arrays.stream(heights).sorted().distinct().toArray();
    }

    private double cornerHeight(Attitude attitude, int i) {
        return attitude.heightThrough(originX + facets[i], originY + facets[i + 1], facets[i + 2]);
    }

    /**
     * What lies below a surface.
     *
     * @param attitude its slopes
     * @param z0 its height at x = y = 0 (m above the baseline)
     */
    public Immersed below(Attitude attitude, double z0) {
        Moments m = integrate(attitude, z0);
        LiquidSurface surface = LiquidSurface.of(attitude, originX, originY, m);
        if (!(m.volume > 0)) {
            return new Immersed(0, Double.NaN, Double.NaN, Double.NaN, surface);
        }
        double x = m.volumeX / m.volume;
        double y = m.volumeY / m.volume;
        double surfaceHeight = attitude.heightAt(z0, originX + x, originY + y);
        return new Immersed(m.volume, originX + x, originY + y, surfaceHeight + m.volumeH / m.volume, surface);
    }

    /** The volume (m3) below a surface. */
    public double volumeBelow(Attitude attitude, double z0) {
        return Math.max(0, integrate(attitude, z0).volume);
    }

    /**
     * The height z0 of the surface below which lies a given volume, to 1e-12 of the whole.
     *
     * @param target m3; at or below 0 the lowest height, at or above the whole volume the highest
     */
    public double heightFor(Attitude attitude, double target) {
        double low = lowest(attitude);
        double high = highest(attitude);
        if (target <= 0) {
            return low;
        }
        if (target >= volume) {
            return high;
        }
        double z = low + (high - low) * target / volume;
        // Newton's step with the surface as the slope, kept inside a bracket that only ever shrinks.
        while (true) {
            Moments m = integrate(attitude, z);
            double error = m.volume - target;
            if (Math.abs(error) <= 1e-12 * volume) {
                return z;
            }
            if (error > 0) {
                high = z;
            } else {
                low = z;
            }
            double step = z - error / m.area;
            double next = step > low && step < high ? step : low + (high - low) / 2;
            if (next == low || next == high) {
                return z;
            }
            z = next;
        }
    }

    private Moments integrate(Attitude attitude, double z0) {
        double p = attitude.trimSlope();
        double q = attitude.heelSlope();
        // The surface seen from the local origin: h = z + x·p − y·q − base.
        double base = attitude.heightAt(z0, originX, originY);
        Moments m = new Moments();
        double[] f = facets;
        for (int i = 0; i < f.length; i += CORNERS) {
            double h0 = f[i + 2] + f[i] * p - f[i + 1] * q - base;
            double h1 = f[i + 5] + f[i + 3] * p - f[i + 4] * q - base;
            double h2 = f[i + 8] + f[i + 6] * p - f[i + 7] * q - base;
            addWet(m, f[i], f[i + 1], h0, f[i + 3], f[i + 4], h1, f[i + 6], f[i + 7], h2);
        }
        return m;
    }

    /** Adds the part of a facet that lies below h = 0, turning the facet so that one case serves three. */
    private static void addWet(
            Moments m,
            double x0,
            double y0,
            double h0,
            double x1,
            double y1,
            double h1,
            double x2,
            double y2,
            double h2) {
        int wet = (h0 < 0 ? 1 : 0) + (h1 < 0 ? 2 : 0) + (h2 < 0 ? 4 : 0);
        switch (wet) {
            case 0 -> {
                // Dry.
            }
            case 7 -> m.add(x0, y0, h0, x1, y1, h1, x2, y2, h2);
            case 1 -> addTip(m, x0, y0, h0, x1, y1, h1, x2, y2, h2);
            case 2 -> addTip(m, x1, y1, h1, x2, y2, h2, x0, y0, h0);
            case 4 -> addTip(m, x2, y2, h2, x0, y0, h0, x1, y1, h1);
            case 6 -> addRoot(m, x0, y0, h0, x1, y1, h1, x2, y2, h2);
            case 5 -> addRoot(m, x1, y1, h1, x2, y2, h2, x0, y0, h0);
            default -> addRoot(m, x2, y2, h2, x0, y0, h0, x1, y1, h1);
        }
    }

    /** Only corner 0 is wet: the small triangle at it. */
    private static void addTip(
            Moments m,
            double x0,
            double y0,
            double h0,
            double x1,
            double y1,
            double h1,
            double x2,
            double y2,
            double h2) {
        double s = h0 / (h0 - h1);
        double t = h0 / (h0 - h2);
        m.add(x0, y0, h0, x0 + (x1 - x0) * s, y0 + (y1 - y0) * s, 0, x0 + (x2 - x0) * t, y0 + (y2 - y0) * t, 0);
    }

    /** Only corner 0 is dry: the quad that remains below it, as two triangles. */
    private static void addRoot(
            Moments m,
            double x0,
            double y0,
            double h0,
            double x1,
            double y1,
            double h1,
            double x2,
            double y2,
            double h2) {
        double s = h0 / (h0 - h1);
        double t = h0 / (h0 - h2);
        double ax = x0 + (x1 - x0) * s;
        double ay = y0 + (y1 - y0) * s;
        double bx = x0 + (x2 - x0) * t;
        double by = y0 + (y2 - y0) * t;
        m.add(ax, ay, 0, x1, y1, h1, x2, y2, h2);
        m.add(ax, ay, 0, x2, y2, h2, bx, by, 0);
    }
}
