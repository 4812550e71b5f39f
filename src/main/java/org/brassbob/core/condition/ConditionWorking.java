// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.vessel.MassPoint;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.core.vessel.Weight;
import org.brassbob.core.working.Step;
import org.brassbob.core.working.Step.Input;
import org.brassbob.core.working.Working;

/** Hands over how the figures of the ship came about. */
final class ConditionWorking {
    private static final String SHIP = "ship";

    private final Vessel vessel;
    private final Flotation flotation;
    private final double seaDensity;
    private final Condition c;
    private final Working working;

    ConditionWorking(Vessel vessel, Flotation flotation, double seaDensity, Condition condition, Working working) {
        this.vessel = vessel;
        this.flotation = flotation;
        this.seaDensity = seaDensity;
        this.c = condition;
        this.working = working;
    }

    void record(Totals totals, List<TankLoad> loads) {
        recordSums(totals, loads);
        recordCentres(totals);
        recordStability();
        recordFlotation();
        recordHeel();
    }

    private void recordSums(Totals totals, List<TankLoad> loads) {
        step("displacement_t", "light ship + weights + tanks", totals.mass, masses(loads));
        step("moment_x_tm", "Σ mass·x", totals.momentX, moments(loads, "lcg_m"));
        step("moment_y_tm", "Σ mass·y", totals.momentY, moments(loads, "tcg_m"));
        step("moment_z_tm", "Σ mass·height", totals.momentZ, moments(loads, "vcg_m"));
        List<Input> asSounded = new ArrayList<>();
        List<Input> byCode = new ArrayList<>();
        for (TankLoad load : loads) {
            asSounded.add(Input.figure(load.tank().id(), "fsm_as_sounded_tm", load.fsmAsSounded()));
            byCode.add(Input.figure(load.tank().id(), "fsm_by_code_tm", load.fsmByCode()));
        }
        step("fsm_as_sounded_tm", "Σ of the tanks", totals.fsmAsSounded, asSounded);
        step("fsm_by_code_tm", "Σ of the tanks", totals.fsmByCode, byCode);
    }

    private List<Input> masses(List<TankLoad> loads) {
        List<Input> inputs = new ArrayList<>();
        inputs.add(Input.from("mass_t", vessel.lightship().mass(), "vessel.json: lightship"));
        for (Weight weight : vessel.weights()) {
            inputs.add(Input.from("mass_t", weight.at().mass(), "weights.csv: " + weight.name()));
        }
        for (TankLoad load : loads) {
            inputs.add(Input.figure(load.tank().id(), "mass_t", load.mass()));
        }
        return inputs;
    }

    /** Masses and centres in turn. */
    private List<Input> moments(List<TankLoad> loads, String centre) {
        List<Input> inputs = new ArrayList<>();
        addMoment(inputs, vessel.lightship(), centre, "vessel.json: lightship");
        for (Weight weight : vessel.weights()) {
            addMoment(inputs, weight.at(), centre, "weights.csv: " + weight.name());
        }
        for (TankLoad load : loads) {
            String id = load.tank().id();
            inputs.add(Input.figure(id, "mass_t", load.mass()));
            inputs.add(Input.figure(id, centre, pick(centre, load.lcg(), load.tcg(), load.vcg())));
        }
        return inputs;
    }

    private static void addMoment(List<Input> inputs, MassPoint at, String centre, String source) {
        inputs.add(Input.from("mass_t", at.mass(), source));
        inputs.add(Input.from(centre, pick(centre, at.lcg(), at.tcg(), at.vcg()), source));
    }

    private static double pick(String centre, double lcg, double tcg, double vcg) {
        return switch (centre) {
            case "lcg_m" -> lcg;
            case "tcg_m" -> tcg;
            default -> vcg;
        };
    }

    private void recordCentres(Totals totals) {
        Input displacement = figure("displacement_t", c.displacement());
        step("lcg_m", "moment / displacement", c.lcg(), figure("moment_x_tm", totals.momentX), displacement);
        step("tcg_m", "moment / displacement", c.tcg(), figure("moment_y_tm", totals.momentY), displacement);
        step("kg_m", "moment / displacement", c.kg(), figure("moment_z_tm", totals.momentZ), displacement);
        step(
                "fs_as_sounded_m",
                "Σ density·second moment / displacement, at the levels as they are",
                c.fsAsSounded(),
                figure("fsm_as_sounded_tm", totals.fsmAsSounded),
                displacement);
        step(
                "fs_by_code_m",
                "Σ free-surface moment / displacement, 2008 IS Code part B 3.1",
                c.fsByCode(),
                figure("fsm_by_code_tm", totals.fsmByCode),
                displacement);
    }

    private void recordStability() {
        Input kg = figure("kg_m", c.kg());
        Input solid = figure("gm_solid_m", c.gmSolid());
        Input byCode = figure("fs_by_code_m", c.fsByCode());
        step("kmt_m", "hydrostatics at the displacement in this water, read linearly", c.kmt(), tableRows());
        step("gm_solid_m", "KM − KG", c.gmSolid(), figure("kmt_m", c.kmt()), kg);
        step(
                "gm_as_sounded_m",
                "solid GM − free surface as sounded",
                c.gmAsSounded(),
                solid,
                figure("fs_as_sounded_m", c.fsAsSounded()));
        step("gm_m", "solid GM − free surface by the code", c.gm(), solid, byCode);
        step("kg_fluid_m", "KG + free surface by the code", c.kgFluid(), kg, byCode);
    }

    /** The displacement the table is entered with, and the KM of the rows about it. */
    private List<Input> tableRows() {
        double entered = flotation.tableDisplacement(c.displacement(), seaDensity);
        List<Input> inputs = new ArrayList<>();
        inputs.add(Input.from("table_displacement_t", entered, "displacement in water of the table's density"));
        inputs.addAll(flotation.rowsAt(entered, c.trim()));
        return inputs;
    }

    private void recordFlotation() {
        HydrostaticTable.Entry even = flotation.evenKeel(c.displacement(), seaDensity);
        HydrostaticTable.Entry entry = flotation.trimmed(c.displacement(), seaDensity, c.trim());
        Input trim = figure("trim_m", c.trim());
        Input aft = figure("draught_aft_m", c.draughtAft());
        step(
                "trim_m",
                "displacement·(LCB − LCG) / (100·MCT)",
                c.trim(),
                figure("displacement_t", c.displacement()),
                Input.from("lcb_m", even.lcb(), "hydrostatics, even keel"),
                figure("lcg_m", c.lcg()),
                Input.from("mct_tm_per_cm", flotation.mct(even, seaDensity), "hydrostatics, in this water"));
        step(
                "draught_aft_m",
                "draught at LCF + trim·LCF / LBP",
                c.draughtAft(),
                Input.from("draught_m", entry.draught(), "hydrostatics"),
                trim,
                Input.from("lcf_m", entry.lcf(), "hydrostatics"),
                Input.from("lbp_m", vessel.particulars().lbp(), "vessel.json"));
        step("draught_forward_m", "draught aft − trim", c.draughtForward(), aft, trim);
        step("draught_mean_m", "draught aft − half the trim", c.draughtMean(), aft, trim);
    }

    private void recordHeel() {
        HydrostaticTable.Entry entry = flotation.trimmed(c.displacement(), seaDensity, c.trim());
        Input gm = figure("gm_m", c.gm());
        Input tcg = figure("tcg_m", c.tcg());
        Input bm = Input.from("bm_m", entry.kmt() - entry.kb(), "KM − KB of the hydrostatics");
        if (c.gm() > 0) {
            step("list_deg", "tan list = TCG / corrected GM", c.listDeg(), tcg, gm);
        } else {
            step("list_deg", "TCG·cos φ = (GM + ½·BM·tan²φ)·sin φ, wall-sided", c.listDeg(), tcg, gm, bm);
        }
        step("loll_deg", "tan φ = √(−2·GM/BM) where GM is negative, wall-sided", c.lollDeg(), gm, bm);
    }

    private static Input figure(String key, double value) {
        return Input.figure(SHIP, key, value);
    }

    private void step(String key, String rule, double value, Input... inputs) {
        step(key, rule, value, List.of(inputs));
    }

    private void step(String key, String rule, double value, List<Input> inputs) {
        working.step(new Step(SHIP + "/" + key, rule, value, inputs));
    }
}
