// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.geometry.SpaceShape.Loop;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.brassbob.core.geometry.SpaceShape.Station;
import org.brassbob.core.table.Origin;
import org.brassbob.core.vessel.Pipe;

/** Random but plausible tanks: a flat top and inboard side, a curved outboard side that narrows and rises along the length. */
public final class RandomTanks {
    private RandomTanks() {}

    /**
     * A tank's shape and a pipe near its after inboard corner, long enough for every trim.
     *
     * @param shape 6 to 12 stations of 8 to 16 points
     * @param pipe from just above the bottom to 3 m over the top
     */
    public record Drawn(SpaceShape shape, Pipe pipe) {}

    /** The next tank of a row of them. */
    public static Drawn draw(Random random) {
        int stations = 6 + random.nextInt(7);
        int points = 8 + random.nextInt(9);
        double x0 = 70 * random.nextDouble();
        double length = 4 + 14 * random.nextDouble();
        double inner = 4 * random.nextDouble();
        double breadth = 1.5 + 5 * random.nextDouble();
        double foot = 2 * random.nextDouble();
        double height = 1 + 5 * random.nextDouble();
        double taper = 0.6 * random.nextDouble();
        double rise = 0.3 * random.nextDouble();
        double bulge = 0.5 + random.nextDouble();
        int side = random.nextBoolean() ? 1 : -1;
        List<Station> all = new ArrayList<>();
        for (int i = 0; i < stations; i++) {
            double f = (double) i / (stations - 1);
            List<Point> section = new ArrayList<>();
            section.add(new Point(side * inner, foot + height * rise * f * f));
            int outboard = points - 2;
            for (int k = 0; k < outboard; k++) {
                double w = (double) k / (outboard - 1);
                double out = breadth * (1 - taper * f * f) * (0.4 + 0.6 * Math.pow(w, bulge));
                double z = foot + height * (rise * f * f * (1 - w) + w);
                section.add(new Point(side * (inner + out), z));
            }
            section.add(new Point(side * inner, foot + height));
            all.add(new Station(x0 + length * f, List.of(new Loop(1, section))));
        }
        Pipe pipe = new Pipe(x0 + 0.3, side * (inner + 0.2), foot + 0.02, height + 3);
        return new Drawn(new SpaceShape(all, Origin.computed("random tank")), pipe);
    }
}
