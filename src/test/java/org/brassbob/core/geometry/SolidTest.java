// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.brassbob.core.geometry.SpaceShape.Loop;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.brassbob.core.geometry.SpaceShape.Station;
import org.brassbob.core.table.Origin;
import org.junit.jupiter.api.Test;

class SolidTest {
    private static SpaceShape box(double l, double b, double d) {
        List<Point> section = List.of(new Point(0, 0), new Point(b, 0), new Point(b, d), new Point(0, d));
        return new SpaceShape(
                List.of(new Station(0, List.of(new Loop(1, section))), new Station(l, List.of(new Loop(1, section)))),
                Origin.computed("box"));
    }

    @Test
    void boxHalfFull() throws ShapeException {
        Solid box = Solid.of(box(10, 6, 4));
        Immersed half = box.below(Attitude.UPRIGHT, 2);
        assertEquals(240, box.volume(), 1e-12);
        assertEquals(120, half.volume(), 1e-12);
        assertEquals(1, half.vcg(), 1e-12);
        assertEquals(10 * 6 * 6 * 6 / 12.0, half.surface().transverse(), 1e-10);
        Attitude tilted = new Attitude(0.02, 0.05);
        double z = box.heightFor(tilted, 77);
        Immersed part = box.below(tilted, z);
        assertEquals(77, part.volume(), 1e-9);
        assertEquals(
                60 * Math.sqrt(1 + 0.02 * 0.02 + 0.05 * 0.05), part.surface().area(), 1e-10);
    }
}
