// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.contents;

import org.brassbob.core.table.Axis;

/** Which rows of a table a linear reading takes, for the working. */
public final class RowsRead {
    private RowsRead() {}

    /** The one row that a value falls on, or that is nearest to it outside the table, or the two that it falls between. */
    public static int[] about(Axis axis, double at) {
        int cell = axis.cell(at);
        double fraction = axis.fraction(at, cell);
        if (fraction == 0) {
            return new int[] {cell};
        }
        return fraction == 1 ? new int[] {cell + 1} : new int[] {cell, cell + 1};
    }
}
