// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.Immersed;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.geometry.Shapes;
import org.brassbob.core.geometry.Solid;
import org.brassbob.core.geometry.SpaceShape.Loop;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.brassbob.core.geometry.SpaceShape.Station;
import org.brassbob.core.table.VolumeTable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Volume tables against closed forms, and how far linear reading between their rows is off. */
class VolumeTableMakerTest {
    private static VolumeTable table(Solid solid) {
        return VolumeTableMaker.of(new NetShape(solid, 0), "test");
    }

    /** Box: centroid at half the depth, i = l·b³/12 at every level, the last row included: just under the top there is a surface. */
    @Test
    void box() {
        VolumeTable table = table(Shapes.box(10, 16, 2, 6, 1, 4));
        assertEquals(0, table.volumes().first());
        assertEquals(72, table.volumes().last());
        for (double volume : new double[] {0, 1.7, 36, 71.9, 72}) {
            VolumeTable.Entry e = table.at(volume);
            assertEquals(13, e.lcg(), 1e-9);
            assertEquals(4, e.tcg(), 1e-9);
            assertEquals(1 + volume / 48, e.vcg(), 2e-6);
            assertEquals(6 * 64 / 12.0, e.secondMoment(), 1e-9);
        }
    }

    /** Structure takes its share of the volume: the table ends at the net capacity, its rows keep their places in height. */
    @Test
    void structureShortensTheTable() {
        VolumeTable table = VolumeTableMaker.of(new NetShape(Shapes.box(0, 10, 0, 4, 0, 2), 2.5), "test");
        assertEquals(78, table.volumes().last());
        assertEquals(1, table.at(78).vcg(), 2e-6);
        assertEquals(0.5, table.at(39).vcg(), 2e-6);
    }

    /** V bottom, closed form: breadth 2·z, so V = l·z², vcg = 2·z/3, i = l·(2·z)³/12. */
    @Test
    void wedge() {
        double length = 8;
        VolumeTable table = table(Shapes.prism(0, length, Shapes.loop(1, 0, 0, 3, 3, -3, 3)));
        double greatest = length * 216 / 12;
        for (double share = 0.02; share < 1; share += 0.013) {
            double volume = share * length * 9;
            double z = Math.sqrt(volume / length);
            assertEquals(0, table.at(volume).tcg(), 1e-9);
            assertEquals(2 * z / 3, table.at(volume).vcg(), 0.003);
            assertEquals(length * 8 * z * z * z / 12, table.at(volume).secondMoment(), 0.006 * greatest);
        }
    }

    /** Lying cylinder as a polygon of 72 sides; half full its surface is that of the diameter: i = l·(2·r)³/12, centroid r − 4·r/(3·π). */
    @Test
    void lyingCylinder() {
        double radius = 1.5;
        double length = 6;
        List<Point> ring = new ArrayList<>();
        for (int i = 0; i < 72; i++) {
            double angle = Math.toRadians(5.0 * i);
            ring.add(new Point(radius * Math.sin(angle), radius - radius * Math.cos(angle)));
        }
        Loop loop = new Loop(1, ring);
        Solid cylinder = Shapes.solid(new Station(0, List.of(loop)), new Station(length, List.of(loop)));
        VolumeTable.Entry half = table(cylinder).at(cylinder.volume() / 2);
        assertEquals(length * Math.pow(2 * radius, 3) / 12, half.secondMoment(), 1e-4);
        // The polygon's half is a little lighter at the rim than the circle's: 0.13 % of 4·r/(3·π).
        assertEquals(radius - 4 * radius / (3 * Math.PI), half.vcg(), 1e-3);
    }

    /** Wherever a step falls between the litres of the file, the surface jumps within 4 litres of it and is right on either side. */
    @ParameterizedTest
    @ValueSource(doubles = {1, 0.99998, 1.00002, 0.99996, 0.987654321, 1.23456789, 1.499999, 2.0000001})
    void aJumpOfTheSurfaceStaysInItsPlace(double step) {
        double corner = 20 * step;
        VolumeTable widening = table(Shapes.prism(0, 10, Shapes.loop(1, 0, 0, 2, 0, 2, step, 6, step, 6, 3, 0, 3)));
        VolumeTable narrowing =
                table(Shapes.prism(0, 10, Shapes.loop(1, 0, 0, 6, 0, 6, 3 - step, 2, 3 - step, 2, 3, 0, 3)));
        double under = 10 * 8 / 12.0;
        double over = 10 * 216 / 12.0;
        double ledge = 60 * (3 - step);
        for (double off : new double[] {0.004, 0.01, 0.1, 1, 5}) {
            assertEquals(under, widening.at(corner - off).secondMoment(), 1e-7, "under by " + off);
            assertEquals(over, widening.at(corner + off).secondMoment(), 1e-7, "over by " + off);
            assertEquals(over, narrowing.at(ledge - off).secondMoment(), 1e-7, "under by " + off);
            assertEquals(under, narrowing.at(ledge + off).secondMoment(), 1e-7, "over by " + off);
        }
    }

    /** A tank in the tank: between its bottom and its top the surface has an island, by parallel axes. */
    @Test
    void aSurfaceWithAnIsland() {
        Solid outer = Shapes.box(0, 10, 0, 8, 0, 4);
        Solid inner = Shapes.box(2, 5, 1, 3, 1, 2);
        VolumeTable table = table(outer.minus(inner));
        double area = 80 - 6;
        double y = (80 * 4 - 6 * 2) / area;
        double island = 10 * 512 / 12.0 + 80 * (4 - y) * (4 - y) - (3 * 8 / 12.0 + 6 * (2 - y) * (2 - y));
        assertEquals(10 * 512 / 12.0, table.at(79.9).secondMoment(), 1e-9);
        assertEquals(island, table.at(80.1).secondMoment(), 1e-9);
        assertEquals(island, table.at(80 + area - 0.1).secondMoment(), 1e-9);
        assertEquals(10 * 512 / 12.0, table.at(80 + area + 0.1).secondMoment(), 1e-9);
        assertEquals(320 - 6, table.volumes().last());
    }

    /**
     * What linear reading does at its worst: in a tank that comes to a point the centroid leaves the point with the cube root of the
     * volume, faster than rows can follow. The moment of what is held is still near: the centroid's error times the volume stays under
     * 2 mm of the whole tank.
     */
    @Test
    void nearAPointTheMomentStaysNear() {
        Solid peak = Shapes.solid(
                Shapes.station(0, Shapes.loop(1, -3, 5, 3, 5, 0, 0)),
                Shapes.station(6, Shapes.loop(1, 0, 5, 0, 5, 0, 4.999)));
        NetShape shape = new NetShape(peak, 0);
        VolumeTable table = VolumeTableMaker.of(shape, "peak");
        for (double share = 1e-4; share < 1; share *= 1.07) {
            double volume = share * shape.capacity();
            Immersed exact = shape.holding(Attitude.UPRIGHT, volume);
            VolumeTable.Entry read = table.at(volume);
            String where = "at " + share;
            assertEquals(exact.lcg() * share, read.lcg() * share, 0.002, where);
            assertEquals(exact.vcg() * share, read.vcg() * share, 0.002, where);
        }
    }

    /** Small tanks: three litres between rows at least, and both ends. */
    @Test
    void aSmallTank() {
        VolumeTable table = table(Shapes.box(0, 0.3, 0, 0.3, 0, 0.5));
        assertEquals(0, table.volumes().first());
        assertEquals(0.045, table.volumes().last());
        for (int i = 1; i < table.volumes().size(); i++) {
            assertTrue(table.volumes().value(i) - table.volumes().value(i - 1) > 0.0025);
        }
    }
}
