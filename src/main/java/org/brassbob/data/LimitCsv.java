// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.List;
import java.util.Optional;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.LimitCurve;
import org.brassbob.core.table.Origin;

/** A limit curve; its second column says whether it limits GM or KG. */
final class LimitCsv {
    private static final String GM = "gm_required_m";
    private static final String KG = "kg_limit_m";
    private static final Columns COLUMNS = Columns.of(List.of("displacement_t"), GM, KG);

    private LimitCsv() {}

    static Optional<LimitCurve> read(String name, String file, byte[] bytes, Problems problems) {
        return CsvTable.read(file, bytes, COLUMNS, problems).flatMap(csv -> curve(name, csv, problems));
    }

    private static Optional<LimitCurve> curve(String name, CsvTable csv, Problems problems) {
        if (csv.has(GM) == csv.has(KG)) {
            problems.add(csv.file(), csv.headerLine(), "expected one of the columns gm_required_m and kg_limit_m");
            return Optional.empty();
        }
        int before = problems.count();
        int n = csv.rows().size();
        double[] displacements = new double[n];
        double[] values = new double[n];
        int[] lines = new int[n];
        for (int i = 0; i < n; i++) {
            Row row = csv.rows().get(i);
            displacements[i] = row.number("displacement_t", 0.01, 2e6);
            values[i] = row.number(csv.has(GM) ? GM : KG, 0, 100);
            lines[i] = row.line();
        }
        Ascending.check(csv, "displacement_t", displacements);
        if (problems.count() > before) {
            return Optional.empty();
        }
        LimitCurve.Kind kind = csv.has(GM) ? LimitCurve.Kind.GM_REQUIRED : LimitCurve.Kind.KG_LIMIT;
        return Optional.of(LimitCurve.of(name, kind, Axis.of(displacements), values, Origin.of(csv.file(), lines)));
    }
}
