// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.brassbob.core.condition.Assessor;
import org.brassbob.core.round.Reading;
import org.brassbob.core.round.ReadingKind;
import org.brassbob.core.round.SoundingRound;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.data.RoundFile;
import org.brassbob.data.VesselFolder;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The demo ship's rounds through a file, the records and a file again. */
class RoundCsvTest {
    private static final Path HERON = Path.of("vessel-data/heron");
    private static final Vessel VESSEL = VesselFolder.read(HERON).orElseThrow();

    @TempDir
    Path folder;

    static List<Path> rounds() throws Exception {
        try (Stream<Path> files = Files.list(HERON.resolve("rounds"))) {
            return files.sorted().toList();
        }
    }

    private static SoundingRound read(String csv) {
        return RoundFile.read("out.csv", csv.getBytes(StandardCharsets.UTF_8), VESSEL)
                .orElseThrow();
    }

    private static SoundingRound bare(SoundingRound round) {
        List<Reading> readings = round.readings().stream()
                .map(r -> new Reading(
                        r.tank(),
                        r.at(),
                        r.kind(),
                        r.kind().hasValue() ? r.value() : 0,
                        r.temperatureC(),
                        r.density(),
                        r.waterSounding(),
                        r.note(),
                        Entries.NOWHERE))
                .toList();
        return new SoundingRound("", round.observed(), round.curve(), readings);
    }

    @ParameterizedTest
    @MethodSource("rounds")
    void roundComesBackAsItWas(Path file) {
        SoundingRound in = RoundFile.read(file, VESSEL).orElseThrow();
        assertFalse(in.readings().isEmpty());
        SoundingRound stored;
        try (Store store = Store.open(folder).opened().orElseThrow()) {
            RoundDraft draft = new RoundDraft(
                    "heron",
                    "abc",
                    in.name(),
                    "A. Teal",
                    in.readings().get(0).at(),
                    new RoundDraft.Sight(in.observed(), Conditions.ALONGSIDE, in.curve()));
            List<ReadingDraft> readings = in.readings().stream()
                    .map(r -> ReadingDraft.plain(r, "A. Teal"))
                    .toList();
            long id = store.rounds().add(draft, Entries.START, readings);
            stored = RoundStore.forCore(
                    store.rounds().find(id).orElseThrow(), store.readings().ofRound(id));
        }
        assertEquals(bare(in), bare(stored));
        assertEquals(bare(in), bare(read(RoundCsv.of(stored))));
        Assessor assessor = Assessor.of(VESSEL);
        assertEquals(assessor.assess(in).condition(), assessor.assess(stored).condition());
    }

    @Test
    void awkwardNotesComeBack() {
        String tank = VESSEL.tanks().get(0).id();
        for (String note : List.of("a, b", "say \"no\"", "# not a comment", " spaces ", "two\nlines")) {
            Reading reading = new Reading(
                    tank, Entries.START, ReadingKind.NOT_TAKEN, Double.NaN, null, null, null, note, Entries.NOWHERE);
            SoundingRound round = new SoundingRound("", Entries.ROUND.sight().observed(), null, List.of(reading));
            assertEquals(note, read(RoundCsv.of(round)).readings().get(0).note());
        }
    }
}
