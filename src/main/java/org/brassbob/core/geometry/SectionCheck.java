// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.brassbob.core.geometry.SpaceShape.Loop;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.brassbob.core.geometry.SpaceShape.Station;

/**
 * Decides whether sections describe a solid, and turns them into strips: the part of one loop between two stations, all running the
 * same way round. A loop inside another is a hole in it (inside a hole, solid again), and its strip runs the other way.
 */
final class SectionCheck {
    /** Below this a loop has no area (m2). */
    private static final double NO_AREA = 1e-12;

    private final SpaceShape shape;

    private SectionCheck(SpaceShape shape) {
        this.shape = shape;
    }

    static List<Strip> check(SpaceShape shape) throws ShapeException {
        return new SectionCheck(shape).strips();
    }

    private List<Strip> strips() throws ShapeException {
        List<Station> stations = shape.stations();
        if (stations.size() < 2) {
            throw new ShapeException(0, "one station only; expected two or more");
        }
        for (int i = 0; i < stations.size(); i++) {
            checkPosition(i);
        }
        for (int i = 0; i < stations.size(); i++) {
            checkLoops(i);
        }
        List<Strip> strips = new ArrayList<>();
        for (int i = 0; i + 1 < stations.size(); i++) {
            if (stations.get(i).x() < stations.get(i + 1).x()) {
                strips.addAll(between(i));
            }
        }
        return strips;
    }

    private void checkLoops(int i) throws ShapeException {
        Station station = shape.stations().get(i);
        Map<Integer, Loop> byNumber = new TreeMap<>();
        for (Loop loop : station.loops()) {
            if (byNumber.put(loop.number(), loop) != null) {
                throw new ShapeException(i, where(i, loop.number()) + " is given twice; expected it once");
            }
            if (loop.points().size() < 3) {
                throw new ShapeException(
                        i, where(i, loop.number()) + " has " + loop.points().size() + " points; expected 3 or more");
            }
            if (Section.crossesItself(loop.points())) {
                throw new ShapeException(i, where(i, loop.number()) + " crosses itself; expected a simple outline");
            }
            checkJoinsSomething(i, loop);
        }
        checkApart(i, station.loops());
    }

    private void checkPosition(int i) throws ShapeException {
        List<Station> stations = shape.stations();
        double x = stations.get(i).x();
        if (stations.get(i).loops().isEmpty()) {
            throw new ShapeException(i, "no loop at x = " + x + "; expected one or more");
        }
        if (i > 0 && stations.get(i - 1).x() > x) {
            throw new ShapeException(
                    i, "x = " + x + " after " + stations.get(i - 1).x() + "; expected ascending x");
        }
        boolean jump = i > 0 && stations.get(i - 1).x() == x;
        if (jump && (i == 1 || i == stations.size() - 1)) {
            throw new ShapeException(i, "two stations at the end x = " + x + "; expected one");
        }
        if (jump && i > 1 && stations.get(i - 2).x() == x) {
            throw new ShapeException(i, "three stations at x = " + x + "; expected two at the most");
        }
    }

    /** A loop needs its number at a neighbouring station; otherwise it is a sheet and the shape is open. */
    private void checkJoinsSomething(int i, Loop loop) throws ShapeException {
        if (!hasNeighbour(i, i - 1, loop.number()) && !hasNeighbour(i, i + 1, loop.number())) {
            throw new ShapeException(
                    i,
                    where(i, loop.number()) + " joins no loop " + loop.number() + " at a neighbouring station: open");
        }
    }

    private boolean hasNeighbour(int i, int j, int number) {
        List<Station> stations = shape.stations();
        return j >= 0
                && j < stations.size()
                && stations.get(j).x() != stations.get(i).x()
                && stations.get(j).loops().stream().anyMatch(l -> l.number() == number);
    }

    private void checkApart(int i, List<Loop> loops) throws ShapeException {
        for (int a = 0; a < loops.size(); a++) {
            for (int b = a + 1; b < loops.size(); b++) {
                if (Section.crossEachOther(loops.get(a).points(), loops.get(b).points())) {
                    throw new ShapeException(
                            i,
                            where(i, loops.get(a).number()) + " crosses loop "
                                    + loops.get(b).number() + "; expected loops apart or one inside the other");
                }
            }
        }
    }

    private List<Strip> between(int i) throws ShapeException {
        Station aft = shape.stations().get(i);
        Station forward = shape.stations().get(i + 1);
        List<Strip> raw = new ArrayList<>();
        for (Loop loop : aft.loops()) {
            for (Loop next : forward.loops()) {
                if (next.number() == loop.number()) {
                    raw.add(strip(i, aft.x(), forward.x(), loop, next));
                }
            }
        }
        if (raw.isEmpty()) {
            throw new ShapeException(
                    i + 1,
                    "no loop at x = " + forward.x() + " joins one at x = " + aft.x() + ": the shape is in two parts");
        }
        List<Strip> turned = new ArrayList<>();
        for (Strip strip : raw) {
            turned.add(depth(strip, raw) % 2 == 0 ? strip : strip.reversed());
        }
        new SkinCheck(i, turned).check();
        return turned;
    }

    private Strip strip(int i, double aftX, double forwardX, Loop loop, Loop next) throws ShapeException {
        if (loop.points().size() != next.points().size()) {
            throw new ShapeException(
                    i + 1,
                    where(i + 1, next.number()) + " has " + next.points().size() + " points; expected "
                            + loop.points().size() + " as at the station before");
        }
        Strip strip = new Strip(loop.number(), aftX, forwardX, loop.points(), next.points());
        Strip outer = runsFromYTowardsZ(i, strip) ? strip : strip.reversed();
        if (Section.area(outer.at(outer.leanest())) < NO_AREA) {
            throw strip.twisted(i + 1);
        }
        if (strip.startsElsewhere()) {
            throw new ShapeException(
                    i + 1,
                    where(i + 1, next.number())
                            + " starts at another corner than at the station before; expected matching points in the same order");
        }
        return outer;
    }

    private boolean runsFromYTowardsZ(int i, Strip strip) throws ShapeException {
        double aftArea = Section.area(strip.aft());
        double forwardArea = Section.area(strip.forward());
        boolean flatAft = Math.abs(aftArea) < NO_AREA;
        boolean flatForward = Math.abs(forwardArea) < NO_AREA;
        if (flatAft && flatForward) {
            throw new ShapeException(
                    i + 1, where(i + 1, strip.number()) + " has no area here nor at the station before: degenerate");
        }
        if (!flatAft && !flatForward && aftArea * forwardArea < 0) {
            throw new ShapeException(
                    i + 1, where(i + 1, strip.number()) + " runs the other way round than at the station before");
        }
        return (flatAft ? forwardArea : aftArea) > 0;
    }

    /** How many other loops this one lies in half way; {@link SkinCheck} makes sure that it is so all the way. */
    private static int depth(Strip strip, List<Strip> strips) {
        List<Point> inner = strip.at(0.5);
        int depth = 0;
        for (Strip other : strips) {
            List<Point> outer = other.at(0.5);
            if (Math.abs(Section.area(inner)) < Math.abs(Section.area(outer)) && Section.liesWithin(inner, outer)) {
                depth++;
            }
        }
        return depth;
    }

    private String where(int station, int loop) {
        return "loop " + loop + " at x = " + shape.stations().get(station).x();
    }
}
