// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.data.VesselFolder;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class CliTest {
    private static final String HERON = "vessel-data/heron";

    @TempDir
    Path folder = Path.of("");

    @Test
    void helpNamesEveryCall() {
        Call call = Call.of("--help");
        assertEquals(ExitStatus.DONE, call.status());
        for (String name : new String[] {"assess", "audit", "tabulate"}) {
            assertTrue(call.out().contains(name), name);
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"assess", "audit", "tabulate"})
    void everyCallHasHelpWithItsExitStatus(String name) {
        Call call = Call.of(name, "--help");
        assertEquals(ExitStatus.DONE, call.status());
        assertTrue(call.out().contains("Exit status"), call.out());
        assertTrue(call.out().contains("VESSEL"), call.out());
    }

    @Test
    void aCallThatIsNoneIsUnusable() {
        Call call = Call.of("weigh", HERON);
        assertEquals(ExitStatus.UNUSABLE, call.status());
        assertEquals(1, call.errorLines().size(), call.err());
    }

    @Test
    void auditOfTheDemoShipIsClean() {
        Call call = Call.of("audit", HERON);
        assertEquals(ExitStatus.DONE, call.status(), call.out());
        assertTrue(call.out().endsWith("0 errors, 0 warnings" + System.lineSeparator()), call.out());
        JsonTree json = JsonTree.parse(Call.of("audit", HERON, "--json").out());
        assertEquals(0, json.get("findings").items().size());
    }

    @Test
    void anAuditErrorIsStatusOneAndNamesTheLine() throws IOException {
        copyHeron();
        Path table = folder.resolve("heron/tanks/dt1-c.volume.csv");
        String[] lines = Files.readString(table).split("\n");
        lines[5] = lines[5].replaceFirst(",1\\.", ",2.");
        Files.writeString(table, String.join("\n", lines) + "\n");
        Call call = Call.of("audit", folder.resolve("heron").toString());
        assertEquals(ExitStatus.LIMIT_BROKEN, call.status(), call.out());
        assertTrue(call.out().contains(table + ":6: error: vcg_m"), call.out());
    }

    private void copyHeron() throws IOException {
        Path source = Path.of(HERON);
        try (var files = Files.walk(source)) {
            for (Path file : files.toList()) {
                Path target =
                        folder.resolve("heron").resolve(source.relativize(file).toString());
                if (Files.isDirectory(file)) {
                    Files.createDirectories(target);
                } else {
                    Files.copy(file, target);
                }
            }
        }
    }

    @Test
    void tabulateWritesTablesThatReadBack() throws IOException {
        copyHeron();
        Path ship = folder.resolve("heron");
        Call refused = Call.of("tabulate", ship.toString(), "--into", ship.toString());
        assertEquals(ExitStatus.UNUSABLE, refused.status());
        Call call = Call.of(
                "tabulate", ship.toString(), "--into", folder.resolve("made").toString());
        assertEquals(ExitStatus.DONE, call.status(), call.err());
        assertEquals(
                Files.readString(ship.resolve("hydrostatics.csv")),
                Files.readString(folder.resolve("made/hydrostatics.csv")));
        assertEquals(Files.readString(ship.resolve("kn.csv")), Files.readString(folder.resolve("made/kn.csv")));
        Vessel heron = VesselFolder.read(ship).orElseThrow();
        for (Tank tank : heron.tanks()) {
            String volumes = "tanks/" + tank.id() + ".volume.csv";
            String soundings = "tanks/" + tank.id() + ".sounding.csv";
            assertEquals(
                    Files.exists(ship.resolve(soundings)),
                    Files.exists(folder.resolve("made").resolve(soundings)));
            assertEquals(
                    Files.readString(ship.resolve(volumes)),
                    Files.readString(folder.resolve("made").resolve(volumes)));
        }
        Call over = Call.of("tabulate", ship.toString(), "--into", ship.toString(), "--replace");
        assertEquals(ExitStatus.DONE, over.status(), over.err());
        assertEquals(ExitStatus.DONE, Call.of("audit", ship.toString()).status());
    }

    @Test
    void tabulateOfOneTank() {
        Call call = Call.of(
                "tabulate",
                HERON,
                "--tank",
                "hyd",
                "--into",
                folder.resolve("made").toString(),
                "--json");
        assertEquals(2, JsonTree.parse(call.out()).get("files").items().size());
        Call none = Call.of(
                "tabulate",
                HERON,
                "--tank",
                "nosuch",
                "--into",
                folder.resolve("made").toString());
        assertEquals(ExitStatus.UNUSABLE, none.status());
        assertEquals(1, none.errorLines().size());
    }

    @Test
    void tabulateIntoAPlaceThatCantBeWrittenIsTold() throws IOException {
        Path file = folder.resolve("a-file");
        Files.writeString(file, "in the way");
        Call call = Call.of("tabulate", HERON, "--tank", "hyd", "--into", file.toString());
        assertEquals(ExitStatus.UNUSABLE, call.status());
        assertEquals(1, call.errorLines().size(), call.err());
        assertTrue(call.err().startsWith(file + ":1: can't be written"), call.err());
    }

    @Test
    void whatCantBeReplacedLeavesNothingBehind() throws IOException {
        Path inTheWay = folder.resolve("made/tanks/hyd.volume.csv");
        Files.createDirectories(inTheWay.resolve("full"));
        Call call = Call.of(
                "tabulate",
                HERON,
                "--tank",
                "hyd",
                "--into",
                folder.resolve("made").toString());
        assertEquals(ExitStatus.UNUSABLE, call.status());
        assertEquals(1, call.errorLines().size(), call.err());
        try (var files = Files.list(folder.resolve("made/tanks"))) {
            assertEquals(
                    List.of("hyd.sounding.csv", "hyd.volume.csv"),
                    files.map(f -> f.getFileName().toString()).sorted().toList());
        }
    }

    @Test
    void aDeviceWithoutEndIsNoRound() {
        Path endless = Path.of("/dev/zero");
        org.junit.jupiter.api.Assumptions.assumeTrue(Files.exists(endless));
        Call call = Call.of("assess", HERON, "--round", endless.toString());
        assertEquals(ExitStatus.UNUSABLE, call.status());
        assertEquals(1, call.errorLines().size(), call.err());
    }
}
