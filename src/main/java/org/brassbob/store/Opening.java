// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.SQLException;
import java.time.Clock;
import java.time.LocalDateTime;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Opens the records of a folder, or says in a line why not. */
final class Opening {
    static final String FILE = "brassbob.db";
    static final String LOCK = "brassbob.lock";
    private static final DateTimeFormatter STAMP = DateTimeFormatter.ofPattern("yyyyMMdd-HHmmss", Locale.ROOT);

    private final Path folder;
    private final Path file;
    private final Clock clock;

    Opening(Path folder, Clock clock) {
        this.folder = folder;
        this.file = folder.resolve(FILE);
        this.clock = clock;
    }

    Opened open() {
        try {
            Files.createDirectories(folder);
            Optional<FolderLock> lock = FolderLock.take(folder.resolve(LOCK));
            return lock.isPresent()
                    ? opened(lock.get())
                    : refused(
                            "is in use by another Brassbob; expected one at a time: close the other, nothing is lost");
        } catch (IOException | SecurityException e) {
            return refused("can't be written; expected a folder that may be changed, with free space");
        }
    }

    private Opened refused(String why) {
        return new Opened(null, folder + ": " + why);
    }

    private Opened opened(FolderLock lock) {
        Opened result = refused("can't be opened");
        try {
            result = checked(lock);
        } catch (SQLException e) {
            result = refused(String.valueOf(StoreException.of(e).getMessage()));
        } catch (StoreException e) {
            result = refused(String.valueOf(e.getMessage()));
        } catch (IOException e) {
            result = refused("can't be written; expected a folder that may be changed, with free space");
        } finally {
            if (result.store() == null) {
                lock.close();
            }
        }
        return result;
    }

    private Opened checked(FolderLock lock) throws SQLException, IOException {
        if (Files.exists(file) && !Files.isWritable(file)) {
            return refused(FILE + " may only be read; expected a file that may be changed");
        }
        try {
            Database database = Database.open(file);
            boolean sound = false;
            try {
                int version = Migrations.version(database.connection());
                if (version > Migrations.STEPS.size()) {
                    return refused(
                            "the records are of version " + version + ", from a newer Brassbob; expected at most "
                                    + Migrations.STEPS.size() + ": nothing was changed");
                }
                requireWhole(database);
                Migrations.run(database.connection());
                sound = true;
            } finally {
                if (!sound) {
                    database.close();
                }
            }
            return new Opened(new Store(database, lock), "");
        } catch (SQLException e) {
            if (StoreException.reasonOf(e) != StoreException.Reason.DAMAGED) {
                throw e;
            }
            return rescued(lock);
        }
    }

    /** A fault of the file itself, as SQLite finds it, is thrown as such. */
    private static void requireWhole(Database database) throws SQLException {
        List<String> faults = Database.list(database.connection(), "PRAGMA quick_check(1)", row -> row.getString(1));
        if (!faults.equals(List.of("ok"))) {
            throw new SQLException("quick_check: " + faults, "", 11);
        }
    }

    private Opened rescued(FolderLock lock) throws SQLException, IOException {
        String kept = keptName();
        Path fresh = folder.resolve("rescue.tmp");
        Rescue.Outcome outcome = Rescue.run(file, fresh);
        for (String tail : List.of("", "-wal", "-shm")) {
            Path part = folder.resolve(FILE + tail);
            if (Files.exists(part)) {
                Files.move(part, folder.resolve(kept + tail));
            }
        }
        Files.move(fresh, file);
        Database database = Database.open(file);
        return new Opened(
                new Store(database, lock),
                folder + ": the records file was damaged; it is kept as " + kept + ", and " + outcome.text());
    }

    private String keptName() {
        String name = "brassbob-damaged-" + STAMP.format(LocalDateTime.now(clock));
        String free = name;
        for (int n = 2; Files.exists(folder.resolve(free + ".db")); n++) {
            free = name + "-" + n;
        }
        return free + ".db";
    }
}
