// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.brassbob.core.vessel.MassPoint;
import org.brassbob.core.vessel.Weight;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Records in and out, each through a real file. */
class StoreTest {
    @TempDir
    Path folder;

    private Store store;

    @BeforeEach
    void open() {
        store = Store.open(folder.resolve("new/deep")).opened().orElseThrow();
    }

    @AfterEach
    void close() {
        store.close();
    }

    private void reopen() {
        store.close();
        open();
    }

    @Test
    void migrationsAreAllThere() {
        List<Integer> version = store.database().list("PRAGMA user_version", row -> row.getInt(1));
        assertEquals(List.of(Migrations.STEPS.size()), version);
        for (int i = 0; i < Migrations.STEPS.size(); i++) {
            assertEquals(i + 1, Integer.parseInt(Migrations.STEPS.get(i).substring(0, 3)));
        }
        assertEquals(
                null,
                Migrations.class.getResource(String.format(Locale.ROOT, "%03d.sql", Migrations.STEPS.size() + 1)));
    }

    @Test
    void commitsAreWrittenThrough() {
        assertEquals(List.of("wal"), store.database().list("PRAGMA journal_mode", row -> row.getString(1)));
        // 2 is FULL (sqlite.org, PRAGMA synchronous).
        assertEquals(List.of(2), store.database().list("PRAGMA synchronous", row -> row.getInt(1)));
        assertEquals(List.of(1), store.database().list("PRAGMA foreign_keys", row -> row.getInt(1)));
    }

    @Test
    void roundIsResumedAndFinished() {
        long id = store.rounds().start(Entries.ROUND);
        store.readings().accept(id, Entries.numbered(1));
        reopen();
        StoredRound round = store.rounds().inProgress("barge").orElseThrow();
        assertEquals(new StoredRound(id, Entries.ROUND, null, 1), round);
        store.rounds().finish(id, Entries.START.plusHours(1));
        assertEquals(Optional.empty(), store.rounds().inProgress("barge"));
        assertThrows(StoreException.class, () -> store.rounds().finish(id, Entries.START.plusHours(2)));
        assertEquals(
                Entries.START.plusHours(1),
                store.rounds().find(id).orElseThrow().finishedAt());
    }

    @Test
    void correctionKeepsTheFirst() {
        long round = store.rounds().start(Entries.ROUND);
        long first = store.readings().accept(round, Entries.sounding("wb", 1.2, Entries.START));
        long second = store.readings().correct(first, Entries.sounding("wb", 2.2, Entries.START));
        List<StoredReading> all = store.readings().ofRound(round);
        assertEquals(List.of(first, second), all.stream().map(StoredReading::id).toList());
        assertEquals(second, all.get(0).correctedBy());
        assertEquals(first, all.get(1).corrects());
        assertEquals(
                List.of(2.2),
                RoundStore.forCore(store.rounds().find(round).orElseThrow(), all).readings().stream()
                        .map(r -> r.value())
                        .toList());
        assertEquals(
                List.of(second),
                store.readings().latest("barge", Entries.START.plusHours(1)).stream()
                        .map(StoredReading::id)
                        .toList());
        assertThrows(
                StoreException.class, () -> store.readings().correct(first, Entries.sounding("wb", 3, Entries.START)));
        assertThrows(StoreException.class, () -> store.readings()
                .correct(second, Entries.sounding("other", 3, Entries.START)));
        assertEquals(2, store.readings().ofRound(round).size());
    }

    @Test
    void readingsCannotBeChangedOrTakenAway() {
        long round = store.rounds().start(Entries.ROUND);
        store.readings().accept(round, Entries.numbered(1));
        for (String sql : List.of("UPDATE reading SET value = 9", "DELETE FROM reading", "DELETE FROM gauging")) {
            StoreException e = assertThrows(
                    StoreException.class, () -> store.database().inTransaction(c -> Database.update(c, sql)));
            assertEquals(StoreException.Reason.REFUSED, e.reason());
        }
        assertTrue(Entries.same(
                Entries.numbered(1), store.readings().ofRound(round).get(0).draft()));
    }

    @Test
    void latestAndTrendGoByTank() {
        long round = store.rounds().start(Entries.ROUND);
        for (int day = 0; day < 10; day++) {
            store.readings().accept(round, Entries.sounding("a", day, Entries.START.plusDays(day)));
            store.readings().accept(round, Entries.sounding("b", 2 * day, Entries.START.plusDays(day)));
        }
        List<StoredReading> latest = store.readings().latest("barge", Entries.START.plusDays(5));
        assertEquals(
                List.of(4.0, 8.0),
                latest.stream().map(r -> r.draft().reading().value()).toList());
        List<TrendPoint> trend = store.readings().trend("barge", "b", Entries.START, Entries.START.plusDays(10), 2);
        assertEquals(List.of(4.0, 14.0), trend.stream().map(TrendPoint::mean).toList());
        assertEquals(List.of(0.0, 10.0), trend.stream().map(TrendPoint::least).toList());
        assertEquals(
                List.of(8.0, 18.0), trend.stream().map(TrendPoint::greatest).toList());
        assertEquals(
                3,
                store.readings()
                        .ofTank("barge", "a", Entries.START.plusDays(2), Entries.START.plusDays(5))
                        .size());
        assertEquals(List.of(), store.readings().latest("another", Entries.START));
    }

    @Test
    void weightsKeepTheirHistory() {
        Weight cargo = new Weight("cargo", new MassPoint(60, 20, 0, 3.5), 2.0, null);
        store.weights().enter("barge", new WeightEntry("cargo", cargo, Entries.START, "A. Teal"));
        assertEquals(List.of(cargo), store.weights().current("barge"));
        store.weights().enter("barge", new WeightEntry("cargo", null, Entries.START.plusHours(1), "A. Teal"));
        reopen();
        assertEquals(List.of(), store.weights().current("barge"));
        assertEquals(2, store.weights().history("barge", "cargo").size());
    }

    @Test
    void settingsTakeOversAndCopiesComeBack() {
        store.settings().set(Setting.DRESS, "night");
        store.settings().set(Setting.DRESS, "sun");
        TakeOver event = new TakeOver("barge", "B. Smew", Entries.START);
        store.rounds().takeOver(event);
        VesselCopy copy = new VesselCopy("abc", "barge", "Mudlark", Entries.START);
        AcceptedFinding finding = new AcceptedFinding("gm.csv:2: warning", Entries.START, "A. Teal");
        store.vessels().keep(copy, Map.of("gm.csv", new byte[] {1, 2}), Map.of("gm.csv", "ff"), List.of(finding));
        reopen();
        assertEquals(Optional.of("sun"), store.settings().get(Setting.DRESS));
        assertEquals(Optional.empty(), store.settings().get(Setting.CURVE));
        assertEquals(Optional.of(event), store.rounds().latestTakeOver("barge"));
        assertEquals(List.of(copy), store.vessels().copies());
        assertArrayEquals(new byte[] {1, 2}, store.vessels().files("abc").get("gm.csv"));
        assertEquals(Map.of("gm.csv", "ff"), store.vessels().hashes("abc"));
        assertEquals(List.of(finding), store.vessels().accepted("abc"));
    }
}
