// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.time.OffsetDateTime;
import java.time.format.DateTimeParseException;
import org.brassbob.core.round.SoundingRound;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.data.Loaded;
import org.brassbob.data.RoundFile;
import org.brassbob.data.VesselFolder;

/** Turns what was typed into what the core works with. */
final class Inputs {
    private Inputs() {}

    static Vessel vessel(String folder) throws UnusableInput {
        Path path = path(folder);
        if (!Files.isDirectory(path)) {
            throw UnusableInput.of(folder + ":1: not a folder; expected a vessel folder");
        }
        Loaded<Vessel> loaded = VesselFolder.read(path);
        if (loaded.value() == null) {
            throw UnusableInput.in(path, loaded.problems());
        }
        return loaded.orElseThrow();
    }

    static SoundingRound round(String file, Vessel vessel) throws UnusableInput {
        Loaded<SoundingRound> loaded = RoundFile.read(path(file), vessel);
        if (loaded.value() == null) {
            throw UnusableInput.of(loaded.problems());
        }
        return loaded.orElseThrow();
    }

    static Path path(String text) throws UnusableInput {
        try {
            return Path.of(text);
        } catch (InvalidPathException e) {
            throw UnusableInput.of("not a path: " + text);
        }
    }

    static OffsetDateTime time(String option, String text) throws UnusableInput {
        try {
            return OffsetDateTime.parse(text);
        } catch (DateTimeParseException e) {
            throw UnusableInput.of(
                    option + " is '" + text + "'; expected a time with offset, such as 2026-03-04T06:10:00+01:00");
        }
    }
}
