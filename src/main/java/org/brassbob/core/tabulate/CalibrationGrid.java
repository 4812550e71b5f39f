// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import org.brassbob.core.table.Axis;

/**
 * How finely a tank is tabulated.
 *
 * @param trims trims of the sounding table (m)
 * @param heels heels of the sounding table (°)
 * @param readings about how many readings it has at the most
 */
public record CalibrationGrid(Axis trims, Axis heels, int readings) {
    /** What a coaster's booklet commonly carries. */
    public static final CalibrationGrid USUAL =
            new CalibrationGrid(Axis.of(-0.5, 0, 0.5, 1, 1.5, 2), Axis.of(-2, -1, 0, 1, 2), 40);
}
