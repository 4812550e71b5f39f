// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

import java.util.ArrayList;
import java.util.List;

/**
 * The moulded hull of the demo coaster up to her main deck, from the transom to the stem.
 *
 * <p>A half-section is flat from the centreline to {@link #FLAT}, rises along a quarter of an ellipse (hollowed towards the ends) to
 * the breadth {@link #SIDE} at the height {@link #BILGE} above the keel, and goes straight from there to the deck edge. Amidships that
 * is a bilge of 1.5 m radius under a vertical side. The hull that counts is the one between {@link #STATIONS}, joined by straight
 * lines: its corners stand on the same waterlines everywhere, so that a space cut at a waterline lies in it exactly.
 */
final class HeronLines {
    static final double DEPTH = 8.2;

    private static final double[] STATIONS = {
        -3.4, -2, -1, 0, 1.5, 3, 4.2, 5.4, 6.6, 8.4, 10.2, 12, 14.4, 16.8, 19.2, 21.6, 24, 27, 33, 42, 51, 57, 60, 63,
        66, 69, 72, 74.4, 76.8, 79.2, 80.4, 81.6, 82.8, 83.4, 84, 84.5, 85
    };

    /** Above the keel: those of the bilge follow its curve, the others are decks and flats, and heights between them. */
    private static final double[] WATERLINES = {0.08, 0.3, 0.65, 1.1, 1.5, 2.4, 3.4, 4.4, 5.2, 5.9, 7, DEPTH};

    private static final Curve KEEL = Curve.through(
            -3.4, 6.1, 0, 5.4, 3, 4.6, 4.2, 2.7, 5.4, 0.6, 6.6, 0, 79.2, 0, 80.4, 0.3, 81.6, 1.2, 82.8, 3, 84, 5.9, 85,
            8.2);
    private static final Curve FLAT = Curve.through(
            -3.4, 1.6, 0, 1.2, 3, 0.4, 5.4, 0.1, 6.6, 0.2, 8.4, 0.7, 10.2, 1.2, 12, 1.8, 14.4, 2.6, 16.8, 3.6, 19.2,
            4.6, 21.6, 5.4, 24, 5.9, 27, 6.2, 57, 6.2, 60, 6, 63, 5.4, 66, 4.4, 69, 3.2, 72, 2.1, 74.4, 1.3, 76.8, 0.6,
            79.2, 0.15, 80.4, 0, 85, 0);
    private static final Curve BILGE = Curve.through(
            -3.4, 1, 0, 1.3, 3, 1.8, 4.2, 3.5, 5.4, 5.5, 6.6, 6.1, 10.2, 5.6, 14.4, 4.6, 19.2, 2.9, 24, 1.7, 27, 1.5,
            57, 1.5, 60, 1.6, 66, 2.4, 72, 4.2, 76.8, 6, 79.2, 6.6, 80.4, 6.6, 81.6, 5.9, 82.8, 4.3, 84, 1.6, 85, 0);
    private static final Curve SIDE = Curve.through(
            -3.4, 4.3, 0, 4.9, 3, 5.4, 6.6, 6, 10.2, 6.6, 14.4, 7.2, 19.2, 7.6, 24, 7.7, 57, 7.7, 63, 7.6, 66, 7.4, 69,
            6.95, 72, 6.2, 74.4, 5.3, 76.8, 4.2, 79.2, 2.9, 80.4, 2.2, 81.6, 1.6, 82.8, 1, 84, 0.4, 85, 0);
    private static final Curve DECK = Curve.through(
            -3.4, 5.8, 0, 6.4, 6.6, 7, 14.4, 7.55, 19.2, 7.7, 66, 7.7, 69, 7.55, 72, 7.15, 74.4, 6.6, 76.8, 5.8, 79.2,
            4.7, 81.6, 3.2, 82.8, 2.3, 84, 1.2, 84.5, 0.7, 85, 0);
    private static final Curve HOLLOW = Curve.through(
            -3.4, 1, 0, 1.1, 3, 1.6, 4.2, 2.6, 6.6, 3.2, 10.2, 2.5, 14.4, 1.7, 19.2, 1.2, 24, 1, 63, 1, 72, 1.2, 79.2,
            1.7, 84, 1.5, 85, 1.5);

    private HeronLines() {}

    /** The half-sections of the hull, starboard side, closed along the centreline and the deck. */
    static Space hull() {
        List<Station> sections = new ArrayList<>();
        for (double x : STATIONS) {
            List<Point> loop = new ArrayList<>();
            loop.add(new Point(0, keel(x)));
            loop.addAll(starboard(x, 0, DEPTH));
            loop.add(new Point(0, DEPTH));
            sections.add(Station.of(x, loop));
        }
        return new Space(sections);
    }

    /** The stations of the hull between two places, and those places themselves. */
    static List<Double> stationsBetween(double aft, double forward) {
        List<Double> between = new ArrayList<>();
        between.add(aft);
        for (double x : STATIONS) {
            if (x > aft && x < forward) {
                between.add(x);
            }
        }
        between.add(forward);
        return between;
    }

    /**
     * The hull's corners at a place from one waterline to a higher one, starboard side.
     *
     * @param low one of the waterlines; 0 for the bottom, beginning at the end of its flat
     * @param high one of the waterlines
     */
    static List<Point> starboard(double x, double low, double high) {
        int i = 0;
        while (i + 2 < STATIONS.length && x >= STATIONS[i + 1]) {
            i++;
        }
        double share = (x - STATIONS[i]) / (STATIONS[i + 1] - STATIONS[i]);
        List<Point> points = new ArrayList<>();
        if (low == 0) {
            points.add(between(i, share, 0));
        }
        for (double z : WATERLINES) {
            if (z >= low && z <= high) {
                points.add(between(i, share, z));
            }
        }
        return points;
    }

    /** The height of the keel (m above the baseline). */
    static double keel(double x) {
        return starboard(x, 0, 0).get(0).z();
    }

    private static Point between(int station, double share, double z) {
        return corner(STATIONS[station], z).towards(corner(STATIONS[station + 1], z), share);
    }

    /** A corner at a station, to 0.1 mm as it is written; a waterline below the keel falls together with the end of the flat. */
    private static Point corner(double x, double z) {
        double keel = KEEL.at(x);
        double flat = FLAT.at(x);
        double height = z - keel;
        if (height <= 0) {
            return rounded(flat, keel);
        }
        double bilge = BILGE.at(x);
        double side = SIDE.at(x);
        if (height < bilge) {
            double up = 1 - height / bilge;
            double out = Math.pow(1 - up * up, HOLLOW.at(x) / 2);
            return rounded(flat + (side - flat) * out, z);
        }
        double above = DEPTH - keel - bilge;
        double flare = above <= 0 ? 1 : (height - bilge) / above;
        return rounded(side + (DECK.at(x) - side) * flare, z);
    }

    private static Point rounded(double y, double z) {
        return new Point(Math.rint(y * 1e4) / 1e4, Math.rint(z * 1e4) / 1e4);
    }
}
