// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.List;

/** Copies the readable rows of one table; a row that breaks the new table's rules is left. */
final class RowCopy {
    private static final long MOST_PROBES = 2_000_000;

    private final Connection from;
    private final String select;
    private final PreparedCopy target;
    private long low;
    private long high = Long.MAX_VALUE;

    private record PreparedCopy(Connection to, String insert, int columns) {}

    RowCopy(Connection from, Connection to, String table, List<String> columns) {
        this.from = from;
        String names = String.join(", ", columns);
        this.select = "SELECT rowid, " + names + " FROM " + table + " NOT INDEXED ";
        String marks = "?" + ", ?".repeat(columns.size());
        this.target = new PreparedCopy(
                to,
                "INSERT OR IGNORE INTO " + table + " (rowid, " + names + ") VALUES (" + marks + ")",
                columns.size());
    }

    /** Whether the whole table was read. */
    boolean upwards() throws SQLException {
        return scan("ORDER BY rowid ASC", true);
    }

    void downwards() throws SQLException {
        scan("ORDER BY rowid DESC", false);
    }

    /** One by one where neither scan came. */
    void between() throws SQLException {
        long top = Math.min(high, low + MOST_PROBES);
        if (high == Long.MAX_VALUE) {
            top = Math.min(low + 20_000, top);
        }
        for (long id = low + 1; id < top; id++) {
            scan("WHERE rowid = " + id, true);
        }
    }

    private boolean scan(String order, boolean upwards) throws SQLException {
        try (PreparedStatement insert = target.to().prepareStatement(target.insert())) {
            return scan(order, upwards, insert);
        }
    }

    private boolean scan(String order, boolean upwards, PreparedStatement insert) {
        try (PreparedStatement statement = from.prepareStatement(select + order);
                ResultSet row = statement.executeQuery()) {
            boolean whole = true;
            while (row.next()) {
                long id = row.getLong(1);
                if (upwards && order.startsWith("ORDER")) {
                    low = Math.max(low, id);
                } else if (!upwards) {
                    high = Math.min(high, id);
                }
                whole &= copied(row, insert);
            }
            return whole;
        } catch (SQLException e) {
            return false;
        }
    }

    private boolean copied(ResultSet row, PreparedStatement insert) throws SQLException {
        for (int i = 1; i <= target.columns() + 1; i++) {
            insert.setObject(i, row.getObject(i));
        }
        insert.executeUpdate();
        return true;
    }
}
