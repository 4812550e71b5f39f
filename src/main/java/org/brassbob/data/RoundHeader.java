// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.brassbob.core.round.SoundingRound.Observed;
import org.brassbob.core.table.LimitCurve;
import org.brassbob.core.vessel.Vessel;
import org.jspecify.annotations.Nullable;

/**
 * The {@code #: key=value} lines before a round's table. A line may carry several pairs, separated by spaces; a curve's name may hold
 * spaces itself, so {@code curve=} takes the rest of its line.
 */
record RoundHeader(Observed observed, @Nullable String curve) {
    private static final String CURVE = "curve";
    private static final List<String> NUMBERS =
            List.of("trim_m", "list_deg", "sea_density_t_m3", "draught_aft_m", "draught_forward_m");

    private record Value(String text, int line) {}

    static RoundHeader read(
            String file, List<CsvTable.Comment> comments, int headerLine, Vessel vessel, Problems problems) {
        Map<String, Value> values = new HashMap<>();
        for (CsvTable.Comment comment : comments) {
            if (comment.text().startsWith(":")) {
                if (comment.line() > headerLine) {
                    problems.add(file, comment.line(), "a header key after the table began; expected it before");
                }
                addPairs(file, comment, values, problems);
            }
        }
        Observed observed = new Observed(
                number(file, values, "trim_m", -50, 50, problems),
                number(file, values, "list_deg", -60, 60, problems),
                number(file, values, "sea_density_t_m3", 0.9, 1.1, problems),
                number(file, values, "draught_aft_m", 0, 60, problems),
                number(file, values, "draught_forward_m", 0, 60, problems));
        if ((observed.draughtAft() == null) != (observed.draughtForward() == null)) {
            Value one = values.getOrDefault("draught_aft_m", values.get("draught_forward_m"));
            problems.add(file, one == null ? 1 : one.line(), "one draught only; expected both aft and forward");
        }
        return new RoundHeader(observed, curve(file, values.get(CURVE), vessel, problems));
    }

    private static void addPairs(String file, CsvTable.Comment comment, Map<String, Value> values, Problems problems) {
        for (String pair : pairs(comment.text().substring(1).strip())) {
            int equals = pair.indexOf('=');
            String key = equals < 0 ? pair : pair.substring(0, equals).strip();
            if (equals < 0 || !(NUMBERS.contains(key) || key.equals(CURVE))) {
                problems.add(
                        file,
                        comment.line(),
                        "unknown header " + Numbers.shown(pair) + "; expected key=value with "
                                + String.join(", ", NUMBERS) + " or curve");
            } else if (values.put(key, new Value(pair.substring(equals + 1).strip(), comment.line())) != null) {
                problems.add(file, comment.line(), "header " + key + " given twice; expected it once");
            }
        }
    }

    private static List<String> pairs(String text) {
        List<String> pairs = new ArrayList<>();
        String rest = text;
        while (!rest.isEmpty()) {
            int space = rest.indexOf(' ');
            if (space < 0 || rest.startsWith(CURVE + "=")) {
                pairs.add(rest);
                return pairs;
            }
            pairs.add(rest.substring(0, space));
            rest = rest.substring(space).strip();
        }
        return pairs;
    }

    private static @Nullable Double number(
            String file, Map<String, Value> values, String key, double low, double high, Problems problems) {
        Value value = values.get(key);
        if (value == null || value.text().isEmpty()) {
            return null;
        }
        double number = Numbers.parse(value.text());
        if (Double.isNaN(number) || number < low || number > high) {
            problems.add(
                    file,
                    value.line(),
                    key + " is " + Numbers.shown(value.text()) + "; expected a number from " + low + " to " + high);
            return null;
        }
        return number;
    }

    private static @Nullable String curve(String file, @Nullable Value value, Vessel vessel, Problems problems) {
        if (value == null || value.text().isEmpty()) {
            return null;
        }
        if (vessel.limitCurve(value.text()).isEmpty()) {
            problems.add(
                    file,
                    value.line(),
                    "curve is " + Numbers.shown(value.text()) + "; expected one of "
                            + String.join(
                                    ", ",
                                    vessel.limitCurves().stream()
                                            .map(LimitCurve::name)
                                            .toList()));
        }
        return value.text();
    }
}
