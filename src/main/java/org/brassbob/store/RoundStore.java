// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.OffsetDateTime;
import java.util.List;
import java.util.Optional;
import org.brassbob.core.round.SoundingRound;
import org.brassbob.core.round.SoundingRound.Observed;
import org.jspecify.annotations.Nullable;

/** Rounds: started, carried on, finished, looked up; and take-overs of the ship. Every call may throw {@link StoreException}. */
public final class RoundStore {
    private static final String SELECT =
            """
            SELECT r.*, (SELECT count(*) FROM reading x WHERE x.round_id = r.id
              AND NOT EXISTS (SELECT 1 FROM reading c WHERE c.corrects = x.id)) AS readings FROM round r
            """;

    private final Database database;

    RoundStore(Database database) {
        this.database = database;
    }

    /** Starts a round; on the disk when this returns. */
    public long start(RoundDraft draft) {
        return database.inTransaction(c -> insert(c, draft));
    }

    private static long insert(java.sql.Connection c, RoundDraft draft) throws SQLException {
        Observed seen = draft.sight().observed();
        return Database.insert(
                c,
                """
                INSERT INTO round (vessel_id, data_sha256, name, officer, started_at, started_ms, conditions, curve,
                  trim_m, list_deg, sea_density_t_m3, draught_aft_m, draught_forward_m)
                VALUES (?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?)
                """,
                draft.vesselId(),
                draft.dataSha256(),
                draft.name(),
                draft.officer(),
                draft.startedAt().toString(),
                millis(draft.startedAt()),
                draft.sight().conditions().code(),
                draft.sight().curve(),
                seen.trim(),
                seen.listDeg(),
                seen.seaDensity(),
                seen.draughtAft(),
                seen.draughtForward());
    }

    /** Puts in what is now seen of the ship. */
    public void observe(long round, RoundDraft.Sight sight) {
        Observed seen = sight.observed();
        database.inTransaction(c -> changed(Database.update(
                c,
                """
                UPDATE round SET conditions = ?, curve = ?, trim_m = ?, list_deg = ?, sea_density_t_m3 = ?,
                  draught_aft_m = ?, draught_forward_m = ? WHERE id = ? AND finished_at IS NULL
                """,
                sight.conditions().code(),
                sight.curve(),
                seen.trim(),
                seen.listDeg(),
                seen.seaDensity(),
                seen.draughtAft(),
                seen.draughtForward(),
                round)));
    }

    /** Ends a round; it is no longer resumed. */
    public void finish(long round, OffsetDateTime at) {
        database.inTransaction(c -> changed(Database.update(
                c, "UPDATE round SET finished_at = ? WHERE id = ? AND finished_at IS NULL", at.toString(), round)));
    }

    private static int changed(int rows) throws SQLException {
        if (rows != 1) {
            throw new SQLException("no such round in progress", "", 19);
        }
        return rows;
    }

    /** Stores a whole round from elsewhere, finished, in one go. */
    public long add(RoundDraft draft, OffsetDateTime finishedAt, List<ReadingDraft> readings) {
        return database.inTransaction(c -> {
            long id = insert(c, draft);
            for (ReadingDraft reading : readings) {
                ReadingStore.insert(c, id, reading, null);
            }
            Database.update(c, "UPDATE round SET finished_at = ? WHERE id = ?", finishedAt.toString(), id);
            return id;
        });
    }

    /** The round to resume: the latest started that is not finished. */
    public Optional<StoredRound> inProgress(String vesselId) {
        return database.first(
                SELECT + " WHERE vessel_id = ? AND finished_at IS NULL ORDER BY started_ms DESC, id DESC LIMIT 1",
                RoundStore::read,
                vesselId);
    }

    public Optional<StoredRound> find(long id) {
        return database.first(SELECT + " WHERE id = ?", RoundStore::read, id);
    }

    /** Rounds, the latest first: at most {@code count}, after the first {@code skip}. */
    public List<StoredRound> page(String vesselId, int skip, int count) {
        return database.list(
                SELECT + " WHERE vessel_id = ? ORDER BY started_ms DESC, id DESC LIMIT ? OFFSET ?",
                RoundStore::read,
                vesselId,
                count,
                skip);
    }

    /** How many rounds there are. */
    public int count(String vesselId) {
        return database.list("SELECT count(*) FROM round WHERE vessel_id = ?", row -> row.getInt(1), vesselId)
                .get(0);
    }

    /** A round as the core takes it: with the readings that count. */
    public static SoundingRound forCore(StoredRound round, List<StoredReading> readings) {
        return new SoundingRound(
                round.draft().name(),
                round.draft().sight().observed(),
                round.draft().sight().curve(),
                readings.stream()
                        .filter(StoredReading::counts)
                        .map(r -> r.draft().reading())
                        .toList());
    }

    public void takeOver(TakeOver event) {
        database.inTransaction(c -> Database.insert(
                c,
                "INSERT INTO take_over (vessel_id, officer, at, at_ms) VALUES (?, ?, ?, ?)",
                event.vesselId(),
                event.officer(),
                event.at().toString(),
                millis(event.at())));
    }

    /** The latest take-over of a ship: what was read before it counts as inherited. */
    public Optional<TakeOver> latestTakeOver(String vesselId) {
        return database.first(
                "SELECT * FROM take_over WHERE vessel_id = ? ORDER BY at_ms DESC, id DESC LIMIT 1",
                row -> new TakeOver(row.getString("vessel_id"), row.getString("officer"), time(row.getString("at"))),
                vesselId);
    }

    private static StoredRound read(ResultSet row) throws SQLException {
        Observed observed = new Observed(
                Database.number(row, "trim_m"),
                Database.number(row, "list_deg"),
                Database.number(row, "sea_density_t_m3"),
                Database.number(row, "draught_aft_m"),
                Database.number(row, "draught_forward_m"));
        RoundDraft draft = new RoundDraft(
                row.getString("vessel_id"),
                row.getString("data_sha256"),
                row.getString("name"),
                row.getString("officer"),
                time(row.getString("started_at")),
                new RoundDraft.Sight(observed, Conditions.of(row.getString("conditions")), row.getString("curve")));
        @Nullable String finished = row.getString("finished_at");
        return new StoredRound(
                row.getLong("id"), draft, finished == null ? null : time(finished), row.getInt("readings"));
    }

    static long millis(OffsetDateTime time) {
        return time.toInstant().toEpochMilli();
    }

    static OffsetDateTime time(String text) {
        return OffsetDateTime.parse(text);
    }
}
