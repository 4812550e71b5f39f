// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/**
 * Writes the vessel folder of the demo coaster "Saltmarsh Heron": everything but the tables that are worked out from her shapes, and
 * the rounds.
 */
public final class HeronYard {
    private static final String TANK_HEADER =
            "tank,name,liquid,may_hold,walk,gauge,pipe_x_m,pipe_y_m,pipe_foot_z_m,pipe_length_m,"
                    + "capacity_m3,fill_limit_pct,residue_m3,use,pair,encloses,steel_pct,rate_m3_h,space";

    /** The thickness of the striking plate under the pipe (m). */
    private static final double STRIKING_PLATE = 0.005;

    private final Map<String, Space> spaces = HeronSpaces.all();
    private final Path folder;

    private HeronYard(Path folder) {
        this.folder = folder;
    }

    /** Writes the folder named by the first argument. */
    public static void main(String[] args) {
        new HeronYard(Path.of(args[0])).write();
    }

    private void write() {
        CsvOut.write(folder.resolve("vessel.json"), HeronPapers.VESSEL);
        CsvOut.of(HeronSchedule.LIQUIDS).to(folder.resolve("liquids.csv"));
        CsvOut.of(HeronPapers.WEIGHTS).to(folder.resolve("weights.csv"));
        shape(HeronLines.hull()).to(folder.resolve("hull.shape.csv"));
        tanks().to(folder.resolve("tanks.csv"));
        spaces.forEach((id, space) -> shape(space).to(folder.resolve("tanks/" + id + ".shape.csv")));
    }

    private static CsvOut shape(Space space) {
        CsvOut out = CsvOut.table("x_m,loop,y_m,z_m");
        for (Station station : space.stations()) {
            int number = station.firstNumber();
            for (List<Point> loop : station.loops()) {
                for (Point point : loop) {
                    out.row(
                            CsvOut.number(station.x()),
                            String.valueOf(number),
                            CsvOut.number(point.y()),
                            CsvOut.number(point.z()));
                }
                number++;
            }
        }
        return out;
    }

    private CsvOut tanks() {
        List<Map<String, String>> rows = rows(HeronSchedule.TANKS);
        CsvOut out = CsvOut.table(TANK_HEADER);
        for (int i = 0; i < rows.size(); i++) {
            Map<String, String> row = rows.get(i);
            Space space = space(row.getOrDefault("tank", ""));
            row.put("walk", String.valueOf(i + 1));
            row.put("capacity_m3", String.format(Locale.ROOT, "%.2f", capacity(row, space)));
            addPipe(row, space);
            out.row(Arrays.stream(TANK_HEADER.split(",", -1))
                    .map(column -> row.getOrDefault(column, ""))
                    .toArray(String[]::new));
        }
        return out;
    }

    private double capacity(Map<String, String> row, Space space) {
        double gross = space.volume();
        String inner = row.getOrDefault("encloses", "");
        if (!inner.isEmpty()) {
            gross -= space(inner).volume();
        }
        return gross * (1 - Double.parseDouble(row.getOrDefault("steel_pct", "0")) / 100);
    }

    private static void addPipe(Map<String, String> row, Space space) {
        String top = row.getOrDefault("pipe_top_z_m", "");
        if (top.isEmpty()) {
            return;
        }
        double x = Double.parseDouble(row.getOrDefault("pipe_x_m", ""));
        double y = Double.parseDouble(row.getOrDefault("pipe_y_m", ""));
        double foot = Math.ceil((space.floorAt(x, y) + STRIKING_PLATE) * 1000 - 1e-6) / 1000;
        row.put("pipe_foot_z_m", CsvOut.number(foot));
        row.put("pipe_length_m", CsvOut.number(Double.parseDouble(top) - foot));
    }

    private Space space(String id) {
        Space space = spaces.get(id);
        if (space == null) {
            throw new IllegalStateException("no space for " + id);
        }
        return space;
    }

    private static List<Map<String, String>> rows(String table) {
        List<String> lines = table.strip().lines().toList();
        List<String> columns = List.of(lines.get(0).split(",", -1));
        List<Map<String, String>> rows = new ArrayList<>();
        for (String line : lines.subList(1, lines.size())) {
            String[] cells = line.split(",", -1);
            Map<String, String> row = new LinkedHashMap<>();
            for (int i = 0; i < cells.length; i++) {
                row.put(columns.get(i), cells[i]);
            }
            rows.add(row);
        }
        return rows;
    }
}
