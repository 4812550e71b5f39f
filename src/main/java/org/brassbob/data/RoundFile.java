// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.io.IOException;
import java.nio.file.Path;
import java.time.OffsetDateTime;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.brassbob.core.round.Reading;
import org.brassbob.core.round.ReadingKind;
import org.brassbob.core.round.SoundingRound;
import org.brassbob.core.table.Origin;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Vessel;
import org.jspecify.annotations.Nullable;

/** Reads a round's readings, checked against the ship that they were taken on. */
public final class RoundFile {
    private static final Columns COLUMNS =
            Columns.of(List.of("tank", "at", "kind", "value"), "temp_c", "density_t_m3", "water_m", "note");

    private final String file;
    private final Vessel vessel;
    private final Map<String, Tank> tanks = new HashMap<>();
    private final Problems problems;

    private RoundFile(String file, Vessel vessel, Problems problems) {
        this.file = file;
        this.vessel = vessel;
        this.problems = problems;
        vessel.tanks().forEach(t -> tanks.put(t.id(), t));
    }

    /** The round in a file on disk. */
    public static Loaded<SoundingRound> read(Path path, Vessel vessel) {
        String file = path.toString();
        try {
            return read(file, DiskFolder.content(path), vessel);
        } catch (IOException e) {
            return unreadable(file);
        }
    }

    private static Loaded<SoundingRound> unreadable(String file) {
        return new Loaded<>(
                null, List.of(new Problem(file, 1, "no such file, or it can't be read; expected a round's readings")));
    }

    /** The round in the bytes of a file. */
    public static Loaded<SoundingRound> read(String file, byte[] bytes, Vessel vessel) {
        Problems problems = new Problems();
        Optional<SoundingRound> round = CsvTable.read(file, bytes, COLUMNS, problems)
                .map(csv -> new RoundFile(file, vessel, problems).round(csv));
        return new Loaded<>(problems.isEmpty() ? round.orElse(null) : null, problems.list());
    }

    private SoundingRound round(CsvTable csv) {
        RoundHeader header = RoundHeader.read(file, csv.comments(), csv.headerLine(), vessel, problems);
        List<Reading> readings = new ArrayList<>();
        Set<String> seen = new HashSet<>();
        for (Row row : csv.rows()) {
            reading(row).ifPresent(readings::add);
            if (!row.text("tank").isEmpty() && !seen.add(row.text("tank") + " " + row.text("at"))) {
                row.problem(
                        "a second reading of " + Numbers.shown(row.text("tank")) + " at the same time; expected one");
            }
        }
        if (csv.rows().isEmpty()) {
            problems.add(file, csv.headerLine(), "no readings; expected one or more");
        }
        return new SoundingRound(file, header.observed(), header.curve(), readings);
    }

    private Optional<Reading> reading(Row row) {
        int before = row.problemCount();
        String id = row.required("tank");
        Tank tank = tanks.get(id);
        if (tank == null && !id.isBlank()) {
            row.problem("tank " + Numbers.shown(id) + " is not one of the ship's; expected an id of tanks.csv");
        }
        Optional<OffsetDateTime> at = time(row);
        Optional<ReadingKind> kind = row.word("kind", ReadingKind.values(), ReadingKind::code);
        double value = kind.map(k -> value(row, k)).orElse(Double.NaN);
        Double temperature = row.optional("temp_c", -30, 200);
        Double density = row.optional("density_t_m3", 0.3, 3);
        Double water = row.optional("water_m", 0, 100);
        if (tank == null || at.isEmpty() || kind.isEmpty()) {
            return Optional.empty();
        }
        checkFits(row, tank, kind.get(), water);
        return row.problemCount() == before
                ? Optional.of(new Reading(
                        id,
                        at.get(),
                        kind.get(),
                        value,
                        temperature,
                        density,
                        water,
                        row.text("note"),
                        Origin.of(file, row.line())))
                : Optional.empty();
    }

    private static void checkFits(Row row, Tank tank, ReadingKind kind, @Nullable Double water) {
        boolean byTape = kind == ReadingKind.SOUNDING || kind == ReadingKind.ULLAGE;
        if ((byTape || (water != null && water > 0)) && !canBeRead(tank, kind)) {
            row.problem("tank " + tank.id() + " has no table or shape that a " + kind.code()
                    + " can be looked up in; expected volume, percent or mass, and no water_m");
        }
        if (kind == ReadingKind.NOT_TAKEN && row.text("note").isBlank()) {
            row.problem("not-taken without a note; expected the reason in note");
        }
        if (kind == ReadingKind.MASS
                && tank.liquid().density() <= 0
                && row.text("density_t_m3").isEmpty()) {
            row.problem(
                    "a mass of " + Numbers.shown(tank.liquid().id()) + ", which has no density; expected density_t_m3");
        }
    }

    /** A table of soundings serves an ullage only with the pipe's length, and the other way round. */
    private static boolean canBeRead(Tank tank, ReadingKind kind) {
        if (tank.pipe() == null && tank.soundings() != null) {
            boolean ullages = tank.soundings().argument() == org.brassbob.core.table.SoundingTable.Argument.ULLAGE;
            return ullages == (kind == ReadingKind.ULLAGE);
        }
        return TanksCsv.canBeSounded(tank);
    }

    private static Optional<OffsetDateTime> time(Row row) {
        String text = row.required("at");
        try {
            OffsetDateTime time = OffsetDateTime.parse(text);
            if (time.getYear() >= 1970 && time.getYear() < 2200) {
                return Optional.of(time);
            }
            row.problem("at is " + Numbers.shown(text) + "; expected a year from 1970 to 2199");
        } catch (DateTimeParseException e) {
            if (!text.isBlank()) {
                row.problem("at is " + Numbers.shown(text)
                        + "; expected a time with offset, such as 2026-03-04T06:10:00+01:00");
            }
        }
        return Optional.empty();
    }

    private static double value(Row row, ReadingKind kind) {
        if (!kind.hasValue()) {
            if (!row.text("value").isEmpty()) {
                row.problem("value is " + Numbers.shown(row.text("value")) + " for " + kind.code() + "; expected none");
            }
            return Double.NaN;
        }
        return row.number("value", 0, kind == ReadingKind.PERCENT || isLength(kind) ? 100 : 1e6);
    }

    private static boolean isLength(ReadingKind kind) {
        return kind == ReadingKind.SOUNDING || kind == ReadingKind.ULLAGE;
    }
}
