// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import static org.junit.jupiter.api.Assertions.assertEquals;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import net.jqwik.api.constraints.Scale;

/** What holds for boxes of any size. */
class BoxProperties {
    @Property(tries = 100)
    void depthDoesNotMatter(
            @ForAll @Scale(9) @DoubleRange(min = 1, max = 30) double length,
            @ForAll @Scale(9) @DoubleRange(min = 1, max = 20) double breadth,
            @ForAll @Scale(9) @DoubleRange(min = 0.01, max = 0.99) double a,
            @ForAll @Scale(9) @DoubleRange(min = 0.01, max = 0.99) double b) {
        Solid box = Shapes.box(0, length, 0, breadth, 0, 5);
        double expected = length * breadth * breadth * breadth / 12;
        assertEquals(expected, box.below(Attitude.UPRIGHT, 5 * a).surface().transverse(), 1e-12 * expected);
        assertEquals(
                box.below(Attitude.UPRIGHT, 5 * a).surface().transverse(),
                box.below(Attitude.UPRIGHT, 5 * b).surface().transverse(),
                1e-12 * expected);
    }

    @Property(tries = 100)
    void nEqualBreadthsDivideTheFreeSurfaceByNSquared(
            @ForAll @IntRange(min = 1, max = 12) int n,
            @ForAll @Scale(9) @DoubleRange(min = 1, max = 30) double length,
            @ForAll @Scale(9) @DoubleRange(min = 1, max = 20) double breadth,
            @ForAll @Scale(9) @DoubleRange(min = 0.1, max = 3.9) double level,
            @ForAll @Scale(9) @DoubleRange(min = -2, max = 2) double trim) {
        Attitude attitude = Attitude.of(trim, 84, 0);
        double z0 = level + attitude.heightThrough(length / 2, 0, 0);
        double whole = Shapes.box(0, length, 0, breadth, 0, 4)
                .below(attitude, z0)
                .surface()
                .transverse();
        double sum = 0;
        for (int k = 0; k < n; k++) {
            Solid part = Shapes.box(0, length, breadth * k / n, breadth * (k + 1) / n, 0, 4);
            sum += part.below(attitude, z0).surface().transverse();
        }
        assertEquals(whole / (n * n), sum, 1e-11 * (1 + whole));
    }

    @Property(tries = 200)
    void aBoxTurnedByAQuarterSwapsItsAxes(
            @ForAll @Scale(9) @DoubleRange(min = 1, max = 20) double l,
            @ForAll @Scale(9) @DoubleRange(min = 1, max = 20) double b,
            @ForAll @Scale(9) @DoubleRange(min = -0.5, max = 0.5) double slope,
            @ForAll @Scale(9) @DoubleRange(min = 0.05, max = 0.95) double share) {
        // Trim of the one is heel of the other: x ↔ y, trim slope ↔ minus heel slope. Each about one axis only, since
        // with both
        // at once the fore-and-aft axis in the surface is not the athwartships one turned.
        Solid one = Shapes.box(0, l, 0, b, 0, 6);
        Solid other = Shapes.box(0, b, 0, l, 0, 6);
        Attitude trimmed = new Attitude(slope, 0);
        Attitude heeled = new Attitude(0, -slope);
        double z0 = height(one, trimmed, share);
        Immersed x = one.below(trimmed, z0);
        Immersed y = other.below(heeled, z0);
        assertEquals(x.volume(), y.volume(), 1e-10 * one.volume());
        assertEquals(x.lcg(), y.tcg(), 1e-9);
        assertEquals(x.tcg(), y.lcg(), 1e-9);
        assertEquals(x.vcg(), y.vcg(), 1e-9);
        assertEquals(
                x.surface().transverse(),
                y.surface().longitudinal(),
                1e-9 * (1 + x.surface().transverse()));
        assertEquals(
                x.surface().longitudinal(),
                y.surface().transverse(),
                1e-9 * (1 + y.surface().transverse()));
    }

    private static double height(Solid solid, Attitude attitude, double share) {
        double low = solid.lowest(attitude);
        return low + (solid.highest(attitude) - low) * share;
    }
}
