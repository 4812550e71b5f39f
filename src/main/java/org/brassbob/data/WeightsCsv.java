// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.brassbob.core.vessel.MassPoint;
import org.brassbob.core.vessel.Weight;

/** weights.csv: cargo, stores, constant. */
final class WeightsCsv {
    static final String FILE = "weights.csv";

    private static final Columns COLUMNS =
            Columns.of(List.of("name", "mass_t", "lcg_m", "tcg_m", "vcg_m"), "mass_u_pct", "vcg_u_m");

    private WeightsCsv() {}

    static List<Weight> read(byte[] bytes, Problems problems) {
        List<Weight> weights = new ArrayList<>();
        Set<String> names = new HashSet<>();
        CsvTable.read(FILE, bytes, COLUMNS, problems).ifPresent(csv -> {
            for (Row row : csv.rows()) {
                Weight weight = weight(row);
                if (!names.add(weight.name())) {
                    row.problem("weight " + Numbers.shown(weight.name()) + " is given twice; expected it once");
                }
                weights.add(weight);
            }
        });
        return weights;
    }

    private static Weight weight(Row row) {
        return new Weight(
                row.required("name"),
                new MassPoint(
                        row.number("mass_t", 0, 1e6),
                        row.number("lcg_m", -100, 700),
                        row.number("tcg_m", -60, 60),
                        row.number("vcg_m", -10, 150)),
                row.optional("mass_u_pct", 0, 100),
                row.optional("vcg_u_m", 0, 50));
    }
}
