// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.geometry.SpaceShape.Point;

/**
 * The moulded half hull of an invented coaster: sections are superellipses from the keel to full breadth, then straight sides to the
 * deck; keel, breadth, fullness and the height of the turn change along the length.
 */
final class HeronLines {
    static final double DEPTH = 8.2;
    static final double STEM_HEAD = 84.9;

    private static final double HALF_BREADTH = 7.7;
    private static final double RUN_BEGINS = 25;
    private static final double ENTRANCE_BEGINS = 54;
    private static final int TURN_POINTS = 12;
    private static final int SIDE_POINTS = 3;

    private static final double[] STATIONS = {
        -2, -1, 0, 1.5, 3, 4.5, 6, 8, 10, 12, 13, 14, 16, 18, 20, 22, 25, 32, 39, 46, 54, 57, 60, 62, 65, 68, 70, 72,
        74, 76, 77.5, 79, 80.5, 82, 83, 84, 84.5, STEM_HEAD
    };

    private HeronLines() {}

    static double[] stations() {
        return STATIONS.clone();
    }

    /** The half section at any x: keel to deck edge, then the deck at the centreline. Between stations the hull is ruled. */
    static List<Point> section(double x) {
        int i = 0;
        while (i + 2 < STATIONS.length && STATIONS[i + 1] <= x) {
            i++;
        }
        double f = (x - STATIONS[i]) / (STATIONS[i + 1] - STATIONS[i]);
        List<Point> aft = stationSection(STATIONS[i]);
        List<Point> forward = stationSection(STATIONS[i + 1]);
        List<Point> section = new ArrayList<>();
        for (int k = 0; k < aft.size(); k++) {
            section.add(new Point(
                    aft.get(k).y() + f * (forward.get(k).y() - aft.get(k).y()),
                    aft.get(k).z() + f * (forward.get(k).z() - aft.get(k).z())));
        }
        return section;
    }

    private static List<Point> stationSection(double x) {
        double keel = keel(x);
        double breadth = breadth(x);
        double run = Math.max(0, (RUN_BEGINS - x) / (RUN_BEGINS + 2));
        double entrance = Math.max(0, (x - ENTRANCE_BEGINS) / (STEM_HEAD - ENTRANCE_BEGINS));
        double fullness = 5 - 3.4 * Math.pow(run, 0.7) - 3.5 * Math.pow(entrance, 0.6);
        double turn = Math.min(DEPTH - keel, 2.4 + 4.2 * run + 5.4 * entrance);
        List<Point> points = new ArrayList<>();
        for (int i = 0; i < TURN_POINTS; i++) {
            double angle = Math.PI / 2 * i / (TURN_POINTS - 1);
            points.add(new Point(
                    round(breadth * Math.pow(Math.sin(angle), 2 / fullness)),
                    round(keel + turn * (1 - Math.pow(Math.max(0, Math.cos(angle)), 2 / fullness)))));
        }
        for (int i = 1; i <= SIDE_POINTS; i++) {
            points.add(new Point(round(breadth), round(keel + turn + (DEPTH - keel - turn) * i / SIDE_POINTS)));
        }
        points.add(new Point(0, DEPTH));
        return points;
    }

    /** Height of the keel line: it rises to the counter aft and to the stem head forward. */
    private static double keel(double x) {
        if (x < 13) {
            return 4.6 * Math.pow((13 - x) / 15, 1.8);
        }
        return x > 78 ? Math.min(DEPTH, DEPTH * Math.pow((x - 78) / (STEM_HEAD - 78), 2.2)) : 0;
    }

    private static double breadth(double x) {
        if (x < RUN_BEGINS) {
            return HALF_BREADTH * (1 - 0.20 * Math.pow((RUN_BEGINS - x) / 27, 2.4));
        }
        double entrance = Math.max(0, (x - ENTRANCE_BEGINS) / (STEM_HEAD - ENTRANCE_BEGINS));
        return HALF_BREADTH * (1 - Math.pow(entrance, 2.2));
    }

    private static double round(double metres) {
        return Math.rint(metres * 1e4) / 1e4;
    }
}
