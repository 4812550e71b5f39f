// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.working.Step;
import org.brassbob.core.working.Step.Input;
import org.brassbob.core.working.Working;

/** From the sums of masses and moments to the ship's condition. */
final class ConditionMaker {
    private static final String SHIP = "ship";

    private final Flotation flotation;
    private final double seaDensity;

    ConditionMaker(Flotation flotation, double seaDensity) {
        this.flotation = flotation;
        this.seaDensity = seaDensity;
    }

    /** Whether the hydrostatic table reaches a displacement (t) in this water. */
    boolean covers(double displacement) {
        return flotation.covers(displacement, seaDensity);
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

    Condition of(Totals totals, Working working) {
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
        Condition condition = new Condition(
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
        if (working.recording()) {
            record(working, totals, condition, even, entry);
        }
        return condition;
    }

    private void record(
            Working working, Totals totals, Condition c, HydrostaticTable.Entry even, HydrostaticTable.Entry entry) {
        Input displacement = Input.figure(SHIP, "displacement_t", c.displacement());
        Input gm = Input.figure(SHIP, "gm_m", c.gm());
        step(working, "displacement_t", "light ship + weights + tanks", c.displacement());
        step(working, "kg_m", "Σ mass·height / displacement", c.kg(), moment("vertical", totals.momentZ), displacement);
        step(working, "lcg_m", "Σ mass·x / displacement", c.lcg(), moment("lengthwise", totals.momentX), displacement);
        step(working, "tcg_m", "Σ mass·y / displacement", c.tcg(), moment("transverse", totals.momentY), displacement);
        step(working, "kmt_m", "hydrostatics at the displacement in this water", c.kmt(), rows(c));
        step(
                working,
                "gm_solid_m",
                "KM − KG",
                c.gmSolid(),
                Input.figure(SHIP, "kmt_m", c.kmt()),
                Input.figure(SHIP, "kg_m", c.kg()));
        step(
                working,
                "fs_as_sounded_m",
                "Σ density·second moment / displacement, at the levels as they are",
                c.fsAsSounded(),
                moment("free surface as sounded", totals.fsmAsSounded),
                displacement);
        step(
                working,
                "fs_by_code_m",
                "Σ free-surface moment / displacement, 2008 IS Code part B 3.1",
                c.fsByCode(),
                moment("free surface by code", totals.fsmByCode),
                displacement);
        Input solid = Input.figure(SHIP, "gm_solid_m", c.gmSolid());
        step(
                working,
                "gm_as_sounded_m",
                "solid GM − free surface as sounded",
                c.gmAsSounded(),
                solid,
                Input.figure(SHIP, "fs_as_sounded_m", c.fsAsSounded()));
        step(
                working,
                "gm_m",
                "solid GM − free surface by the code",
                c.gm(),
                solid,
                Input.figure(SHIP, "fs_by_code_m", c.fsByCode()));
        step(
                working,
                "trim_m",
                "displacement·(LCB − LCG) / (100·MCT)",
                c.trim(),
                displacement,
                Input.from("lcb_m", even.lcb(), rows(c).source()),
                Input.figure(SHIP, "lcg_m", c.lcg()),
                Input.from("mct_tm_per_cm", flotation.mct(even, seaDensity), rows(c).source()));
        step(
                working,
                "draught_aft_m",
                "draught at LCF + trim·LCF / LBP",
                c.draughtAft(),
                Input.from("draught_m", entry.draught(), rows(c).source()),
                Input.from("lcf_m", entry.lcf(), rows(c).source()),
                Input.figure(SHIP, "trim_m", c.trim()));
        step(
                working,
                "draught_forward_m",
                "draught aft − trim",
                c.draughtForward(),
                Input.figure(SHIP, "draught_aft_m", c.draughtAft()),
                Input.figure(SHIP, "trim_m", c.trim()));
        step(
                working,
                "list_deg",
                "tan list = TCG / corrected GM",
                c.listDeg(),
                Input.figure(SHIP, "tcg_m", c.tcg()),
                gm);
    }

    private Input rows(Condition c) {
        double entered = flotation.tableDisplacement(c.displacement(), seaDensity);
        return Input.from("table_displacement_t", entered, flotation.rowsAt(entered, c.trim()));
    }

    private static Input moment(String which, double value) {
        return Input.from("moment_tm", value, which);
    }

    private static void step(Working working, String key, String rule, double value, Input... inputs) {
        working.step(Step.of(SHIP, key, rule, value, inputs));
    }
}
