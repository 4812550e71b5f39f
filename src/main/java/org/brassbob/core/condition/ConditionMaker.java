// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import org.brassbob.core.table.HydrostaticTable;

/** From the sums of masses and moments to the ship's condition. */
final class ConditionMaker {
    private final Flotation flotation;
    private final double seaDensity;

    ConditionMaker(Flotation flotation, double seaDensity) {
        this.flotation = flotation;
        this.seaDensity = seaDensity;
    }

    /** Of the water she floats in (t/m3). */
    double seaDensity() {
        return seaDensity;
    }

    /** Whether the hydrostatic table reaches a displacement (t) in this water. */
    boolean covers(double displacement) {
        return flotation.covers(displacement, seaDensity);
    }

    /** Whether the hull reaches a displacement (t) that the table does not. */
    boolean hullCovers(double displacement) {
        return flotation.hullCovers(displacement, seaDensity);
    }

    /** The corrected GM (m) alone, for looking at many levels. */
    double gm(Totals totals) {
        double trim = 0;
        if (flotation.readsTrim()) {
            HydrostaticTable.Entry even = flotation.evenKeel(totals.mass, seaDensity);
            trim = flotation.trim(even, totals.mass, totals.lcg(), seaDensity);
        }
        double km = flotation.trimmed(totals.mass, seaDensity, trim).kmt();
        return km - totals.kg() - totals.fsmByCode / totals.mass;
    }

    Condition of(Totals totals) {
        double displacement = totals.mass;
        double lcg = totals.lcg();
        HydrostaticTable.Entry even = flotation.evenKeel(displacement, seaDensity);
        double trim = flotation.trim(even, displacement, lcg, seaDensity);
        HydrostaticTable.Entry entry = flotation.trimmed(displacement, seaDensity, trim);
        double kg = totals.kg();
        double gmSolid = entry.kmt() - kg;
        double fsAsSounded = totals.fsmAsSounded / displacement;
        double fsByCode = totals.fsmByCode / displacement;
        double gm = gmSolid - fsByCode;
        double bm = entry.kmt() - entry.kb();
        double aft = flotation.draughtAft(entry, trim);
        return new Condition(
                displacement,
                lcg,
                totals.tcg(),
                kg,
                entry.kmt(),
                gmSolid,
                fsAsSounded,
                gmSolid - fsAsSounded,
                fsByCode,
                gm,
                kg + fsByCode,
                aft,
                aft - trim,
                aft - trim / 2,
                trim,
                Heel.listDeg(totals.tcg(), gm, bm),
                Heel.lollDeg(gm, bm));
    }
}
