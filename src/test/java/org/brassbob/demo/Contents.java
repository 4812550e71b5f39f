// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

/**
 * What a tank holds up to a level, upright.
 *
 * @param volume m3
 * @param lcg m forward of the aft perpendicular
 * @param tcg m from the centreline, starboard positive
 * @param vcg m above the baseline
 * @param secondMoment of the free surface about its own fore-and-aft axis (m4)
 */
record Contents(double volume, double lcg, double tcg, double vcg, double secondMoment) {}
