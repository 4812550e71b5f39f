// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.bench;

import java.util.concurrent.TimeUnit;
import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.Immersed;
import org.brassbob.core.geometry.Shapes;
import org.brassbob.core.geometry.Solid;
import org.brassbob.core.geometry.SpaceShape;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** How long the integrals below an inclined surface take, for a wing tank and for a whole hull of 41 stations × 20 points. */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@State(Scope.Benchmark)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class GeometryBenchmark {
    private static final Attitude TILTED = new Attitude(0.8 / 84, Math.tan(Math.toRadians(2.5)));

    /** Which solid. */
    public enum Kind {
        TANK,
        HULL
    }

    @Param({"TANK", "HULL"})
    public Kind kind = Kind.TANK;

    private SpaceShape shape = tank();
    private Solid solid = Shapes.solid(shape);
    private double height;
    private double target;

    @Setup
    public void build() {
        shape = kind == Kind.TANK ? tank() : hull();
        solid = kind == Kind.TANK ? Shapes.solid(shape) : Shapes.solid(shape).mirroredBothSides();
        target = 0.55 * solid.volume();
        height = solid.heightFor(TILTED, target);
    }

    @Benchmark
    public Solid check() {
        return Shapes.solid(shape);
    }

    @Benchmark
    public Immersed below() {
        return solid.below(TILTED, height);
    }

    @Benchmark
    public double volumeBelow() {
        return solid.volumeBelow(TILTED, height);
    }

    @Benchmark
    public double heightFor() {
        return solid.heightFor(TILTED, target);
    }

    private static SpaceShape tank() {
        return Shapes.shape(
                Shapes.station(20, Shapes.loop(1, 3, 0, 6, 0, 7, 1.2, 7, 4, 3, 4)),
                Shapes.station(26, Shapes.loop(1, 3, 0, 5.7, 0, 6.8, 1.2, 6.9, 4, 3, 4)),
                Shapes.station(32, Shapes.loop(1, 3, 0, 5, 0.1, 6.4, 1.3, 6.6, 4, 3, 4)),
                Shapes.station(38, Shapes.loop(1, 3, 0, 4.2, 0.2, 5.6, 1.5, 6, 4, 3, 4)));
    }

    private static SpaceShape hull() {
        return Shapes.halfHull(
                40,
                17,
                84,
                8.2,
                (u, w) -> 7.7 * (1 - Math.pow(2 * u - 1, 4) * (1 - 0.2 * w)) * Math.min(1, Math.sqrt(w + 0.02)));
    }
}
