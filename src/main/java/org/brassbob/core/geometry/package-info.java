// SPDX-License-Identifier: GPL-3.0-or-later

/**
 * Solids bounded by cross-sections, and what an inclined liquid surface makes of them: volume, centroid, and area and second moments
 * of the surface, exactly, facet by facet; and the inverse, the surface for a given volume.
 */
@NullMarked
package org.brassbob.core.geometry;

import org.jspecify.annotations.NullMarked;
