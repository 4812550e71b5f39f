// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.round.Reading;
import org.brassbob.core.round.SoundingRound;
import org.brassbob.core.round.SoundingRound.Observed;
import org.jspecify.annotations.Nullable;

/** A round as a file of readings (vessel data contract, 'A round's readings'): UTF-8 text, lines end in a line feed. */
public final class RoundCsv {
    private RoundCsv() {}

    /** The text; numbers are written so that they read back as the same double. */
    public static String of(SoundingRound round) {
        Observed seen = round.observed();
        StringBuilder text = new StringBuilder();
        header(text, "trim_m", seen.trim());
        header(text, "list_deg", seen.listDeg());
        header(text, "sea_density_t_m3", seen.seaDensity());
        header(text, "draught_aft_m", seen.draughtAft());
        header(text, "draught_forward_m", seen.draughtForward());
        header(text, "curve", round.curve());
        text.append("tank,at,kind,value,temp_c,density_t_m3,water_m,note\n");
        round.readings().forEach(r -> text.append(line(r)).append('\n'));
        return text.toString();
    }

    private static void header(StringBuilder text, String key, @Nullable Object value) {
        if (value != null) {
            text.append("#: ").append(key).append('=').append(value).append('\n');
        }
    }

    private static String line(Reading reading) {
        List<String> cells = new ArrayList<>();
        cells.add(quoted(reading.tank()));
        cells.add(reading.at().toString());
        cells.add(reading.kind().code());
        cells.add(reading.kind().hasValue() ? Double.toString(reading.value()) : "");
        cells.add(number(reading.temperatureC()));
        cells.add(number(reading.density()));
        cells.add(number(reading.waterSounding()));
        cells.add(quoted(reading.note()));
        return String.join(",", cells);
    }

    private static String number(@Nullable Double value) {
        return value == null ? "" : value.toString();
    }

    /** RFC 4180, 2: a cell with a comma, a quote or a line break is quoted, its quotes doubled; so is one that would start a comment. */
    private static String quoted(String cell) {
        boolean plain = cell.chars().noneMatch(c -> ",\"\n\r#".indexOf(c) >= 0) && cell.equals(cell.strip());
        return plain ? cell : '"' + cell.replace("\"", "\"\"") + '"';
    }
}
