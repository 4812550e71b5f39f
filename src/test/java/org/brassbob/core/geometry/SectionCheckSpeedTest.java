// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import static org.brassbob.core.geometry.Shapes.loop;
import static org.brassbob.core.geometry.Shapes.shape;
import static org.brassbob.core.geometry.Shapes.solid;
import static org.brassbob.core.geometry.Shapes.station;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.geometry.SpaceShape.Loop;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.brassbob.core.geometry.SpaceShape.Station;
import org.junit.jupiter.api.Test;

/** However tangled a shape is, the answer comes soon. */
class SectionCheckSpeedTest {
    @Test
    void aHullIsCheckedQuickly() {
        List<Station> stations = new ArrayList<>();
        for (int i = 0; i <= 40; i++) {
            double u = i / 40.0;
            List<Point> points = new ArrayList<>();
            points.add(new Point(0, 0));
            for (int k = 0; k < 18; k++) {
                double w = k / 17.0;
                points.add(new Point(8 * (1 - Math.pow(2 * u - 1, 4)) * Math.sqrt(w + 0.01), 8 * w));
            }
            points.add(new Point(0, 8));
            stations.add(new Station(84 * u, List.of(new Loop(1, points))));
        }
        Solid hull =
                assertTimeoutPreemptively(Duration.ofSeconds(2), () -> solid(shape(stations.toArray(new Station[0]))));
        assertEquals(84, hull.bounds().maxX(), 0);
    }

    @Test
    void aTangleIsRefusedQuickly() {
        // Many points thrown about at random: every pair of edges may cross.
        java.util.Random random = new java.util.Random(7);
        double[] a = random.doubles(800).toArray();
        double[] b = random.doubles(800).toArray();
        assertTimeoutPreemptively(
                Duration.ofSeconds(5),
                () -> assertThrows(
                        ShapeException.class, () -> Solid.of(shape(station(0, loop(1, a)), station(1, loop(1, b))))));
    }

    @Test
    void aSwirlOfManyPointsIsJudgedQuickly() {
        // Both ends are stars of 400 points, in between every spike sweeps over others.
        double[] a = star(400, 0, 0.5);
        double[] b = star(400, 2.0, 0.7);
        assertTimeoutPreemptively(
                Duration.ofSeconds(10),
                () -> assertThrows(
                        ShapeException.class, () -> Solid.of(shape(station(0, loop(1, a)), station(1, loop(1, b))))));
    }

    private static double[] star(int points, double turn, double inner) {
        double[] yz = new double[2 * points];
        for (int i = 0; i < points; i++) {
            double angle = 2 * Math.PI * i / points + (i % 2 == 0 ? turn : 0);
            double r = i % 2 == 0 ? 1 : inner;
            yz[2 * i] = r * Math.cos(angle);
            yz[2 * i + 1] = r * Math.sin(angle);
        }
        return yz;
    }
}
