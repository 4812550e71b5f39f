// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

/**
 * Running sums of facet integrals below a surface, about a local origin. With h the height of a facet above the surface (negative
 * when wet) and dA the element of its projection on xy, positive where the facet faces up, the divergence theorem in z turns the
 * volume integrals into facet integrals in which the surface itself (h = 0) has no part:
 *
 * <pre>V = Σ∫h dA,  ∫x dV = Σ∫xh dA,  ∫y dV = Σ∫yh dA,  ∫h dV = Σ∫h²/2 dA</pre>
 *
 * <p>and because the projections of a closed skin cancel, those of the surface are those of the wet facets with the sign turned. Walls
 * parallel to z project to nothing and have no part at all. Integrals of products over a triangle are closed forms
 * (∫fg dA = A/12·(Σf·g + Σf·Σg), for linear f and g given at the corners).
 */
final class Moments implements SkinCut.Sums {
    double area;
    /** The same without regard to sign: how much cancelled to leave the area. */
    double gross;

    double x;
    double y;
    double xx;
    double xy;
    double yy;
    double volume;
    double volumeX;
    double volumeY;
    double volumeH;

    @Override
    public void add(double x0, double y0, double h0, double x1, double y1, double h1, double x2, double y2, double h2) {
        double a = ((x1 - x0) * (y2 - y0) - (x2 - x0) * (y1 - y0)) / 2;
        double sx = x0 + x1 + x2;
        double sy = y0 + y1 + y2;
        double sh = h0 + h1 + h2;
        double third = a / 3;
        double twelfth = a / 12;
        area -= a;
        gross += Math.abs(a);
        x -= third * sx;
        y -= third * sy;
        xx -= twelfth * (x0 * x0 + x1 * x1 + x2 * x2 + sx * sx);
        xy -= twelfth * (x0 * y0 + x1 * y1 + x2 * y2 + sx * sy);
        yy -= twelfth * (y0 * y0 + y1 * y1 + y2 * y2 + sy * sy);
        volume += third * sh;
        volumeX += twelfth * (x0 * h0 + x1 * h1 + x2 * h2 + sx * sh);
        volumeY += twelfth * (y0 * h0 + y1 * h1 + y2 * h2 + sy * sh);
        volumeH += twelfth / 2 * (h0 * h0 + h1 * h1 + h2 * h2 + sh * sh);
    }
}
