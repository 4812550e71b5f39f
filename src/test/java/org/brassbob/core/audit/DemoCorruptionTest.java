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
 * One digit typed wrong in one cell of the demo ship, column by column, at places drawn by a fixed seed. Her tables follow her shapes to
 * rounding, so that nearly every slip must be found; the share that must be is stated beside each column.
 */
class DemoCorruptionTest {
    private static final int SLIPS = 40;

    private static MemoryFolder heron() throws IOException {
        return MemoryFolder.of(Path.of("vessel-data/heron"));
    }

    @Test
    void theShipAsDeliveredHasNoFinding() throws IOException {
        Vessel vessel = VesselFolder.read(heron()).orElseThrow();
        assertEquals(List.of(), Audit.of(vessel).stream().map(Finding::text).toList());
    }

    @ParameterizedTest
    @CsvSource({
        ".sounding.csv, volume_m3, 1.0",
        ".volume.csv, volume_m3, 1.0",
        ".volume.csv, lcg_m, 1.0",
        ".volume.csv, tcg_m, 1.0",
        ".volume.csv, vcg_m, 1.0",
        ".volume.csv, fs_m4, 1.0",
        "hydrostatics.csv, draught_m, 1.0",
        "hydrostatics.csv, displacement_t, 1.0",
        "hydrostatics.csv, lcb_m, 1.0",
        "hydrostatics.csv, lcf_m, 1.0",
        "hydrostatics.csv, kmt_m, 1.0",
        "hydrostatics.csv, mct_tm_per_cm, 1.0",
        "hydrostatics.csv, tpc_t_per_cm, 1.0",
        "hydrostatics.csv, kb_m, 1.0",
        "kn.csv, kn_5deg_m, 1.0",
        "kn.csv, kn_30deg_m, 1.0",
        "kn.csv, kn_60deg_m, 1.0",
    })
    void slipsAreFound(String file, String column, double share) throws IOException {
        MemoryFolder heron = heron();
        List<String> files =
                heron.paths().stream().filter(p -> p.endsWith(file)).toList();
        Random random = new Random((file + column).hashCode());
        List<String> missed = new ArrayList<>();
        for (int i = 0; i < SLIPS; i++) {
            String path = files.get(random.nextInt(files.size()));
            MistypedCell slip = MistypedCell.in(heron.text(path), column, random);
            if (slip.size() > 0 && !isFound(heron.with(path, slip.text()), path)) {
                missed.add(String.format(
                        Locale.ROOT, "%s:%d %s typed as %s", path, slip.line(), slip.before(), slip.after()));
            }
        }
        assertTrue(SLIPS - missed.size() >= share * SLIPS, () -> missed.size() + " of " + SLIPS + " missed: " + missed);
    }

    private static boolean isFound(MemoryFolder folder, String path) {
        Loaded<Vessel> loaded = VesselFolder.read(folder);
        Vessel vessel = loaded.value();
        return vessel == null
                ? loaded.problems().stream().anyMatch(p -> p.file().equals(path))
                : Audit.of(relevant(vessel, path)).stream()
                        .anyMatch(f -> f.severity() == Finding.Severity.ERROR
                                && f.file().equals(path));
    }

    /** The cross curves take most of an audit's time and have no part in the other tables. */
    private static Vessel relevant(Vessel v, String path) {
        return path.equals("kn.csv")
                ? v
                : new Vessel(
                        v.id(),
                        v.name(),
                        v.particulars(),
                        v.lightship(),
                        v.seaDensity(),
                        v.draughtMarks(),
                        v.policy(),
                        v.sources(),
                        v.hydrostatics(),
                        v.limitCurves(),
                        null,
                        v.weights(),
                        v.liquids(),
                        v.tanks(),
                        v.hull(),
                        v.dataSha256());
    }
}
