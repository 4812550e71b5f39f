// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import java.util.List;
import org.brassbob.core.geometry.SpaceShape.Point;

/** Makes sure that the strips between two stations bound a region at both of them and all the way between. */
final class SkinCheck {
    private final int aftStation;
    private final List<Strip> strips;

    /**
     * A check of the strips between two stations.
     *
     * @param aftStation index of the after station
     * @param strips outer ones running from y towards z, holes the other way round
     */
    SkinCheck(int aftStation, List<Strip> strips) {
        this.aftStation = aftStation;
        this.strips = strips;
    }

    void check() throws ShapeException {
        double[] shares = Meetings.between(strips);
        checkAlone(aftStation, 0);
        checkAlone(aftStation + 1, 1);
        for (double share : shares) {
            checkCrossing(share);
        }
        checkTogether(aftStation, 0);
        checkTogether(aftStation + 1, 1);
        for (double share : shares) {
            if (!isSimple(all(share))) {
                throw overlapping("loops overlap");
            }
        }
    }

    private void checkAlone(int station, double share) throws ShapeException {
        for (Strip strip : strips) {
            if (!isSimpleAlone(strip.at(share))) {
                throw new ShapeException(
                        station,
                        "loop " + strip.number() + " at x = " + x(strip, share)
                                + " runs over or through itself; expected a simple outline");
            }
        }
    }

    private void checkTogether(int station, double share) throws ShapeException {
        if (!isSimple(all(share))) {
            throw new ShapeException(
                    station,
                    "loops at x = " + x(strips.get(0), share)
                            + " overlap; expected loops apart or one inside the other");
        }
    }

    private void checkCrossing(double share) throws ShapeException {
        for (int a = 0; a < strips.size(); a++) {
            Strip strip = strips.get(a);
            List<Point> loop = strip.at(share);
            if (Section.crossesItself(loop) || !isSimpleAlone(loop)) {
                throw strip.twisted(aftStation + 1);
            }
            for (Strip other : strips.subList(a + 1, strips.size())) {
                if (Section.crossEachOther(loop, other.at(share))) {
                    throw overlapping("loop " + strip.number() + " and loop " + other.number() + " cross");
                }
            }
        }
    }

    /** Whether one loop alone, run the way of an outer one, is a simple outline. */
    private static boolean isSimpleAlone(List<Point> loop) {
        return isSimple(List.of(Section.area(loop) < 0 ? Strip.reversed(loop) : loop));
    }

    private static boolean isSimple(List<List<Point>> loops) {
        return new SectionRegion(loops).isSimple();
    }

    private List<List<Point>> all(double share) {
        return strips.stream().map(strip -> strip.at(share)).toList();
    }

    private static double x(Strip strip, double share) {
        return share == 0 ? strip.aftX() : strip.forwardX();
    }

    private ShapeException overlapping(String what) {
        return new ShapeException(
                aftStation + 1,
                what + " between x = " + x(strips.get(0), 0) + " and x = " + x(strips.get(0), 1)
                        + "; expected loops apart or one inside the other");
    }
}
