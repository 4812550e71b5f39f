// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.sql.Connection;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.List;

/** The steps from an empty file to the records as this version knows them; a step, once released, is never changed. */
final class Migrations {
    /** In order; step n takes the file from version n-1 to n. */
    static final List<String> STEPS = List.of("001.sql", "002.sql");

    private Migrations() {}

    static int version(Connection connection) throws SQLException {
        return Database.list(connection, "PRAGMA user_version", row -> row.getInt(1))
                .get(0);
    }

    /** Takes the steps that the file lacks, each whole or not at all. */
    static void run(Connection connection) throws SQLException {
        for (int step = version(connection) + 1; step <= STEPS.size(); step++) {
            String script = script(STEPS.get(step - 1));
            int version = step;
            Database.transaction(connection, c -> {
                runScript(c, script);
                Database.execute(c, "PRAGMA user_version = " + version);
                return version;
            });
        }
    }

    /** The driver runs every statement of a text only by this call; its execute stops after the first. */
    private static void runScript(Connection connection, String script) throws SQLException {
        try (Statement statement = connection.createStatement()) {
            statement.executeUpdate(script);
        }
    }

    /** The statement of the migrations that makes a trigger. */
    static String trigger(String name) {
        return STEPS.stream()
                .flatMap(step -> script(step).lines())
                .filter(line -> line.startsWith("CREATE TRIGGER " + name + " "))
                .findFirst()
                .orElseThrow();
    }

    static String script(String name) {
        try (InputStream in = Migrations.class.getResourceAsStream(name)) {
            if (in == null) {
                throw new IllegalStateException("no migration " + name + "; expected it beside the classes");
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
