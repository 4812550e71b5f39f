// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.bench;

import java.nio.file.Path;
import java.time.OffsetDateTime;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.IntStream;
import org.brassbob.core.round.Reading;
import org.brassbob.core.round.ReadingKind;
import org.brassbob.core.round.SoundingRound.Observed;
import org.brassbob.core.table.Origin;
import org.brassbob.store.Conditions;
import org.brassbob.store.ReadingDraft;
import org.brassbob.store.RoundDraft;
import org.brassbob.store.Store;
import org.brassbob.store.StoredReading;
import org.brassbob.store.StoredRound;
import org.brassbob.store.TrendPoint;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.TearDown;

/** Ten years of records: 60 tanks, 6 rounds a day, 1.3 million readings, made once under target. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
public class StoreBenchmark {
    private static final Path FOLDER = Path.of("target/ten-years");
    private static final int ROUNDS = 6 * 3650;
    private static final OffsetDateTime START = OffsetDateTime.parse("2016-05-01T00:00:00Z");
    private static final OffsetDateTime END = START.plusHours(4L * ROUNDS);

    private Store store = Store.open(FOLDER).opened().orElseThrow();

    /** Makes what is missing. */
    @Setup
    public void fill() {
        for (int n = store.rounds().count("bench"); n < ROUNDS; n++) {
            OffsetDateTime at = START.plusHours(4L * n);
            RoundDraft draft = new RoundDraft(
                    "bench",
                    "abc",
                    "round " + n,
                    "A. Teal",
                    at,
                    new RoundDraft.Sight(Observed.NOTHING, Conditions.AT_SEA, null));
            int round = n;
            List<ReadingDraft> readings = IntStream.range(0, 60)
                    .mapToObj(tank -> reading(round, tank, at))
                    .toList();
            store.rounds().add(draft, at.plusHours(1), readings);
        }
    }

    private static ReadingDraft reading(int round, int tank, OffsetDateTime at) {
        double metres = (round * 37L + tank * 101L) % 5000 / 1000.0;
        return ReadingDraft.plain(
                new Reading(
                        "tank-" + tank,
                        at.plusSeconds(40L * tank),
                        ReadingKind.SOUNDING,
                        metres,
                        null,
                        null,
                        null,
                        "",
                        Origin.computed("bench")),
                "A. Teal");
    }

    @TearDown
    public void close() {
        store.close();
    }

    @Benchmark
    public List<StoredRound> firstPageOfRounds() {
        return store.rounds().page("bench", 0, 50);
    }

    @Benchmark
    public List<StoredRound> lastPageOfRounds() {
        return store.rounds().page("bench", ROUNDS - 50, 50);
    }

    @Benchmark
    public List<StoredReading> oneRound() {
        return store.readings().ofRound(ROUNDS / 2);
    }

    @Benchmark
    public List<TrendPoint> trendOfTenYears() {
        return store.readings().trend("bench", "tank-30", START, END, 400);
    }

    @Benchmark
    public List<StoredReading> latestOfEachTank() {
        return store.readings().latest("bench", END);
    }

    /** With the check of the whole file. */
    @Benchmark
    public Store closeAndOpen() {
        store.close();
        store = Store.open(FOLDER).opened().orElseThrow();
        return store;
    }
}
