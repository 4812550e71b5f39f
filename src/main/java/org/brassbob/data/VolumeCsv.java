// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.List;
import java.util.Optional;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.Origin;
import org.brassbob.core.table.VolumeTable;

/** tanks/TANK.volume.csv: centroid and second moment of the free surface by rising volume. */
final class VolumeCsv {
    private static final Columns COLUMNS = Columns.of(List.of("volume_m3", "lcg_m", "tcg_m", "vcg_m", "fs_m4"));

    private VolumeCsv() {}

    static Optional<VolumeTable> read(String file, byte[] bytes, Problems problems) {
        return CsvTable.read(file, bytes, COLUMNS, problems).flatMap(csv -> table(csv, problems));
    }

    private static Optional<VolumeTable> table(CsvTable csv, Problems problems) {
        int before = problems.count();
        int n = csv.rows().size();
        double[] volume = new double[n];
        double[] lcg = new double[n];
        double[] tcg = new double[n];
        double[] vcg = new double[n];
        double[] fs = new double[n];
        int[] lines = new int[n];
        for (int i = 0; i < n; i++) {
            Row row = csv.rows().get(i);
            volume[i] = row.number("volume_m3", 0, 1e6);
            lcg[i] = row.number("lcg_m", -100, 700);
            tcg[i] = row.number("tcg_m", -60, 60);
            vcg[i] = row.number("vcg_m", -10, 100);
            fs[i] = row.number("fs_m4", 0, 1e9);
            lines[i] = row.line();
        }
        Ascending.check(csv, "volume_m3", volume);
        if (problems.count() > before) {
            return Optional.empty();
        }
        return Optional.of(VolumeTable.of(Axis.of(volume), lcg, tcg, vcg, fs, Origin.of(csv.file(), lines)));
    }
}
