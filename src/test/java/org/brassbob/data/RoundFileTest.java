// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import org.brassbob.core.round.ReadingKind;
import org.brassbob.core.round.SoundingRound;
import org.brassbob.core.vessel.Vessel;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RoundFileTest {
    private static final Vessel BARGE = VesselFolder.read(SmallShip.folder()).orElseThrow();

    private static Loaded<SoundingRound> read(String text) {
        return RoundFile.read("r.csv", text.getBytes(StandardCharsets.UTF_8), BARGE);
    }

    private static List<String> faults(String text) {
        Loaded<SoundingRound> loaded = read(text);
        assertNull(loaded.value());
        return loaded.problems().stream().map(Problem::toString).toList();
    }

    @Test
    void aGoodRoundIsReadAsItStands() {
        SoundingRound round = read(SmallShip.ROUND).orElseThrow();
        assertEquals(0.1, round.observed().trim());
        assertEquals(0.5, round.observed().listDeg());
        assertNull(round.observed().seaDensity());
        assertNull(round.curve());
        assertEquals(5, round.readings().size());
        var fo = round.readings().get(2);
        assertEquals(ReadingKind.ULLAGE, fo.kind());
        assertEquals(1.1, fo.value());
        assertEquals(40.0, fo.temperatureC());
        assertEquals(0.05, fo.waterSounding());
        assertEquals("r.csv:7", fo.origin().at(0));
    }

    @Test
    void headerKeysMayShareALineAndACurveMayHaveSpaces() {
        SoundingRound round = read("#: trim_m=0.2 list_deg=-1\n#: curve=intact\n"
                        + SmallShip.ROUND.substring(SmallShip.ROUND.indexOf("tank,")))
                .orElseThrow();
        assertEquals(0.2, round.observed().trim());
        assertEquals(-1.0, round.observed().listDeg());
        assertEquals("intact", round.curve());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            textBlock =
                    """
        trim_m=0.1 | trim_m=0,1 | r.csv:2: trim_m is '0,1'; expected a number from -50.0 to 50.0
        trim_m=0.1 | trim=0.1 | r.csv:2: unknown header 'trim=0.1'; expected key=value with trim_m, list_deg, sea_density_t_m3, draught_aft_m, draught_forward_m or curve
        list_deg=0.5 | trim_m=0.5 | r.csv:3: header trim_m given twice; expected it once
        list_deg=0.5 | draught_aft_m=2 | r.csv:3: one draught only; expected both aft and forward
        list_deg=0.5 | curve=timber | r.csv:3: curve is 'timber'; expected one of intact
        wb-s, | wb-x, | r.csv:6: tank 'wb-x' is not one of the ship's; expected an id of tanks.csv
        06:05:00Z | 06:05:00 | r.csv:6: at is '2026-05-01T06:05:00'; expected a time with offset, such as 2026-03-04T06:10:00+01:00
        percent,50 | percent,150 | r.csv:8: value is 150; expected 0 to 100
        percent,50 | percent,-1 | r.csv:8: value is -1; expected 0 to 100
        percent,50 | percent, | r.csv:8: value is empty; expected a number
        percent,50 | full,50 | r.csv:8: value is '50' for full; expected none
        percent,50 | not-taken, | r.csv:8: not-taken without a note; expected the reason in note
        percent,50 | sounding,1 | r.csv:8: tank lo has no table or shape that a sounding can be looked up in; expected volume, percent or mass, and no water_m
        ullage,1.1,40 | ullage,1.1,400 | r.csv:7: temp_c is 400; expected -30 to 200
        coff,2026-05-01T06:20:00Z | wb-p,2026-05-01T06:00:00Z | r.csv:9: a second reading of 'wb-p' at the same time; expected one
        """)
    void eachFaultIsToldWithItsLine(String old, String now, String expected) {
        assertTrue(SmallShip.ROUND.contains(old), old);
        List<String> faults = faults(SmallShip.ROUND.replace(old, now));
        assertTrue(faults.contains(expected), () -> String.join("\n", faults));
    }

    @Test
    void aRoundWithoutReadingsIsTold() {
        assertEquals(List.of("r.csv:1: no readings; expected one or more"), faults("tank,at,kind,value\n"));
        assertEquals(List.of("r.csv:1: no header row; expected tank,at,kind,value"), faults(""));
    }

    @Test
    void aFileThatIsntThereIsTold() {
        assertEquals(
                List.of("nosuch.csv:1: no such file, or it can't be read; expected a round's readings"),
                RoundFile.read(Path.of("nosuch.csv"), BARGE).problems().stream()
                        .map(Problem::toString)
                        .toList());
    }
}
