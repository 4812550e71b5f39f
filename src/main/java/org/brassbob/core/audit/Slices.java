// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.geometry.SpaceShape.Loop;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.brassbob.core.geometry.SpaceShape.Station;

/** Cross-sections of shapes anywhere between their stations. */
final class Slices {
    private Slices() {}

    /** The loops at x, which must not be a station; none beyond the ends. */
    static List<List<Point>> at(SpaceShape shape, double x) {
        List<List<Point>> loops = new ArrayList<>();
        List<Station> stations = shape.stations();
        for (int i = 0; i + 1 < stations.size(); i++) {
            Station aft = stations.get(i);
            Station forward = stations.get(i + 1);
            if (aft.x() < x && x < forward.x()) {
                double f = (x - aft.x()) / (forward.x() - aft.x());
                for (Loop loop : aft.loops()) {
                    forward.loops().stream()
                            .filter(l -> l.number() == loop.number())
                            .forEach(l -> loops.add(between(loop.points(), l.points(), f)));
                }
            }
        }
        return loops;
    }

    private static List<Point> between(List<Point> a, List<Point> b, double f) {
        List<Point> points = new ArrayList<>();
        for (int i = 0; i < a.size(); i++) {
            points.add(new Point(
                    a.get(i).y() + f * (b.get(i).y() - a.get(i).y()),
                    a.get(i).z() + f * (b.get(i).z() - a.get(i).z())));
        }
        return points;
    }

    /** The same loops on the other side of the ship. */
    static List<List<Point>> mirrored(List<List<Point>> loops) {
        return loops.stream()
                .map(loop -> loop.stream().map(p -> new Point(-p.y(), p.z())).toList())
                .toList();
    }
}
