// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.tabulate.HullTables;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.data.MemoryFolder;
import org.brassbob.data.TableFiles;
import org.brassbob.data.VesselFolder;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Each check is shown to find its fault, with file and line, on the demo ships with one thing changed. */
class AuditTest {
    private static final MemoryFolder HERON = ship("heron");
    private static final MemoryFolder DABCHICK = ship("dabchick");

    private static MemoryFolder ship(String name) {
        try {
            return MemoryFolder.of(Path.of("vessel-data", name));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static List<String> findings(MemoryFolder folder) {
        return Audit.of(VesselFolder.read(folder).orElseThrow()).stream()
                .map(Finding::text)
                .toList();
    }

    private static MemoryFolder changed(MemoryFolder folder, String file, String old, String now) {
        String text = folder.text(file);
        assertTrue(text.contains(old), () -> file + " has no " + old);
        return folder.with(file, text.replaceFirst(Pattern.quote(old), Matcher.quoteReplacement(now)));
    }

    private static void assertFound(List<String> findings, String start) {
        assertTrue(
                findings.stream().anyMatch(f -> f.startsWith(start)),
                () -> start + "\nnot among\n" + String.join("\n", findings));
    }

    /** Changes one cell of a tank's row in tanks.csv, by column. */
    private static MemoryFolder tank(MemoryFolder folder, String id, String column, String value) {
        String[] lines = folder.text("tanks.csv").split("\n", -1);
        List<String> header = List.of();
        for (int i = 0; i < lines.length; i++) {
            if (lines[i].startsWith("tank,")) {
                header = List.of(lines[i].split(",", -1));
            } else if (lines[i].startsWith(id + ",")) {
                String[] cells = lines[i].split(",", -1);
                cells[header.indexOf(column)] = value;
                lines[i] = String.join(",", cells);
            }
        }
        return folder.with("tanks.csv", String.join("\n", lines));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            textBlock =
                    """
        dt1-c | capacity_m3 | 160 | tanks.csv:6: error: capacity of dt1-c against the shape's net volume: 160 m3; expected 168.8
        dt1-c | capacity_m3 | 167.5 | tanks.csv:6: warning: capacity of dt1-c against the shape's net volume: 167.5 m3; expected 168.8
        dt1-c | pipe_x_m | 60 | tanks.csv:6: error: place of the pipe of dt1-c: x 60 m, y 1.6 m; expected x 72 to
        dt1-c | pipe_foot_z_m | 0.2 | tanks.csv:6: error: foot of the pipe of dt1-c: 0.2 m above the baseline; expected 1.1 to
        dt1-c | pipe_foot_z_m | 2.2 | tanks.csv:6: warning: volume below the foot of the pipe of dt1-c:
        dt1-c | pipe_length_m | 2 | tanks.csv:6: warning: rim of the pipe of dt1-c: 3.105 m above the baseline; expected at or above the top of the tank at
        db3-s | capacity_m3 | 80.9 | tanks.csv:28: warning: capacity of db3-p against its pair db3-s: 81.23 m3; expected 80.9 m3
        db3-s | pipe_y_m | 5.5 | tanks.csv:28: warning: pipe of db3-p against its pair db3-s: x 36.4, y -5.9
        """)
    void tankRows(String id, String column, String value, String expected) {
        assertFound(findings(tank(HERON, id, column, value)), expected);
    }

    @Test
    void aTankThatIsNotTakenOutOverlaps() {
        List<String> findings = findings(tank(HERON, "dt1-c", "encloses", ""));
        assertFound(findings, "tanks.csv:6: error: shapes of dt1-c and hyd overlap: 3.2");
    }

    @Test
    void aTankThatSticksOutOfTheOneRoundItIsFound() {
        String shape = HERON.text("tanks/hyd.shape.csv");
        MemoryFolder moved = HERON.with("tanks/hyd.shape.csv", shape.replaceAll("(?m)^7(\\d)", "6$1"));
        List<String> findings = findings(moved);
        assertFound(findings, "tanks.csv:6: error: shape of hyd sticks out of dt1-c, which encloses it:");
    }

    @Test
    void aTankThatSticksOutOfTheHullIsFound() {
        String shape = HERON.text("tanks/fp.shape.csv");
        StringBuilder wider = new StringBuilder();
        for (String line : shape.lines().toList()) {
            String[] cells = line.split(",", -1);
            boolean point = cells.length == 4 && !cells[0].startsWith("x") && !line.startsWith("#");
            if (point) {
                cells[2] = String.valueOf(1.3 * Double.parseDouble(cells[2]));
            }
            wider.append(String.join(",", cells)).append('\n');
        }
        assertFound(
                findings(HERON.with("tanks/fp.shape.csv", wider.toString())),
                "tanks.csv:3: error: shape of fp sticks out of the hull of heron:");
    }

    @Test
    void aWholeTableOffItsShapeIsFound() {
        String table = HERON.text("tanks/dt1-c.sounding.csv");
        StringBuilder more = new StringBuilder();
        for (String line : table.lines().toList()) {
            String[] cells = line.split(",", -1);
            if (!line.startsWith("sounding")) {
                cells[1] = String.valueOf(1.2 * Double.parseDouble(cells[1]));
            }
            more.append(String.join(",", cells)).append('\n');
        }
        assertFound(
                findings(HERON.with("tanks/dt1-c.sounding.csv", more.toString())),
                "tanks/dt1-c.sounding.csv:2: error: the whole table of dt1-c against the shape:");
    }

    /** Where plan and shape agree, it is the table's last volume that is wrong, and the finding stands there. */
    @Test
    void aLastVolumeAgainstCapacityAndShapeIsFoundInTheTable() {
        List<String> lines = HERON.text("tanks/hyd.volume.csv").lines().toList();
        String last = lines.get(lines.size() - 1);
        String typed = last.replaceFirst("^3", "4");
        assertFound(
                findings(HERON.with(
                        "tanks/hyd.volume.csv",
                        HERON.text("tanks/hyd.volume.csv").replace(last, typed))),
                "tanks/hyd.volume.csv:" + lines.size() + ": error: last volume of hyd against capacity and shape: 4.2");
    }

    @Test
    void aRoughTableIsHeldToItsOwnRoughness() {
        // A booklet's table, good to a few litres: no cell stands out, and none is reported.
        java.util.Random random = new java.util.Random(3);
        StringBuilder rough = new StringBuilder();
        for (String line : HERON.text("tanks/dt1-c.volume.csv").lines().toList()) {
            String[] cells = line.split(",", -1);
            if (!line.startsWith("volume")) {
                cells[1] = String.format(
                        java.util.Locale.ROOT, "%.4f", Double.parseDouble(cells[1]) + 0.01 * random.nextDouble());
            }
            rough.append(String.join(",", cells)).append('\n');
        }
        assertEquals(List.of(), findings(HERON.with("tanks/dt1-c.volume.csv", rough.toString())));
    }

    @Test
    void aSecondMomentBeyondItsBoxIsFound() {
        String table = HERON.text("tanks/hyd.volume.csv");
        String[] lines = table.split("\n", -1);
        lines[3] = lines[3].substring(0, lines[3].lastIndexOf(',')) + ",900";
        assertFound(
                findings(HERON.with("tanks/hyd.volume.csv", String.join("\n", lines))),
                "tanks/hyd.volume.csv:4: error: fs_m4 in hyd: 900; expected at the most l·b³/12 =");
    }

    @Test
    void aPlainShipWithoutHullIsHeldAgainstHerself() {
        MemoryFolder bare = HERON.without("hull.shape.csv");
        assertEquals(List.of(), findings(bare));
        String kn = bare.text("kn.csv");
        String[] lines = kn.split("\n", -1);
        String[] cells = lines[12].split(",", -1);
        cells[5] = String.valueOf(Double.parseDouble(cells[5]) + 0.2);
        lines[12] = String.join(",", cells);
        assertFound(
                findings(bare.with("kn.csv", String.join("\n", lines))),
                "kn.csv:13: error: KN out of line with its neighbours at 25°");
        cells[5] = String.valueOf(Double.parseDouble(cells[5]) - 0.2);
        cells[1] = String.valueOf(Double.parseDouble(cells[1]) + 0.3);
        lines[12] = String.join(",", cells);
        assertFound(
                findings(bare.with("kn.csv", String.join("\n", lines))), "kn.csv:13: error: KN against KM·sin φ at 5°");
    }

    /** Where the waterline meets a transom or a chine, columns kink: smoothness alone must not condemn a correct table. */
    @ParameterizedTest
    @CsvSource({"20", "32", "41", "60"})
    void finerHydrostaticsWithoutAHullRaiseNoError(int rows) throws IOException {
        Vessel heron = VesselFolder.read(HERON).orElseThrow();
        HydrostaticTable finer = HullTables.hydrostatics(heron, java.util.Objects.requireNonNull(heron.hull()), rows);
        Path folder = java.nio.file.Files.createTempDirectory("hydrostatics");
        new TableFiles(folder).write("hydrostatics.csv", finer);
        String csv = java.nio.file.Files.readString(folder.resolve("hydrostatics.csv"));
        java.nio.file.Files.delete(folder.resolve("hydrostatics.csv"));
        java.nio.file.Files.delete(folder);
        List<String> errors = findings(HERON.without("hull.shape.csv").with("hydrostatics.csv", csv)).stream()
                .filter(f -> f.contains(": error: "))
                .toList();
        assertEquals(List.of(), errors);
    }

    @Test
    void layersOfAVolumeTableMustRise() {
        List<String> findings = findings(changed(DABCHICK, "tanks/db-c.volume.csv", "0.35", "0.05"));
        assertTrue(
                findings.stream().anyMatch(f -> f.contains("lies lower than the layer under it")),
                () -> String.join("\n", findings));
    }

    @Test
    void volumesMustRiseWithSoundings() {
        String table = DABCHICK.text("tanks/cof.sounding.csv");
        List<String> findings =
                findings(DABCHICK.with("tanks/cof.sounding.csv", table.replace("0.1,0.288", "0.1,0.088")));
        assertFound(
                findings,
                "tanks/cof.sounding.csv:5: error: volume must rise with the sounding: 0.088 m3; expected at least 0.144 m3");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            textBlock =
                    """
        weights.csv | 1120,59.2 | 1120,592 | weights.csv:1: warning: centre of Hold 1 bagged cargo: x 592, y 0.02, z 4.75 m; expected a place aboard
        vessel.json | "vcg_m": 6.05 | "vcg_m": 60.5 | vessel.json:1: warning: centre of light ship: x 36.1, y 0, z 60.5 m; expected a place aboard
        liquids.csv | 0.845,15 | 0.945,15 | liquids.csv:1: warning: density of mgo, a gas-oil: 0.945 t/m3; expected 0.8 to 0.9 t/m3 (common practice)
        vessel.json | "mass_t": 1920.0 | "mass_t": 320.0 | hydrostatics.csv:2: warning: first displacement:
        """)
    void plausibility(String file, String old, String now, String expected) {
        assertFound(findings(changed(HERON, file, old, now)), expected);
    }

    @Test
    void aShipWithoutWeightsIsDoubted() {
        assertFound(findings(DABCHICK.without("weights.csv")), "weights.csv:1: warning: weights: none; expected");
    }

    @Test
    void aLimitCurveOutOfLineOrTooShortIsDoubted() {
        String curve = HERON.text("gm-required-intact.csv");
        String[] lines = curve.split("\n", -1);
        String[] cells = lines[15].split(",", -1);
        lines[15] = cells[0] + "," + (Double.parseDouble(cells[1]) + 0.3);
        assertFound(
                findings(HERON.with("gm-required-intact.csv", String.join("\n", lines))),
                "gm-required-intact.csv:16: warning: limit 'intact' out of line with its neighbours");
        assertFound(
                findings(HERON.with("gm-required-intact.csv", "displacement_t,gm_required_m\n4000,0.2\n6000,0.4\n")),
                "gm-required-intact.csv:2: warning: range of limit 'intact': 4000 to 6000 t; expected to reach the light ship of 1920 t");
    }

    @Test
    void aTwinThatIsNoMirrorIsDoubted() {
        String table = DABCHICK.text("tanks/c1-p.sounding.csv");
        String scaled = table.lines()
                        .map(l -> l.matches("^[0-9.].*")
                                ? l.substring(0, l.lastIndexOf(',') + 1)
                                        + String.format(
                                                java.util.Locale.ROOT,
                                                "%.3f",
                                                0.99 * Double.parseDouble(l.substring(l.lastIndexOf(',') + 1)))
                                : l)
                        .collect(java.util.stream.Collectors.joining("\n"))
                + "\n";
        assertFound(
                findings(DABCHICK.with("tanks/c1-p.sounding.csv", scaled)),
                "tanks/c1-p.sounding.csv:3: warning: sounding table of c1-p: is no mirror of c1-s; expected mirrored tables");
    }

    @Test
    void hydrostaticsThatEndTooEarlyAreDoubted() {
        String json = DABCHICK.text("vessel.json")
                .replaceFirst("\"summer_draught_m\": [0-9.]+", "\"summer_draught_m\": 3.59");
        json = json.replaceFirst("\"depth_m\": [0-9.]+", "\"depth_m\": 4");
        List<String> findings = findings(DABCHICK.with("vessel.json", json));
        assertTrue(
                findings.stream().anyMatch(f -> f.contains("warning: last draught:")),
                () -> String.join("\n", findings));
    }
}
