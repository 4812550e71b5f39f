// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

import java.util.ArrayList;
import java.util.List;

/**
 * A cross-section of a space.
 *
 * @param x m forward of the aft perpendicular
 * @param loops closed outlines, the first point not repeated
 * @param firstNumber the number of the first loop; the others follow on
 */
record Station(double x, List<List<Point>> loops, int firstNumber) {
    Station {
        loops = List.copyOf(loops);
    }

    static Station of(double x, List<Point> loop) {
        return new Station(x, List.of(loop), 1);
    }

    /** The same section with other loop numbers. */
    Station numberedFrom(int number) {
        return new Station(x, loops, number);
    }

    /** Area within all loops (m2). */
    double area() {
        return loops.stream().mapToDouble(l -> Math.abs(signedArea(l))).sum();
    }

    private static double signedArea(List<Point> loop) {
        double twice = 0;
        Point last = loop.get(loop.size() - 1);
        for (Point point : loop) {
            twice += last.y() * point.z() - point.y() * last.z();
            last = point;
        }
        return twice / 2;
    }

    /** The section a share of the way to another, point by point. */
    Station towards(Station other, double share) {
        List<List<Point>> between = new ArrayList<>();
        for (int i = 0; i < loops.size(); i++) {
            List<Point> loop = new ArrayList<>();
            for (int j = 0; j < loops.get(i).size(); j++) {
                loop.add(loops.get(i).get(j).towards(other.loops.get(i).get(j), share));
            }
            between.add(loop);
        }
        return new Station(x + (other.x - x) * share, between, firstNumber);
    }

    /** The section on the other side of the ship: it keeps its first point, and runs the same way round. */
    Station mirrored() {
        List<List<Point>> turned = new ArrayList<>();
        for (List<Point> loop : loops) {
            List<Point> mirror = new ArrayList<>();
            mirror.add(loop.get(0).mirrored());
            for (int i = loop.size() - 1; i > 0; i--) {
                mirror.add(loop.get(i).mirrored());
            }
            turned.add(mirror);
        }
        return new Station(x, turned, firstNumber);
    }

    /** Both sections as the loops of one. */
    Station and(Station other) {
        List<List<Point>> all = new ArrayList<>(loops);
        all.addAll(other.loops);
        return new Station(x, all, firstNumber);
    }

    /** The lowest point (m above the baseline) of the outline at a distance from the centreline; NaN where it doesn't reach. */
    double floorAt(double y) {
        double lowest = Double.NaN;
        for (List<Point> loop : loops) {
            Point last = loop.get(loop.size() - 1);
            for (Point point : loop) {
                double z = heightOnEdge(last, point, y);
                if (Double.isNaN(lowest) || z < lowest) {
                    lowest = z;
                }
                last = point;
            }
        }
        return lowest;
    }

    private static double heightOnEdge(Point a, Point b, double y) {
        if (y < Math.min(a.y(), b.y()) || y > Math.max(a.y(), b.y())) {
            return Double.NaN;
        }
        return a.y() == b.y() ? Math.min(a.z(), b.z()) : a.z() + (b.z() - a.z()) * (y - a.y()) / (b.y() - a.y());
    }
}
