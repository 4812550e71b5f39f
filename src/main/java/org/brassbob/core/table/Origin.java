// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.table;

/**
 * Where the rows of a table were read: a file name relative to the vessel folder and the line of each row. Carried by every table, so
 * that an audit finding and the working of a figure can name the line.
 */
public final class Origin {
    private final String file;
    private final int[] lines;

    private Origin(String file, int[] lines) {
        this.file = file;
        this.lines = lines;
    }

    /**
     * From columns already read.
     *
     * @param file path relative to the vessel folder, with forward slashes
     * @param lines the line number (from 1) of each row, in the order of the table's rows
     */
    public static Origin of(String file, int... lines) {
        return new Origin(file, lines.clone());
    }

    /** A table that was worked out, not read; its rows have no lines (0). */
    public static Origin computed(String what) {
        return new Origin(what, new int[0]);
    }

    public String file() {
        return file;
    }

    /** The line (from 1) of row {@code row} (from 0); 0 where there is none. */
    public int line(int row) {
        return row >= 0 && row < lines.length ? lines[row] : 0;
    }

    /** {@code FILE:LINE} of row {@code row}, or the file alone where the row has no line. */
    public String at(int row) {
        int line = line(row);
        return line > 0 ? file + ":" + line : file;
    }

    @Override
    public String toString() {
        return file;
    }
}
