// SPDX-License-Identifier: GPL-3.0-or-later

/**
 * Draws up the vessel folders of the two demo ships. Both ships are invented, and so is every figure here: they serve to show the
 * program and to exercise it, and stand for no ship that floats.
 *
 * <p>{@link org.brassbob.demo.HeronYard} builds a geared coaster from her lines ({@link org.brassbob.demo.HeronLines}), the spaces cut
 * out of them ({@link org.brassbob.demo.HeronSpaces}) and the schedule of her tanks; her calibration tables and hydrostatics are then
 * made from those shapes by the program itself. {@link org.brassbob.demo.TenderYard} writes a small tanker that has tables only, each
 * worked out in closed form. What they write depends on nothing but their code: the same bytes each time.
 */
@NullMarked
package org.brassbob.demo;

import org.jspecify.annotations.NullMarked;
