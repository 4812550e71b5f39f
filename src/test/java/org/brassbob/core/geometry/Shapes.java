// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleBiFunction;
import org.brassbob.core.geometry.SpaceShape.Loop;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.brassbob.core.geometry.SpaceShape.Station;
import org.brassbob.core.table.Origin;

/** Shapes for tests, from plain numbers. */
public final class Shapes {
    private Shapes() {}

    /** A loop of points given as y, z, y, z, … */
    public static Loop loop(int number, double... yz) {
        List<Point> points = new ArrayList<>();
        for (int i = 0; i < yz.length; i += 2) {
            points.add(new Point(yz[i], yz[i + 1]));
        }
        return new Loop(number, points);
    }

    public static Station station(double x, Loop... loops) {
        return new Station(x, List.of(loops));
    }

    public static SpaceShape shape(Station... stations) {
        return new SpaceShape(List.of(stations), Origin.computed("test shape"));
    }

    /** A rectangular loop from (y0, z0) to (y1, z1). */
    public static Loop rectangle(int number, double y0, double y1, double z0, double z1) {
        return loop(number, y0, z0, y1, z0, y1, z1, y0, z1);
    }

    /** The same section from x0 to x1. */
    public static Solid prism(double x0, double x1, Loop... loops) {
        return solid(station(x0, loops), station(x1, loops));
    }

    public static Solid box(double x0, double x1, double y0, double y1, double z0, double z1) {
        return prism(x0, x1, rectangle(1, y0, y1, z0, z1));
    }

    public static Solid solid(Station... stations) {
        return solid(shape(stations));
    }

    /** The solid of a shape that the test knows to be one. */
    public static Solid solid(SpaceShape shape) {
        try {
            return Solid.of(shape);
        } catch (ShapeException e) {
            throw new AssertionError(e.getMessage(), e);
        }
    }

    /**
     * The starboard half of a hull whose half breadth is given, sampled evenly.
     *
     * @param halfBreadth of (x, z), both in 0 to 1, m
     */
    public static SpaceShape halfHull(
            int stations, int points, double length, double depth, ToDoubleBiFunction<Double, Double> halfBreadth) {
        List<Station> all = new ArrayList<>();
        for (int i = 0; i <= stations; i++) {
            double u = (double) i / stations;
            List<Point> section = new ArrayList<>();
            section.add(new Point(0, 0));
            for (int k = 0; k <= points; k++) {
                double w = (double) k / points;
                section.add(new Point(halfBreadth.applyAsDouble(u, w), depth * w));
            }
            section.add(new Point(0, depth));
            all.add(new Station(length * u, List.of(new Loop(1, section))));
        }
        return new SpaceShape(all, Origin.computed("half hull"));
    }
}
