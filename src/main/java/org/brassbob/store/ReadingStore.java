// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Instant;
import java.time.OffsetDateTime;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.brassbob.core.round.Reading;
import org.brassbob.core.round.ReadingKind;
import org.brassbob.core.table.Origin;
import org.jspecify.annotations.Nullable;

/** Readings: only ever added. Every call may throw {@link StoreException}. */
public final class ReadingStore {
    private static final String COLUMNS = "r.*, (SELECT c.id FROM reading c WHERE c.corrects = r.id) AS corrected_by";
    private static final String COUNTS = "NOT EXISTS (SELECT 1 FROM reading c WHERE c.corrects = r.id)";

    private final Database database;

    ReadingStore(Database database) {
        this.database = database;
    }

    /** Accepts a reading; on the disk, whole, when this returns. */
    public long accept(long round, ReadingDraft draft) {
        return database.inTransaction(c -> insert(c, round, draft, null));
    }

    /**
     * Accepts a correction; the first entry stays.
     *
     * @param corrected id of a reading of the same round and tank that no other corrects yet
     */
    public long correct(long corrected, ReadingDraft draft) {
        return database.inTransaction(c -> {
            List<Long> round = Database.list(
                    c,
                    "SELECT round_id FROM reading WHERE id = ? AND tank = ?",
                    row -> row.getLong(1),
                    corrected,
                    draft.reading().tank());
            if (round.isEmpty()) {
                throw new SQLException("no reading of this tank to correct", "", 19);
            }
            return insert(c, round.get(0), draft, corrected);
        });
    }

    static long insert(Connection c, long round, ReadingDraft draft, @Nullable Long corrects) throws SQLException {
        Reading reading = draft.reading();
        long id = Database.insert(
                c,
                """
                INSERT INTO reading (round_id, vessel_id, tank, at, at_ms, kind, value, temperature_c, density_t_m3,
                  water_m, note, question, who, corrects)
                VALUES (?, coalesce((SELECT vessel_id FROM round WHERE id = ?), ''), ?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?)
                """,
                round,
                round,
                reading.tank(),
                reading.at().toString(),
                RoundStore.millis(reading.at()),
                reading.kind().code(),
                reading.kind().hasValue() ? reading.value() : null,
                reading.temperatureC(),
                reading.density(),
                reading.waterSounding(),
                reading.note(),
                draft.question(),
                draft.who(),
                corrects);
        for (int i = 0; i < draft.gaugings().size(); i++) {
            Database.update(
                    c,
                    "INSERT INTO gauging (reading_id, place, value) VALUES (?, ?, ?)",
                    id,
                    i,
                    draft.gaugings().get(i));
        }
        return id;
    }

    /** All readings of a round in the order of entry, corrected ones too. */
    public List<StoredReading> ofRound(long round) {
        return read("SELECT " + COLUMNS + " FROM reading r WHERE round_id = ? ORDER BY id", round);
    }

    /** The latest reading of each tank before a time that states a level and counts. */
    public List<StoredReading> latest(String vesselId, OffsetDateTime before) {
        return read(
                """
                WITH RECURSIVE tanks (tank) AS (
                  SELECT min(tank) FROM reading WHERE vessel_id = ?1
                  UNION ALL
                  SELECT (SELECT min(tank) FROM reading WHERE vessel_id = ?1 AND tank > tanks.tank) FROM tanks
                  WHERE tanks.tank IS NOT NULL)
                SELECT r.*, NULL AS corrected_by FROM tanks JOIN reading r ON r.id = (
                  SELECT r.id FROM reading r WHERE r.vessel_id = ?1 AND r.tank = tanks.tank AND r.at_ms < ?2
                  AND r.kind <> 'not-taken' AND %s ORDER BY r.at_ms DESC, r.id DESC LIMIT 1)
                WHERE tanks.tank IS NOT NULL ORDER BY r.tank
                """
                        .replace("%s", COUNTS),
                vesselId,
                RoundStore.millis(before));
    }

    /** A tank's readings that count from a time to before another, in the order of time. */
    public List<StoredReading> ofTank(String vesselId, String tank, OffsetDateTime from, OffsetDateTime to) {
        return read(
                "SELECT " + COLUMNS
                        + " FROM reading r WHERE vessel_id = ? AND tank = ? AND at_ms >= ? AND at_ms < ? AND " + COUNTS
                        + " ORDER BY at_ms, id",
                vesselId,
                tank,
                RoundStore.millis(from),
                RoundStore.millis(to));
    }

    /** A tank's readings that count, drawn together into at most {@code stretches} stretches of equal length a kind. */
    public List<TrendPoint> trend(String vesselId, String tank, OffsetDateTime from, OffsetDateTime to, int stretches) {
        long start = RoundStore.millis(from);
        long width = Math.max(1, (RoundStore.millis(to) - start + stretches - 1) / stretches);
        return database.list(
                """
                SELECT min(at_ms) AS first, kind, min(value) AS least, avg(value) AS mean, max(value) AS greatest,
                  count(*) AS n FROM reading r
                WHERE vessel_id = ? AND tank = ? AND at_ms >= ? AND at_ms < ? AND value IS NOT NULL AND %s
                GROUP BY (at_ms - ?) / ?, kind ORDER BY first
                """
                        .replace("%s", COUNTS),
                row -> new TrendPoint(
                        Instant.ofEpochMilli(row.getLong("first")),
                        kind(row.getString("kind")),
                        row.getDouble("least"),
                        row.getDouble("mean"),
                        row.getDouble("greatest"),
                        row.getInt("n")),
                vesselId,
                tank,
                start,
                RoundStore.millis(to),
                start,
                width);
    }

    private List<StoredReading> read(String sql, @Nullable Object... values) {
        List<StoredReading> bare = database.list(sql, row -> reading(row, List.of()), values);
        Map<Long, List<Double>> gaugings = new HashMap<>();
        for (StoredReading one : bare) {
            List<Double> list = database.list(
                    "SELECT value FROM gauging WHERE reading_id = ? ORDER BY place", row -> row.getDouble(1), one.id());
            gaugings.put(one.id(), list);
        }
        List<StoredReading> whole = new ArrayList<>();
        for (StoredReading one : bare) {
            ReadingDraft draft = one.draft();
            whole.add(new StoredReading(
                    one.id(),
                    one.roundId(),
                    new ReadingDraft(
                            draft.reading(), gaugings.getOrDefault(one.id(), List.of()), draft.question(), draft.who()),
                    one.corrects(),
                    one.correctedBy()));
        }
        return whole;
    }

    private static StoredReading reading(ResultSet row, List<Double> gaugings) throws SQLException {
        @Nullable Double value = Database.number(row, "value");
        Reading reading = new Reading(
                row.getString("tank"),
                RoundStore.time(row.getString("at")),
                kind(row.getString("kind")),
                value == null ? Double.NaN : value,
                Database.number(row, "temperature_c"),
                Database.number(row, "density_t_m3"),
                Database.number(row, "water_m"),
                row.getString("note"),
                Origin.computed("round " + row.getLong("round_id") + ", reading " + row.getLong("id")));
        return new StoredReading(
                row.getLong("id"),
                row.getLong("round_id"),
                new ReadingDraft(reading, gaugings, row.getString("question"), row.getString("who")),
                Database.id(row, "corrects"),
                Database.id(row, "corrected_by"));
    }

    private static ReadingKind kind(String code) {
        for (ReadingKind kind : ReadingKind.values()) {
            if (kind.code().equals(code)) {
                return kind;
            }
        }
        throw new IllegalStateException("reading of kind " + code + "; expected a kind that a round's file knows");
    }
}
