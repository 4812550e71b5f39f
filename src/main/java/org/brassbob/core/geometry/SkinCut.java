// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

/**
 * A skin cut by one surface: the wet part of each facet, split where the surface crosses it, goes to a running sum. Facets are turned
 * so that one case serves three.
 */
final class SkinCut {
    /** What becomes of the wet triangles; x and y from any origin, h the height above the surface (m). */
    interface Sums {
        /** Takes a wet triangle; the order of the corners gives the sign. */
        void add(double x0, double y0, double h0, double x1, double y1, double h1, double x2, double y2, double h2);
    }

    private final double[] x;
    private final double[] y;
    /** The height of each corner above the surface. */
    private final double[] h;

    SkinCut(double[] x, double[] y, double[] h) {
        this.x = x;
        this.y = y;
        this.h = h;
    }

    /** Sums over all facets, three corner numbers each. A facet that lies in the surface counts as dry. */
    void sum(int[] facets, Sums sums) {
        for (int i = 0; i < facets.length; i += 3) {
            addWet(sums, facets[i], facets[i + 1], facets[i + 2]);
        }
    }

    private void addWet(Sums sums, int a, int b, int c) {
        int wet = (h[a] < 0 ? 1 : 0) + (h[b] < 0 ? 2 : 0) + (h[c] < 0 ? 4 : 0);
        switch (wet) {
            case 0 -> {
                // Dry.
            }
            case 7 -> sums.add(x[a], y[a], h[a], x[b], y[b], h[b], x[c], y[c], h[c]);
            case 1 -> addTip(sums, a, b, c);
            case 2 -> addTip(sums, b, c, a);
            case 4 -> addTip(sums, c, a, b);
            case 6 -> addRoot(sums, a, b, c);
            case 5 -> addRoot(sums, b, c, a);
            default -> addRoot(sums, c, a, b);
        }
    }

    /** Only corner a is wet: the small triangle at it. */
    private void addTip(Sums sums, int a, int b, int c) {
        double s = h[a] / (h[a] - h[b]);
        double t = h[a] / (h[a] - h[c]);
        sums.add(x[a], y[a], h[a], along(x, a, b, s), along(y, a, b, s), 0, along(x, a, c, t), along(y, a, c, t), 0);
    }

    /** Only corner a is dry: the quad that remains below it, as two triangles. */
    private void addRoot(Sums sums, int a, int b, int c) {
        double s = h[b] / (h[b] - h[a]);
        double t = h[c] / (h[c] - h[a]);
        double abX = along(x, b, a, s);
        double abY = along(y, b, a, s);
        sums.add(abX, abY, 0, x[b], y[b], h[b], x[c], y[c], h[c]);
        sums.add(abX, abY, 0, x[c], y[c], h[c], along(x, c, a, t), along(y, c, a, t), 0);
    }

    /** From the wet corner on: facets either side of an edge then cut it at the same place to the last digit, and little remains exact. */
    private static double along(double[] from, int a, int b, double f) {
        return from[a] + (from[b] - from[a]) * f;
    }
}
