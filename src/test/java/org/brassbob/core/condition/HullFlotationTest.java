// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.brassbob.core.notice.NoticeCode;
import org.brassbob.core.round.SoundingRound;
import org.brassbob.core.tabulate.HullTables;
import org.brassbob.core.tabulate.HydrostaticMaker;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.data.MemoryFolder;
import org.brassbob.data.RoundFile;
import org.brassbob.data.VesselFolder;
import org.junit.jupiter.api.Test;

/** Where the hydrostatic table doesn't reach, or isn't there, the hull's shape serves (product rule 1, for hydrostatics). */
class HullFlotationTest {
    private static MemoryFolder heron() throws IOException {
        return MemoryFolder.of(Path.of("vessel-data/heron"));
    }

    private static Assessment assess(MemoryFolder folder) throws IOException {
        Vessel vessel = VesselFolder.read(folder).orElseThrow();
        byte[] bytes = Files.readString(Path.of("vessel-data/heron/rounds/departure.csv"))
                .getBytes(StandardCharsets.UTF_8);
        SoundingRound round = RoundFile.read("departure.csv", bytes, vessel).orElseThrow();
        return Assessor.of(vessel).assess(round);
    }

    private static void assertExact(Assessment assessment) throws IOException {
        Vessel vessel = VesselFolder.read(heron()).orElseThrow();
        double density =
                java.util.Objects.requireNonNull(assessment.round().observed().seaDensity());
        HydrostaticMaker hull = new HydrostaticMaker(
                HullTables.bothSides(java.util.Objects.requireNonNull(vessel.hull())), density, 84);
        double exact =
                hull.atDisplacement(assessment.condition().displacement()).kmt();
        assertEquals(exact, assessment.condition().kmt(), 2e-4);
    }

    @Test
    void withoutATableTheHullGivesKm() throws IOException {
        assertExact(assess(heron().without("hydrostatics.csv")));
    }

    @Test
    void beyondTheTableTheHullGivesKmAndSaysSo() throws IOException {
        MemoryFolder heron = heron();
        List<String> rows = heron.text("hydrostatics.csv").lines().toList();
        // Only the rows up to a draught of 4 m: the ship floats deeper.
        Assessment assessment = assess(heron.with("hydrostatics.csv", String.join("\n", rows.subList(0, 9))));
        assertExact(assessment);
        assertTrue(assessment.notices().stream().anyMatch(n -> n.code() == NoticeCode.OUTSIDE_HYDROSTATICS_HULL));
    }

    @Test
    void withNeitherTheEdgeIsTakenAndTheStateHeld() throws IOException {
        MemoryFolder heron = heron().without("hull.shape.csv");
        List<String> rows = heron.text("hydrostatics.csv").lines().toList();
        Assessment assessment = assess(heron.with("hydrostatics.csv", String.join("\n", rows.subList(0, 9))));
        assertTrue(assessment.notices().stream().anyMatch(n -> n.code() == NoticeCode.OUTSIDE_HYDROSTATICS_EDGE));
        assertTrue(assessment.margin().state() != Margin.State.CLEAR);
    }
}
