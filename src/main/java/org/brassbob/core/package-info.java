// SPDX-License-Identifier: GPL-3.0-or-later

/**
 * What the product exists for: vessel, tank geometry, free surface, stability. Pure computation: this package and those below it
 * know no files, database, screens, clock or locale.
 *
 * <p>Conventions, the same in every class below: lengths in metres, areas in m2, volumes in m3, masses in t, densities in t/m3,
 * moments of mass in t·m, second moments of area in m4, unless a name says otherwise (a suffix {@code Deg}, {@code Pct},
 * {@code Hours}, {@code C}). x is metres forward of the aft perpendicular, y metres to starboard of the centreline, z metres above
 * the baseline. Trim is draught aft minus draught forward between perpendiculars; list and heel are degrees, positive to starboard.
 */
@NullMarked
package org.brassbob.core;

import org.jspecify.annotations.NullMarked;
