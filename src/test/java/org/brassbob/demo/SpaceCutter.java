// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/** Cuts spaces out of the demo coaster, by bulkheads, flats and the hull itself. */
final class SpaceCutter {
    /** Closer than this (m) to the hull no inner boundary may come. */
    private static final double CLEAR = 0.05;

    private SpaceCutter() {}

    /** A space between planes; y to starboard from {@code inner} to {@code outer}. */
    static Space box(Range x, Range y, Range z) {
        List<Point> loop = List.of(
                new Point(y.from(), z.from()),
                new Point(y.to(), z.from()),
                new Point(y.to(), z.to()),
                new Point(y.from(), z.to()));
        for (double end : List.of(x.from(), x.to())) {
            checkInside(end, loop);
        }
        return new Space(List.of(Station.of(x.from(), loop), Station.of(x.to(), loop)));
    }

    /**
     * A space on the starboard side, out to the hull.
     *
     * @param inner its inner boundary from its bottom to its top, the same all along; both ends on waterlines of the hull
     */
    static Space outboard(Range x, Point... inner) {
        Point bottom = inner[0];
        Point top = inner[inner.length - 1];
        List<Station> stations = new ArrayList<>();
        for (double place : HeronLines.stationsBetween(x.from(), x.to())) {
            List<Point> loop = new ArrayList<>();
            loop.add(bottom);
            loop.addAll(HeronLines.starboard(place, bottom.z(), top.z()));
            for (int i = inner.length - 1; i > 0; i--) {
                loop.add(inner[i]);
            }
            checkInside(place, List.of(inner));
            stations.add(Station.of(place, loop));
        }
        return new Space(stations);
    }

    /** A space from side to side between two waterlines, or from the keel (0) to a waterline. */
    static Space across(Range x, double low, double high) {
        List<Station> stations = new ArrayList<>();
        for (double place : HeronLines.stationsBetween(x.from(), x.to())) {
            List<Point> starboard = HeronLines.starboard(place, low, high);
            List<Point> port =
                    new ArrayList<>(starboard.stream().map(Point::mirrored).toList());
            Collections.reverse(port);
            List<Point> loop = new ArrayList<>(starboard);
            loop.addAll(port);
            stations.add(Station.of(place, loop));
        }
        return new Space(stations);
    }

    /** Refuses a boundary that would pierce the hull. */
    private static void checkInside(double x, List<Point> boundary) {
        Station hull = Station.of(x, section(x));
        for (Point point : boundary) {
            double y = Math.abs(point.y());
            double floor = hull.floorAt(y + CLEAR);
            if (Double.isNaN(floor) || point.z() < floor) {
                throw new IllegalStateException("a boundary at x = " + x + " pierces the hull at " + point);
            }
        }
    }

    private static List<Point> section(double x) {
        List<Point> loop = new ArrayList<>();
        loop.add(new Point(0, HeronLines.keel(x)));
        loop.addAll(HeronLines.starboard(x, 0, HeronLines.DEPTH));
        loop.add(new Point(0, HeronLines.DEPTH));
        return loop;
    }
}
