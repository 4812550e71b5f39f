// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.table.HydrostaticTable.Entry;
import org.brassbob.core.table.Origin;

/** hydrostatics.csv: rows by rising draught, for even keel or for each of several trims. */
final class HydrostaticsCsv {
    static final String FILE = "hydrostatics.csv";

    private static final Columns COLUMNS = Columns.of(
            List.of("draught_m", "displacement_t", "lcb_m", "lcf_m", "kmt_m", "mct_tm_per_cm", "tpc_t_per_cm"),
            "kb_m",
            "trim_m");

    private HydrostaticsCsv() {}

    static Optional<HydrostaticTable> read(byte[] bytes, Problems problems) {
        return CsvTable.read(FILE, bytes, COLUMNS, problems).flatMap(csv -> table(csv, problems));
    }

    private static Optional<HydrostaticTable> table(CsvTable csv, Problems problems) {
        int before = problems.count();
        Map<Double, List<Row>> byTrim = new TreeMap<>();
        for (Row row : csv.rows()) {
            double trim = csv.has("trim_m") ? row.number("trim_m", -50, 50) + 0.0 : 0;
            byTrim.computeIfAbsent(trim, t -> new ArrayList<>()).add(row);
        }
        List<HydrostaticTable.Rows> sets = new ArrayList<>();
        for (List<Row> rows : byTrim.values()) {
            set(csv, rows).ifPresent(sets::add);
        }
        if (csv.rows().isEmpty()) {
            problems.add(FILE, csv.headerLine(), "0 rows; expected 2 or more");
        }
        if (!byTrim.isEmpty()
                && (byTrim.keySet().stream().allMatch(t -> t > 0)
                        || byTrim.keySet().stream().allMatch(t -> t < 0))) {
            problems.add(
                    FILE,
                    csv.headerLine(),
                    "the trims don't reach even keel; expected trim_m on both sides of 0, or 0");
        }
        if (problems.count() > before) {
            return Optional.empty();
        }
        double[] trims = byTrim.keySet().stream().mapToDouble(t -> t).toArray();
        return Optional.of(HydrostaticTable.of(Axis.of(trims), sets));
    }

    private static Optional<HydrostaticTable.Rows> set(CsvTable csv, List<Row> rows) {
        Problems problems = csv.problems();
        int before = problems.count();
        List<Entry> entries = new ArrayList<>();
        for (Row row : rows) {
            entries.add(entry(row));
            checkRises(row, entries);
        }
        if (rows.size() < 2) {
            rows.get(0).problem("one row at this trim; expected 2 or more");
        }
        if (problems.count() > before) {
            return Optional.empty();
        }
        int[] lines = rows.stream().mapToInt(Row::line).toArray();
        return Optional.of(HydrostaticTable.Rows.of(entries, Origin.of(FILE, lines)));
    }

    private static Entry entry(Row row) {
        Double kb = row.optional("kb_m", 0, 60);
        return new Entry(
                row.number("draught_m", 0.01, 60),
                row.number("displacement_t", 0.01, 2e6),
                row.number("lcb_m", -100, 700),
                row.number("lcf_m", -100, 700),
                row.number("kmt_m", 0.01, 1000),
                row.number("mct_tm_per_cm", 1e-6, 1e6),
                row.number("tpc_t_per_cm", 1e-6, 1e6),
                kb == null ? Double.NaN : kb);
    }

    private static void checkRises(Row row, List<Entry> entries) {
        if (entries.size() < 2) {
            return;
        }
        Entry before = entries.get(entries.size() - 2);
        Entry now = entries.get(entries.size() - 1);
        if (now.draught() <= before.draught()) {
            row.problem("draught_m is " + now.draught() + " after " + before.draught() + "; expected it to rise");
        }
        if (now.displacement() <= before.displacement()) {
            row.problem("displacement_t is " + now.displacement() + " after " + before.displacement()
                    + "; expected it to rise");
        }
    }
}
