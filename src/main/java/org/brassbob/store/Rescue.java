// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.sql.Connection;
import java.sql.SQLException;
import java.util.List;

/**
 * Reads what can be read of a damaged file, row by row, into a new one. The damaged file is only copied, never written. A table is
 * read upwards until a fault, then downwards until a fault, then row by row in between.
 */
final class Rescue {
    private static final List<String> TABLES = List.of(
            "vessel_copy",
            "vessel_file",
            "accepted_finding",
            "round",
            "reading",
            "gauging",
            "take_over",
            "weight",
            "setting");
    private static final int HEADER = 100;

    /**
     * What was saved.
     *
     * @param rounds saved
     * @param readings saved
     * @param faults whether any part of a table could not be read
     */
    record Outcome(long rounds, long readings, boolean faults) {
        String text() {
            return rounds + " rounds with " + readings + " readings were rescued from it"
                    + (faults ? "; others could not be read: compare with your own notes" : "");
        }
    }

    private final Connection from;
    private final Connection to;
    private boolean faults;

    private Rescue(Connection from, Connection to) {
        this.from = from;
        this.to = to;
    }

    static Outcome run(Path damaged, Path fresh) throws SQLException, IOException {
        Path copy = fresh.resolveSibling("rescue-from.tmp");
        clear(fresh);
        clear(copy);
        copy(damaged, copy, "");
        copy(damaged, copy, "-wal");
        try (Database target = Database.open(fresh)) {
            Migrations.run(target.connection());
            if (!opens(copy)) {
                mendHeader(copy, fresh);
            }
            Outcome outcome = rescued(copy, target.connection());
            Database.execute(target.connection(), "PRAGMA wal_checkpoint(TRUNCATE)");
            return outcome;
        } finally {
            clear(copy);
        }
    }

    private static Outcome rescued(Path copy, Connection target) throws SQLException {
        Database.execute(target, "PRAGMA foreign_keys = OFF");
        try (Connection source = Database.connect(copy)) {
            Rescue rescue = new Rescue(source, target);
            Outcome outcome = Database.transaction(target, c -> rescue.all());
            return outcome;
        }
    }

    private static void copy(Path from, Path to, String tail) throws IOException {
        Path source = from.resolveSibling(from.getFileName() + tail);
        if (Files.exists(source)) {
            Files.copy(source, to.resolveSibling(to.getFileName() + tail), StandardCopyOption.REPLACE_EXISTING);
        }
    }

    private static void clear(Path file) throws IOException {
        for (String tail : List.of("", "-wal", "-shm", "-journal")) {
            Files.deleteIfExists(file.resolveSibling(file.getFileName() + tail));
        }
    }

    private static boolean opens(Path file) {
        try (Connection connection = Database.connect(file)) {
            return !Database.list(connection, "SELECT count(*) FROM sqlite_schema", row -> row.getInt(1))
                    .isEmpty();
        } catch (SQLException e) {
            return false;
        }
    }

    /** The header's 100 bytes are the same for every file of ours but for a few counts, which SQLite can do without. */
    private static void mendHeader(Path copy, Path fresh) throws SQLException, IOException {
        try (Connection connection = Database.connect(fresh)) {
            Database.execute(connection, "PRAGMA wal_checkpoint(TRUNCATE)");
        }
        ByteBuffer header = ByteBuffer.allocate(HEADER);
        try (FileChannel sound = FileChannel.open(fresh, StandardOpenOption.READ);
                FileChannel broken = FileChannel.open(copy, StandardOpenOption.WRITE)) {
            sound.read(header, 0);
            // A page count of 0 lets SQLite take it from the file's size; no list of free pages (file format, 1.3).
            header.putInt(28, 0).putInt(32, 0).putInt(36, 0);
            broken.write(header.flip(), 0);
        }
    }

    private Outcome all() throws SQLException {
        for (String table : TABLES) {
            table(table);
        }
        int lost = Database.update(
                to,
                """
                INSERT INTO round (id, vessel_id, data_sha256, name, officer, started_at, started_ms, finished_at, conditions)
                SELECT round_id, vessel_id, '', 'rescued', '', at, min(at_ms), at, 'alongside' FROM reading
                WHERE round_id NOT IN (SELECT id FROM round) GROUP BY round_id
                """);
        faults |= lost > 0;
        dropStrays();
        return new Outcome(count("round"), count("reading"), faults);
    }

    /** Rows that hang on a row that was lost and mean nothing without it. A correction outlives the reading that it corrects. */
    private void dropStrays() throws SQLException {
        Database.execute(to, "DROP TRIGGER reading_stays");
        Database.execute(to, "DROP TRIGGER gauging_is_kept");
        Database.update(to, "UPDATE reading SET corrects = NULL WHERE corrects NOT IN (SELECT id FROM reading)");
        Database.update(to, "DELETE FROM gauging WHERE reading_id NOT IN (SELECT id FROM reading)");
        Database.update(to, "DELETE FROM vessel_file WHERE copy_sha256 NOT IN (SELECT sha256 FROM vessel_copy)");
        Database.update(to, "DELETE FROM accepted_finding WHERE copy_sha256 NOT IN (SELECT sha256 FROM vessel_copy)");
        Database.execute(to, Migrations.trigger("reading_stays"));
        Database.execute(to, Migrations.trigger("gauging_is_kept"));
    }

    private long count(String table) throws SQLException {
        return Database.list(to, "SELECT count(*) FROM " + table, row -> row.getLong(1))
                .get(0);
    }

    private void table(String table) throws SQLException {
        RowCopy copy = new RowCopy(from, to, table, columns(table));
        if (copy.upwards()) {
            return;
        }
        faults = true;
        copy.downwards();
        copy.between();
    }

    /** Those of the new table that the damaged one has: it may be of an older version. */
    private List<String> columns(String table) throws SQLException {
        String sql = "SELECT name FROM pragma_table_info(?)";
        List<String> columns = Database.list(to, sql, row -> row.getString(1), table);
        try {
            List<String> older = Database.list(from, sql, row -> row.getString(1), table);
            return older.isEmpty()
                    ? columns
                    : columns.stream().filter(older::contains).toList();
        } catch (SQLException e) {
            faults = true;
            return columns;
        }
    }
}
