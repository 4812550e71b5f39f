// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.data.Loaded;
import org.brassbob.data.MemoryFolder;
import org.brassbob.data.VesselFolder;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * One digit typed wrong in a ship without shapes. Only the tables themselves speak then: what their smoothness can show, and what it
 * can't, is measured here and pinned as the share that must be found.
 */
class TablesOnlyCorruptionTest {
    private static final int SLIPS = 150;

    private static MemoryFolder dabchick() throws IOException {
        return MemoryFolder.of(Path.of("vessel-data/dabchick"));
    }

    @Test
    void theShipAsDeliveredHasNoFinding() throws IOException {
        Vessel vessel = VesselFolder.read(dabchick()).orElseThrow();
        assertEquals(List.of(), Audit.of(vessel).stream().map(Finding::text).toList());
    }

    @ParameterizedTest
    @CsvSource({
        ".sounding.csv, volume_m3, 0.91",
        ".volume.csv, volume_m3, 0.85",
        ".volume.csv, lcg_m, 0.95",
        ".volume.csv, tcg_m, 0.93",
        ".volume.csv, vcg_m, 0.94",
        ".volume.csv, fs_m4, 0.89",
        "hydrostatics.csv, displacement_t, 0.68",
        "hydrostatics.csv, lcb_m, 0.87",
        "hydrostatics.csv, lcf_m, 0.78",
        "hydrostatics.csv, kmt_m, 0.72",
        "hydrostatics.csv, mct_tm_per_cm, 0.85",
        "hydrostatics.csv, tpc_t_per_cm, 0.86",
        "hydrostatics.csv, kb_m, 0.86",
    })
    void slipsAreFound(String file, String column, double share) throws IOException {
        MemoryFolder ship = dabchick();
        List<String> files = ship.paths().stream().filter(p -> p.endsWith(file)).toList();
        Random random = new Random((file + column).hashCode());
        List<String> missed = new ArrayList<>();
        for (int i = 0; i < SLIPS; i++) {
            String path = files.get(random.nextInt(files.size()));
            MistypedCell slip = MistypedCell.in(ship.text(path), column, random);
            if (slip.size() > 0 && !isFound(ship.with(path, slip.text()))) {
                missed.add(String.format(
                        Locale.ROOT, "%s:%d %s typed as %s", path, slip.line(), slip.before(), slip.after()));
            }
        }
        assertTrue(SLIPS - missed.size() >= share * SLIPS, () -> missed.size() + " of " + SLIPS + " missed: " + missed);
    }

    private static boolean isFound(MemoryFolder folder) {
        Loaded<Vessel> loaded = VesselFolder.read(folder);
        Vessel vessel = loaded.value();
        return vessel == null || !Audit.of(vessel).isEmpty();
    }
}
