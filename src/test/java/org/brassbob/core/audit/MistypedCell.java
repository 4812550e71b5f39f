// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;

/**
 * A CSV text in which one digit of one cell of a column was typed wrong.
 *
 * @param text the whole file
 * @param before the cell as it was
 * @param after the cell as it is now
 * @param line its line
 */
record MistypedCell(String text, String before, String after, int line) {
    static MistypedCell in(String csv, String column, Random random) {
        List<String> lines = new ArrayList<>(Arrays.asList(csv.split("\n", -1)));
        int header = 0;
        while (lines.get(header).startsWith("#")) {
            header++;
        }
        int index = Arrays.asList(lines.get(header).split(",", -1)).indexOf(column);
        while (true) {
            int line = header + 1 + random.nextInt(lines.size() - header - 1);
            String[] cells = lines.get(line).split(",", -1);
            if (cells.length > index && !cells[index].isEmpty()) {
                String before = cells[index];
                cells[index] = mistyped(before, random);
                lines.set(line, String.join(",", cells));
                return new MistypedCell(String.join("\n", lines), before, cells[index], line + 1);
            }
        }
    }

    private static String mistyped(String number, Random random) {
        char[] signs = number.toCharArray();
        int at;
        do {
            at = random.nextInt(signs.length);
        } while (!Character.isDigit(signs[at]));
        char old = signs[at];
        while (signs[at] == old) {
            signs[at] = (char) ('0' + random.nextInt(10));
        }
        return new String(signs);
    }

    double size() {
        return Math.abs(Double.parseDouble(after) - Double.parseDouble(before));
    }
}
