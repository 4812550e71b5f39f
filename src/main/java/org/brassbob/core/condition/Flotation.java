// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.contents.RowsRead;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.tabulate.HullTables;
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
    /** So many rows that reading linearly between them is as good as the hull itself: KM to a tenth of a millimetre. */
    private static final int HULL_ROWS = 240;

    private final Vessel vessel;
    private final HydrostaticTable table;
    private final double tableDensity;
    private final double lbp;
    private volatile @Nullable HydrostaticTable beyond;

    /**
     * Of a ship: from her table, and from her hull where that does not reach or there is none.
     *
     * @throws IllegalArgumentException if she has neither
     */
    Flotation(Vessel vessel) {
        this.vessel = vessel;
        this.tableDensity = vessel.seaDensity();
        this.lbp = vessel.particulars().lbp();
        @Nullable HydrostaticTable given = vessel.hydrostatics();
        this.table = given != null ? given : fromHull(vessel);
    }

    private static HydrostaticTable fromHull(Vessel vessel) {
        SpaceShape hull = vessel.hull();
        if (hull == null) {
            throw new IllegalArgumentException(
                    "vessel " + vessel.id() + " has neither hydrostatic table nor hull shape");
        }
        return HullTables.hydrostatics(vessel, hull, HULL_ROWS);
    }

    /** The table to read at a displacement (t, in the table's water): the ship's own, or the hull's where that alone reaches. */
    private HydrostaticTable tableFor(double tableDisplacement) {
        return coversOnEvenKeel(table, tableDisplacement) || vessel.hull() == null ? table : beyond();
    }

    private HydrostaticTable beyond() {
        HydrostaticTable known = beyond;
        if (known == null) {
            known = fromHull(vessel);
            beyond = known;
        }
        return known;
    }

    private static boolean coversOnEvenKeel(HydrostaticTable table, double tableDisplacement) {
        return table.covers(
                tableDisplacement,
                Math.min(Math.max(0, table.trims().first()), table.trims().last()));
    }

    /** The displacement (t) that has the same volume in the table's water. */
    double tableDisplacement(double displacement, double seaDensity) {
        return displacement * tableDensity / seaDensity;
    }

    /** Whether the ship's own table reaches a displacement (t). */
    boolean covers(double displacement, double seaDensity) {
        return coversOnEvenKeel(table, tableDisplacement(displacement, seaDensity));
    }

    /** Whether the hull reaches a displacement (t) that the table does not. */
    boolean hullCovers(double displacement, double seaDensity) {
        return vessel.hull() != null && coversOnEvenKeel(beyond(), tableDisplacement(displacement, seaDensity));
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
        double entered = tableDisplacement(displacement, seaDensity);
        return tableFor(entered).at(entered, 0);
    }

    /** The entry at a displacement (t) and trim (m). */
    HydrostaticTable.Entry trimmed(double displacement, double seaDensity, double trim) {
        double entered = tableDisplacement(displacement, seaDensity);
        return tableFor(entered).at(entered, trim);
    }

    /** Displacement and KM of the rows read at a displacement (t, in the table's water) and trim (m), and where they stand. */
    List<Input> rowsAt(double tableDisplacement, double trim) {
        List<Input> inputs = new ArrayList<>();
        HydrostaticTable read = tableFor(tableDisplacement);
        for (int set : RowsRead.about(read.trims(), trim)) {
            HydrostaticTable.Rows rows = read.rows(set);
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
