// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.nio.file.Path;
import java.time.Clock;
import java.time.ZoneId;

/** The records of one folder, open; held alone until closed. */
public final class Store implements AutoCloseable {
    private final Database database;
    private final FolderLock lock;
    private final RoundStore rounds;
    private final ReadingStore readings;
    private final WeightStore weights;
    private final SettingStore settings;
    private final VesselStore vessels;

    Store(Database database, FolderLock lock) {
        this.database = database;
        this.lock = lock;
        this.rounds = new RoundStore(database);
        this.readings = new ReadingStore(database);
        this.weights = new WeightStore(database);
        this.settings = new SettingStore(database);
        this.vessels = new VesselStore(database);
    }

    /** Opens the records of a folder; makes both where they are missing. Never throws: what is wrong is in the message. */
    public static Opened open(Path folder) {
        return open(folder, Clock.system(ZoneId.systemDefault()));
    }

    /** As {@link #open(Path)}; the clock dates the name of a damaged file that is kept aside. */
    public static Opened open(Path folder, Clock clock) {
        return new Opening(folder, clock).open();
    }

    /** Rounds and take-overs. */
    public RoundStore rounds() {
        return rounds;
    }

    public ReadingStore readings() {
        return readings;
    }

    public WeightStore weights() {
        return weights;
    }

    public SettingStore settings() {
        return settings;
    }

    /** Copies of ships' data, and the findings accepted with them. */
    public VesselStore vessels() {
        return vessels;
    }

    /** Only for tests in this package: to bring the database into straits. */
    Database database() {
        return database;
    }

    @Override
    public void close() {
        try {
            database.close();
        } finally {
            lock.close();
        }
    }
}
