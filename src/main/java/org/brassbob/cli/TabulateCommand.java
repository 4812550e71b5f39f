// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.contents.TankShapes;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.tabulate.CalibrationGrid;
import org.brassbob.core.tabulate.CalibrationMaker;
import org.brassbob.core.tabulate.HullTables;
import org.brassbob.core.tabulate.VolumeTableMaker;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.data.TableFiles;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParseResult;

/** {@code tabulate}: tables from shapes. */
final class TabulateCommand implements Command {
    @Override
    public CommandSpec spec() {
        return Options.command(
                        "Makes calibration tables from the shapes of the tanks, and hydrostatics, cross curves and the GM that the "
                                + "general criteria require from the shape of the hull.",
                        "",
                        "Exit status: 0 done; 2 the input can't be used.",
                        "")
                .addPositional(Options.vessel())
                .addOption(Options.text("--tank", "ID", false, "this tank only, and nothing of the hull"))
                .addOption(Options.text("--into", "DIR", true, "the folder to write to; made where it is missing"))
                .addOption(Options.flag(
                        "--replace", "write over the tables of the vessel folder itself, which else is refused"))
                .addOption(Options.json());
    }

    @Override
    public int run(ParseResult given, PrintWriter out) throws UnusableInput {
        Path from = Inputs.path(Options.vessel(given));
        Path into = Inputs.path(given.matchedOptionValue("--into", ""));
        refuseOwnFolder(from, into, given.hasMatchedOption("--replace"));
        Vessel vessel = Inputs.vessel(Options.vessel(given));
        String only = given.matchedOptionValue("--tank", "");
        List<String> written = new ArrayList<>();
        try {
            TableFiles files = new TableFiles(into);
            writeTanks(vessel, only, files, written);
            SpaceShape hull = vessel.hull();
            if (only.isEmpty() && hull != null) {
                writeHull(HullTables.of(vessel, hull), files, written);
            }
        } catch (IOException e) {
            throw UnusableInput.of(into + ":1: can't be written ("
                    + e.getClass().getSimpleName() + "); expected a folder with room that may be written to");
        }
        print(given, out, into, written);
        return ExitStatus.DONE;
    }

    private static void refuseOwnFolder(Path from, Path into, boolean replace) throws UnusableInput {
        try {
            if (!replace && Files.isDirectory(into) && Files.isDirectory(from) && Files.isSameFile(from, into)) {
                throw UnusableInput.of(into + ":1: is the vessel folder itself; expected another folder, or --replace");
            }
        } catch (IOException e) {
            throw UnusableInput.of(into + ":1: can't be looked at; expected a folder");
        }
    }

    private static void writeTanks(Vessel vessel, String only, TableFiles files, List<String> written)
            throws IOException, UnusableInput {
        TankShapes shapes = TankShapes.of(vessel);
        if (!only.isEmpty() && shapes.net(only).isEmpty()) {
            throw UnusableInput.of("--tank is '" + only + "'; expected the id of a tank with a shape");
        }
        CalibrationMaker maker = new CalibrationMaker(vessel.particulars().lbp(), CalibrationGrid.USUAL);
        for (Tank tank : vessel.tanks()) {
            @Nullable NetShape shape = shapes.net(tank.id()).orElse(null);
            if (shape == null || !(only.isEmpty() || only.equals(tank.id()))) {
                continue;
            }
            String base = "tanks/" + tank.id();
            var soundings = maker.soundings(tank, shape);
            if (soundings.isPresent()) {
                files.write(base + ".sounding.csv", soundings.get());
                written.add(base + ".sounding.csv");
            }
            files.write(base + ".volume.csv", VolumeTableMaker.of(shape, tank.id()));
            written.add(base + ".volume.csv");
        }
    }

    private static void writeHull(HullTables tables, TableFiles files, List<String> written) throws IOException {
        files.write("hydrostatics.csv", tables.hydrostatics());
        files.write("kn.csv", tables.crossCurves());
        files.write("gm-required-general.csv", tables.requiredGm());
        written.addAll(List.of("hydrostatics.csv", "kn.csv", "gm-required-general.csv"));
    }

    private static void print(ParseResult given, PrintWriter out, Path into, List<String> written) {
        if (given.hasMatchedOption("--json")) {
            out.print(
                    JsonText.document(json -> json.put("into", into.toString()).words("files", written)));
        } else {
            written.forEach(file -> out.println(into.resolve(file)));
        }
    }
}
