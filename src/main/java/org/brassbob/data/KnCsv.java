// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.CrossCurves;
import org.brassbob.core.table.Origin;

/** kn.csv: righting-lever cross curves, a column for each heel. */
final class KnCsv {
    static final String FILE = "kn.csv";

    private static final Pattern HEEL = Pattern.compile("kn_(\\d{1,2}(?:\\.\\d{1,2})?)deg_m");
    private static final Columns COLUMNS = new Columns(
            List.of("displacement_t"),
            List.of("flooding_deg", "wind_area_m2", "wind_lever_m"),
            name -> HEEL.matcher(name).matches());

    private KnCsv() {}

    static Optional<CrossCurves> read(byte[] bytes, Problems problems) {
        return CsvTable.read(FILE, bytes, COLUMNS, problems).flatMap(csv -> curves(csv, problems));
    }

    private static Optional<CrossCurves> curves(CsvTable csv, Problems problems) {
        int before = problems.count();
        List<String> names =
                csv.header().stream().filter(n -> HEEL.matcher(n).matches()).toList();
        double[] heels = names.stream().mapToDouble(KnCsv::heel).toArray();
        for (int i = 0; i < heels.length; i++) {
            if (heels[i] <= 0 || (i > 0 && heels[i] <= heels[i - 1])) {
                problems.add(FILE, csv.headerLine(), "column " + names.get(i) + "; expected heels above 0 that rise");
            }
        }
        if (heels.length < 2) {
            problems.add(FILE, csv.headerLine(), heels.length + " KN columns; expected 2 or more, such as kn_10deg_m");
        }
        List<CrossCurves.Row> rows = new ArrayList<>();
        for (Row row : csv.rows()) {
            rows.add(row(row, names));
        }
        Ascending.check(
                csv,
                "displacement_t",
                rows.stream().mapToDouble(CrossCurves.Row::displacement).toArray());
        if (problems.count() > before) {
            return Optional.empty();
        }
        int[] lines = csv.rows().stream().mapToInt(Row::line).toArray();
        return Optional.of(CrossCurves.of(Axis.of(heels), rows, Origin.of(FILE, lines)));
    }

    private static double heel(String column) {
        Matcher matcher = HEEL.matcher(column);
        return matcher.matches() ? Numbers.parse(matcher.group(1)) : Double.NaN;
    }

    private static CrossCurves.Row row(Row row, List<String> names) {
        List<Double> kn = new ArrayList<>();
        for (String name : names) {
            kn.add(row.number(name, -20, 60));
        }
        return new CrossCurves.Row(
                row.number("displacement_t", 0.01, 2e6),
                kn,
                row.optional("flooding_deg", 0, 90),
                row.optional("wind_area_m2", 0, 1e5),
                row.optional("wind_lever_m", 0, 200));
    }
}
