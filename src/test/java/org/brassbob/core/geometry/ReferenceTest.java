// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.brassbob.core.geometry.SpaceShape.Loop;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.Polygon;

/** Against general-purpose libraries: JTS for plane areas, centroids and clipping, Hipparchus for integrals along x. */
class ReferenceTest {
    private static final GeometryFactory JTS = new GeometryFactory();

    /** Corners about a centre by rising angle: a simple polygon, seldom convex, run from y towards z. */
    private static List<Point> star(Random random, int n, double y, double z, double size) {
        List<Point> points = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            double angle = 2 * Math.PI * (i + 0.8 * random.nextDouble()) / n;
            double r = size * (0.3 + 0.7 * random.nextDouble());
            points.add(new Point(y + r * Math.cos(angle), z + r * Math.sin(angle)));
        }
        return points;
    }

    private static Geometry polygon(List<Point> points) {
        List<Coordinate> ring = new ArrayList<>();
        points.forEach(p -> ring.add(new Coordinate(p.y(), p.z())));
        ring.add(ring.get(0));
        return JTS.createPolygon(ring.toArray(new Coordinate[0]));
    }

    /** What of a section is below the line z = z0 + q·y. */
    private static Geometry below(Geometry section, double z0, double q) {
        double far = 1e3;
        Polygon half = JTS.createPolygon(new Coordinate[] {
            new Coordinate(-far, -far * 10),
            new Coordinate(far, -far * 10),
            new Coordinate(far, z0 + q * far),
            new Coordinate(-far, z0 - q * far),
            new Coordinate(-far, -far * 10)
        });
        return section.intersection(half);
    }

    @ParameterizedTest
    @CsvSource({"0, 3", "0, 5", "0, 17", "0.1, 8", "-0.7, 9", "5.7, 12", "-2, 40"})
    void prismsOfAnySectionAgainstJts(double heelSlope, int corners) {
        // JTS clips in floating arithmetic; its overlay is good to about 1e-10 of the section here.
        Random random = new Random(corners);
        for (int trial = 0; trial < 40; trial++) {
            List<Point> section = star(random, corners, 3, 4, 4);
            Solid prism = Shapes.prism(10, 13, new Loop(1, section));
            Attitude attitude = new Attitude(0, heelSlope);
            double low = prism.lowest(attitude);
            double z0 = low + (prism.highest(attitude) - low) * random.nextDouble();
            Geometry wet = below(polygon(section), z0, heelSlope);
            Immersed i = prism.below(attitude, z0);
            assertEquals(polygon(section).getArea() * 3, prism.volume(), 1e-12 * 100);
            assertEquals(wet.getArea() * 3, i.volume(), 1e-9);
            if (wet.getArea() > 1e-3) {
                assertEquals(11.5, i.lcg(), 1e-10);
                assertEquals(wet.getCentroid().getX(), i.tcg(), 1e-8);
                assertEquals(wet.getCentroid().getY(), i.vcg(), 1e-8);
            }
        }
    }

    @Test
    void waterplanesOfPrismsAgainstJts() {
        // Where the surface line runs through the section, its length within it times the length of the prism is the
        // area.
        Random random = new Random(11);
        for (int trial = 0; trial < 100; trial++) {
            List<Point> section = star(random, 11, -2, 5, 3);
            Solid prism = Shapes.prism(0, 7, new Loop(1, section));
            double q = random.nextDouble() - 0.5;
            Attitude attitude = new Attitude(0, q);
            double low = prism.lowest(attitude);
            double z0 = low + (prism.highest(attitude) - low) * (0.05 + 0.9 * random.nextDouble());
            Geometry line = JTS.createLineString(
                            new Coordinate[] {new Coordinate(-50, z0 - 50 * q), new Coordinate(50, z0 + 50 * q)})
                    .intersection(polygon(section));
            LiquidSurface s = prism.below(attitude, z0).surface();
            assertEquals(line.getLength() * 7, s.area(), 1e-9);
            assertEquals(line.getCentroid().getX(), s.y(), 1e-9);
            double second = 0;
            for (int k = 0; k < line.getNumGeometries(); k++) {
                Geometry piece = line.getGeometryN(k);
                double b = piece.getLength();
                double off = (piece.getCentroid().getX() - s.y()) * Math.sqrt(1 + q * q);
                second += 7 * (b * b * b / 12 + b * off * off);
            }
            assertEquals(second, s.transverse(), 1e-8);
            assertEquals(s.area() * 49 / 12, s.longitudinal(), 1e-8);
        }
    }

    @ParameterizedTest
    @CsvSource({"0, 0", "0.02, 0", "0, 0.15", "0.01, 0.05", "-0.3, 0.6", "0.5, -5.7", "2, 1"})
    void warpedSolidsAgainstHipparchus(double trimSlope, double heelSlope) throws ShapeException {
        Random random = new Random(Double.hashCode(trimSlope + 3 * heelSlope));
        int compared = 0;
        while (compared < 12) {
            int n = 3 + random.nextInt(7);
            List<Point> aft = star(random, n, 2, 5, 4);
            List<Point> forward = star(random, n, 2.5, 5.5, 2.5);
            SpaceShape shape =
                    Shapes.shape(Shapes.station(20, new Loop(1, aft)), Shapes.station(29, new Loop(1, forward)));
            Attitude attitude = new Attitude(trimSlope, heelSlope);
            Solid solid = Solid.of(shape);
            double low = solid.lowest(attitude);
            double z0 = low + (solid.highest(attitude) - low) * (0.02 + 0.96 * random.nextDouble());
            compare(solid, new RuledReference(20, aft, 29, forward, attitude, z0), attitude, z0);
            compared++;
        }
        assertEquals(12, compared);
    }

    /** To 1e-10 of the whole. */
    private static void compare(Solid solid, RuledReference reference, Attitude attitude, double z0) {
        Immersed i = solid.below(attitude, z0);
        double v = solid.volume();
        assertEquals(reference.volume(), i.volume(), 1e-10 * v);
        assertEquals(reference.momentX(), i.volume() * i.lcg(), 1e-10 * v * 29);
        assertEquals(reference.momentY(), i.volume() * i.tcg(), 1e-10 * v * 10);
        assertEquals(reference.momentZ(), i.volume() * i.vcg(), 1e-10 * v * 10);
        assertSurface(reference.projectedSurface(), i.surface(), attitude);
    }

    /** From moments of the projection to those in the surface, written out with vectors: another way than the code's. */
    private static void assertSurface(double[] m, LiquidSurface s, Attitude attitude) {
        double p = attitude.trimSlope();
        double q = attitude.heelSlope();
        double stretch = Math.sqrt(1 + p * p + q * q);
        double x = m[1] / m[0];
        double y = m[2] / m[0];
        double xx = m[3] - m[0] * x * x;
        double xy = m[4] - m[0] * x * y;
        double yy = m[5] - m[0] * y * y;
        // A place r = (dx, dy, −p·dx + q·dy); along e = (1, 0, −p)/√(1 + p²); across is what remains: r·r − (r·e)².
        double ee = 1 + p * p;
        double rr = xx * (1 + p * p) + yy * (1 + q * q) - 2 * p * q * xy;
        double along = ((1 + p * p) * (1 + p * p) * xx - 2 * (1 + p * p) * p * q * xy + p * p * q * q * yy) / ee;
        double scale = stretch * stretch * stretch * 200;
        assertEquals(m[0] * stretch, s.area(), 1e-9 * scale);
        assertEquals(x, s.x(), 1e-8);
        assertEquals(y, s.y(), 1e-8);
        assertEquals(along * stretch, s.longitudinal(), 1e-9 * scale * 10);
        assertEquals((rr - along) * stretch, s.transverse(), 1e-9 * scale * 10);
        assertTrue(s.area() > 0);
    }
}
