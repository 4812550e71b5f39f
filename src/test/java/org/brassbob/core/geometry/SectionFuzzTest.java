// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.brassbob.core.geometry.SpaceShape.Loop;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.algorithm.RayCrossingCounter;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.Location;
import org.locationtech.jts.operation.polygonize.Polygonizer;
import org.locationtech.jts.triangulate.polygon.PolygonTriangulator;

/**
 * Loops of random points on a coarse grid, which touch, double back and cross as often as not. Whatever is taken for a solid must have
 * sections whose area JTS finds too, though it goes about it in another way: it nodes the edges and puts the faces together afresh.
 */
class SectionFuzzTest {
    private static final GeometryFactory JTS = new GeometryFactory();

    private static Loop onGrid(Random random, int number, int corners, int side) {
        List<Point> points = new ArrayList<>();
        for (int i = 0; i < corners; i++) {
            points.add(new Point(random.nextInt(side), random.nextInt(side)));
        }
        return new Loop(number, points);
    }

    private static Loop moved(Random random, Loop loop, int by) {
        return new Loop(
                loop.number(),
                loop.points().stream()
                        .map(p -> new Point(p.y() + random.nextInt(by), p.z() + random.nextInt(by)))
                        .toList());
    }

    private static Loop shifted(Loop loop, int by) {
        return new Loop(
                loop.number(),
                loop.points().stream()
                        .map(p -> new Point(p.y() + by, p.z() + by))
                        .toList());
    }

    private static Optional<Solid> solid(List<Loop> aft, List<Loop> forward) {
        try {
            return Optional.of(Solid.of(Shapes.shape(
                    Shapes.station(0, aft.toArray(new Loop[0])), Shapes.station(6, forward.toArray(new Loop[0])))));
        } catch (ShapeException e) {
            assertTrue(e.getMessage().startsWith("loop"), e::getMessage);
            return Optional.empty();
        }
    }

    private static List<Point> section(Loop aft, Loop forward, double t) {
        List<Point> points = new ArrayList<>();
        for (int i = 0; i < aft.points().size(); i++) {
            Point a = aft.points().get(i);
            Point b = forward.points().get(i);
            points.add(new Point(a.y() + (b.y() - a.y()) * t, a.z() + (b.z() - a.z()) * t));
        }
        return points;
    }

    /** What a line drawn out from it crosses the ring an odd number of times; faces from the ring's edges noded and put together. */
    private static Geometry jts(List<Point> points) {
        List<Coordinate> ring = new ArrayList<>();
        points.forEach(p -> ring.add(new Coordinate(p.y(), p.z())));
        ring.add(ring.get(0));
        Coordinate[] corners = ring.toArray(new Coordinate[0]);
        Polygonizer polygonizer = new Polygonizer();
        polygonizer.add(JTS.createLineString(corners).union());
        List<Geometry> inside = new ArrayList<>();
        for (Object face : polygonizer.getPolygons()) {
            Geometry polygon = (Geometry) face;
            // Noding leaves slivers of no area where edges run along each other.
            if (polygon.getArea() > 1e-9 && isInside(polygon, corners)) {
                inside.add(polygon);
            }
        }
        return inside.isEmpty()
                ? JTS.createPolygon()
                : JTS.buildGeometry(inside).union();
    }

    /** Judged by a place in the largest triangle of the face, chosen such that no spike of the ring runs through it. */
    private static boolean isInside(Geometry face, Coordinate[] ring) {
        Geometry triangles = PolygonTriangulator.triangulate(face);
        Geometry largest = triangles.getGeometryN(0);
        for (int i = 1; i < triangles.getNumGeometries(); i++) {
            largest = triangles.getGeometryN(i).getArea() > largest.getArea() ? triangles.getGeometryN(i) : largest;
        }
        Coordinate[] c = largest.getCoordinates();
        double u = 0.31830988;
        double v = 0.36787944;
        double w = 1 - u - v;
        Coordinate place = new Coordinate(u * c[0].x + v * c[1].x + w * c[2].x, u * c[0].y + v * c[1].y + w * c[2].y);
        int where = RayCrossingCounter.locatePointInRing(place, ring);
        assertNotEquals(Location.BOUNDARY, where);
        return where == Location.INTERIOR;
    }

    @Test
    void singleLoops() {
        Random random = new Random(4);
        int taken = 0;
        for (int trial = 0; trial < 2000; trial++) {
            Loop aft = onGrid(random, 1, 3 + random.nextInt(5), 4);
            Loop forward = moved(random, aft, 1 + random.nextInt(3));
            Optional<Solid> solid = solid(List.of(aft), List.of(forward));
            if (solid.isPresent()) {
                taken++;
                for (double t : new double[] {0, 0.03, 0.27, 0.5, 0.61, 0.88, 1}) {
                    List<Point> section = section(aft, forward, t);
                    assertEquals(
                            Math.abs(Section.area(section)), jts(section).getArea(), 1e-9, () -> aft + " " + forward);
                }
                assertEquals(
                        (area(aft, forward, 0) + 4 * area(aft, forward, 0.5) + area(aft, forward, 1)),
                        solid.get().volume(),
                        1e-9,
                        () -> aft + " " + forward);
            }
        }
        assertTrue(taken > 400, "taken: " + taken);
        assertTrue(taken < 1600, "taken: " + taken);
    }

    private static double area(Loop aft, Loop forward, double t) {
        return jts(section(aft, forward, t)).getArea();
    }

    @Test
    void pairsOfLoops() {
        Random random = new Random(5);
        int taken = 0;
        int holes = 0;
        for (int trial = 0; trial < 3000; trial++) {
            Loop a = onGrid(random, 1, 3 + random.nextInt(2), 12);
            Loop b = shifted(onGrid(random, 2, 3 + random.nextInt(2), 4), 4);
            Loop a2 = moved(random, a, 2);
            Loop b2 = moved(random, b, 2);
            Optional<Solid> solid = solid(List.of(a, b), List.of(a2, b2));
            if (solid.isPresent()) {
                taken++;
                // What is in one of them but not in both: the ring round a hole, or two apart. Simpson's rule is exact.
                double expected = either(a, a2, b, b2, 0) + 4 * either(a, a2, b, b2, 0.5) + either(a, a2, b, b2, 1);
                assertEquals(expected, solid.get().volume(), 1e-8, () -> a + " " + a2 + " " + b + " " + b2);
                holes += jts(a.points()).contains(jts(b.points())) ? 1 : 0;
            }
        }
        assertTrue(taken > 100, "taken: " + taken);
        assertTrue(holes > 20, "holes: " + holes);
    }

    private static double either(Loop a, Loop a2, Loop b, Loop b2, double t) {
        return jts(section(a, a2, t)).symDifference(jts(section(b, b2, t))).getArea();
    }
}
