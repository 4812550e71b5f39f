// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.bench;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Random;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;
import org.brassbob.core.contents.TankShapes;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.SoundingTable;
import org.brassbob.core.table.VolumeTable;
import org.brassbob.core.tabulate.CalibrationGrid;
import org.brassbob.core.tabulate.CalibrationMaker;
import org.brassbob.core.tabulate.HullTables;
import org.brassbob.core.tabulate.VolumeTableMaker;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.data.VesselFolder;
import org.brassbob.fixture.Shapes;
import org.brassbob.fixture.TankBuilder;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/**
 * Full calibration of 42 random tanks, 300 readings × 9 trims each, in one thread and in all; and the demo ship's volume tables and the
 * tables of her hull. Her own full calibration is in {@link DemoShipBenchmark}.
 */
@BenchmarkMode(Mode.SingleShotTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@State(Scope.Benchmark)
@Fork(1)
@Warmup(iterations = 3)
@Measurement(iterations = 5)
public class TabulateBenchmark {
    private static final int TANKS = 42;
    private static final CalibrationGrid FULL =
            new CalibrationGrid(Axis.of(-1, -0.5, 0, 0.5, 1, 1.5, 2, 2.5, 3), Axis.of(0), 300);

    private final CalibrationMaker maker = new CalibrationMaker(TankBuilder.LBP, FULL);
    private final Map<String, NetShape> shapes = new TreeMap<>();
    private final List<Tank> random = new ArrayList<>();
    private final List<Tank> demo = new ArrayList<>();
    private final Vessel heron = VesselFolder.read(Path.of("vessel-data/heron")).orElseThrow();

    /** Draws the tanks and reads the demo ship. */
    public TabulateBenchmark() {
        Random seeded = new Random(42);
        for (int i = 0; i < TANKS; i++) {
            RandomTanks.Drawn drawn = RandomTanks.draw(seeded);
            Tank tank = TankBuilder.shaped("r" + i, drawn.shape())
                    .pipe(
                            drawn.pipe().x(),
                            drawn.pipe().y(),
                            drawn.pipe().footZ(),
                            drawn.pipe().length())
                    .build();
            random.add(tank);
            shapes.put(tank.id(), Shapes.net(drawn.shape()));
        }
        TankShapes net = TankShapes.of(heron);
        for (Tank tank : heron.tanks()) {
            demo.add(tank);
            shapes.put(tank.id(), net.net(tank.id()).orElseThrow());
        }
    }

    private NetShape shape(Tank tank) {
        return Objects.requireNonNull(shapes.get(tank.id()));
    }

    private List<SoundingTable> calibrate(boolean together) {
        var stream = together ? random.parallelStream() : random.stream();
        return stream.flatMap(tank -> maker.soundings(tank, shape(tank)).stream())
                .toList();
    }

    @Benchmark
    public List<SoundingTable> randomTanksOneThread() {
        return calibrate(false);
    }

    @Benchmark
    public List<SoundingTable> randomTanksAllThreads() {
        return calibrate(true);
    }

    @Benchmark
    public List<VolumeTable> demoShipVolumeTables() {
        return demo.stream()
                .map(tank -> VolumeTableMaker.of(shape(tank), tank.id()))
                .toList();
    }

    @Benchmark
    public HullTables demoShipHull() {
        return HullTables.of(heron, Objects.requireNonNull(heron.hull()));
    }
}
