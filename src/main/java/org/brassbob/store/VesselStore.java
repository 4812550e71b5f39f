// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Copies of ships' data, each under its fingerprint, so that an old round finds the data it was worked out with. */
public final class VesselStore {
    private final Database database;

    VesselStore(Database database) {
        this.database = database;
    }

    /** Keeps a copy with the findings accepted; one that is there already stays as it is and takes the findings. */
    public void keep(
            VesselCopy copy, Map<String, byte[]> files, Map<String, String> hashes, List<AcceptedFinding> accepted) {
        database.inTransaction(c -> {
            int added = Database.update(
                    c,
                    "INSERT OR IGNORE INTO vessel_copy (sha256, vessel_id, name, added_at) VALUES (?, ?, ?, ?)",
                    copy.sha256(),
                    copy.vesselId(),
                    copy.name(),
                    copy.addedAt().toString());
            for (Map.Entry<String, byte[]> file :
                    added == 0 ? List.<Map.Entry<String, byte[]>>of() : files.entrySet()) {
                Database.update(
                        c,
                        "INSERT INTO vessel_file (copy_sha256, path, sha256, content) VALUES (?, ?, ?, ?)",
                        copy.sha256(),
                        file.getKey(),
                        hashes.get(file.getKey()),
                        file.getValue());
            }
            for (AcceptedFinding finding : accepted) {
                Database.insert(
                        c,
                        "INSERT INTO accepted_finding (copy_sha256, text, at, who) VALUES (?, ?, ?, ?)",
                        copy.sha256(),
                        finding.text(),
                        finding.at().toString(),
                        finding.who());
            }
            return added;
        });
    }

    /** All copies, the latest added first. */
    public List<VesselCopy> copies() {
        return database.list(
                "SELECT * FROM vessel_copy ORDER BY rowid DESC",
                row -> new VesselCopy(
                        row.getString("sha256"),
                        row.getString("vessel_id"),
                        row.getString("name"),
                        RoundStore.time(row.getString("added_at"))));
    }

    /** The files of a copy by path; empty where there is no such copy. */
    public Map<String, byte[]> files(String sha256) {
        Map<String, byte[]> files = new LinkedHashMap<>();
        database.list(
                "SELECT path, content FROM vessel_file WHERE copy_sha256 = ? ORDER BY path",
                row -> files.put(row.getString(1), row.getBytes(2)),
                sha256);
        return files;
    }

    /** The SHA-256 of each file of a copy. */
    public Map<String, String> hashes(String sha256) {
        Map<String, String> hashes = new LinkedHashMap<>();
        database.list(
                "SELECT path, sha256 FROM vessel_file WHERE copy_sha256 = ? ORDER BY path",
                row -> hashes.put(row.getString(1), row.getString(2)),
                sha256);
        return hashes;
    }

    public List<AcceptedFinding> accepted(String sha256) {
        return database.list(
                "SELECT * FROM accepted_finding WHERE copy_sha256 = ? ORDER BY id",
                row -> new AcceptedFinding(
                        row.getString("text"), RoundStore.time(row.getString("at")), row.getString("who")),
                sha256);
    }
}
