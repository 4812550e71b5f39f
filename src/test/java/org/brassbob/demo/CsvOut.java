// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** A file of a vessel folder while it is being written. Every file begins by saying what it is. */
final class CsvOut {
    private static final String DEMO = "# Demo data, invented; not a real ship";
    private static final int DECIMALS = 4;

    private final List<String> lines = new ArrayList<>();

    private CsvOut() {}

    /** A table with its header row. */
    static CsvOut table(String header) {
        CsvOut out = new CsvOut();
        out.lines.add(DEMO);
        out.lines.add(header);
        return out;
    }

    /** A table given whole. */
    static CsvOut of(String text) {
        CsvOut out = new CsvOut();
        out.lines.add(DEMO);
        out.lines.addAll(text.strip().lines().toList());
        return out;
    }

    void row(String... cells) {
        lines.add(String.join(",", cells));
    }

    /** How many rows there are, the header among them. */
    int rows() {
        return lines.size() - 1;
    }

    /** A row of numbers. */
    void numbers(double... values) {
        row(Arrays.stream(values).mapToObj(CsvOut::number).toArray(String[]::new));
    }

    /** A number with as many decimals as it needs, four at the most. */
    static String number(double value) {
        BigDecimal rounded =
                new BigDecimal(value).setScale(DECIMALS, RoundingMode.HALF_EVEN).stripTrailingZeros();
        return rounded.signum() == 0 ? "0" : rounded.toPlainString();
    }

    void to(Path file) {
        write(file, String.join("\n", lines) + "\n");
    }

    /** Writes a text, making the folders above it. */
    static void write(Path file, String text) {
        try {
            Path folder = file.getParent();
            if (folder != null) {
                Files.createDirectories(folder);
            }
            Files.write(file, text.getBytes(StandardCharsets.UTF_8));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
