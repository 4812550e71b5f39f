// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.brassbob.core.contents.TankShapes;
import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.geometry.ShapeException;
import org.brassbob.core.geometry.Solid;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.geometry.SpaceShape.Loop;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.brassbob.core.geometry.SpaceShape.Station;
import org.brassbob.core.table.Axis;
import org.brassbob.core.tabulate.CalibrationGrid;
import org.brassbob.core.tabulate.CalibrationMaker;
import org.brassbob.core.tabulate.HullTables;
import org.brassbob.core.tabulate.VolumeTableMaker;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.data.TableFiles;
import org.brassbob.data.VesselFolder;
import org.brassbob.demo.HeronTanks.Spec;

/** Builds the vessel folder of Saltmarsh Heron. */
public final class HeronYard {
    private static final String NOTE = "# Demo data, invented; not a real ship\n";

    private static final CalibrationGrid GRID =
            new CalibrationGrid(Axis.of(-0.5, 0, 0.5, 1, 1.5, 2), Axis.of(-2, -1, 0, 1, 2), 40);

    private final Path folder;

    private HeronYard(Path folder) {
        this.folder = folder;
    }

    /** Builds her into the folder given, or into vessel-data/heron. */
    public static void main(String[] args) throws IOException {
        new HeronYard(Path.of(args.length > 0 ? args[0] : "vessel-data/heron")).build();
    }

    private void build() throws IOException {
        Files.createDirectories(folder.resolve("tanks"));
        write("vessel.json", HeronPapers.vesselJson(false));
        write("liquids.csv", HeronPapers.LIQUIDS);
        write("weights.csv", HeronPapers.WEIGHTS);
        write("hull.shape.csv", shapeCsv(hull()));
        List<Spec> specs = HeronTanks.all();
        Map<String, SpaceShape> shapes = new HashMap<>();
        for (Spec spec : specs) {
            SpaceShape shape = HeronTanks.shape(spec);
            shapes.put(spec.id(), shape);
            write("tanks/" + spec.id() + ".shape.csv", shapeCsv(shape));
        }
        write("tanks.csv", tanksCsv(specs, shapes));
        Vessel bare = VesselFolder.read(folder).orElseThrow();
        tabulate(bare);
        write("vessel.json", HeronPapers.vesselJson(true));
        HeronRounds.write(VesselFolder.read(folder).orElseThrow(), folder.resolve("rounds"));
    }

    private void tabulate(Vessel vessel) throws IOException {
        TableFiles files = new TableFiles(folder);
        TankShapes shapes = TankShapes.of(vessel);
        CalibrationMaker maker = new CalibrationMaker(vessel.particulars().lbp(), GRID);
        for (Tank tank : vessel.tanks()) {
            NetShape shape = shapes.net(tank.id()).orElseThrow();
            var soundings = maker.soundings(tank, shape);
            if (soundings.isPresent()) {
                files.write("tanks/" + tank.id() + ".sounding.csv", soundings.get());
            }
            files.write("tanks/" + tank.id() + ".volume.csv", VolumeTableMaker.of(shape, tank.id()));
        }
        SpaceShape hull = vessel.hull();
        if (hull != null) {
            HullTables tables = HullTables.of(vessel, hull);
            files.write("hydrostatics.csv", tables.hydrostatics());
            files.write("kn.csv", tables.crossCurves());
            files.write("gm-required-intact.csv", tables.requiredGm());
        }
    }

    private static SpaceShape hull() {
        List<Station> stations = new ArrayList<>();
        for (double x : HeronLines.stations()) {
            stations.add(new Station(x, List.of(new Loop(1, HeronLines.section(x)))));
        }
        return new SpaceShape(stations, org.brassbob.core.table.Origin.computed("hull"));
    }

    private static String shapeCsv(SpaceShape shape) {
        StringBuilder csv = new StringBuilder("x_m,loop,y_m,z_m\n");
        for (Station station : shape.stations()) {
            for (Loop loop : station.loops()) {
                for (Point p : loop.points()) {
                    csv.append(HeronPapers.plain(station.x()))
                            .append(',')
                            .append(loop.number())
                            .append(',')
                            .append(HeronPapers.plain(p.y()))
                            .append(',')
                            .append(HeronPapers.plain(p.z()))
                            .append('\n');
                }
            }
        }
        return csv.toString();
    }

    private static String tanksCsv(List<Spec> specs, Map<String, SpaceShape> shapes) {
        StringBuilder csv = new StringBuilder(NOTE);
        csv.append("tank,name,liquid,may_hold,walk,gauge,pipe_x_m,pipe_y_m,pipe_foot_z_m,pipe_length_m,capacity_m3,"
                + "fill_limit_pct,residue_m3,use,pair,encloses,steel_pct,rate_m3_h,space\n");
        for (Spec spec : specs) {
            Solid solid = solid(shapes, spec.id());
            Solid net = spec.encloses().isEmpty() ? solid : solid.minus(solid(shapes, spec.encloses()));
            double capacity = Math.floor(net.volume() * (100 - spec.steelPct())) / 100;
            csv.append(String.join(
                            ",",
                            spec.id(),
                            spec.name(),
                            spec.liquid(),
                            spec.mayHold(),
                            String.valueOf(HeronPapers.WALK.indexOf(spec.id()) + 1),
                            spec.gauge(),
                            pipe(spec, solid),
                            HeronPapers.plain(capacity),
                            HeronPapers.plain(spec.fillLimitPct()),
                            HeronPapers.plain(spec.residue()),
                            spec.use(),
                            spec.pair(),
                            spec.encloses(),
                            HeronPapers.plain(spec.steelPct()),
                            spec.rate() > 0 ? HeronPapers.plain(spec.rate()) : "",
                            spec.space()))
                    .append('\n');
        }
        return csv.toString();
    }

    /** The pipe stands near the aft end, towards the side where the tank is deepest, its foot 10 mm clear of the bottom. */
    private static String pipe(Spec spec, Solid solid) {
        // The counter rises aft: under it a tank is deepest at its forward end.
        double in = Math.min(0.6, 0.3 * (spec.forward() - spec.aft()));
        double x = spec.id().equals("ap") ? spec.forward() - in : spec.aft() + in;
        double sign = spec.side() == HeronTanks.Side.PORT ? -1 : 1;
        double y = spec.side() == HeronTanks.Side.BOTH ? offCentre(spec) : sign * (spec.inner() + 0.4);
        double foot = bottom(spec, solid, x, y) + 0.01;
        double top = Math.max(spec.pipeTop(), spec.crown() + 0.3);
        return String.join(
                ",",
                HeronPapers.plain(x),
                HeronPapers.plain(y),
                HeronPapers.plain(Math.rint(foot * 1000) / 1000),
                HeronPapers.plain(Math.rint((top - foot) * 1000) / 1000));
    }

    /** A pipe on the centreline of a tank that holds another would stand in that one. */
    private static double offCentre(Spec spec) {
        return spec.encloses().isEmpty() ? 0.2 : 1.6;
    }

    /** The height of the bottom at a spot: a probe as thin as a pipe, filled until it holds something. */
    private static double bottom(Spec spec, Solid solid, double x, double y) {
        if (spec.form() == HeronTanks.Form.BOX) {
            return spec.floor();
        }
        List<Point> section = HeronTanks.shape(spec).stations().stream()
                .filter(s -> s.x() >= x)
                .findFirst()
                .orElseThrow()
                .loops()
                .get(0)
                .points();
        double low = solid.lowest(Attitude.UPRIGHT);
        double here = new HullCut(x)
                .between(Math.abs(y), 99, spec.floor(), spec.crown())
                .get(0)
                .z();
        return Math.max(low, section.isEmpty() ? low : here);
    }

    private static Solid solid(Map<String, SpaceShape> shapes, String id) {
        SpaceShape shape = Objects.requireNonNull(shapes.get(id));
        try {
            return Solid.of(shape);
        } catch (ShapeException e) {
            throw new IllegalStateException(id + ": " + e.getMessage(), e);
        }
    }

    private void write(String file, String text) {
        try {
            Files.writeString(folder.resolve(file), text);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
