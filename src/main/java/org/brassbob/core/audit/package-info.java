// SPDX-License-Identifier: GPL-3.0-or-later

/**
 * Checks a ship's data against themselves: every table against the shape it belongs to, against its neighbours, and against itself.
 *
 * <p>Two ways of finding a mistyped cell serve throughout. Where there is a reference (a shape, a twin), the differences of a whole table
 * are looked at together, and a cell is suspect that differs far more than its fellows ({@link org.brassbob.core.audit.Residuals}): a
 * table that follows its shape to rounding is held to rounding, one that follows it roughly only to that. Where there is none, a cell is
 * suspect whose change makes the slopes swing to and fro about it ({@link org.brassbob.core.audit.Series}), which a true corner of a tank
 * never does.
 */
@NullMarked
package org.brassbob.core.audit;

import org.jspecify.annotations.NullMarked;
