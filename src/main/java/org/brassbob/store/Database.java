// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.sqlite.SQLiteDataSource;

/** One connection to the records file, used by one thread at a time. */
final class Database implements AutoCloseable {
    /** Work on the connection. */
    interface Work<T> {
        T run(Connection connection) throws SQLException;
    }

    /** Makes a value of a row. */
    interface RowReader<T> {
        T read(ResultSet row) throws SQLException;
    }

    private final Connection connection;

    private Database(Connection connection) {
        this.connection = connection;
    }

    /** Opens or makes the file, write-ahead logged and written through on every commit. */
    static Database open(Path file) throws SQLException {
        Connection connection = connect(file);
        try (Statement statement = connection.createStatement()) {
            statement.execute("PRAGMA busy_timeout = 0");
            statement.execute("PRAGMA journal_mode = WAL");
            statement.execute("PRAGMA synchronous = FULL");
            statement.execute("PRAGMA foreign_keys = ON");
        } catch (SQLException e) {
            connection.close();
            throw e;
        }
        return new Database(connection);
    }

    /** A bare connection, for a file that may be damaged. */
    static Connection connect(Path file) throws SQLException {
        SQLiteDataSource source = new SQLiteDataSource();
        source.setUrl("jdbc:sqlite:" + file);
        return source.getConnection();
    }

    Connection connection() {
        return connection;
    }

    /** All of the work, on the disk when this returns, or none of it. */
    synchronized <T> T inTransaction(Work<T> work) {
        try {
            return transaction(connection, work);
        } catch (SQLException e) {
            throw StoreException.of(e);
        }
    }

    static <T> T transaction(Connection connection, Work<T> work) throws SQLException {
        execute(connection, "BEGIN IMMEDIATE");
        boolean done = false;
        try {
            T result = work.run(connection);
            execute(connection, "COMMIT");
            done = true;
            return result;
        } finally {
            if (!done) {
                rollBack(connection);
            }
        }
    }

    /** SQLite has rolled back by itself after some failures (a full disk); then there is nothing left to roll back. */
    private static void rollBack(Connection connection) {
        try {
            execute(connection, "ROLLBACK");
        } catch (SQLException e) {
            if (!String.valueOf(e.getMessage()).contains("no transaction is active")) {
                throw StoreException.of(e);
            }
        }
    }

    static void execute(Connection connection, String sql) throws SQLException {
        try (Statement statement = connection.createStatement()) {
            statement.execute(sql);
        }
    }

    synchronized <T> List<T> list(String sql, RowReader<T> reader, @Nullable Object... values) {
        try {
            return list(connection, sql, reader, values);
        } catch (SQLException e) {
            throw StoreException.of(e);
        }
    }

    static <T> List<T> list(Connection connection, String sql, RowReader<T> reader, @Nullable Object... values)
            throws SQLException {
        List<T> rows = new ArrayList<>();
        try (PreparedStatement statement = connection.prepareStatement(sql)) {
            set(statement, values);
            try (ResultSet result = statement.executeQuery()) {
                while (result.next()) {
                    rows.add(reader.read(result));
                }
            }
        }
        return rows;
    }

    <T> Optional<T> first(String sql, RowReader<T> reader, @Nullable Object... values) {
        return list(sql, reader, values).stream().findFirst();
    }

    /** Adds a row and tells its id. */
    static long insert(Connection connection, String sql, @Nullable Object... values) throws SQLException {
        update(connection, sql, values);
        return list(connection, "SELECT last_insert_rowid()", row -> row.getLong(1))
                .get(0);
    }

    static int update(Connection connection, String sql, @Nullable Object... values) throws SQLException {
        try (PreparedStatement statement = connection.prepareStatement(sql)) {
            set(statement, values);
            return statement.executeUpdate();
        }
    }

    private static void set(PreparedStatement statement, @Nullable Object... values) throws SQLException {
        for (int i = 0; i < values.length; i++) {
            statement.setObject(i + 1, values[i]);
        }
    }

    static @Nullable Double number(ResultSet row, String column) throws SQLException {
        double value = row.getDouble(column);
        return row.wasNull() ? null : value;
    }

    static @Nullable Long id(ResultSet row, String column) throws SQLException {
        long value = row.getLong(column);
        return row.wasNull() ? null : value;
    }

    @Override
    public synchronized void close() {
        try {
            connection.close();
        } catch (SQLException e) {
            throw StoreException.of(e);
        }
    }
}
