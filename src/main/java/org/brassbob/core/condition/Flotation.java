// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.vessel.Vessel;
import org.jspecify.annotations.Nullable;

/**
 * How the ship floats at a displacement and centre of gravity, from her hydrostatic table.
 *
 * <p>The table is made for water of one density. In other water the same displacement has another volume: the table is entered with
 * {@code Δ·ρ table/ρ}; draughts, LCB, LCF, KB and KM belong to that volume and hold, MCT goes with the density of the water. Trim is
 * {@code Δ·(LCB − LCG)/(100·MCT)}, from the even-keel entry; where the table has trims, KM, LCF and the draught are then taken at that
 * trim. Draughts at the perpendiculars are laid off from the draught at the centre of flotation.
 */
final class Flotation {
    private final HydrostaticTable table;
    private final double tableDensity;
    private final double lbp;

    /**
     * Of a ship.
     *
     * @throws IllegalArgumentException if she has no hydrostatic table
     */
    Flotation(Vessel vessel) {
        @Nullable HydrostaticTable given = vessel.hydrostatics();
        if (given == null) {
            throw new IllegalArgumentException("vessel " + vessel.id() + " has no hydrostatic table");
        }
        this.table = given;
        this.tableDensity = vessel.seaDensity();
        this.lbp = vessel.particulars().lbp();
    }

    /** The displacement (t) that has the same volume in the table's water. */
    double tableDisplacement(double displacement, double seaDensity) {
        return displacement * tableDensity / seaDensity;
    }

    boolean covers(double displacement, double seaDensity) {
        return table.covers(
                tableDisplacement(displacement, seaDensity),
                Math.min(Math.max(0, table.trims().first()), table.trims().last()));
    }

    /** Whether the table has rows for several trims. */
    boolean readsTrim() {
        return table.trims().size() > 1;
    }

    boolean coversTrim(double trim) {
        return !readsTrim() || table.trims().covers(trim);
    }

    /** The entry at a displacement (t) on even keel. */
    HydrostaticTable.Entry evenKeel(double displacement, double seaDensity) {
        return table.at(tableDisplacement(displacement, seaDensity), 0);
    }

    /** The entry at a displacement (t) and trim (m). */
    HydrostaticTable.Entry trimmed(double displacement, double seaDensity, double trim) {
        return table.at(tableDisplacement(displacement, seaDensity), trim);
    }

    /** The files and lines of the rows read at a displacement (t, in the table's water) and trim (m). */
    String rowsAt(double tableDisplacement, double trim) {
        HydrostaticTable.Rows rows = table.rows(table.trims().cell(trim));
        int row = rows.displacements().cell(tableDisplacement);
        return rows.origin().at(row) + " and the row after it";
    }

    /** MCT (t·m/cm) in water of a density. */
    double mct(HydrostaticTable.Entry entry, double seaDensity) {
        return entry.mct() * seaDensity / tableDensity;
    }

    /** Trim (m) from the even-keel entry. */
    double trim(HydrostaticTable.Entry evenKeel, double displacement, double lcg, double seaDensity) {
        return displacement * (evenKeel.lcb() - lcg) / (100 * mct(evenKeel, seaDensity));
    }

    /** Draught at the aft perpendicular (m). */
    double draughtAft(HydrostaticTable.Entry entry, double trim) {
        return entry.draught() + trim * entry.lcf() / lbp;
    }
}
