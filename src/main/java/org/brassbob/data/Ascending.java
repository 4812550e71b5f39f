// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

/** Reports rows that don't ascend, and tables too short to be read between. */
final class Ascending {
    private Ascending() {}

    static void check(CsvTable csv, String column, double[] values) {
        if (values.length < 2) {
            csv.problems().add(csv.file(), csv.headerLine(), values.length + " rows; expected 2 or more");
        }
        for (int i = 1; i < values.length; i++) {
            if (values[i] <= values[i - 1]) {
                csv.rows()
                        .get(i)
                        .problem(column + " is " + values[i] + " after " + values[i - 1] + "; expected it to rise");
            }
        }
    }
}
