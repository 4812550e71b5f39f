// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.bench;

import java.util.concurrent.TimeUnit;
import org.brassbob.core.condition.Assessment;
import org.brassbob.core.condition.Assessor;
import org.brassbob.core.round.SoundingRound;
import org.brassbob.core.working.WorkingRecord;
import org.brassbob.fixture.RoundBuilder;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;

/** One assessment of a ship of 42 tanks and 20 weights, warm. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
public class AssessBenchmark {
    private final Assessor tabled = BenchShip.tabled().assessor();
    private final Assessor shaped = BenchShip.shaped().assessor();
    private final SoundingRound observed =
            BenchShip.round(RoundBuilder.round().trim(0.83).list(-0.6), 0).build();
    private final SoundingRound unobserved =
            BenchShip.round(RoundBuilder.round(), 0).build();
    private final SoundingRound twoUnknown =
            BenchShip.round(RoundBuilder.round().trim(0.83).list(-0.6), 2).build();
    private final SoundingRound unobservedTwoUnknown =
            BenchShip.round(RoundBuilder.round(), 2).build();
    private final SoundingRound[] trims = trims();
    private int next;

    private static SoundingRound[] trims() {
        SoundingRound[] rounds = new SoundingRound[64];
        for (int i = 0; i < rounds.length; i++) {
            rounds[i] = BenchShip.round(RoundBuilder.round().trim(0.02 * i).list(-0.6), 0)
                    .build();
        }
        return rounds;
    }

    @Benchmark
    public Assessment tablesObserved() {
        return tabled.assess(observed);
    }

    @Benchmark
    public Assessment tablesObservedWithWorking() {
        return tabled.assess(observed, null, new WorkingRecord());
    }

    @Benchmark
    public Assessment tablesUnobserved() {
        return tabled.assess(unobserved);
    }

    @Benchmark
    public Assessment tablesTwoUnknown() {
        return tabled.assess(twoUnknown);
    }

    @Benchmark
    public Assessment shapesObserved() {
        return shaped.assess(observed);
    }

    /** Another trim every time, so that nothing worked out for one trim serves the next. */
    @Benchmark
    public Assessment shapesObservedAtChangingTrims() {
        next = (next + 1) % trims.length;
        return shaped.assess(trims[next]);
    }

    @Benchmark
    public Assessment shapesUnobserved() {
        return shaped.assess(unobserved);
    }

    @Benchmark
    public Assessment shapesTwoUnknown() {
        return shaped.assess(twoUnknown);
    }

    @Benchmark
    public Assessment tablesUnobservedTwoUnknown() {
        return tabled.assess(unobservedTwoUnknown);
    }

    @Benchmark
    public Assessment shapesUnobservedTwoUnknown() {
        return shaped.assess(unobservedTwoUnknown);
    }
}
