// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.Immersed;
import org.brassbob.core.geometry.Shapes;
import org.brassbob.core.geometry.Solid;
import org.brassbob.core.geometry.SpaceShape.Loop;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.brassbob.core.geometry.SpaceShape.Station;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;

/** KN against sections clipped by JTS, a general-purpose geometry library, and against shapes whose KN is known. */
class CrossCurveReferenceTest {
    private static final double LENGTH = 50;
    private static final double BREADTH = 14;
    private static final double DEPTH = 8;
    private static final GeometryFactory JTS = new GeometryFactory();

    /** Deck edge under, bilge out, both or neither: a box at light, half and deep draught, heeled to 75°. */
    @ParameterizedTest
    @ValueSource(doubles = {1.3, 4, 6.7})
    void boxClippedByJts(double draught) {
        Solid box = Shapes.box(0, LENGTH, 0, BREADTH / 2, 0, DEPTH).mirroredBothSides();
        CrossCurveMaker maker = new CrossCurveMaker(box, 1);
        for (double heel = 5; heel <= 75; heel += 5) {
            double area = BREADTH * draught;
            assertEquals(clippedLever(area, heel), maker.kn(area * LENGTH, heel), 1e-8, "heel " + heel);
        }
    }

    /** Lever of a box section about its keel: the section turned to starboard, clipped at the level that leaves the area, by JTS. */
    private static double clippedLever(double area, double heelDeg) {
        double cos = Math.cos(Math.toRadians(heelDeg));
        double sin = Math.sin(Math.toRadians(heelDeg));
        double[][] corners = {{-BREADTH / 2, 0}, {BREADTH / 2, 0}, {BREADTH / 2, DEPTH}, {-BREADTH / 2, DEPTH}};
        Coordinate[] ring = new Coordinate[5];
        for (int i = 0; i < 5; i++) {
            double y = corners[i % 4][0];
            double z = corners[i % 4][1];
            ring[i] = new Coordinate(y * cos + z * sin, z * cos - y * sin);
        }
        Geometry section = JTS.createPolygon(ring);
        double low = -20;
        double high = 20;
        for (int i = 0; i < 80; i++) {
            double level = (low + high) / 2;
            if (below(section, level).getArea() < area) {
                low = level;
            } else {
                high = level;
            }
        }
        return below(section, low).getCentroid().getX();
    }

    private static Geometry below(Geometry section, double level) {
        Coordinate[] half = {
            new Coordinate(-40, -40),
            new Coordinate(40, -40),
            new Coordinate(40, level),
            new Coordinate(-40, level),
            new Coordinate(-40, -40)
        };
        return section.intersection(JTS.createPolygon(half));
    }

    /**
     * A round section: whatever the draught, buoyancy acts through its centre, so KN = R·sin φ. A regular polygon of 360 sides does so
     * exactly at whole degrees, by symmetry.
     */
    @ParameterizedTest
    @ValueSource(doubles = {0.2, 0.5, 0.9})
    void roundHullTurnsAboutItsCentre(double share) {
        double radius = 5;
        List<Point> half = new ArrayList<>();
        for (int i = 0; i <= 180; i++) {
            double angle = Math.toRadians(i);
            half.add(new Point(i == 180 ? 0 : radius * Math.sin(angle), radius - radius * Math.cos(angle)));
        }
        Loop loop = new Loop(1, half);
        Solid hull = Shapes.solid(new Station(0, List.of(loop)), new Station(40, List.of(loop)))
                .mirroredBothSides();
        CrossCurveMaker maker = new CrossCurveMaker(hull, 1);
        for (int heel : new int[] {1, 10, 30, 45, 60, 75}) {
            double expected = radius * Math.sin(Math.toRadians(heel));
            assertEquals(expected, maker.kn(share * hull.volume(), heel), 1e-7, "heel " + heel);
        }
    }

    /** However far she must trim, the buoyancy comes back under where it was: a stubby hull, full aft and fine forward, with a low stern. */
    @ParameterizedTest
    @ValueSource(doubles = {20, 45, 60, 75})
    void aStubbyHullFindsItsTrim(double heelDeg) {
        Solid hull = Shapes.solid(
                        Shapes.station(0, Shapes.rectangle(1, 0, 9, 0, 4)),
                        Shapes.station(12, Shapes.rectangle(1, 0, 1, 0, 9)))
                .mirroredBothSides();
        double volume = 0.55 * hull.volume();
        double lcb = holding(hull, Attitude.UPRIGHT, volume).lcg();
        double q = Math.tan(Math.toRadians(heelDeg));
        double low = -5;
        double high = 5;
        for (int i = 0; i < 80; i++) {
            double p = (low + high) / 2;
            if (holding(hull, new Attitude(p, q), volume).lcg() > lcb) {
                low = p;
            } else {
                high = p;
            }
        }
        Immersed below = holding(hull, new Attitude(low, q), volume);
        assertEquals(lcb, below.lcg(), 1e-8);
        double c2q = q / (1 + low * low);
        double expected = (below.tcg() + c2q * below.vcg()) / Math.sqrt(1 + c2q * q);
        assertEquals(expected, new CrossCurveMaker(hull, 1).kn(volume, heelDeg), 1e-7, "trim slope " + low);
    }

    private static Immersed holding(Solid hull, Attitude attitude, double volume) {
        return hull.below(attitude, hull.heightFor(attitude, volume));
    }

    /**
     * KN/sin φ tends to KM as φ goes to nought, with the square of it: for a hull with flare, rise of floor and fine ends, floating halfway
     * between two corners of her sections, so that to 2° her waterline keeps to the same facets.
     */
    @Test
    void smallAnglesOfAShipTendToKmWithTheSquare() {
        Solid hull = Shapes.solid(Shapes.halfHull(
                        20,
                        12,
                        84,
                        8,
                        (u, w) -> 7 * (1 - Math.pow(2 * u - 1, 4)) * Math.min(1, Math.pow(w + 0.05, 0.4)) + 0.05 * w))
                .mirroredBothSides();
        double displacement = hull.volumeBelow(Attitude.UPRIGHT, 8 * 5.5 / 12);
        double km =
                new HydrostaticMaker(hull, 1, 84).atDisplacement(displacement).kmt();
        CrossCurveMaker maker = new CrossCurveMaker(hull, 1);
        double[] errors = new double[3];
        for (int i = 0; i < 3; i++) {
            double heel = 2.0 / (1 << i);
            errors[i] = maker.kn(displacement, heel) / Math.sin(Math.toRadians(heel)) - km;
        }
        assertTrue(Math.abs(errors[0]) < 0.01, () -> "at 2° " + errors[0]);
        assertEquals(4, errors[0] / errors[1], 0.2);
        assertEquals(4, errors[1] / errors[2], 0.2);
    }
}
