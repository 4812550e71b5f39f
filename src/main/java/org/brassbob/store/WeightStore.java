// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.List;
import java.util.Optional;
import org.brassbob.core.vessel.MassPoint;
import org.brassbob.core.vessel.Weight;
import org.jspecify.annotations.Nullable;

/** Weights with their history: only ever added. Every call may throw {@link StoreException}. */
public final class WeightStore {
    private final Database database;

    WeightStore(Database database) {
        this.database = database;
    }

    /** Enters a weight, its change, or that it went ashore; on the disk when this returns. */
    public void enter(String vesselId, WeightEntry entry) {
        @Nullable Weight weight = entry.weight();
        @Nullable MassPoint at = weight == null ? null : weight.at();
        database.inTransaction(c -> Database.insert(
                c,
                """
                INSERT INTO weight (vessel_id, name, mass_t, lcg_m, tcg_m, vcg_m, mass_u_pct, vcg_u_m, at, at_ms, who)
                VALUES (?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?)
                """,
                vesselId,
                entry.name(),
                at == null ? null : at.mass(),
                at == null ? null : at.lcg(),
                at == null ? null : at.tcg(),
                at == null ? null : at.vcg(),
                weight == null ? null : weight.massUncertaintyPct(),
                weight == null ? null : weight.vcgUncertainty(),
                entry.at().toString(),
                RoundStore.millis(entry.at()),
                entry.who()));
    }

    /** The weights aboard, by name: the latest entry of each. */
    public List<Weight> current(String vesselId) {
        return database
                .list(
                        """
                        SELECT * FROM weight w WHERE vessel_id = ?1 AND id = (
                          SELECT id FROM weight x WHERE x.vessel_id = ?1 AND x.name = w.name
                          ORDER BY at_ms DESC, id DESC LIMIT 1) ORDER BY name
                        """,
                        WeightStore::read,
                        vesselId)
                .stream()
                .flatMap(e -> Optional.ofNullable(e.weight()).stream())
                .toList();
    }

    /** Every entry of a weight, in the order of time. */
    public List<WeightEntry> history(String vesselId, String name) {
        return database.list(
                "SELECT * FROM weight WHERE vessel_id = ? AND name = ? ORDER BY at_ms, id",
                WeightStore::read,
                vesselId,
                name);
    }

    private static WeightEntry read(ResultSet row) throws SQLException {
        String name = row.getString("name");
        @Nullable Double mass = Database.number(row, "mass_t");
        @Nullable
        Weight weight = mass == null
                ? null
                : new Weight(
                        name,
                        new MassPoint(mass, row.getDouble("lcg_m"), row.getDouble("tcg_m"), row.getDouble("vcg_m")),
                        Database.number(row, "mass_u_pct"),
                        Database.number(row, "vcg_u_m"));
        return new WeightEntry(name, weight, RoundStore.time(row.getString("at")), row.getString("who"));
    }
}
