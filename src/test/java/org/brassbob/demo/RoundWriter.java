// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.OffsetDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.brassbob.core.condition.Assessor;
import org.brassbob.core.condition.Condition;
import org.brassbob.core.contents.TankShapes;
import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.round.Reading;
import org.brassbob.core.round.ReadingKind;
import org.brassbob.core.round.SoundingRound;
import org.brassbob.core.table.Origin;
import org.brassbob.core.vessel.Gauge;
import org.brassbob.core.vessel.Pipe;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Vessel;
import org.jspecify.annotations.Nullable;

/**
 * Writes a round as the tape would have shown it: the ship floats as her contents make her, and every reading is where the surface of
 * that volume, at that trim and list, cuts the pipe.
 */
final class RoundWriter {
    private static final int MINUTES_A_TANK = 3;

    private final Vessel vessel;
    private final TankShapes shapes;

    RoundWriter(Vessel vessel) {
        this.vessel = vessel;
        this.shapes = TankShapes.of(vessel);
    }

    void write(RoundPlan plan, Path folder) throws IOException {
        Condition afloat = Assessor.of(vessel).assess(asVolumes(plan)).condition();
        double trim = Math.rint(afloat.trim() * 100) / 100;
        double list = Math.rint(afloat.listDeg() * 10) / 10;
        StringBuilder csv = new StringBuilder("# Demo data, invented; not a real ship\n");
        if (plan.byDraughts()) {
            csv.append(String.format(Locale.ROOT, "#: draught_aft_m=%.2f%n", atMark(afloat, 0)));
            csv.append(String.format(Locale.ROOT, "#: draught_forward_m=%.2f%n", atMark(afloat, 1)));
        } else {
            csv.append(String.format(Locale.ROOT, "#: trim_m=%.2f%n", trim));
        }
        csv.append(String.format(Locale.ROOT, "#: list_deg=%.1f%n#: sea_density_t_m3=%s%n", list, plan.sea()));
        csv.append("tank,at,kind,value,temp_c,density_t_m3,water_m,note\n");
        OffsetDateTime at = OffsetDateTime.parse(plan.start());
        for (Tank tank : vessel.tanks()) {
            csv.append(row(tank, at, plan.of(tank.id()), trim, list)).append('\n');
            at = at.plusMinutes(MINUTES_A_TANK);
        }
        Files.createDirectories(folder);
        Files.writeString(folder.resolve(plan.file()), csv.toString());
    }

    private double atMark(Condition afloat, int mark) {
        double x = vessel.draughtMarks().get(mark).x();
        return afloat.draughtAft() - afloat.trim() * x / vessel.particulars().lbp();
    }

    private SoundingRound asVolumes(RoundPlan plan) {
        OffsetDateTime at = OffsetDateTime.parse(plan.start());
        List<Reading> readings = new ArrayList<>();
        for (Tank tank : vessel.tanks()) {
            double volume = plan.of(tank.id()).percent() * tank.capacity() / 100;
            readings.add(new Reading(
                    tank.id(), at, ReadingKind.VOLUME, volume, null, null, null, "", Origin.computed("plan")));
        }
        SoundingRound.Observed observed =
                new SoundingRound.Observed(null, null, Double.parseDouble(plan.sea()), null, null);
        return new SoundingRound(plan.file(), observed, null, readings);
    }

    private String row(Tank tank, OffsetDateTime at, RoundPlan.Entry entry, double trim, double list) {
        String kind = entry.kind();
        String value = "";
        if (kind.equals("gauge")) {
            kind = tank.gauge() == Gauge.REMOTE ? "volume" : tank.gauge().code();
            value = gauge(tank, entry.percent() * tank.capacity() / 100, trim, list);
        } else if (kind.equals("percent")) {
            value = HeronPapers.plain(entry.percent());
        }
        return String.join(
                ",", tank.id(), at.toString(), kind, value, entry.temperature(), "", entry.water(), entry.note());
    }

    private String gauge(Tank tank, double volume, double trim, double list) {
        @Nullable Pipe pipe = tank.pipe();
        if (tank.gauge() == Gauge.REMOTE || pipe == null) {
            return String.format(Locale.ROOT, "%.2f", volume);
        }
        NetShape shape = shapes.net(tank.id()).orElseThrow();
        Attitude attitude = Attitude.of(trim, vessel.particulars().lbp(), list);
        double surface = attitude.heightAt(shape.heightFor(attitude, volume), pipe.x(), pipe.y());
        double sounding = Math.max(0, surface - pipe.footZ());
        double reading = tank.gauge() == Gauge.ULLAGE ? pipe.length() - sounding : sounding;
        return String.format(Locale.ROOT, "%.3f", reading);
    }
}
