// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import static org.brassbob.core.audit.Findings.show;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.brassbob.core.geometry.SpaceShape.Station;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Vessel;

/**
 * Tanks don't overlap, what a tank encloses lies wholly inside it, and all lie inside the hull. Sections are compared at two places
 * between each two stations of either shape (Gauss), their common areas exactly; walls that touch have no area in common.
 */
final class OverlapCheck {
    private static final double[] GAUSS = {0.5 - Math.sqrt(1.0 / 12), 0.5 + Math.sqrt(1.0 / 12)};
    private static final double TOLERANCE = 0.01;
    private static final double TOLERANCE_SHARE = 0.001;

    /** Tanks drawn to the shell follow it between stations less closely than each other (share of their volume). */
    private static final double SHELL_SHARE = 0.005;

    private final Vessel vessel;
    private final Findings findings;
    private final List<Tank> shaped;

    private OverlapCheck(Vessel vessel, Findings findings) {
        this.vessel = vessel;
        this.findings = findings;
        this.shaped = vessel.tanks().stream().filter(t -> t.shape() != null).toList();
    }

    static void check(Vessel vessel, Findings findings) {
        OverlapCheck check = new OverlapCheck(vessel, findings);
        check.pairs();
        SpaceShape hull = vessel.hull();
        if (hull != null) {
            check.shaped.forEach(t -> check.insideHull(t, hull));
        }
    }

    private void pairs() {
        for (int i = 0; i < shaped.size(); i++) {
            for (int j = i + 1; j < shaped.size(); j++) {
                Tank a = shaped.get(i);
                Tank b = shaped.get(j);
                if (a.encloses().contains(b.id())) {
                    insideOther(a, b);
                } else if (b.encloses().contains(a.id())) {
                    insideOther(b, a);
                } else {
                    apart(a, b);
                }
            }
        }
    }

    private void apart(Tank a, Tank b) {
        double common = commonVolume(shape(a), shape(b));
        double smaller = Math.min(a.capacity(), b.capacity());
        if (common > Math.max(TOLERANCE, TOLERANCE_SHARE * smaller)) {
            findings.error(
                    a.origin(),
                    0,
                    "shapes of " + a.id() + " and " + b.id() + " overlap",
                    show(common) + " m3 in common",
                    "none, or " + a.id() + " or " + b.id() + " to enclose the other");
        }
    }

    private void insideOther(Tank outer, Tank inner) {
        double volume = commonVolume(shape(inner), shape(inner));
        double outside = volume - commonVolume(shape(outer), shape(inner));
        if (outside > Math.max(TOLERANCE, TOLERANCE_SHARE * volume)) {
            findings.error(
                    outer.origin(),
                    0,
                    "shape of " + inner.id() + " sticks out of " + outer.id() + ", which encloses it",
                    show(outside) + " m3 outside",
                    "none");
        }
    }

    private void insideHull(Tank tank, SpaceShape hull) {
        SpaceShape shape = shape(tank);
        double outside = 0;
        for (double[] place : places(shape, hull)) {
            List<List<Point>> section = Slices.at(shape, place[0]);
            if (!section.isEmpty()) {
                List<List<Point>> half = Slices.at(hull, place[0]);
                double inside = ScanLines.common(section, half) + ScanLines.common(Slices.mirrored(section), half);
                outside += place[1] * (ScanLines.area(section) - inside);
            }
        }
        if (outside > Math.max(TOLERANCE, SHELL_SHARE * tank.capacity())) {
            findings.error(
                    tank.origin(),
                    0,
                    "shape of " + tank.id() + " sticks out of the hull of " + vessel.id(),
                    show(outside) + " m3 outside",
                    "none");
        }
    }

    private static SpaceShape shape(Tank tank) {
        SpaceShape shape = tank.shape();
        if (shape == null) {
            throw new IllegalStateException("tank " + tank.id() + " has no shape");
        }
        return shape;
    }

    private static double commonVolume(SpaceShape a, SpaceShape b) {
        boolean apart = last(a) <= first(b) || last(b) <= first(a);
        double volume = 0;
        for (double[] place : apart ? List.<double[]>of() : places(a, b)) {
            List<List<Point>> sectionA = Slices.at(a, place[0]);
            List<List<Point>> sectionB = Slices.at(b, place[0]);
            if (!sectionA.isEmpty() && !sectionB.isEmpty()) {
                volume += place[1] * ScanLines.common(sectionA, sectionB);
            }
        }
        return volume;
    }

    private static double first(SpaceShape shape) {
        return shape.stations().get(0).x();
    }

    private static double last(SpaceShape shape) {
        return shape.stations().get(shape.stations().size() - 1).x();
    }

    /** Where sections are compared, and the length that each stands for. */
    private static List<double[]> places(SpaceShape a, SpaceShape b) {
        TreeSet<Double> xs = new TreeSet<>();
        for (SpaceShape shape : List.of(a, b)) {
            for (Station station : shape.stations()) {
                xs.add(station.x());
            }
        }
        List<double[]> places = new ArrayList<>();
        double before = xs.first();
        for (double x : xs.tailSet(before, false)) {
            for (double share : GAUSS) {
                places.add(new double[] {before + share * (x - before), (x - before) / 2});
            }
            before = x;
        }
        return places;
    }
}
