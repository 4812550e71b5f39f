// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.working.Step;
import org.brassbob.core.working.Step.Input;
import org.brassbob.core.working.Working;

/** Hands over the steps of the ship's condition, with the figures that {@link ConditionMaker} worked out. */
final class ConditionWorking {
    private static final String SHIP = "ship";

    private final Flotation flotation;
    private final double seaDensity;
    private final Working working;

    ConditionWorking(Flotation flotation, double seaDensity, Working working) {
        this.flotation = flotation;
        this.seaDensity = seaDensity;
        this.working = working;
    }

    void record(Totals totals, Condition c, HydrostaticTable.Entry even, HydrostaticTable.Entry entry) {
        recordCentres(totals, c);
        recordMetacentre(totals, c);
        recordDraughts(c, even, entry);
    }

    private void recordCentres(Totals totals, Condition c) {
        Input displacement = figure("displacement_t", c.displacement());
        step("displacement_t", "light ship + weights + tanks", c.displacement());
        step("kg_m", "Σ mass·height / displacement", c.kg(), moment("vertical", totals.momentZ), displacement);
        step("lcg_m", "Σ mass·x / displacement", c.lcg(), moment("lengthwise", totals.momentX), displacement);
        step("tcg_m", "Σ mass·y / displacement", c.tcg(), moment("transverse", totals.momentY), displacement);
    }

    private void recordMetacentre(Totals totals, Condition c) {
        Input displacement = figure("displacement_t", c.displacement());
        Input solid = figure("gm_solid_m", c.gmSolid());
        Input asSounded = figure("fs_as_sounded_m", c.fsAsSounded());
        Input byCode = figure("fs_by_code_m", c.fsByCode());
        step("kmt_m", "hydrostatics at the displacement in this water", c.kmt(), displacement, rows(c));
        step("gm_solid_m", "KM − KG", c.gmSolid(), figure("kmt_m", c.kmt()), figure("kg_m", c.kg()));
        step(
                "fs_as_sounded_m",
                "Σ density·second moment / displacement, at the levels as they are",
                c.fsAsSounded(),
                moment("free surface as sounded", totals.fsmAsSounded),
                displacement);
        step(
                "fs_by_code_m",
                "Σ free-surface moment / displacement, 2008 IS Code part B 3.1",
                c.fsByCode(),
                moment("free surface by code", totals.fsmByCode),
                displacement);
        step("gm_as_sounded_m", "solid GM − free surface as sounded", c.gmAsSounded(), solid, asSounded);
        step("gm_m", "solid GM − free surface by the code", c.gm(), solid, byCode);
        step("kg_fluid_m", "KG + free surface by the code", c.kgFluid(), figure("kg_m", c.kg()), byCode);
    }

    private void recordDraughts(Condition c, HydrostaticTable.Entry even, HydrostaticTable.Entry entry) {
        String source = rows(c).source();
        Input trim = figure("trim_m", c.trim());
        Input aft = figure("draught_aft_m", c.draughtAft());
        step(
                "trim_m",
                "displacement·(LCB − LCG) / (100·MCT)",
                c.trim(),
                figure("displacement_t", c.displacement()),
                Input.from("lcb_m", even.lcb(), source),
                figure("lcg_m", c.lcg()),
                Input.from("mct_tm_per_cm", flotation.mct(even, seaDensity), source));
        step(
                "draught_aft_m",
                "draught at LCF + trim·LCF / LBP",
                c.draughtAft(),
                Input.from("draught_m", entry.draught(), source),
                Input.from("lcf_m", entry.lcf(), source),
                trim);
        step("draught_forward_m", "draught aft − trim", c.draughtForward(), aft, trim);
        step("draught_mean_m", "draught aft − trim / 2", c.draughtMean(), aft, trim);
        step(
                "list_deg",
                "tan list = TCG / corrected GM; wall-sided where that is not positive",
                c.listDeg(),
                figure("tcg_m", c.tcg()),
                figure("gm_m", c.gm()));
        step(
                "loll_deg",
                "tan loll = √(−2·GM/BM) where the corrected GM is negative",
                c.lollDeg(),
                figure("gm_m", c.gm()));
    }

    private Input rows(Condition c) {
        double entered = flotation.tableDisplacement(c.displacement(), seaDensity);
        return Input.from("table_displacement_t", entered, flotation.rowsAt(entered, c.trim()));
    }

    private static Input moment(String which, double value) {
        return Input.from("moment_tm", value, which);
    }

    private static Input figure(String key, double value) {
        return Input.figure(SHIP, key, value);
    }

    private void step(String key, String rule, double value, Input... inputs) {
        working.step(Step.of(SHIP, key, rule, value, inputs));
    }
}
