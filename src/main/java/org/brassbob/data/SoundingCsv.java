// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.Origin;
import org.brassbob.core.table.SoundingTable;

/** tanks/TANK.sounding.csv: a full grid of volumes by sounding or ullage, trim and heel, its rows in any order. */
final class SoundingCsv {
    private static final Columns SOUNDINGS = Columns.of(List.of("sounding_m", "volume_m3"), "trim_m", "heel_deg");
    private static final Columns ULLAGES = Columns.of(List.of("ullage_m", "volume_m3"), "trim_m", "heel_deg");

    private record Entry(double reading, double trim, double heel, double volume, int line) {}

    private SoundingCsv() {}

    static Optional<SoundingTable> read(String file, byte[] bytes, Problems problems) {
        boolean ullage = startsWithUllage(bytes);
        return CsvTable.read(file, bytes, ullage ? ULLAGES : SOUNDINGS, problems)
                .flatMap(csv ->
                        grid(csv, ullage ? SoundingTable.Argument.ULLAGE : SoundingTable.Argument.SOUNDING, problems));
    }

    /** Whether the header names an ullage: the only thing that must be known before the columns can be checked. */
    private static boolean startsWithUllage(byte[] bytes) {
        int length = Math.min(bytes.length, 2000);
        String start = new String(bytes, 0, length, java.nio.charset.StandardCharsets.UTF_8);
        return start.lines()
                .filter(l -> !l.startsWith("#"))
                .findFirst()
                .orElse("")
                .contains("ullage_m");
    }

    private static Optional<SoundingTable> grid(CsvTable csv, SoundingTable.Argument argument, Problems problems) {
        int before = problems.count();
        String column = argument == SoundingTable.Argument.ULLAGE ? "ullage_m" : "sounding_m";
        Entry[] entries = new Entry[csv.rows().size()];
        for (int i = 0; i < entries.length; i++) {
            Row row = csv.rows().get(i);
            entries[i] = new Entry(
                    row.number(column, 0, 100),
                    csv.has("trim_m") ? row.number("trim_m", -50, 50) : 0,
                    csv.has("heel_deg") ? row.number("heel_deg", -60, 60) : 0,
                    row.number("volume_m3", 0, 1e6),
                    row.line());
        }
        if (problems.count() > before) {
            return Optional.empty();
        }
        if (entries.length < 2) {
            problems.add(csv.file(), csv.headerLine(), entries.length + " rows; expected 2 or more");
            return Optional.empty();
        }
        return place(csv, argument, entries, problems);
    }

    private static Optional<SoundingTable> place(
            CsvTable csv, SoundingTable.Argument argument, Entry[] entries, Problems problems) {
        Axis readings = axis(entries, Entry::reading);
        Axis trims = axis(entries, Entry::trim);
        Axis heels = axis(entries, Entry::heel);
        long nodes = (long) readings.size() * trims.size() * heels.size();
        // A full grid has a row for each node; a table far from that is not worth laying out.
        if (nodes > 4L * entries.length + 16) {
            problems.add(
                    csv.file(),
                    csv.headerLine(),
                    entries.length + " rows for " + readings.size() + " readings × " + trims.size() + " trims × "
                            + heels.size() + " heels; expected a full grid of " + nodes);
            return Optional.empty();
        }
        double[] volumes = new double[(int) nodes];
        int[] lines = new int[(int) nodes];
        int before = problems.count();
        for (Entry e : entries) {
            int node = (exact(trims, e.trim) * heels.size() + exact(heels, e.heel)) * readings.size()
                    + exact(readings, e.reading);
            if (lines[node] != 0) {
                problems.add(
                        csv.file(),
                        e.line,
                        "reading " + e.reading + " m at trim " + e.trim + " m and heel " + e.heel + "° is also on line "
                                + lines[node] + "; expected it once");
            }
            volumes[node] = e.volume;
            lines[node] = e.line;
        }
        reportMissing(csv, readings, trims, heels, lines, problems);
        if (problems.count() > before) {
            return Optional.empty();
        }
        Origin origin = Origin.of(csv.file(), lines);
        return Optional.of(SoundingTable.of(argument, readings, trims, heels, volumes, origin));
    }

    private static void reportMissing(
            CsvTable csv, Axis readings, Axis trims, Axis heels, int[] lines, Problems problems) {
        for (int node = 0; node < lines.length; node++) {
            if (lines[node] == 0) {
                int r = node % readings.size();
                int h = node / readings.size() % heels.size();
                int t = node / readings.size() / heels.size();
                problems.add(
                        csv.file(),
                        csv.headerLine(),
                        "no row for reading " + readings.value(r) + " m at trim " + trims.value(t) + " m and heel "
                                + heels.value(h) + "°; expected a full grid");
            }
        }
    }

    private static Axis axis(Entry[] entries, ToDoubleFunction<Entry> part) {
        // Adding 0 turns a minus nought into nought, so that both fall together.
        return Axis.of(Arrays.stream(entries)
                .mapToDouble(part)
                .map(v -> v + 0.0)
                .sorted()
                .distinct()
                .toArray());
    }

    private static int exact(Axis axis, double value) {
        int cell = axis.cell(value);
        return axis.size() > cell + 1 && axis.value(cell + 1) == value ? cell + 1 : cell;
    }
}
