// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import org.brassbob.core.table.LimitCurve;
import org.brassbob.core.vessel.Expansion;
import org.brassbob.core.vessel.Gauge;
import org.brassbob.core.vessel.LiquidClass;
import org.brassbob.core.vessel.Policy;
import org.brassbob.core.vessel.SpaceKind;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Use;
import org.brassbob.core.vessel.Vessel;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class VesselFolderTest {
    private static List<String> faults(MemoryFolder folder) {
        Loaded<Vessel> loaded = VesselFolder.read(folder);
        assertNull(loaded.value(), "a folder with faults gives no ship");
        return loaded.problems().stream().map(Problem::toString).toList();
    }

    @Test
    void aGoodFolderIsReadAsItStands() {
        Vessel barge = VesselFolder.read(SmallShip.folder()).orElseThrow();
        assertEquals("Mudlark", barge.name());
        assertEquals(40, barge.particulars().lbp());
        assertEquals(19.5, barge.lightship().lcg());
        assertEquals(6, barge.policy().staleAfterHours(barge.tank("fo").orElseThrow()));
        assertEquals(12, barge.policy().staleAfterHours(barge.tank("coff").orElseThrow()));
        assertEquals(24, barge.policy().staleAfterHours(barge.tank("lo").orElseThrow()));
        assertEquals(Policy.MassIn.VACUUM, barge.policy().massIn());
        assertEquals(
                List.of("wb-p", "wb-s", "fo", "lo", "coff"),
                barge.tanks().stream().map(Tank::id).toList());
        Tank fo = barge.tank("fo").orElseThrow();
        assertEquals(Gauge.ULLAGE, fo.gauge());
        assertEquals(Use.CONSUMABLE, fo.use());
        assertEquals(List.of("lo"), fo.encloses());
        assertEquals(Expansion.PETROLEUM, fo.liquid().expansion());
        assertEquals(2.8, java.util.Objects.requireNonNull(fo.pipe()).length());
        assertEquals(4, fo.origin().line(0));
        Tank coff = barge.tank("coff").orElseThrow();
        assertEquals(SpaceKind.VOID, coff.space());
        assertEquals(LiquidClass.NONE, coff.liquid().liquidClass());
        assertEquals(100, coff.fillLimitPct(), "an empty fill limit is no limit");
        assertNull(barge.tank("lo").orElseThrow().pipe());
        var soundings = java.util.Objects.requireNonNull(
                barge.tank("wb-p").orElseThrow().soundings());
        assertEquals(12, soundings.volume(0.6, 0.3, 1));
        assertEquals(2, soundings.origin().line(0));
        assertEquals(LimitCurve.Kind.GM_REQUIRED, barge.limitCurves().get(0).kind());
        var kn = java.util.Objects.requireNonNull(barge.crossCurves());
        assertEquals(40.0, kn.rows().get(0).floodingDeg());
        assertNull(kn.rows().get(1).floodingDeg());
        assertEquals(2.0, barge.weights().get(0).massUncertaintyPct());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            textBlock =
                    """
        vessel.json | "format": 1 | "format": 2 | vessel.json:2: format is 2.0; expected 1
        vessel.json | "lbp_m": 40, | | vessel.json:5: particulars.lbp_m is missing
        vessel.json | "lbp_m": 40 | "lbp_m": "40" | vessel.json:5: particulars.lbp_m is not a number; expected one, without quotes
        vessel.json | "lbp_m": 40 | "lbp_m": -4 | vessel.json:5: particulars.lbp_m is -4.0; expected 1.0 to 600.0
        vessel.json | "id": "barge" | "id": "the barge" | vessel.json:3: id is 'the barge'; expected letters, digits and -
        vessel.json | "mass_in": "vacuum" | "mass_in": "water" | vessel.json:10: mass_in is 'water'; expected vacuum or air
        vessel.json | "list_limit_deg" | "list_limit" | vessel.json:9: unknown key 'policy.list_limit'; check its spelling
        vessel.json | "default": 24, | "default": 24, "default": 25, | vessel.json:10: key 'default' given twice; expected it once
        vessel.json | "summer_draught_m": 2.2 | "summer_draught_m": 3.2 | vessel.json:5: summer_draught_m is more than depth_m; expected less
        vessel.json | "trim_min_m": -0.5 | "trim_min_m": 1.5 | vessel.json:9: trim_min_m is more than trim_max_m; expected less
        vessel.json | "file": "gm.csv" | "file": "gn.csv" | vessel.json:11: limit curve file 'gn.csv' is not in the folder; expected it there
        vessel.json | "file": "gm.csv" | "file": "../gm.csv" | vessel.json:11: file is '../gm.csv'; expected the name of a .csv file in this folder
        vessel.json | "x_m": 39 | "x_m": 1 | vessel.json:8: two draught marks at x_m 1.0; expected them apart
        hydrostatics.csv | draught_m, | draft_m, | hydrostatics.csv:1: column draught_m is missing
        hydrostatics.csv | 1.20, | 0.90, | hydrostatics.csv:5: draught_m is 0.9 after 0.9; expected it to rise
        hydrostatics.csv | ,3.28,0.150 | ,0,0.150 | hydrostatics.csv:2: tpc_t_per_cm is 0; expected 1.0E-6 to 1000000
        gm.csv | 900,0.4 | 90,0.4 | gm.csv:3: displacement_t is 90.0 after 100.0; expected it to rise
        gm.csv | gm_required_m | gm_m | gm.csv:1: unknown column 'gm_m'; expected displacement_t[,gm_required_m,kg_limit_m]
        kn.csv | kn_20deg_m | kn_5deg_m | kn.csv:1: column kn_5deg_m; expected heels above 0 that rise
        weights.csv | deck cargo,60 | deck cargo,6x | weights.csv:2: mass_t is '6x'; expected a number
        weights.csv | deck cargo,60,20 | deck cargo,"60,5",20 | weights.csv:2: mass_t is '60,5'; expected a number (decimal point, no comma)
        weights.csv | ,3.5,2 | ,3.5 | weights.csv:2: 5 cells; expected 6 as in the header
        liquids.csv | hfo,fuel oil,fuel-oil | hfo,fuel oil,fueloil | liquids.csv:3: class is 'fueloil'; expected one of sea-water, fresh-water, fuel-oil, gas-oil, lube-oil, hydraulic-oil, grey-water, black-water, oily-water, urea, cargo, none
        liquids.csv | 0.96,15,petroleum | 0.96,20,petroleum | liquids.csv:3: reference_temp_c is 20.0; expected 15, which the petroleum rule is made for
        liquids.csv | 0.96,15,petroleum | 1.96,15,petroleum | liquids.csv:3: density_t_m3 is 1.96; expected 0.653 to 1.075, which the petroleum rule covers
        liquids.csv | dry,nothing | sw,nothing | liquids.csv:5: liquid 'sw' is given twice; expected it once
        tanks.csv | wb-s,WB S | wb-p,WB S | tanks.csv:3: tank wb-p is also on line 2; expected each id once
        tanks.csv | lo,LUBE,lube,,4 | lo,LUBE,lube,,3 | tanks.csv:5: walk 3 is also on line 4; expected each place once
        tanks.csv | lo,LUBE,lube | lo,LUBE,tube | tanks.csv:5: liquid is 'tube'; expected one of sw, hfo, lube, dry
        tanks.csv | fixed,wb-s, | fixed,wb-x, | tanks.csv:2: pair is 'wb-x'; expected the id of another tank
        tanks.csv | fixed,wb-s, | fixed,fo, | tanks.csv:2: pair is fo, whose own pair is 'null'; expected wb-p
        tanks.csv | consumable,,lo,0 | consumable,,lp,0 | tanks.csv:4: encloses names 'lp'; expected the id of another tank
        tanks.csv | 40,100,0.5,fixed,wb-s | 40,100,41,fixed,wb-s | tanks.csv:2: residue_m3 is 41.0, not less than the fill limit of 40.0 m3; expected less
        tanks.csv | 20,-2,0,3 | 20,,0,3 | tanks.csv:2: pipe_y_m is empty; expected a number
        tanks.csv | lo,LUBE,lube,,4,remote | lo,LUBE,lube,,4,sounding | tanks.csv:5: tank lo is read by sounding; expected tanks/lo.sounding.csv, or a shape and a pipe
        tanks/wb-p.sounding.csv | 1.0,20,1,0 | 1.1,20,1,0 | tanks/wb-p.sounding.csv:1: no row for reading 1.0 m at trim 1.0 m and heel 0.0°; expected a full grid
        tanks/wb-p.sounding.csv | 1.0,20,1,0 | 0.5,20,1,0 | tanks/wb-p.sounding.csv:24: reading 0.5 m at trim 1.0 m and heel 0.0° is also on line 23; expected it once
        tanks/wb-p.volume.csv | 15,25 | 5,25 | tanks/wb-p.volume.csv:5: volume_m3 is 5.0 after 10.0; expected it to rise
        tanks/fo.shape.csv | 10.0,1,-3.0,2.4 | | tanks/fo.shape.csv:6: loop 1 at x = 10.0 has 3 points; expected 4 as at the station before
        tanks/fo.shape.csv | 4.0,1,3.0,0.2 | 4.0,1,3.0,9e9 | tanks/fo.shape.csv:3: z_m is 9e9; expected -10 to 100
        """)
    void eachFaultIsToldWithFileAndLine(String file, String old, String now, String expected) {
        MemoryFolder good = SmallShip.folder();
        String text = good.text(file);
        assertTrue(text.contains(old), () -> file + " has no '" + old + "'");
        List<String> faults = faults(good.with(
                file,
                text.replaceFirst(
                        java.util.regex.Pattern.quote(old),
                        now == null ? "" : java.util.regex.Matcher.quoteReplacement(now))));
        assertTrue(faults.contains(expected), () -> String.join("\n", faults));
    }

    @Test
    void allFaultsOfAllFilesAreTold() {
        MemoryFolder bad = SmallShip.folder()
                .with("gm.csv", "displacement_t,gm_required_m\nx,0.3\n900,y\n")
                .with("weights.csv", "name,mass_t,lcg_m,tcg_m,vcg_m\n,1,2,3,4\nb,,2,3,4\n")
                .without("liquids.csv");
        List<String> faults = faults(bad);
        for (String start : List.of(
                "gm.csv:2: displacement_t is 'x'",
                "gm.csv:3: gm_required_m is 'y'",
                "weights.csv:2: name is empty",
                "weights.csv:3: mass_t is empty",
                "liquids.csv:1: no such file")) {
            assertTrue(
                    faults.stream().anyMatch(f -> f.startsWith(start)), () -> start + "\n" + String.join("\n", faults));
        }
    }

    @Test
    void missingFilesAreTold() {
        List<String> faults = faults(MemoryFolder.empty());
        assertEquals(
                List.of("vessel.json", "hydrostatics.csv", "liquids.csv", "tanks.csv"),
                faults.stream().map(f -> f.substring(0, f.indexOf(':'))).toList());
    }

    @Test
    void aTableThatBelongsToNoTankIsTold() {
        List<String> faults = faults(SmallShip.folder().with("tanks/wb-q.volume.csv", "x"));
        assertEquals(
                List.of("tanks/wb-q.volume.csv:1: belongs to no tank of tanks.csv; expected TANK.sounding.csv, "
                        + "TANK.volume.csv or TANK.shape.csv"),
                faults);
    }

    @ParameterizedTest
    @CsvSource({
        "weigths.csv, weights.csv",
        "Weights.csv, weights.csv",
        "hydrostatic.csv, hydrostatics.csv",
        "knn.csv, kn.csv"
    })
    void aFileNameWithASlipIsTold(String slip, String meant) {
        assertEquals(
                List.of(slip + ":1: no file of a vessel folder; expected it to be named " + meant),
                faults(SmallShip.folder().with(slip, "x")));
    }

    @Test
    void withoutHydrostaticsTheHullServes() {
        Vessel barge = VesselFolder.read(SmallShip.folder().without("hydrostatics.csv"))
                .orElseThrow();
        assertNull(barge.hydrostatics());
        assertEquals(
                List.of("hydrostatics.csv:1: no such file; expected it, or hull.shape.csv to work it out from"),
                faults(SmallShip.folder().without("hydrostatics.csv").without("hull.shape.csv")));
    }

    @Test
    void otherFilesAreNobodysBusiness() {
        assertNotNull(VesselFolder.read(SmallShip.folder().with("plan.csv", "x").with("notes.txt", "y"))
                .value());
    }

    @Test
    void bytesThatAreNoTextAreToldWithTheirLine() {
        byte[] bytes = "name,mass_t,lcg_m,tcg_m,vcg_m\na,1,1,1,1\nb\u00ff".getBytes(StandardCharsets.ISO_8859_1);
        assertEquals(
                List.of("weights.csv:3: bytes that are not UTF-8; expected UTF-8 text"),
                faults(SmallShip.folder().with("weights.csv", bytes)));
    }

    @Test
    void byteOrderMarksAndCarriageReturnsAreTaken() {
        MemoryFolder good = SmallShip.folder();
        String text = "\uFEFF" + good.text("weights.csv").replace("\n", "\r\n");
        assertNotNull(VesselFolder.read(good.with("weights.csv", text)).value());
    }

    @Test
    void brokenJsonIsToldWithItsLine() {
        List<String> faults = faults(SmallShip.folder().with("vessel.json", "{\n \"format\": 1,\n oops }"));
        assertTrue(faults.get(0).startsWith("vessel.json:3: not JSON: "), faults.get(0));
    }

    @Test
    void aShipWithoutLimitCurvesOrWeightsIsRead() {
        MemoryFolder good = SmallShip.folder();
        String json = good.text("vessel.json").replace("[ { \"name\": \"intact\", \"file\": \"gm.csv\" } ]", "[]");
        Vessel bare = VesselFolder.read(
                        good.with("vessel.json", json).without("weights.csv").without("kn.csv"))
                .orElseThrow();
        assertEquals(List.of(), bare.limitCurves());
        assertEquals(List.of(), bare.weights());
    }

    @Test
    void theFingerprintFollowsEveryFileAndNoRound() {
        MemoryFolder good = SmallShip.folder();
        String print = VesselFolder.read(good).orElseThrow().dataSha256();
        assertEquals(64, print.length());
        assertEquals(print, VesselFolder.read(SmallShip.folder()).orElseThrow().dataSha256());
        assertEquals(
                print,
                VesselFolder.read(good.with("rounds/a.csv", "x")).orElseThrow().dataSha256());
        String changed = good.text("weights.csv").replace("60", "61");
        assertNotEquals(
                print,
                VesselFolder.read(good.with("weights.csv", changed))
                        .orElseThrow()
                        .dataSha256());
        assertEquals(15, VesselFolder.fingerprints(good).size());
    }

    /** The seam of two stations whose rows run on: a tank that jumps from 2 m to 1 m of height, its end stepping down by a corner. */
    @Test
    void aJumpOfOneLoopIsTwoStations() {
        String step =
                """
                x_m,loop,y_m,z_m
                4,1,-3,0.2
                4,1,3,0.2
                4,1,3,2.2
                4,1,-3,2.2
                7,1,-3,0.2
                7,1,3,0.2
                7,1,3,2.2
                7,1,-3,2.2
                7,1,-3,0.2
                7,1,3,0.2
                7,1,3,1.2
                7,1,0,1.2
                7,1,-3,1.2
                10,1,-3,0.2
                10,1,3,0.2
                10,1,3,1.2
                10,1,0,1.2
                10,1,-3,1.2
                """;
        Vessel barge = VesselFolder.read(SmallShip.folder().with("tanks/fo.shape.csv", step))
                .orElseThrow();
        var shape =
                java.util.Objects.requireNonNull(barge.tank("fo").orElseThrow().shape());
        assertEquals(4, shape.stations().size());
        assertEquals(10, shape.origin().line(2));
        var moulded =
                org.brassbob.core.contents.TankShapes.of(barge).moulded("fo").orElseThrow();
        assertEquals(3 * 6 * 2 + 3 * 6, moulded.volume(), 1e-9);
    }
}
