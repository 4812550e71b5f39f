// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.function.IntFunction;
import java.util.function.ToDoubleFunction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Hydrostatics of hulls in closed form: the box barge (Barrass and Derrett, Ship Stability for Masters and Mates, from memory: KB = T/2,
 * BM = B²/12T) and the parabolic hull of Wigley (1942) y = B/2·(1 − (2x/L)²)(1 − (z/T)²), whose integrals are elementary:
 * V = 4/9·LBT, Aw = 2/3·LB, KB = 5/8·T, BM = 3B²/35T, BML = 3L²/40T.
 */
class HullFormTest {
    private static final double L = 100;
    private static final double B = 10;
    private static final double T = 6.25;

    @ParameterizedTest
    @ValueSource(doubles = {0.1, 2, 5.5, 7.999})
    void boxBarge(double draught) {
        Solid barge = Shapes.box(0, 84, 0, 7, 0, 8).mirroredBothSides();
        Immersed i = barge.below(Attitude.UPRIGHT, draught);
        double v = 84 * 14 * draught;
        assertEquals(v, i.volume(), 1e-12 * v);
        assertEquals(draught / 2, i.vcg(), 1e-12);
        assertEquals(42, i.lcg(), 1e-12);
        assertEquals(0, i.tcg(), 1e-13);
        assertEquals(14 * 14 / (12 * draught), i.surface().transverse() / v, 1e-11 * 14 * 14 / draught);
        assertEquals(84 * 84 / (12 * draught), i.surface().longitudinal() / v, 1e-11 * 84 * 84 / draught);
    }

    @Test
    void boxBargeHeeledIsWallSided() {
        // Wall-sided formula (Atwood; Barrass and Derrett, from memory): the centre of buoyancy moves BM·tan φ to the
        // side and
        // BM/2·tan²φ up, while neither bilge nor deck edge passes the water.
        Solid barge = Shapes.box(0, 84, 0, 7, 0, 8).mirroredBothSides();
        double tan = Math.tan(Math.toRadians(15));
        Immersed i = barge.below(new Attitude(0, tan), 4);
        double bm = 14 * 14 / (12 * 4.0);
        assertEquals(84 * 14 * 4, i.volume(), 1e-9);
        assertEquals(bm * tan, i.tcg(), 1e-12);
        assertEquals(2 + bm / 2 * tan * tan, i.vcg(), 1e-12);
    }

    /** Wigley's hull sampled at n × n, both sides, upright; z up from the keel. */
    private static Immersed wigley(int n) {
        SpaceShape half = Shapes.halfHull(n, n, L, T, (u, w) -> B / 2 * (1 - sq(2 * u - 1)) * (1 - sq(1 - w)));
        return Shapes.solid(half).mirroredBothSides().below(Attitude.UPRIGHT, T - 1e-9);
    }

    private static double sq(double a) {
        return a * a;
    }

    /** The limit of a figure that converges at second order, by Romberg's table over doubled sampling (Richardson, 1911). */
    private static double limit(IntFunction<Immersed> hull, ToDoubleFunction<Immersed> figure) {
        double[] row = new double[4];
        for (int k = 0; k < row.length; k++) {
            row[k] = figure.applyAsDouble(hull.apply(8 << k));
        }
        double power = 4;
        for (int order = row.length - 1; order > 0; order--) {
            for (int k = 0; k < order; k++) {
                row[k] = (power * row[k + 1] - row[k]) / (power - 1);
            }
            power *= 4;
        }
        return row[0];
    }

    private static void converges(double exact, ToDoubleFunction<Immersed> figure) {
        assertEquals(exact, limit(HullFormTest::wigley, figure), 1e-6 * exact);
        double coarse = figure.applyAsDouble(wigley(16)) - exact;
        double fine = figure.applyAsDouble(wigley(32)) - exact;
        assertEquals(2, Math.log(coarse / fine) / Math.log(2), 0.02, "order of convergence");
    }

    @Test
    void wigleyVolume() {
        converges(4.0 / 9 * L * B * T, Immersed::volume);
    }

    @Test
    void wigleyWaterplane() {
        converges(2.0 / 3 * L * B, i -> i.surface().area());
    }

    @Test
    void wigleyCentreOfBuoyancy() {
        // The error of the centroid is that of a quotient: the moment about the keel is the plain integral.
        converges(5.0 / 8 * T * 4 / 9 * L * B * T, i -> i.vcg() * i.volume());
        assertEquals(5.0 / 8 * T, limit(HullFormTest::wigley, Immersed::vcg), 1e-6 * T);
    }

    @Test
    void wigleyTransverseMetacentricRadius() {
        converges(4.0 / 105 * L * B * B * B, i -> i.surface().transverse());
        assertEquals(
                3 * B * B / (35 * T),
                limit(HullFormTest::wigley, i -> i.surface().transverse() / i.volume()),
                1e-6 * B * B / T);
    }

    @Test
    void wigleyLongitudinalMetacentricRadius() {
        converges(B * L * L * L / 30, i -> i.surface().longitudinal());
        assertEquals(
                3 * L * L / (40 * T),
                limit(HullFormTest::wigley, i -> i.surface().longitudinal() / i.volume()),
                1e-6 * L * L / T);
    }

    @Test
    void wigleyIsAlikeForeAndAftAndBothSides() {
        Immersed i = wigley(32);
        assertEquals(50, i.lcg(), 1e-12);
        assertEquals(50, i.surface().x(), 1e-12);
        assertEquals(0, i.tcg(), 1e-13);
        assertEquals(0, i.surface().y(), 1e-13);
    }

    @Test
    void theSurfaceIsTheSlopeOfTheMoment() {
        // For constant volume, dB/dφ at small heel is BM (Bouguer's metacentre): by central difference, error of second
        // order.
        SpaceShape half = Shapes.halfHull(24, 24, L, T, (u, w) -> B / 2 * (1 - sq(2 * u - 1)) * (1 - sq(1 - w)));
        Solid hull = Shapes.solid(half).mirroredBothSides();
        double v = 0.8 * hull.volume();
        double h = 1e-4;
        double y = hull.below(new Attitude(0, h), hull.heightFor(new Attitude(0, h), v))
                .tcg();
        Immersed upright = hull.below(Attitude.UPRIGHT, hull.heightFor(Attitude.UPRIGHT, v));
        double bm = upright.surface().transverse() / v;
        assertEquals(bm, y / h, 1e-6 * bm);
    }
}
