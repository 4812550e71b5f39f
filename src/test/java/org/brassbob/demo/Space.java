// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

import java.util.ArrayList;
import java.util.List;

/**
 * A space bounded by cross-sections, joined point by point with straight lines.
 *
 * @param stations by ascending x; two at one x where the section jumps
 */
record Space(List<Station> stations) {
    Space {
        stations = List.copyOf(stations);
    }

    /** The space on the other side of the ship. */
    Space mirrored() {
        return new Space(stations.stream().map(Station::mirrored).toList());
    }

    /**
     * This space and the one that begins where it ends, as one. Loops beyond the jump get new numbers: a file would show no end
     * between two like-numbered loops at one x.
     */
    Space then(Space forward) {
        List<Station> all = new ArrayList<>(stations);
        Station last = stations.get(stations.size() - 1);
        int next = last.firstNumber() + last.loops().size();
        forward.stations.forEach(s -> all.add(s.numberedFrom(next)));
        return new Space(all);
    }

    /** This space and another with the same stations, as one space in two parts. */
    Space and(Space other) {
        List<Station> both = new ArrayList<>();
        for (int i = 0; i < stations.size(); i++) {
            both.add(stations.get(i).and(other.stations.get(i)));
        }
        return new Space(both);
    }

    /** Volume (m3): between stations the area is quadratic in x, so that Simpson's rule is exact. */
    double volume() {
        double sum = 0;
        for (int i = 0; i + 1 < stations.size(); i++) {
            Station aft = stations.get(i);
            Station forward = stations.get(i + 1);
            if (aft.x() < forward.x()) {
                double middle = aft.towards(forward, 0.5).area();
                sum += (forward.x() - aft.x()) / 6 * (aft.area() + 4 * middle + forward.area());
            }
        }
        return sum;
    }

    /**
     * The height of its bottom (m above the baseline) at a place.
     *
     * @throws IllegalArgumentException where the space doesn't reach
     */
    double floorAt(double x, double y) {
        for (int i = 0; i + 1 < stations.size(); i++) {
            Station aft = stations.get(i);
            Station forward = stations.get(i + 1);
            if (aft.x() <= x && x < forward.x()) {
                double floor = aft.towards(forward, (x - aft.x()) / (forward.x() - aft.x()))
                        .floorAt(y);
                if (!Double.isNaN(floor)) {
                    return floor;
                }
            }
        }
        throw new IllegalArgumentException("nothing of the space at x = " + x + ", y = " + y);
    }
}
