// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.brassbob.core.contents.PetroleumFactor;
import org.brassbob.core.vessel.Expansion;
import org.brassbob.core.vessel.Liquid;
import org.brassbob.core.vessel.LiquidClass;

/**
 * liquids.csv. A density holds at {@code reference_temp_c}; where that is empty, at 15 °C. The petroleum rules take their density at
 * 15 °C and no other.
 */
final class LiquidsCsv {
    static final String FILE = "liquids.csv";

    private static final double PETROLEUM_REFERENCE_C = 15;
    private static final Columns COLUMNS =
            Columns.of(List.of("liquid", "name", "class", "density_t_m3"), "reference_temp_c", "expansion");

    private LiquidsCsv() {}

    static Map<String, Liquid> read(byte[] bytes, Problems problems) {
        Map<String, Liquid> liquids = new LinkedHashMap<>();
        CsvTable.read(FILE, bytes, COLUMNS, problems).ifPresent(csv -> {
            for (Row row : csv.rows()) {
                liquid(row).ifPresent(liquid -> {
                    if (liquids.put(liquid.id(), liquid) != null) {
                        row.problem("liquid " + Numbers.shown(liquid.id()) + " is given twice; expected it once");
                    }
                });
            }
        });
        return liquids;
    }

    private static Optional<Liquid> liquid(Row row) {
        String id = row.required("liquid");
        if (!id.isBlank() && !id.matches("[A-Za-z0-9._-]{1,40}")) {
            row.problem("liquid is " + Numbers.shown(id) + "; expected letters, digits, '.', '_' and '-'");
        }
        Optional<LiquidClass> liquidClass = row.word("class", LiquidClass.values(), LiquidClass::code);
        Expansion expansion = expansion(row);
        double density = row.number("density_t_m3", liquidClass.orElse(null) == LiquidClass.NONE ? 0 : 0.3, 3);
        double reference = row.optional("reference_temp_c", -50, 200, PETROLEUM_REFERENCE_C);
        String name = row.required("name");
        if (expansion != Expansion.NONE) {
            checkPetroleum(row, expansion, density, reference);
        }
        return liquidClass.map(c -> new Liquid(id, name, c, density, reference, expansion));
    }

    private static Expansion expansion(Row row) {
        return row.text("expansion").isEmpty()
                ? Expansion.NONE
                : row.word("expansion", Expansion.values(), Expansion::code).orElse(Expansion.NONE);
    }

    private static void checkPetroleum(Row row, Expansion expansion, double density, double reference) {
        if (reference != PETROLEUM_REFERENCE_C) {
            row.problem("reference_temp_c is " + reference + "; expected 15, which the petroleum rule is made for");
        }
        boolean lubricant = expansion == Expansion.PETROLEUM_LUBRICANT;
        double factor = lubricant ? PetroleumFactor.ofLubricant(density, 20) : PetroleumFactor.of(density, 20);
        if (Double.isNaN(factor) && !Double.isNaN(density)) {
            row.problem("density_t_m3 is " + density + "; expected " + (lubricant ? "0.800 to 1.164" : "0.653 to 1.075")
                    + ", which the petroleum rule covers");
        }
    }
}
