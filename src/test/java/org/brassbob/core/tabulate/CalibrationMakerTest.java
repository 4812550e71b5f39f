// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.Immersed;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.geometry.Shapes;
import org.brassbob.core.geometry.Solid;
import org.brassbob.core.table.SoundingTable;
import org.brassbob.core.table.VolumeTable;
import org.brassbob.core.vessel.Pipe;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.data.VesselFolder;
import org.junit.jupiter.api.Test;

/** Tables made from shapes hold what the shapes say: at every node exactly, between nodes to a stated part of capacity. */
class CalibrationMakerTest {
    private static final Vessel HERON =
            VesselFolder.read(java.nio.file.Path.of("vessel-data/heron")).orElseThrow();
    private static final double LBP = 84;

    private static SoundingTable made(Tank tank, NetShape shape) {
        return new CalibrationMaker(LBP, CalibrationGrid.USUAL)
                .soundings(tank, shape)
                .orElseThrow();
    }

    private static NetShape net(Tank tank) {
        return org.brassbob.core.contents.TankShapes.of(HERON).net(tank.id()).orElseThrow();
    }

    private static Pipe pipe(Tank tank) {
        return java.util.Objects.requireNonNull(tank.pipe());
    }

    private static double sounding(SoundingTable table, Pipe pipe, double reading) {
        return table.argument() == SoundingTable.Argument.SOUNDING ? reading : pipe.complement(reading);
    }

    @Test
    void everyNodeIsTheShapesOwnVolume() {
        for (Tank tank : HERON.tanks()) {
            if (tank.pipe() == null) {
                continue;
            }
            NetShape shape = net(tank);
            SoundingTable table = made(tank, shape);
            Pipe pipe = pipe(tank);
            for (int t = 0; t < table.trims().size(); t++) {
                for (int h = 0; h < table.heels().size(); h++) {
                    Attitude attitude = Attitude.of(
                            table.trims().value(t), LBP, table.heels().value(h));
                    for (int r = 0; r < table.readings().size(); r += 7) {
                        double depth = sounding(table, pipe, table.readings().value(r));
                        double z0 = attitude.heightThrough(pipe.x(), pipe.y(), pipe.footZ() + depth);
                        assertEquals(
                                shape.volumeBelow(attitude, z0), table.volume(table.node(r, t, h)), 1e-12, tank.id());
                    }
                }
            }
        }
    }

    /** The error of reading linearly between rows, over random readings, trims and lists: worst of all tanks, as a part of capacity. */
    @Test
    void betweenNodesTheErrorIsSmall() {
        Random random = new Random(84);
        double worst = 0;
        double sum = 0;
        int n = 0;
        for (Tank tank : HERON.tanks()) {
            if (tank.pipe() == null) {
                continue;
            }
            NetShape shape = net(tank);
            SoundingTable table = made(tank, shape);
            Pipe pipe = pipe(tank);
            for (int i = 0; i < 200; i++) {
                double trim = -0.5 + 2.5 * random.nextDouble();
                double list = -2 + 4 * random.nextDouble();
                double reading = table.readings().first()
                        + random.nextDouble()
                                * (table.readings().last() - table.readings().first());
                Attitude attitude = Attitude.of(trim, LBP, list);
                double exact = shape.volumeBelow(
                        attitude,
                        attitude.heightThrough(pipe.x(), pipe.y(), pipe.footZ() + sounding(table, pipe, reading)));
                double error = Math.abs(table.volume(reading, trim, list) - exact) / shape.capacity();
                worst = Math.max(worst, error);
                sum += error;
                n++;
            }
        }
        double mean = sum / n;
        double greatest = worst;
        assertTrue(greatest < 0.02 && mean < 0.001, () -> "worst " + greatest + ", mean " + mean);
    }

    @Test
    void theTableReachesFromDryToFullAtEveryTrimAndHeel() {
        for (Tank tank : HERON.tanks()) {
            if (tank.pipe() == null) {
                continue;
            }
            NetShape shape = net(tank);
            SoundingTable table = made(tank, shape);
            Pipe pipe = pipe(tank);
            double first = Math.min(
                    sounding(table, pipe, table.readings().first()),
                    sounding(table, pipe, table.readings().last()));
            assertEquals(0, first, 1e-9, tank.id());
            double deepest = Math.max(
                    sounding(table, pipe, table.readings().first()),
                    sounding(table, pipe, table.readings().last()));
            for (int t = 0; t < table.trims().size(); t++) {
                for (int h = 0; h < table.heels().size(); h++) {
                    double reading = table.argument() == SoundingTable.Argument.SOUNDING
                            ? table.readings().last()
                            : table.readings().first();
                    double volume = table.volume(
                            reading, table.trims().value(t), table.heels().value(h));
                    boolean toTheRim = deepest >= pipe.length() - 1e-4;
                    assertTrue(toTheRim || volume >= shape.capacity() - 1e-9, tank.id());
                }
            }
        }
    }

    @Test
    void aTankWithoutAPipeHasNoSoundingTable() {
        Tank urea = HERON.tank("urea").orElseThrow();
        assertTrue(new CalibrationMaker(LBP, CalibrationGrid.USUAL)
                .soundings(urea, net(urea))
                .isEmpty());
    }

    /** Between its rows a volume table errs by less than it promises, for every tank of the demo ship. */
    @Test
    void volumeTablesErrByMillimetres() {
        Random random = new Random(7);
        for (Tank tank : HERON.tanks()) {
            NetShape shape = net(tank);
            VolumeTable table = VolumeTableMaker.of(shape, tank.id());
            double scale = 0;
            for (int i = 0; i < table.volumes().size(); i++) {
                scale = Math.max(scale, table.row(i).secondMoment());
            }
            for (int i = 0; i < 60; i++) {
                double volume = shape.capacity() * (0.005 + 0.99 * random.nextDouble());
                Immersed exact = shape.holding(Attitude.UPRIGHT, volume);
                VolumeTable.Entry read = table.at(volume);
                String where = tank.id() + " at " + volume;
                assertEquals(exact.lcg(), read.lcg(), 0.012, where);
                assertEquals(exact.tcg(), read.tcg(), 0.012, where);
                assertEquals(exact.vcg(), read.vcg(), 0.006, where);
                assertEquals(exact.surface().transverse(), read.secondMoment(), 0.03 * scale, where);
            }
        }
    }

    /** A tank whose surface jumps at a step has rows on both sides of it. */
    @Test
    void aJumpOfTheSurfaceHasRowsOnBothSides() {
        Solid stepped = Shapes.prism(0, 10, Shapes.loop(1, 0, 0, 2, 0, 2, 1, 6, 1, 6, 3, 0, 3));
        VolumeTable table = VolumeTableMaker.of(new NetShape(stepped, 0), "stepped");
        assertEquals(10 * 8 / 12.0, table.at(19.9).secondMoment(), 1e-9);
        assertEquals(10 * 216 / 12.0, table.at(20.1).secondMoment(), 1e-9);
    }
}
