// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.geometry.SpaceShape.Loop;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.brassbob.core.geometry.SpaceShape.Station;
import org.brassbob.core.table.Origin;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Attitude, box and net shape. */
class SmallTypesTest {
    @Test
    void attitudeOfATrimmedAndHeeledShip() {
        Attitude a = Attitude.of(1.68, 84, 45);
        assertEquals(0.02, a.trimSlope(), 1e-17);
        assertEquals(1, a.heelSlope(), 1e-15);
    }

    @Test
    void theSurfaceFallsForwardByTheSternAndRisesToStarboard() {
        Attitude a = new Attitude(0.02, 0.5);
        assertEquals(5 - 10 * 0.02 + 3 * 0.5, a.heightAt(5, 10, 3), 1e-15);
        assertEquals(5, a.heightThrough(10, 3, a.heightAt(5, 10, 3)), 1e-15);
    }

    @ParameterizedTest
    @CsvSource({
        "1, 0, 0",
        "1, -84, 0",
        "1, NaN, 0",
        "1, 84, 90",
        "1, 84, -90",
        "1, 84, NaN",
        "NaN, 84, 0",
        "Infinity, 84, 0",
        "-Infinity, 84, 0"
    })
    void noAttitudeOutside(double trim, double lbp, double heel) {
        IllegalArgumentException e = assertThrows(IllegalArgumentException.class, () -> Attitude.of(trim, lbp, heel));
        assertEquals("no attitude for trim " + trim + " m over " + lbp + " m and heel " + heel + "°", e.getMessage());
    }

    @Test
    void almostOnBeamEndsIsStillAnAttitude() {
        assertTrue(Attitude.of(0, 84, 89.999).heelSlope() > 57_000);
        assertTrue(Attitude.of(0, 84, -89.999).heelSlope() < -57_000);
    }

    @ParameterizedTest
    @CsvSource({"NaN, 0", "0, NaN", "Infinity, 0", "0, -Infinity"})
    void noAttitudeWithoutNumbers(double trimSlope, double heelSlope) {
        IllegalArgumentException e =
                assertThrows(IllegalArgumentException.class, () -> new Attitude(trimSlope, heelSlope));
        assertEquals("no attitude with slopes " + trimSlope + " and " + heelSlope, e.getMessage());
    }

    @Test
    void boundsAreTheBoxAround() {
        Solid solid = Shapes.solid(
                Shapes.station(3, Shapes.rectangle(1, -1, 2, 0, 4)),
                Shapes.station(9, Shapes.rectangle(1, 0, 5, 1, 3)));
        assertEquals(new Bounds(3, 9, -1, 5, 0, 4), solid.bounds());
    }

    @Test
    void boundsEncloseToATolerance() {
        Bounds b = new Bounds(0, 10, -3, 3, 0, 5);
        assertTrue(b.encloses(b, 0));
        for (int side = 0; side < 6; side++) {
            assertTrue(b.encloses(grown(b, side, 0.009), 0.01), "side " + side);
            assertFalse(b.encloses(grown(b, side, 0.011), 0.01), "side " + side);
        }
        assertTrue(b.contains(10, 3, 5, 0));
        assertTrue(b.contains(0, -3, 0, 0));
        assertFalse(b.contains(10.1, 0, 1, 0));
        assertFalse(b.contains(1, 3.1, 1, 0));
        assertFalse(b.contains(1, 0, 5.1, 0));
    }

    private static Bounds grown(Bounds b, int side, double by) {
        double[] v = {b.minX(), b.maxX(), b.minY(), b.maxY(), b.minZ(), b.maxZ()};
        v[side] += side % 2 == 0 ? -by : by;
        return new Bounds(v[0], v[1], v[2], v[3], v[4], v[5]);
    }

    @Test
    void structureTakesItsShareOfVolumesAndLeavesTheSurface() {
        Solid box = Shapes.box(0, 10, 0, 6, 0, 4);
        NetShape net = new NetShape(box, 2);
        assertSame(box, net.solid());
        assertEquals(240 * 0.98, net.capacity(), 1e-12);
        assertEquals(120 * 0.98, net.volumeBelow(Attitude.UPRIGHT, 2), 1e-12);
        Immersed half = net.below(Attitude.UPRIGHT, 2);
        assertEquals(120 * 0.98, half.volume(), 1e-12);
        assertEquals(5, half.lcg(), 1e-12);
        assertEquals(3, half.tcg(), 1e-12);
        assertEquals(1, half.vcg(), 1e-12);
        assertEquals(10 * 216 / 12.0, half.surface().transverse(), 1e-11);
        assertEquals(2, net.heightFor(Attitude.UPRIGHT, 120 * 0.98), 1e-11);
        assertEquals(4, net.heightFor(Attitude.UPRIGHT, net.capacity()), 1e-11);
        Immersed held = net.holding(new Attitude(0.01, 0.1), 100);
        assertEquals(100, held.volume(), 1e-9);
        assertEquals(LiquidSurface.NONE, net.holding(Attitude.UPRIGHT, 0).surface());
    }

    @ParameterizedTest
    @CsvSource({"0, 0, 4", "25, 60, 4", "99.5, 238.8, 4"})
    void aFullNetShapeHasNoSurface(double steelPct, double steel, double top) {
        NetShape net = new NetShape(Shapes.box(0, 10, 0, 6, 0, 4), steelPct);
        assertEquals(240 - steel, net.capacity(), 1e-11);
        assertEquals(top, net.heightFor(Attitude.UPRIGHT, net.capacity() * 1.000001), 0);
        assertEquals(
                LiquidSurface.NONE,
                net.holding(Attitude.UPRIGHT, net.capacity() * 1.000001).surface());
    }

    @ParameterizedTest
    @CsvSource({"-0.001", "100", "NaN", "250"})
    void structureIsAShare(double steelPct) {
        Solid box = Shapes.box(0, 1, 0, 1, 0, 1);
        IllegalArgumentException e = assertThrows(IllegalArgumentException.class, () -> new NetShape(box, steelPct));
        assertEquals("structure of " + steelPct + " %; expected 0 to below 100", e.getMessage());
    }

    @Test
    void aShapeKeepsItsOwnCopyOfEverything() {
        List<Point> points = new ArrayList<>(List.of(new Point(0, 0), new Point(1, 0), new Point(0, 1)));
        List<Loop> loops = new ArrayList<>(List.of(new Loop(1, points)));
        List<Station> stations = new ArrayList<>(List.of(new Station(0, loops)));
        SpaceShape shape = new SpaceShape(stations, Origin.of("tanks/A.shape.csv", 2));
        points.clear();
        loops.clear();
        stations.clear();
        assertEquals(3, shape.stations().get(0).loops().get(0).points().size());
        assertEquals("tanks/A.shape.csv:2", shape.origin().at(0));
    }
}
