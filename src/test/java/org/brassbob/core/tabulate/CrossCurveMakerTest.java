// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.Immersed;
import org.brassbob.core.geometry.Shapes;
import org.brassbob.core.geometry.Solid;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.CrossCurves;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class CrossCurveMakerTest {
    private static final double LENGTH = 60;
    private static final double BREADTH = 12;
    private static final double DEPTH = 8;
    private static final double DRAUGHT = 4;
    private static final double DENSITY = 1.025;
    private static final double DISPLACEMENT = DENSITY * LENGTH * BREADTH * DRAUGHT;

    private static Solid barge() {
        return Shapes.box(0, LENGTH, 0, BREADTH / 2, 0, DEPTH).mirroredBothSides();
    }

    /** Wall-sided formula (any ship-stability textbook): GZ = (GM + ½·BM·tan²φ)·sin φ until deck or bilge is reached; KN = GZ + KG·sin φ. */
    @ParameterizedTest
    @ValueSource(doubles = {2, 5, 10, 20, 30})
    void wallSidedBox(double heelDeg) {
        double heel = Math.toRadians(heelDeg);
        double bm = BREADTH * BREADTH / (12 * DRAUGHT);
        double km = DRAUGHT / 2 + bm;
        double expected = (km + bm / 2 * Math.tan(heel) * Math.tan(heel)) * Math.sin(heel);
        assertEquals(expected, new CrossCurveMaker(barge(), DENSITY).kn(DISPLACEMENT, heelDeg), 1e-9);
    }

    /**
     * Half its depth deep, a box heeled to the angle of its diagonal floats with a triangle under water: the centroid is at a third of
     * each side from the low corner, so KN follows by hand. tan φ = D/B.
     */
    @Test
    void boxAtItsDiagonal() {
        double heel = Math.atan2(DEPTH, BREADTH);
        double y = BREADTH / 2 - BREADTH / 3;
        double z = DEPTH / 3;
        double expected = y * Math.cos(heel) + z * Math.sin(heel);
        assertEquals(expected, new CrossCurveMaker(barge(), DENSITY).kn(DISPLACEMENT, Math.toDegrees(heel)), 1e-8);
    }

    /** At 90° less a little the box lies on its side: KN tends to D/2 for a box whose draught is half its depth, heeled to its beam ends. */
    @Test
    void boxOnItsSide() {
        assertEquals(DEPTH / 2, new CrossCurveMaker(barge(), DENSITY).kn(DISPLACEMENT, 89.99), 0.01);
    }

    /** A wedge-shaped hull trims as it heels: the lever must be that of a surface with the buoyancy under the centre of gravity. */
    @Test
    void freeToTrim() {
        Solid half = Shapes.solid(
                Shapes.station(0, Shapes.rectangle(1, 0, 8, 0, 6)),
                Shapes.station(60, Shapes.rectangle(1, 0, 3, 0, 6)));
        Solid hull = half.mirroredBothSides();
        double volume = 2000;
        CrossCurveMaker maker = new CrossCurveMaker(hull, 1);
        double lcb = hull.below(Attitude.UPRIGHT, hull.heightFor(Attitude.UPRIGHT, volume))
                .lcg();
        double q = Math.tan(Math.toRadians(35));
        // An independent search for the trim: plain bisection on the aft-going centre of buoyancy.
        double low = -0.2;
        double high = 0.2;
        for (int i = 0; i < 60; i++) {
            double mid = (low + high) / 2;
            Attitude attitude = new Attitude(mid, q);
            if (hull.below(attitude, hull.heightFor(attitude, volume)).lcg() > lcb) {
                low = mid;
            } else {
                high = mid;
            }
        }
        assertTrue(Math.abs(low) > 1e-4, "this hull must trim, found " + low);
        Attitude attitude = new Attitude(low, q);
        Immersed below = hull.below(attitude, hull.heightFor(attitude, volume));
        // The lever by vectors: the upright is the normal of the surface, the fore-and-aft line lies in the surface in
        // the centreplane.
        double norm = Math.sqrt(low * low + q * q + 1);
        double[] up = {low / norm, -q / norm, 1 / norm};
        double along = Math.sqrt(1 + low * low);
        double[] forward = {1 / along, 0, -low / along};
        double[] athwart = {
            up[1] * forward[2] - up[2] * forward[1],
            up[2] * forward[0] - up[0] * forward[2],
            up[0] * forward[1] - up[1] * forward[0]
        };
        double lever = below.tcg() * athwart[1] + below.vcg() * athwart[2];
        assertEquals(Math.abs(lever), maker.kn(volume, 35), 1e-7);
    }

    @Test
    void smallAnglesFollowTheMetacentre() {
        HydrostaticMaker hydrostatics = new HydrostaticMaker(barge(), DENSITY, LENGTH);
        double km = hydrostatics.atDisplacement(DISPLACEMENT).kmt();
        CrossCurves curves = new CrossCurveMaker(barge(), DENSITY)
                .curves(Axis.of(DISPLACEMENT, 1.2 * DISPLACEMENT), Axis.of(0.1, 10));
        assertEquals(km * Math.sin(Math.toRadians(0.1)), curves.kn(DISPLACEMENT, 0), 1e-7);
    }
}
