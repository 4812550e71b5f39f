// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.brassbob.core.geometry.SpaceShape.Point;

/**
 * What loops enclose together, found by lines of equal z between their corners. Loops may touch, and run along each other or
 * themselves, as they do where part of a section shrinks to nothing; what counts is how often each place is gone round.
 */
final class SectionRegion {
    /** Edges closer than this (m) run along each other. */
    private static final double SAME = 1e-9;

    private final List<List<Point>> loops;

    SectionRegion(List<List<Point>> loops) {
        this.loops = loops;
    }

    /** Where an edge passes a line of equal z, and by how much it changes how often one is inside there. */
    private record Passing(double y, int turn) {}

    /**
     * Whether every place is inside once or not at all; the loops must not cross, and those that bound a region from outside run from y
     * towards z, those that bound a hole the other way round.
     */
    boolean isSimple() {
        double[] levels = levels();
        for (int i = 0; i + 1 < levels.length; i++) {
            if (levels[i + 1] - levels[i] > SAME && !isSimple(passings(levels[i], levels[i + 1]))) {
                return false;
            }
        }
        return true;
    }

    private static boolean isSimple(List<Passing> passings) {
        int inside = 0;
        for (int i = 0; i < passings.size(); i++) {
            inside += passings.get(i).turn();
            boolean last = i + 1 == passings.size();
            boolean apart = last || passings.get(i + 1).y() - passings.get(i).y() > SAME;
            if (apart && (inside < 0 || inside > 1)) {
                return false;
            }
        }
        return true;
    }

    /** A place well inside the loops, where they have an area at all. */
    Optional<Point> placeInside() {
        double[] levels = levels();
        double widest = 0;
        Optional<Point> place = Optional.empty();
        for (int i = 0; i + 1 < levels.length; i++) {
            List<Passing> passings = passings(levels[i], levels[i + 1]);
            for (int k = 0; k + 1 < passings.size(); k += 2) {
                double y0 = passings.get(k).y();
                double y1 = passings.get(k + 1).y();
                double size = (y1 - y0) * (levels[i + 1] - levels[i]);
                if (size > widest) {
                    widest = size;
                    place = Optional.of(new Point((y0 + y1) / 2, (levels[i] + levels[i + 1]) / 2));
                }
            }
        }
        return place;
    }

    private double[] levels() {
        return loops.stream()
                .flatMap(List::stream)
                .mapToDouble(Point::z)
                .sorted()
                .distinct()
                .toArray();
    }

    /** The edges that reach from one level to the next, by rising y half way between. */
    private List<Passing> passings(double low, double high) {
        List<Passing> passings = new ArrayList<>();
        double z = (low + high) / 2;
        for (List<Point> loop : loops) {
            Point a = loop.get(loop.size() - 1);
            for (Point b : loop) {
                if (Math.min(a.z(), b.z()) <= low && Math.max(a.z(), b.z()) >= high) {
                    double y = a.y() + (b.y() - a.y()) * (z - a.z()) / (b.z() - a.z());
                    passings.add(new Passing(y, b.z() < a.z() ? 1 : -1));
                }
                a = b;
            }
        }
        passings.sort(Comparator.comparingDouble(Passing::y));
        return passings;
    }
}
