// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.contents.RowsRead;
import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.core.working.Step.Input;
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

    /** Displacement and KM of the rows read at a displacement (t, in the table's water) and trim (m), and where they stand. */
    List<Input> rowsAt(double tableDisplacement, double trim) {
        List<Input> inputs = new ArrayList<>();
        for (int set : RowsRead.about(table.trims(), trim)) {
            HydrostaticTable.Rows rows = table.rows(set);
            for (int row : RowsRead.about(rows.displacements(), tableDisplacement)) {
                String source = rows.origin().at(row);
                inputs.add(Input.from("displacement_t", rows.displacements().value(row), source));
                inputs.add(Input.from("kmt_m", rows.entries().get(row).kmt(), source));
            }
        }
        return inputs;
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
