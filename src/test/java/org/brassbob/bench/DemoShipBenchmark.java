// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.bench;

import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.DoubleStream;
import org.brassbob.core.audit.Audit;
import org.brassbob.core.audit.Finding;
import org.brassbob.core.condition.Assessment;
import org.brassbob.core.condition.Assessor;
import org.brassbob.core.contents.TankShapes;
import org.brassbob.core.round.SoundingRound;
import org.brassbob.core.table.Axis;
import org.brassbob.core.tabulate.CalibrationGrid;
import org.brassbob.core.tabulate.CalibrationMaker;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.data.RoundFile;
import org.brassbob.data.VesselFolder;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** The demo ship, 42 spaces: one assessment, reading her folder, an audit, a full calibration. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class DemoShipBenchmark {
    private static final Path HERON = Path.of("vessel-data/heron");

    private Vessel heron = VesselFolder.read(HERON).orElseThrow();
    private SoundingRound observed = round("departure.csv");
    private SoundingRound unobserved = observed;
    private Assessor withTables = Assessor.of(heron);
    private Assessor withShapes = Assessor.of(withoutTables(heron));

    private SoundingRound round(String name) {
        return RoundFile.read(HERON.resolve("rounds").resolve(name), heron).orElseThrow();
    }

    /** Her shapes alone, so that every figure comes from them. */
    private static Vessel withoutTables(Vessel v) {
        List<Tank> bare = v.tanks().stream()
                .map(t -> new Tank(
                        t.id(),
                        t.name(),
                        t.liquid(),
                        t.mayHold(),
                        t.walk(),
                        t.gauge(),
                        t.pipe(),
                        t.capacity(),
                        t.fillLimitPct(),
                        t.residue(),
                        t.use(),
                        t.pair(),
                        t.encloses(),
                        t.steelPct(),
                        t.rateM3PerHour(),
                        t.space(),
                        null,
                        null,
                        t.shape(),
                        t.origin()))
                .toList();
        return new Vessel(
                v.id(),
                v.name(),
                v.particulars(),
                v.lightship(),
                v.seaDensity(),
                v.draughtMarks(),
                v.policy(),
                v.sources(),
                v.hydrostatics(),
                v.limitCurves(),
                v.crossCurves(),
                v.weights(),
                v.liquids(),
                bare,
                v.hull(),
                v.dataSha256());
    }

    @Setup
    public void prepare() {
        observed = round("departure.csv");
        unobserved =
                new SoundingRound("unobserved", SoundingRound.Observed.NOTHING, observed.curve(), observed.readings());
    }

    @Benchmark
    public Assessment assessWithTables() {
        return withTables.assess(observed);
    }

    @Benchmark
    public Assessment assessWithTablesTrimAndListWorkedOut() {
        return withTables.assess(unobserved);
    }

    @Benchmark
    public Assessment assessWithShapes() {
        return withShapes.assess(observed);
    }

    @Benchmark
    public Vessel readTheFolder() {
        return VesselFolder.read(HERON).orElseThrow();
    }

    @Benchmark
    public List<Finding> audit() {
        return Audit.of(heron);
    }

    /** 300 levels × 9 trims of every tank. */
    @Benchmark
    public double fullCalibration() {
        double[] trims = DoubleStream.iterate(-1, t -> t + 0.5).limit(9).toArray();
        CalibrationMaker maker = new CalibrationMaker(84, new CalibrationGrid(Axis.of(trims), Axis.of(0), 300));
        TankShapes shapes = TankShapes.of(heron);
        double sum = 0;
        for (Tank tank : heron.tanks()) {
            var table = maker.soundings(tank, shapes.net(tank.id()).orElseThrow());
            sum += table.map(t -> t.volume(0)).orElse(0.0);
        }
        return sum;
    }
}
