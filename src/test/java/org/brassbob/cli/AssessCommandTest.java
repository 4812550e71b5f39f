// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class AssessCommandTest {
    private static final String HERON = "vessel-data/heron";
    private static final String DEPARTURE = HERON + "/rounds/departure.csv";

    @TempDir
    Path folder = Path.of("");

    private String round(String text) throws IOException {
        Path file = folder.resolve("round.csv");
        Files.writeString(file, text);
        return file.toString();
    }

    private static JsonTree json(String round) {
        return JsonTree.parse(
                Call.of("assess", HERON, "--round", round, "--json").out());
    }

    @Test
    void jsonHasTheKeysOfTheContract() {
        JsonTree root = json(DEPARTURE);
        assertEquals(
                List.of("vessel", "round", "tanks", "condition", "margin", "criteria", "notices"),
                List.copyOf(root.keys()));
        assertEquals(
                List.of("id", "name", "data_sha256"),
                List.copyOf(root.get("vessel").keys()));
        assertEquals(
                List.of("file", "taken_from", "taken_to"),
                List.copyOf(root.get("round").keys()));
        assertEquals(
                List.of(
                        "tank",
                        "name",
                        "liquid",
                        "reading",
                        "volume_m3",
                        "fill_pct",
                        "density_t_m3",
                        "mass_t",
                        "lcg_m",
                        "tcg_m",
                        "vcg_m",
                        "state",
                        "stale",
                        "fsm_as_sounded_tm",
                        "fsm_by_code_tm",
                        "gm_loss_m",
                        "share_pct",
                        "rank",
                        "negligible",
                        "notes"),
                List.copyOf(root.get("tanks").items().get(0).keys()));
        assertEquals(
                List.of("kind", "value", "at", "age_h"),
                List.copyOf(root.get("tanks").items().get(0).get("reading").keys()));
        assertEquals(
                List.of(
                        "displacement_t",
                        "lcg_m",
                        "tcg_m",
                        "kg_m",
                        "kmt_m",
                        "gm_solid_m",
                        "fs_as_sounded_m",
                        "gm_as_sounded_m",
                        "fs_by_code_m",
                        "gm_m",
                        "kg_fluid_m",
                        "draught_aft_m",
                        "draught_forward_m",
                        "draught_mean_m",
                        "trim_m",
                        "list_deg",
                        "loll_deg"),
                List.copyOf(root.get("condition").keys()));
        assertEquals(
                List.of("curve", "gm_required_m", "margin_m", "uncertainty_m", "band_m", "state"),
                List.copyOf(root.get("margin").keys()));
    }

    @ParameterizedTest
    @ValueSource(strings = {"departure", "three-days-out", "arrival"})
    void figuresOfTheDemoRoundsHangTogether(String name) {
        JsonTree root = json(HERON + "/rounds/" + name + ".csv");
        JsonTree c = root.get("condition");
        double displacement = c.get("displacement_t").number();
        double fsm = 0;
        double share = 0;
        double loss = 0;
        for (JsonTree tank : root.get("tanks").items()) {
            fsm += tank.get("fsm_by_code_tm").number();
            share += tank.get("share_pct").number();
            loss += tank.get("gm_loss_m").number();
            assertTrue(tank.get("fsm_by_code_tm").number()
                    >= tank.get("fsm_as_sounded_tm").number() - 1e-9);
            assertTrue(Set.of("empty", "slack", "full", "unknown")
                    .contains(tank.get("state").text()));
        }
        assertEquals(c.get("fs_by_code_m").number(), fsm / displacement, 1e-8);
        assertEquals(c.get("fs_by_code_m").number(), loss, 1e-6);
        assertEquals(100, share, 1e-5);
        assertEquals(
                c.get("gm_solid_m").number(),
                c.get("kmt_m").number() - c.get("kg_m").number(),
                1e-8);
        assertEquals(
                c.get("gm_m").number(),
                c.get("gm_solid_m").number() - c.get("fs_by_code_m").number(),
                1e-8);
        assertEquals(
                c.get("trim_m").number(),
                c.get("draught_aft_m").number() - c.get("draught_forward_m").number(),
                1e-8);
        JsonTree m = root.get("margin");
        assertEquals(
                m.get("margin_m").number(),
                c.get("gm_m").number() - m.get("gm_required_m").number(),
                1e-8);
    }

    @Test
    void textTellsTheVerdictAndItsLimits() {
        Call call = Call.of("assess", HERON, "--round", DEPARTURE);
        assertEquals(ExitStatus.DONE, call.status());
        assertEquals("", call.err());
        assertTrue(call.out().contains("Saltmarsh Heron"));
        assertTrue(call.out().contains("WHAT EACH FREE SURFACE TAKES FROM GM"));
        assertTrue(call.out().contains("CLEAR"));
        assertTrue(call.out().contains("approved stability booklet"));
        assertTrue(call.out().contains("Demo data"), "demo data says that it is a demo");
    }

    @Test
    void aLimitBrokenIsStatusOne() throws IOException {
        // Every tank of the double bottom half full: the demo ship loses more than her margin.
        StringBuilder csv = new StringBuilder("tank,at,kind,value\n");
        for (String tank :
                List.of("db1-c", "db2-p", "db2-s", "db3-p", "db3-s", "db4-p", "db4-s", "dt1-c", "fp", "ap")) {
            csv.append(tank).append(",2026-03-04T06:10:00+01:00,percent,8\n");
        }
        Call call = Call.of("assess", HERON, "--round", round(csv.toString()), "--json");
        JsonTree root = JsonTree.parse(call.out());
        assertEquals("below", root.get("margin").get("state").text());
        assertEquals(ExitStatus.LIMIT_BROKEN, call.status());
        assertTrue(root.get("notices").items().stream()
                .anyMatch(n -> n.get("severity").text().equals("stop")));
    }

    @Test
    void everyFaultOfARoundIsALine() throws IOException {
        String file = round(
                """
                #: trim_m=0,4
                tank,at,kind,value
                fp,2026-03-04T06:10:00+01:00,sounding,1.2.3
                nosuch,2026-03-04T06:10:00+01:00,sounding,1
                dt1-c,yesterday,sounding,1
                dt1-c,2026-03-04T06:10:00+01:00,dip,1
                """);
        Call call = Call.of("assess", HERON, "--round", file);
        assertEquals(ExitStatus.UNUSABLE, call.status());
        assertEquals("", call.out());
        assertEquals(5, call.errorLines().size(), call.err());
        assertTrue(call.errorLines().get(0).startsWith(file + ":1: trim_m is '0,4'"), call.err());
        assertTrue(call.errorLines().get(1).startsWith(file + ":3: value is '1.2.3'"), call.err());
        assertTrue(call.errorLines().get(2).startsWith(file + ":4: tank 'nosuch'"), call.err());
        assertTrue(call.errorLines().get(3).startsWith(file + ":5: at is 'yesterday'"), call.err());
        assertTrue(call.errorLines().get(4).startsWith(file + ":6: kind is 'dip'"), call.err());
    }

    @Test
    void everyFaultOfAFolderIsALine() throws IOException {
        Files.createDirectories(folder.resolve("ship"));
        Files.writeString(folder.resolve("ship/vessel.json"), "{ \"format\": 2 }");
        Call call = Call.of("assess", folder.resolve("ship").toString(), "--round", DEPARTURE);
        assertEquals(ExitStatus.UNUSABLE, call.status());
        assertTrue(call.errorLines().stream().allMatch(l -> l.matches(".+:\\d+: .+")), call.err());
        assertTrue(call.errorLines().size() >= 6, call.err());
    }

    @Test
    void ageIsCountedToTheTimeGiven() {
        Call call = Call.of("assess", HERON, "--round", DEPARTURE, "--as-of", "2026-03-11T06:10:00+01:00", "--json");
        JsonTree root = JsonTree.parse(call.out());
        assertEquals(
                48, root.get("tanks").items().get(0).get("reading").get("age_h").number(), 1e-9);
        assertTrue(root.get("tanks").items().get(0).get("stale").truth());
        assertEquals("caution", root.get("margin").get("state").text());
        assertFalse(json(DEPARTURE).get("tanks").items().get(0).get("stale").truth());
    }

    @Test
    void badTimeIsTold() {
        Call call = Call.of("assess", HERON, "--round", DEPARTURE, "--as-of", "noon");
        assertEquals(ExitStatus.UNUSABLE, call.status());
        assertEquals(1, call.errorLines().size());
        assertTrue(call.err().startsWith("--as-of is 'noon'; expected a time with offset"), call.err());
    }

    @Test
    void workingLeadsDownToTheReading() {
        Call call = Call.of("assess", HERON, "--round", DEPARTURE, "--working");
        assertTrue(call.out().contains("ship/gm_m = "));
        assertTrue(call.out().contains("lsfo-p/volume_m3 = "));
        assertTrue(call.out().contains(DEPARTURE + ":"), "the reading's line");
        assertTrue(call.out().contains("tanks/lsfo-p.sounding.csv:"), "the table's rows");
    }

    @Test
    void unknownOptionsAreToldInALine() {
        Call call = Call.of("assess", HERON, "--rounds", "x");
        assertEquals(ExitStatus.UNUSABLE, call.status());
        assertEquals(1, call.errorLines().size(), call.err());
    }
}
