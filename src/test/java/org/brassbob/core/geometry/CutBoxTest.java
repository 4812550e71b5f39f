// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import static org.brassbob.core.geometry.Shapes.loop;
import static org.brassbob.core.geometry.Shapes.rectangle;
import static org.brassbob.core.geometry.Shapes.solid;
import static org.brassbob.core.geometry.Shapes.station;
import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Volumes and centroids of boxes and wedges cut by an inclined surface, against elementary solid geometry (prisms, tetrahedra). */
class CutBoxTest {
    private static final double RELATIVE = 1e-12;

    /** A box with one corner at the origin. */
    private static final double L = 8;

    private static final double B = 6;
    private static final double D = 5;
    private final Solid box = Shapes.box(0, L, 0, B, 0, D);

    private static void assertImmersed(Immersed i, double volume, double x, double y, double z) {
        assertEquals(volume, i.volume(), RELATIVE * volume);
        assertEquals(x, i.lcg(), RELATIVE * 10);
        assertEquals(y, i.tcg(), RELATIVE * 10);
        assertEquals(z, i.vcg(), RELATIVE * 10);
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-3, 0.5, 2.0, 4.999})
    void heelLeavesATriangleAtTheSide(double depth) {
        // Depth at the starboard side, surface meeting the bottom at a breadth w from it: triangle w·depth/2, centroid
        // a third up.
        double q = 1.0;
        double w = depth / q;
        Immersed i = box.below(new Attitude(0, q), depth - B * q);
        assertImmersed(i, L * w * depth / 2, L / 2, B - w / 3, depth / 3);
        double s = w * Math.sqrt(1 + q * q);
        assertEquals(L * s * s * s / 12, i.surface().transverse(), 1e-11 * Math.max(1e-3, s * s * s));
    }

    @Test
    void heelLeavesATrapezoid() {
        // Depths a = 1 to port and b = 4 to starboard over the breadth: area (a + b)/2·B, centroid y = B(a + 2b)/(3(a +
        // b)),
        // z = (a² + ab + b²)/(3(a + b)).
        double a = 1;
        double b = 4;
        Immersed i = box.below(new Attitude(0, (b - a) / B), a);
        assertImmersed(
                i,
                L * B * (a + b) / 2,
                L / 2,
                B * (a + 2 * b) / (3 * (a + b)),
                (a * a + a * b + b * b) / (3 * (a + b)));
    }

    @Test
    void trimByTheSternLeavesATrapezoid() {
        // Deeper aft (x = 0): depth 4 there, 1 forward.
        double a = 4;
        double f = 1;
        Immersed i = box.below(new Attitude((a - f) / L, 0), a);
        assertImmersed(
                i,
                L * B * (a + f) / 2,
                L * (a + 2 * f) / (3 * (a + f)),
                B / 2,
                (a * a + a * f + f * f) / (3 * (a + f)));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.01, 0.3, 1.5, 3.0})
    void aCornerLeavesATetrahedron(double depth) {
        // At the after starboard bottom corner: legs depth/p along, depth/q across, depth up; V = product/6, centroid a
        // quarter in.
        double p = 0.5;
        double q = 0.75;
        Immersed i = box.below(new Attitude(p, q), depth - B * q);
        assertImmersed(i, depth / p * depth / q * depth / 6, depth / p / 4, B - depth / q / 4, depth / 4);
        // Triangle: area by the cross product of its sides.
        double area = depth / p * depth / q / 2 * Math.sqrt(1 + p * p + q * q);
        assertEquals(area, i.surface().area(), RELATIVE * area);
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-3, 0.3, 1.5})
    void theLastCornerAirIsATetrahedron(double gap) {
        // The air is at the forward port top corner: what is full less it.
        double p = 0.5;
        double q = 0.75;
        double air = gap / p * gap / q * gap / 6;
        double full = L * B * D;
        Immersed i = box.below(new Attitude(p, q), D - gap + L * p);
        double v = full - air;
        assertImmersed(
                i,
                v,
                (full * L / 2 - air * (L - gap / p / 4)) / v,
                (full * B / 2 - air * (gap / q / 4)) / v,
                (full * D / 2 - air * (D - gap / 4)) / v);
    }

    @Test
    void aTetrahedronLessTheTipsOutsideTheBox() {
        // Legs longer than the box: the tetrahedron less the similar ones beyond its ends (inclusion and exclusion; no
        // overlap here).
        double p = 0.5;
        double q = 0.5;
        double depth = 4.5;
        double beyondX = depth - L * p;
        double beyondY = depth - B * q;
        double v = (cube(depth) - cube(beyondX) - cube(beyondY)) / (6 * p * q);
        double momentX = (cube(depth) * depth / p / 4
                        - cube(beyondX) * (L + beyondX / p / 4)
                        - cube(beyondY) * (beyondY / p / 4))
                / (6 * p * q);
        double momentZ =
                (cube(depth) * depth / 4 - cube(beyondX) * beyondX / 4 - cube(beyondY) * beyondY / 4) / (6 * p * q);
        double momentY =
                (cube(depth) * depth / q / 4 - cube(beyondX) * beyondX / q / 4 - cube(beyondY) * (B + beyondY / q / 4))
                        / (6 * p * q);
        Immersed i = box.below(new Attitude(p, q), depth - B * q);
        assertImmersed(i, v, momentX / v, B - momentY / v, momentZ / v);
    }

    private static double cube(double a) {
        return a * a * a;
    }

    @Test
    void aHexagonalCutThroughTheMiddleHalvesACube() {
        // The plane square to a space diagonal through the centre of a cube: a regular hexagon of side a/√2, area
        // 3√3/4·a².
        double a = 4;
        Solid cube = Shapes.box(0, a, 0, a, 0, a);
        Immersed i = cube.below(new Attitude(1, 1), a / 2 + a / 2 - a / 2);
        assertEquals(cube(a) / 2, i.volume(), 1e-12 * cube(a));
        assertEquals(3 * Math.sqrt(3) / 4 * a * a, i.surface().area(), 1e-12 * a * a);
        assertEquals(a / 2, i.surface().x(), 1e-12);
        assertEquals(a / 2, i.surface().y(), 1e-12);
        // A regular hexagon of side s has I = 5√3/16·s⁴ about every axis through its centre (Gere and Timoshenko, app.
        // D, from memory).
        double hexagon = 5 * Math.sqrt(3) / 16 * Math.pow(a / Math.sqrt(2), 4);
        assertEquals(hexagon, i.surface().transverse(), 1e-12 * hexagon);
        assertEquals(hexagon, i.surface().longitudinal(), 1e-12 * hexagon);
    }

    @Test
    void aWedgeFilledToAShareOfItsDepth() {
        // A V section: area goes with depth², centroid at two thirds of the depth.
        Solid vee = Shapes.prism(2, 7, loop(1, 0, 0, 3, 4, -3, 4));
        for (double z : new double[] {1e-9, 0.1, 2, 3.9}) {
            Immersed i = vee.below(Attitude.UPRIGHT, z);
            assertImmersed(i, 5 * 0.75 * z * z, 4.5, 0, z * 2 / 3);
        }
    }

    @Test
    void anUpendedPyramidFilledToAShareOfItsDepth() {
        // Point down at (x, y, z) = (4, 0, 0), the base a square on its corner with diagonals of 8; volume goes with
        // depth³, centroid at
        // 3/4.
        Solid pyramid = solid(
                station(0, loop(1, 0, 4, 0, 4, 0, 4, 0, 4)),
                station(4, loop(1, -4, 4, 0, 0, 4, 4, 0, 4)),
                station(8, loop(1, 0, 4, 0, 4, 0, 4, 0, 4)));
        assertEquals(8 * 8 * 4 / 2.0 / 3, pyramid.volume(), 1e-12);
        for (double z : new double[] {1e-6, 0.1, 2, 3.9}) {
            double base = 8 * 8 / 2.0 * z * z / 16;
            assertImmersed(pyramid.below(Attitude.UPRIGHT, z), base * z / 3, 4, 0, z * 3 / 4);
        }
    }

    @Test
    void aTetrahedralTankUnderAnyPlaneParallelToAFace() {
        // The tetrahedron (0,0,0) (6,0,0) (0,4,0) (0,0,3): plane z = c − x/2 − ... parallel to its slanted face cuts a
        // similar one.
        Solid tetrahedron = solid(station(0, loop(1, 0, 0, 4, 0, 0, 3)), station(6, loop(1, 0, 0, 0, 0, 0, 0)));
        assertEquals(6 * 4 * 3 / 6.0, tetrahedron.volume(), 1e-13);
        Attitude parallel = new Attitude(3 / 6.0, -3 / 4.0);
        for (double k : new double[] {1e-3, 0.2, 0.7, 0.99}) {
            assertImmersed(tetrahedron.below(parallel, 3 * k), 12 * cube(k), 6 * k / 4, 4 * k / 4, 3 * k / 4);
        }
    }

    @Test
    void aWarpedSideEnclosesTheVolumeOfItsRuledSurface() {
        // A square turned by 45° from end to end: the section at t is the polygon of the moved corners, its area of
        // second degree in
        // t, so Simpson's rule is exact for the volume.
        double r = 2;
        double h = r / Math.sqrt(2);
        Solid twisted =
                solid(station(0, loop(1, r, 0, 0, r, -r, 0, 0, -r)), station(6, loop(1, h, h, -h, h, -h, -h, h, -h)));
        double end = 2 * r * r;
        double middle = end * sq(Math.cos(Math.PI / 8));
        assertEquals(6 * (end + 4 * middle + end) / 6, twisted.volume(), 1e-12);
    }

    private static double sq(double a) {
        return a * a;
    }

    @Test
    void farFromTheOriginNothingIsLost() {
        Solid far = Shapes.box(1000, 1000 + L, -500, -500 + B, 0, D);
        double p = 0.5;
        double q = 0.75;
        double depth = 0.3;
        Immersed i = far.below(new Attitude(p, q), depth + 1000 * p - (-500 + B) * q);
        double v = depth / p * depth / q * depth / 6;
        assertEquals(v, i.volume(), 1e-11 * v);
        assertEquals(1000 + depth / p / 4, i.lcg(), 1e-10);
        assertEquals(-500 + B - depth / q / 4, i.tcg(), 1e-10);
    }

    @Test
    void mirroredHalfIsTheWhole() {
        Solid half = solid(station(0, rectangle(1, 0, 3, 0, 4)), station(9, rectangle(1, 0, 2, 1, 4)));
        Solid whole = half.mirroredBothSides();
        Solid given = solid(station(0, rectangle(1, -3, 3, 0, 4)), station(9, rectangle(1, -2, 2, 1, 4)));
        Attitude tilted = new Attitude(0.05, 0.3);
        Immersed a = whole.below(tilted, 2);
        Immersed b = given.below(tilted, 2);
        assertEquals(b.volume(), a.volume(), 1e-12);
        assertEquals(b.lcg(), a.lcg(), 1e-12);
        assertEquals(b.tcg(), a.tcg(), 1e-12);
        assertEquals(b.vcg(), a.vcg(), 1e-12);
        assertEquals(b.surface().transverse(), a.surface().transverse(), 1e-11);
        assertEquals(b.surface().longitudinal(), a.surface().longitudinal(), 1e-10);
        assertEquals(given.bounds(), whole.bounds());
    }
}
