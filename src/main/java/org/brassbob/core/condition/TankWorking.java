// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.contents.LiquidState;
import org.brassbob.core.contents.VolumeWorking;
import org.brassbob.core.round.Reading;
import org.brassbob.core.table.VolumeTable;
import org.brassbob.core.vessel.Policy.MassIn;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Use;
import org.brassbob.core.working.Step;
import org.brassbob.core.working.Step.Input;
import org.brassbob.core.working.Working;

/** Hands over how the figures of a tank came about. */
final class TankWorking {
    private static final List<String> ALL = List.of("lcg_m", "tcg_m", "vcg_m", "second_moment_m4");
    private static final List<String> LIQUID =
            List.of("liquid_lcg_m", "liquid_tcg_m", "liquid_vcg_m", "second_moment_m4");
    private static final List<String> WATER =
            List.of("water_lcg_m", "water_tcg_m", "water_vcg_m", "water_second_moment_m4");

    private final MassIn massIn;
    private final Totals totals;
    private final double trim;
    private final double listDeg;
    private final Working working;

    TankWorking(MassIn massIn, Totals totals, double trim, double listDeg, Working working) {
        this.massIn = massIn;
        this.totals = totals;
        this.trim = trim;
        this.listDeg = listDeg;
        this.working = working;
    }

    void record(TankLoad load) {
        recordVolume(load);
        recordDensity(load);
        if (load.water() > 0) {
            recordWithWater(load);
        } else {
            contents(load, "volume_m3", load.volume(), load.contents(), ALL);
            step(load, "mass_t", "volume·density", load.mass(), volume(load), density(load));
        }
        recordSurface(load);
    }

    private void recordVolume(TankLoad load) {
        Tank tank = load.tank();
        Reading reading = load.reading();
        if (reading == null) {
            String rule = tank.isVoid()
                    ? "no reading: a void is taken as dry"
                    : "no reading: the level that gives the lowest corrected GM";
            step(load, "volume_m3", rule, load.volume());
        } else {
            double density = load.liquid().density();
            Step read = VolumeWorking.volume(load.model(), reading, load.volume(), density, trim, listDeg);
            working.step(load.range().isInterval() ? lessFavourable(read) : read);
            step(
                    load,
                    "age_h",
                    "from the reading to the time asked for",
                    load.ageHours(),
                    Input.from(
                            "at_epoch_s",
                            (double) reading.at().toEpochSecond(),
                            reading.origin().at(0)));
        }
        Input capacity =
                Input.from("capacity_m3", tank.capacity(), tank.origin().at(0));
        step(load, "fill_pct", "100·volume / capacity", 100 * load.volume() / tank.capacity(), volume(load), capacity);
    }

    private static Step lessFavourable(Step read) {
        return new Step(
                read.figure(),
                read.rule() + "; the pipe reads dry or brim-full: the less favourable end",
                read.value(),
                read.inputs());
    }

    private void recordDensity(TankLoad load) {
        Tank tank = load.tank();
        Reading reading = load.reading();
        List<Input> inputs = new ArrayList<>();
        if (reading != null && reading.density() != null) {
            inputs.add(Input.from(
                    "density_t_m3", reading.density(), reading.origin().at(0)));
        } else {
            String source = "liquids.csv: " + tank.liquid().id();
            inputs.add(Input.from("density_t_m3", tank.liquid().density(), source));
        }
        if (reading != null && reading.temperatureC() != null) {
            inputs.add(Input.from(
                    "temp_c", reading.temperatureC(), reading.origin().at(0)));
        }
        if (massIn == MassIn.AIR) {
            inputs.add(Input.from("air_buoyancy_t_m3", LiquidState.AIR_BUOYANCY, "API MPMS 11.1"));
        }
        String rule = "expansion: " + tank.liquid().expansion().code() + "; mass in " + massIn.code();
        working.step(new Step(tank.id() + "/density_t_m3", rule, load.liquid().density(), inputs));
    }

    private void recordWithWater(TankLoad load) {
        Input water = figure(load, "free_water_m3", load.water());
        Input waterDensity = Input.from("sea_density_t_m3", load.waterDensity(), "the water she floats in");
        step(load, "free_water_m3", "from the depth of water found", load.water());
        contents(load, "volume_m3", load.volume(), load.contents(), LIQUID);
        VolumeTable.Entry under = load.model().contents(load.water(), trim);
        contents(load, "free_water_m3", load.water(), under, WATER);
        String mass = "volume·density + free water·(its density − density)";
        step(load, "mass_t", mass, load.mass(), volume(load), density(load), water, waterDensity);
        String centre = "liquid in the whole volume, and the difference of the free water, by moments";
        step(
                load,
                "lcg_m",
                centre,
                load.lcg(),
                together(load, 0, load.contents().lcg(), under.lcg()));
        step(
                load,
                "tcg_m",
                centre,
                load.tcg(),
                together(load, 1, load.contents().tcg(), under.tcg()));
        step(
                load,
                "vcg_m",
                centre,
                load.vcg(),
                together(load, 2, load.contents().vcg(), under.vcg()));
    }

    private Input[] together(TankLoad load, int column, double liquid, double water) {
        return new Input[] {
            volume(load),
            density(load),
            figure(load, LIQUID.get(column), liquid),
            figure(load, "free_water_m3", load.water()),
            Input.from("sea_density_t_m3", load.waterDensity(), "the water she floats in"),
            figure(load, WATER.get(column), water)
        };
    }

    private void contents(TankLoad load, String volumeKey, double volume, VolumeTable.Entry entry, List<String> keys) {
        VolumeWorking.contents(load.model(), volumeKey, volume, trim, entry, keys)
                .forEach(working::step);
    }

    private void recordSurface(TankLoad load) {
        double own = load.contents().secondMoment();
        double byCode = load.model().secondMomentByCode(own, trim);
        String id = load.tank().id();
        step(
                load,
                "second_moment_by_code_m4",
                codeRule(load),
                byCode,
                figure(load, "second_moment_m4", own),
                Input.from(
                        "residue_m3",
                        load.tank().residue(),
                        load.tank().origin().at(0)),
                Input.from(
                        "fill_limit_pct",
                        load.tank().fillLimitPct(),
                        load.tank().origin().at(0)));
        surface(load, "fsm_as_sounded_tm", load.fsmAsSounded(), figure(load, "second_moment_m4", own));
        surface(load, "fsm_by_code_tm", load.fsmByCode(), figure(load, "second_moment_by_code_m4", byCode));
        Input moment = Input.figure(id, "fsm_by_code_tm", load.fsmByCode());
        step(
                load,
                "gm_loss_m",
                "free-surface moment by the code / displacement",
                load.fsmByCode() / totals.mass,
                moment,
                Input.figure("ship", "displacement_t", totals.mass));
        step(
                load,
                "share_pct",
                "100·free-surface moment by the code / that of all tanks",
                totals.fsmByCode > 0 ? 100 * load.fsmByCode() / totals.fsmByCode : 0,
                moment,
                Input.figure("ship", "fsm_by_code_tm", totals.fsmByCode));
    }

    private void surface(TankLoad load, String key, double value, Input secondMoment) {
        List<Input> inputs = new ArrayList<>();
        if (load.hasSurface()) {
            inputs.add(density(load));
            inputs.add(secondMoment);
        }
        boolean twoSurfaces =
                load.water() > 0 && load.waterDensity() > load.liquid().density();
        if (twoSurfaces) {
            double under = load.model().contents(load.water(), trim).secondMoment();
            inputs.add(figure(load, "water_second_moment_m4", under));
            inputs.add(Input.from("sea_density_t_m3", load.waterDensity(), "the water she floats in"));
            inputs.add(density(load));
        }
        String rule = load.hasSurface()
                ? "density·second moment"
                : "none: up to the residue, or 98 % and over (2008 IS Code part B 3.1.2)";
        String withWater =
                load.water() > 0 ? "; under it the interface to free water, by the difference of densities" : "";
        working.step(new Step(load.tank().id() + "/" + key, rule + withWater, value, inputs));
    }

    private static String codeRule(TankLoad load) {
        return load.tank().use() == Use.FIXED
                ? "fixed level: at its level (2008 IS Code part B 3.1.3)"
                : "consumable: the greatest between residue and the lesser of fill limit and 98 %, not less than at its level"
                        + " (2008 IS Code part B 3.1.3)";
    }

    private static Input volume(TankLoad load) {
        return figure(load, "volume_m3", load.volume());
    }

    private static Input density(TankLoad load) {
        return figure(load, "density_t_m3", load.liquid().density());
    }

    private static Input figure(TankLoad load, String key, double value) {
        return Input.figure(load.tank().id(), key, value);
    }

    private void step(TankLoad load, String key, String rule, double value, Input... inputs) {
        working.step(Step.of(load.tank().id(), key, rule, value, inputs));
    }
}
