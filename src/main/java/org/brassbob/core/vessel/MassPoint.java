// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.vessel;

/**
 * A mass and where its centre is.
 *
 * @param mass t
 * @param lcg m forward of the aft perpendicular
 * @param tcg m to starboard of the centreline
 * @param vcg m above the baseline
 */
public record MassPoint(double mass, double lcg, double tcg, double vcg) {}
