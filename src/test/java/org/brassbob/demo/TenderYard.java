// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Writes the vessel folder of the demo tender "Fenland Dabchick", a small harbour tanker that has tables only: no shapes, no cross
 * curves, and a limit of KG in place of one of GM. Her tanks are boxes, a wedge and cylinders, so that every cell is a formula's.
 */
public final class TenderYard {
    private static final String TANK_HEADER =
            "tank,name,liquid,walk,gauge,pipe_x_m,pipe_y_m,pipe_foot_z_m,pipe_length_m,"
                    + "capacity_m3,fill_limit_pct,residue_m3,use,pair,rate_m3_h,space";
    private static final double[] CARGO_TRIMS = {-0.5, 0, 0.5, 1};
    private static final double[] CARGO_HEELS = {-2, 0, 2};
    private static final double[] BALLAST_TRIMS = {-0.5, 0, 0.5, 1};
    private static final double STEP = 0.05;
    private static final double GM_KEPT = 1.2;

    private final Map<String, PlainTank> tanks = new LinkedHashMap<>();
    private final Path folder;

    private TenderYard(Path folder) {
        this.folder = folder;
        tanks.put("fp", new WedgeTank(Range.of(32, 34), Range.of(0.3, 3.4), 3.2));
        addPair("c1", 20, 28);
        tanks.put("cof", new BoxTank(Range.of(19.6, 20), Range.of(-3.6, 3.6), Range.of(0.9, 3.5)));
        addPair("c2", 11.6, 19.6);
        tanks.put("db-c", new BoxTank(Range.of(12, 26), Range.of(-2, 2), Range.of(0, 0.8)));
        tanks.put("fo-s", new LyingCylinder(Range.of(6, 10), new Point(2.6, 2.3), 0.75));
        tanks.put("fo-p", new LyingCylinder(Range.of(6, 10), new Point(-2.6, 2.3), 0.75));
        tanks.put("fw", new StandingCylinder(4.5, -1.4, Range.of(1.1, 3.3), 1));
    }

    private void addPair(String id, double aft, double forward) {
        tanks.put(id + "-s", new BoxTank(Range.of(aft, forward), Range.of(0, 3.6), Range.of(0.9, 3.5)));
        tanks.put(id + "-p", new BoxTank(Range.of(aft, forward), Range.of(-3.6, 0), Range.of(0.9, 3.5)));
    }

    /** Writes the folder named by the first argument. */
    public static void main(String[] args) {
        new TenderYard(Path.of(args[0])).write();
    }

    private void write() {
        CsvOut.write(folder.resolve("vessel.json"), TenderPapers.VESSEL);
        CsvOut.of(TenderPapers.LIQUIDS).to(folder.resolve("liquids.csv"));
        CsvOut.of(TenderPapers.WEIGHTS).to(folder.resolve("weights.csv"));
        TenderHull.hydrostatics().to(folder.resolve("hydrostatics.csv"));
        limit().to(folder.resolve("kg-limit-harbour.csv"));
        CsvOut schedule = CsvOut.table(TANK_HEADER);
        TenderPapers.TANKS.strip().lines().forEach(line -> writeTank(line.split(",", -1), schedule));
        schedule.to(folder.resolve("tanks.csv"));
    }

    private static CsvOut limit() {
        CsvOut out = CsvOut.table("displacement_t,kg_limit_m");
        for (int step = 5; step <= 15; step++) {
            double draught = 0.2 * step;
            out.numbers(TenderHull.displacement(draught), TenderHull.km(draught) - GM_KEPT);
        }
        return out;
    }

    /** A line of the schedule: id, name, liquid, gauge, pipe x, y and upper end, then what tanks.csv has from fill limit on. */
    private void writeTank(String[] line, CsvOut schedule) {
        String id = line[0];
        PlainTank tank = tanks.get(id);
        if (tank == null) {
            throw new IllegalStateException("no tank " + id);
        }
        double x = Double.parseDouble(line[4]);
        double y = Double.parseDouble(line[5]);
        double length = Double.parseDouble(line[6]) - tank.bottom();
        List<String> cells = new ArrayList<>(List.of(id, line[1], line[2], String.valueOf(schedule.rows()), line[3]));
        for (double value : new double[] {x, y, tank.bottom(), length, tank.capacity()}) {
            cells.add(CsvOut.number(value));
        }
        cells.addAll(List.of(line).subList(7, line.length));
        schedule.row(cells.toArray(String[]::new));
        volumes(tank).to(folder.resolve("tanks/" + id + ".volume.csv"));
        soundings(id, tank, new Surface(x, y, tank.bottom(), 0, 0), length)
                .to(folder.resolve("tanks/" + id + ".sounding.csv"));
    }

    private static CsvOut volumes(PlainTank tank) {
        CsvOut out = CsvOut.table("volume_m3,lcg_m,tcg_m,vcg_m,fs_m4");
        for (double height : heights(tank.top() - tank.bottom())) {
            Contents held = tank.upTo(tank.bottom() + height);
            out.numbers(held.volume(), held.lcg(), held.tcg(), held.vcg(), held.secondMoment());
        }
        return out;
    }

    private static CsvOut soundings(String id, PlainTank tank, Surface foot, double length) {
        if (tank instanceof BoxTank box && id.startsWith("c") && !id.equals("cof")) {
            return ullages(box, foot, length);
        }
        if (tank instanceof BoxTank box && id.equals("db-c")) {
            return trimmed(box, foot);
        }
        CsvOut out = CsvOut.table("sounding_m,volume_m3");
        for (double height : heights(tank.top() - tank.bottom())) {
            out.numbers(height, tank.upTo(tank.bottom() + height).volume());
        }
        return out;
    }

    private static CsvOut ullages(BoxTank box, Surface foot, double length) {
        CsvOut out = CsvOut.table("ullage_m,trim_m,heel_deg,volume_m3");
        for (double ullage : heights(length)) {
            for (double trim : CARGO_TRIMS) {
                for (double heel : CARGO_HEELS) {
                    double slope = Math.tan(Math.toRadians(heel));
                    double volume = box.below(surface(foot, length - ullage, trim, slope));
                    out.numbers(ullage, trim, heel, volume);
                }
            }
        }
        return out;
    }

    private static CsvOut trimmed(BoxTank box, Surface foot) {
        CsvOut out = CsvOut.table("sounding_m,trim_m,volume_m3");
        double full = box.top() - box.bottom();
        for (double sounding : heights(full + 0.5)) {
            for (double trim : BALLAST_TRIMS) {
                out.numbers(sounding, trim, box.below(surface(foot, sounding, trim, 0)));
            }
        }
        return out;
    }

    private static Surface surface(Surface foot, double height, double trim, double slopeY) {
        double slopeX = trim == 0 ? 0 : -trim / TenderHull.LENGTH;
        return new Surface(foot.x(), foot.y(), foot.z() + height, slopeX, slopeY);
    }

    /** From 0 to the whole height in even steps, and the whole height itself. */
    private static List<Double> heights(double whole) {
        List<Double> heights = new ArrayList<>();
        for (int i = 0; i * STEP < whole - STEP / 4; i++) {
            heights.add(i * STEP);
        }
        heights.add(whole);
        return heights;
    }
}
