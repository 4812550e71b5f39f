// SPDX-License-Identifier: GPL-3.0-or-later

/**
 * The ship as her booklet describes her: particulars, light ship, tanks and their tables, hydrostatics, limits. Data only, no
 * formulas: the calculators live in {@code contents} and {@code condition}.
 */
@NullMarked
package org.brassbob.core.vessel;

import org.jspecify.annotations.NullMarked;
