// SPDX-License-Identifier: GPL-3.0-or-later

/** From a reading to what is in a tank: level, volume, mass, centroid, free surface. */
@NullMarked
package org.brassbob.core.contents;

import org.jspecify.annotations.NullMarked;
