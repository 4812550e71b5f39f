// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.util.Optional;

/** Settings of this device. Every call may throw {@link StoreException}. */
public final class SettingStore {
    private final Database database;

    SettingStore(Database database) {
        this.database = database;
    }

    public void set(Setting setting, String value) {
        database.inTransaction(c -> Database.update(
                c,
                "INSERT INTO setting (key, value) VALUES (?, ?) ON CONFLICT (key) DO UPDATE SET value = excluded.value",
                setting.key(),
                value));
    }

    /** Empty where it was never set. */
    public Optional<String> get(Setting setting) {
        return database.first("SELECT value FROM setting WHERE key = ?", row -> row.getString(1), setting.key());
    }
}
