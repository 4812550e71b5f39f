// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import java.util.Arrays;

/**
 * The triangles of a closed skin: corners, each once, and the facets as three corner numbers, the order giving the outside. Facets
 * parallel to z are not among them.
 */
final class Skin {
    private final double[] x;
    private final double[] y;
    private final double[] z;
    private final int[] facets;

    Skin(double[] x, double[] y, double[] z, int[] facets) {
        this.x = x;
        this.y = y;
        this.z = z;
        this.facets = facets;
    }

    /** The number of corners. */
    int size() {
        return x.length;
    }

    double x(int corner) {
        return x[corner];
    }

    double y(int corner) {
        return y[corner];
    }

    double z(int corner) {
        return z[corner];
    }

    /** Three corner numbers for each facet in turn; not to be changed. */
    int[] facets() {
        return facets;
    }

    /** The height of each corner above the surface with these slopes and this height at x = y = 0. */
    double[] heights(Attitude attitude, double base) {
        double p = attitude.trimSlope();
        double q = attitude.heelSlope();
        double[] h = new double[x.length];
        for (int i = 0; i < h.length; i++) {
            h[i] = z[i] + x[i] * p - y[i] * q - base;
        }
        return h;
    }

    SkinCut cut(double[] heights) {
        return new SkinCut(x, y, heights);
    }

    /** The same skin seen in a mirror: y becomes shift − y. */
    Skin mirrored(double shift) {
        double[] turned = new double[y.length];
        Arrays.setAll(turned, i -> shift - y[i]);
        return new Skin(x, turned, z, turnedOver());
    }

    /** The same skin moved, its inside out. */
    Skin insideOut(double dx, double dy) {
        double[] movedX = new double[x.length];
        double[] movedY = new double[y.length];
        Arrays.setAll(movedX, i -> x[i] + dx);
        Arrays.setAll(movedY, i -> y[i] + dy);
        return new Skin(movedX, movedY, z, turnedOver());
    }

    /** Both skins together. */
    Skin and(Skin other) {
        int[] all = joined(facets, other.facets);
        for (int i = facets.length; i < all.length; i++) {
            all[i] += x.length;
        }
        return new Skin(joined(x, other.x), joined(y, other.y), joined(z, other.z), all);
    }

    private int[] turnedOver() {
        int[] turned = new int[facets.length];
        for (int i = 0; i < facets.length; i += 3) {
            turned[i] = facets[i + 2];
            turned[i + 1] = facets[i + 1];
            turned[i + 2] = facets[i];
        }
        return turned;
    }

    private static int[] joined(int[] a, int[] b) {
        int[] all = Arrays.copyOf(a, a.length + b.length);
        System.arraycopy(b, 0, all, a.length, b.length);
        return all;
    }

    private static double[] joined(double[] a, double[] b) {
        double[] all = Arrays.copyOf(a, a.length + b.length);
        System.arraycopy(b, 0, all, a.length, b.length);
        return all;
    }
}
