// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import org.brassbob.core.table.Origin;
import org.brassbob.core.table.VolumeTable;
import org.brassbob.core.vessel.Gauge;
import org.brassbob.core.vessel.Liquid;
import org.brassbob.core.vessel.LiquidClass;
import org.brassbob.core.vessel.Pipe;
import org.brassbob.core.vessel.SpaceKind;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Use;
import org.jspecify.annotations.Nullable;

/** tanks.csv, each row with the tables and shape that belong to it. */
final class TanksCsv {
    static final String FILE = "tanks.csv";

    private static final List<String> PIPE = List.of("pipe_x_m", "pipe_y_m", "pipe_foot_z_m", "pipe_length_m");
    private static final Columns COLUMNS = Columns.of(
            List.of("tank", "name", "liquid", "walk", "gauge", "use"),
            "may_hold",
            "pipe_x_m",
            "pipe_y_m",
            "pipe_foot_z_m",
            "pipe_length_m",
            "capacity_m3",
            "fill_limit_pct",
            "residue_m3",
            "pair",
            "encloses",
            "steel_pct",
            "rate_m3_h",
            "space");

    private final Map<String, Liquid> liquids;
    private final Function<String, TankTables> tables;

    private TanksCsv(Map<String, Liquid> liquids, Function<String, TankTables> tables) {
        this.liquids = liquids;
        this.tables = tables;
    }

    /** The ids of the rows, whatever else is wrong with them. */
    static List<String> ids(CsvTable csv) {
        return csv.rows().stream().map(r -> r.text("tank")).toList();
    }

    static Optional<CsvTable> open(byte[] bytes, Problems problems) {
        return CsvTable.read(FILE, bytes, COLUMNS, problems);
    }

    /** The tanks in the order of the walk; those of rows with faults are left out. */
    static List<Tank> read(CsvTable csv, Map<String, Liquid> liquids, Function<String, TankTables> tables) {
        return new TanksCsv(liquids, tables).tanks(csv);
    }

    private List<Tank> tanks(CsvTable csv) {
        Map<String, Integer> ids = new HashMap<>();
        Map<Integer, Integer> walks = new HashMap<>();
        List<Tank> tanks = new ArrayList<>();
        if (csv.rows().isEmpty()) {
            csv.problems().add(FILE, csv.headerLine(), "no tanks; expected one or more");
        }
        for (Row row : csv.rows()) {
            String id = row.required("tank");
            if (!id.isBlank() && !id.matches("[A-Za-z0-9-]{1,40}")) {
                row.problem("tank is " + Numbers.shown(id) + "; expected letters, digits and -");
                continue;
            }
            // File systems that ignore case would give two such tanks one file.
            Integer earlier = ids.putIfAbsent(id.toLowerCase(Locale.ROOT), row.line());
            if (earlier != null) {
                row.problem("tank " + id + " is also on line " + earlier + "; expected each id once");
            }
            int walk = row.whole("walk", 0, 100_000);
            Integer sameWalk = walks.putIfAbsent(walk, row.line());
            if (sameWalk != null) {
                row.problem("walk " + walk + " is also on line " + sameWalk + "; expected each place once");
            }
            tank(row, id, walk).ifPresent(tanks::add);
        }
        tanks.sort(Comparator.comparingInt(Tank::walk));
        new TankRelations(csv, tanks).check();
        return tanks;
    }

    private Optional<Tank> tank(Row row, String id, int walk) {
        int before = row.problemCount();
        TankTables own = tables.apply(id);
        Optional<Liquid> liquid = liquid(row, "liquid", row.text("liquid"));
        List<Liquid> mayHold = new ArrayList<>();
        for (String other : row.words("may_hold")) {
            liquid(row, "may_hold", other).ifPresent(mayHold::add);
        }
        Optional<Gauge> gauge = row.word("gauge", Gauge.values(), Gauge::code);
        Optional<Use> use = row.word("use", Use.values(), Use::code);
        SpaceKind space = row.text("space").isEmpty()
                ? SpaceKind.TANK
                : row.word("space", SpaceKind.values(), SpaceKind::code).orElse(SpaceKind.TANK);
        Pipe pipe = pipe(row);
        double capacity = capacity(row, own);
        String pair = row.text("pair");
        Tank tank = new Tank(
                id,
                row.required("name"),
                liquid.orElse(NO_LIQUID),
                mayHold,
                walk,
                gauge.orElse(Gauge.REMOTE),
                pipe,
                capacity,
                row.optional("fill_limit_pct", 0.1, 100, 100),
                row.optional("residue_m3", 0, 1e6, 0),
                use.orElse(Use.FIXED),
                pair.isEmpty() ? null : pair,
                row.words("encloses"),
                row.optional("steel_pct", 0, 50, 0),
                row.optional("rate_m3_h", 0.001, 1e5),
                space,
                own.soundings(),
                own.volumes(),
                own.shape(),
                Origin.of(FILE, row.line()));
        if (tank.residue() >= tank.fillLimit() && capacity > 0) {
            row.problem("residue_m3 is " + tank.residue() + ", not less than the fill limit of " + tank.fillLimit()
                    + " m3; expected less");
        }
        if (!own.anyFault() && gauge.isPresent()) {
            checkReadable(row, tank);
        }
        return row.problemCount() == before ? Optional.of(tank) : Optional.empty();
    }

    /** Stands in while the faults of a row are gathered; a row that uses it is never kept. */
    private static final Liquid NO_LIQUID =
            new Liquid("", "", LiquidClass.NONE, 0, 15, org.brassbob.core.vessel.Expansion.NONE);

    private Optional<Liquid> liquid(Row row, String column, String id) {
        Liquid liquid = liquids.get(id);
        if (liquid == null) {
            row.problem(
                    column + " is " + Numbers.shown(id) + "; expected one of " + String.join(", ", liquids.keySet()));
        }
        return Optional.ofNullable(liquid);
    }

    private static @Nullable Pipe pipe(Row row) {
        List<String> given = PIPE.stream().filter(c -> !row.text(c).isEmpty()).toList();
        if (given.isEmpty()) {
            return null;
        }
        return new Pipe(
                row.number("pipe_x_m", -100, 700),
                row.number("pipe_y_m", -60, 60),
                row.number("pipe_foot_z_m", -10, 100),
                row.number("pipe_length_m", 0.01, 100));
    }

    private static double capacity(Row row, TankTables own) {
        VolumeTable volumes = own.volumes();
        if (row.text("capacity_m3").isEmpty() && volumes != null) {
            return volumes.volumes().last();
        }
        return row.number("capacity_m3", 1e-6, 1e6);
    }

    private static void checkReadable(Row row, Tank tank) {
        if (tank.shape() == null && tank.volumes() == null) {
            row.problem("tank " + tank.id() + " has neither a shape nor a volume table; expected tanks/" + tank.id()
                    + ".shape.csv or tanks/" + tank.id() + ".volume.csv");
        } else if (tank.gauge() != Gauge.REMOTE && !canBeSounded(tank)) {
            row.problem("tank " + tank.id() + " is read by " + tank.gauge().code() + "; expected tanks/" + tank.id()
                    + ".sounding.csv, or a shape and a pipe");
        }
    }

    /** Whether a sounding or ullage can be turned into a volume: an ullage table needs the pipe's length for a sounding. */
    static boolean canBeSounded(Tank tank) {
        boolean byShape = tank.shape() != null && tank.pipe() != null;
        return byShape || tank.soundings() != null;
    }
}
