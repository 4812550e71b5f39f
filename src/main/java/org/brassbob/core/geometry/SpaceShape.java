// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import java.util.List;
import org.brassbob.core.table.Origin;

/**
 * A space as given: cross-sections by ascending x, each of one or more closed loops. A loop joins the same-numbered loop of the next
 * station point by point with straight lines. A station given twice at the same x is a jump of the section. What the description
 * means, and whether it is a solid at all, {@link Solid#of} decides.
 *
 * @param stations by ascending x
 * @param origin file and, for each station in turn, the line of its first point
 */
public record SpaceShape(List<Station> stations, Origin origin) {
    public SpaceShape {
        stations = List.copyOf(stations);
    }

    /**
     * A cross-section.
     *
     * @param x m forward of the aft perpendicular
     * @param loops in the order given
     */
    public record Station(double x, List<Loop> loops) {
        public Station {
            loops = List.copyOf(loops);
        }
    }

    /**
     * A closed loop of points; the last joins the first.
     *
     * @param number which loop it is; the same number at the next station joins it
     * @param points in order, either way round
     */
    public record Loop(int number, List<Point> points) {
        public Loop {
            points = List.copyOf(points);
        }
    }

    /**
     * A corner of a section.
     *
     * @param y m to starboard of the centreline
     * @param z m above the baseline
     */
    public record Point(double y, double z) {}
}
