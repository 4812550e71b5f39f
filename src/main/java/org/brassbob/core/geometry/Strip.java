// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.brassbob.core.geometry.SpaceShape.Point;

/**
 * The part of a loop between two stations.
 *
 * @param number of the loop
 * @param aftX x of the after station
 * @param forwardX x of the forward station
 * @param aft its points at the after station
 * @param forward as many points at the forward station
 */
record Strip(int number, double aftX, double forwardX, List<Point> aft, List<Point> forward) {
    /** Nearer to a station than this share of the way is at it. */
    private static final double NEAR_END = 1e-6;

    /** The section at a share of the way from the after station to the forward one. */
    List<Point> at(double share) {
        if (share == 0 || share == 1) {
            return share == 0 ? aft : forward;
        }
        List<Point> points = new ArrayList<>(aft.size());
        for (int i = 0; i < aft.size(); i++) {
            points.add(between(aft.get(i), forward.get(i), share));
        }
        return points;
    }

    /** The same strip, its loops running the other way round. */
    Strip reversed() {
        return new Strip(number, aftX, forwardX, reversed(aft), reversed(forward));
    }

    /**
     * The share of the way at which the area (positive) is least, where that is neither end: the area is of second degree in the share. Half way
     * where it has no least value in between.
     */
    double leanest() {
        double a = Section.area(aft);
        double b = Section.area(forward);
        double middle = Section.area(at(0.5));
        double bend = 2 * (a + b) - 4 * middle;
        double share = bend > 0 ? (3 * a + b - 4 * middle) / (2 * bend) : 0.5;
        return share > NEAR_END && share < 1 - NEAR_END ? share : 0.5;
    }

    /**
     * Whether the points would match much better if the forward loop began at another of its points: less than half as far apart, as
     * the root of the mean square. Then the loops were begun at different corners, and the skin between them would be wrung.
     */
    boolean startsElsewhere() {
        double asGiven = apart(0);
        for (int shift = 1; shift < aft.size(); shift++) {
            if (4 * apart(shift) < asGiven * (1 - NEAR_END)) {
                return true;
            }
        }
        return false;
    }

    private double apart(int shift) {
        double sum = 0;
        for (int i = 0; i < aft.size(); i++) {
            Point a = aft.get(i);
            Point b = forward.get((i + shift) % aft.size());
            sum += (b.y() - a.y()) * (b.y() - a.y()) + (b.z() - a.z()) * (b.z() - a.z());
        }
        return sum;
    }

    /** The refusal of a strip that turns over on its way. */
    ShapeException twisted(int forwardStation) {
        return new ShapeException(
                forwardStation,
                "loop " + number + " at x = " + forwardX + " does not match the station before point by point: "
                        + "the skin crosses itself between them");
    }

    private static Point between(Point a, Point b, double share) {
        return new Point(a.y() + (b.y() - a.y()) * share, a.z() + (b.z() - a.z()) * share);
    }

    static List<Point> reversed(List<Point> points) {
        List<Point> turned = new ArrayList<>(points);
        Collections.reverse(turned);
        return turned;
    }
}
