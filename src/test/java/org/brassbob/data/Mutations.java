// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Random;

/** Spoils a file at random: bytes, cells, lines, columns, numbers, signs that nobody expects. */
final class Mutations {
    private static final List<String> NASTY = List.of(
            "",
            "NaN",
            "Infinity",
            "-Infinity",
            "1e400",
            "-1e400",
            "1e308",
            "-0",
            "0",
            "-1",
            "1e-320",
            "0x1p3",
            "1,5",
            "1.5.5",
            "999999999",
            "--1",
            "+1",
            ".",
            "e",
            "\"",
            "\"\"",
            "'",
            "\u0000",
            "\u202e",
            "Ⅻ",
            "١٢",
            "null",
            "{",
            "[",
            "#",
            "#: trim_m=9",
            "../../etc",
            "true",
            "1 000",
            " 1",
            "1 ");

    private final Random random;

    Mutations(long seed) {
        random = new Random(seed);
    }

    byte[] spoil(byte[] original) {
        byte[] bytes = original;
        for (int i = 0, n = 1 + random.nextInt(3); i < n; i++) {
            bytes = spoilOnce(bytes);
        }
        return bytes;
    }

    private byte[] spoilOnce(byte[] bytes) {
        if (bytes.length == 0) {
            return new byte[] {(byte) random.nextInt(256)};
        }
        return switch (random.nextInt(9)) {
            case 0 -> flipped(bytes);
            case 1 -> Arrays.copyOf(bytes, random.nextInt(bytes.length));
            case 2 -> lines(bytes, l -> l.remove(random.nextInt(l.size())));
            case 3 -> lines(bytes, l -> l.add(random.nextInt(l.size()), l.get(random.nextInt(l.size()))));
            case 4 -> lines(bytes, l -> Collections.swap(l, random.nextInt(l.size()), random.nextInt(l.size())));
            case 5 -> inserted(bytes, NASTY.get(random.nextInt(NASTY.size())));
            case 6 -> digit(bytes);
            default -> lines(bytes, this::spoilCell);
        };
    }

    private byte[] flipped(byte[] bytes) {
        byte[] copy = bytes.clone();
        copy[random.nextInt(copy.length)] ^= (byte) (1 << random.nextInt(8));
        return copy;
    }

    private byte[] inserted(byte[] bytes, String text) {
        byte[] middle = text.getBytes(StandardCharsets.UTF_8);
        int at = random.nextInt(bytes.length);
        byte[] all = new byte[bytes.length + middle.length];
        System.arraycopy(bytes, 0, all, 0, at);
        System.arraycopy(middle, 0, all, at, middle.length);
        System.arraycopy(bytes, at, all, at + middle.length, bytes.length - at);
        return all;
    }

    /** Another digit in place of one: the slip that leaves a file well formed. */
    private byte[] digit(byte[] bytes) {
        byte[] copy = bytes.clone();
        for (int tries = 0; tries < 50; tries++) {
            int at = random.nextInt(copy.length);
            if (copy[at] >= '0' && copy[at] <= '9') {
                copy[at] = (byte) ('0' + random.nextInt(10));
                return copy;
            }
        }
        return copy;
    }

    private interface Change {
        void to(List<String> lines);
    }

    private static byte[] lines(byte[] bytes, Change change) {
        List<String> lines = new ArrayList<>(Arrays.asList(new String(bytes, StandardCharsets.UTF_8).split("\n", -1)));
        change.to(lines);
        return String.join("\n", lines).getBytes(StandardCharsets.UTF_8);
    }

    private void spoilCell(List<String> lines) {
        int line = random.nextInt(lines.size());
        String[] cells = lines.get(line).split(",", -1);
        int cell = random.nextInt(cells.length);
        if (random.nextBoolean()) {
            cells[cell] = NASTY.get(random.nextInt(NASTY.size()));
        } else {
            cells[cell] = cells[random.nextInt(cells.length)];
        }
        lines.set(line, String.join(",", cells));
    }
}
