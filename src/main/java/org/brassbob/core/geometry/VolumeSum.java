// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

/** Only the volume and the projected area of the surface, which is all that finding a height needs; see {@link Moments}. */
final class VolumeSum implements SkinCut.Sums {
    double area;
    double volume;

    @Override
    public void add(double x0, double y0, double h0, double x1, double y1, double h1, double x2, double y2, double h2) {
        double a = ((x1 - x0) * (y2 - y0) - (x2 - x0) * (y1 - y0)) / 2;
        area -= a;
        volume += a * (h0 + h1 + h2) / 3;
    }
}
