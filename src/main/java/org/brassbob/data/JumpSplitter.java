// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.brassbob.core.geometry.SpaceShape.Loop;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.brassbob.core.geometry.SpaceShape.Station;

/**
 * Finds the seam where two stations at one x end and begin with the same loop, so that their rows run on as one. A loop that has as many
 * points as the same loop at the station before and at the station after together, and would fit neither, is those two.
 */
final class JumpSplitter {
    private JumpSplitter() {}

    /** Splits what runs on, in the list of stations and in the list of their lines. */
    static void split(List<Station> stations, List<Integer> lines) {
        for (int i = stations.size() - 2; i > 0; i--) {
            Station station = stations.get(i);
            for (int k = 0; k < station.loops().size(); k++) {
                Loop loop = station.loops().get(k);
                int before = points(stations.get(i - 1), loop.number());
                int after = points(stations.get(i + 1), loop.number());
                if (before > 0 && after > 0 && loop.points().size() == before + after) {
                    stations.set(i, aft(station, k, before));
                    stations.add(i + 1, forward(station, k, before));
                    lines.add(i + 1, lines.get(i) + rowsBefore(station, k) + before);
                    break;
                }
            }
        }
    }

    private static int points(Station station, int number) {
        Optional<Loop> loop =
                station.loops().stream().filter(l -> l.number() == number).findFirst();
        return loop.map(l -> l.points().size()).orElse(0);
    }

    private static int rowsBefore(Station station, int loop) {
        return station.loops().subList(0, loop).stream()
                .mapToInt(l -> l.points().size())
                .sum();
    }

    private static Station aft(Station station, int k, int seam) {
        List<Loop> loops = new ArrayList<>(station.loops().subList(0, k));
        loops.add(part(station.loops().get(k), 0, seam));
        return new Station(station.x(), loops);
    }

    private static Station forward(Station station, int k, int seam) {
        List<Loop> loops = new ArrayList<>();
        Loop loop = station.loops().get(k);
        loops.add(part(loop, seam, loop.points().size()));
        loops.addAll(station.loops().subList(k + 1, station.loops().size()));
        return new Station(station.x(), loops);
    }

    private static Loop part(Loop loop, int from, int to) {
        List<Point> points = loop.points().subList(from, to);
        return new Loop(loop.number(), points);
    }
}
