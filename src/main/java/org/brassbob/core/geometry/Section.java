// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import java.util.List;
import org.brassbob.core.geometry.SpaceShape.Point;

/** Plane geometry of the loops of a cross-section. */
final class Section {
    private Section() {}

    /** The area (m2) within a loop, positive where it runs from y towards z, negative the other way round. */
    static double area(List<Point> loop) {
        double twice = 0;
        Point last = loop.get(loop.size() - 1);
        Point origin = loop.get(0);
        for (Point point : loop) {
            twice += (last.y() - origin.y()) * (point.z() - origin.z())
                    - (point.y() - origin.y()) * (last.z() - origin.z());
            last = point;
        }
        return twice / 2;
    }

    /** Whether two edges of the loop cross; edges that only touch do not. */
    static boolean crossesItself(List<Point> loop) {
        int n = loop.size();
        for (int i = 0; i < n; i++) {
            for (int j = i + 2; j < n; j++) {
                if (cross(loop.get(i), loop.get(i + 1), loop.get(j), loop.get((j + 1) % n))) {
                    return true;
                }
            }
        }
        return false;
    }

    /** Whether an edge of one loop crosses an edge of another; edges that only touch do not. */
    static boolean crossEachOther(List<Point> a, List<Point> b) {
        for (int i = 0; i < a.size(); i++) {
            for (int j = 0; j < b.size(); j++) {
                if (cross(a.get(i), a.get((i + 1) % a.size()), b.get(j), b.get((j + 1) % b.size()))) {
                    return true;
                }
            }
        }
        return false;
    }

    /** Whether the first loop lies within the second, given that they do not cross: judged by a place well inside the first. */
    static boolean liesWithin(List<Point> inner, List<Point> outer) {
        return new SectionRegion(List.of(inner))
                .placeInside()
                .map(place -> contains(outer, place.y(), place.z()))
                .orElse(false);
    }

    private static boolean contains(List<Point> loop, double y, double z) {
        boolean in = false;
        Point a = loop.get(loop.size() - 1);
        for (Point b : loop) {
            if ((a.z() > z) != (b.z() > z) && y < a.y() + (b.y() - a.y()) * (z - a.z()) / (b.z() - a.z())) {
                in = !in;
            }
            a = b;
        }
        return in;
    }

    private static boolean cross(Point a, Point b, Point c, Point d) {
        double ca = side(c, d, a);
        double cb = side(c, d, b);
        double ac = side(a, b, c);
        double ad = side(a, b, d);
        return ca * cb < 0 && ac * ad < 0;
    }

    /** Which side of the line a-b a point lies; 0 where it lies on it to rounding. */
    private static double side(Point a, Point b, Point p) {
        double dy = b.y() - a.y();
        double dz = b.z() - a.z();
        double py = p.y() - a.y();
        double pz = p.z() - a.z();
        double twice = dy * pz - dz * py;
        double scale = Math.abs(dy * pz) + Math.abs(dz * py);
        return Math.abs(twice) <= 1e-12 * scale ? 0 : twice;
    }
}
