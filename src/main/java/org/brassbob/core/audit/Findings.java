// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import java.util.TreeSet;
import org.brassbob.core.table.Origin;

/** Collects findings while checks run, each once. */
final class Findings {
    private final TreeSet<Finding> found = new TreeSet<>();

    void error(Origin origin, int row, String what, String figure, String expected) {
        add(Finding.Severity.ERROR, origin, row, what, figure, expected);
    }

    void warning(Origin origin, int row, String what, String figure, String expected) {
        add(Finding.Severity.WARNING, origin, row, what, figure, expected);
    }

    /** Something that only the column's own run speaks against: an error where it is beyond what the code tolerates, else a doubt. */
    void doubt(boolean grave, Origin origin, int row, String what, String figure, String expected) {
        add(grave ? Finding.Severity.ERROR : Finding.Severity.WARNING, origin, row, what, figure, expected);
    }

    private void add(Finding.Severity severity, Origin origin, int row, String what, String figure, String expected) {
        found.add(new Finding(severity, origin.file(), Math.max(1, origin.line(row)), what, figure, expected));
    }

    List<Finding> list() {
        return List.copyOf(found);
    }

    /** A number as shown in a finding: four decimals at the most. */
    static String show(double value) {
        if (!Double.isFinite(value)) {
            return "nothing";
        }
        BigDecimal rounded = new BigDecimal(value).setScale(4, RoundingMode.HALF_EVEN);
        return rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString();
    }
}
