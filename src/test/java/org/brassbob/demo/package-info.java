// SPDX-License-Identifier: GPL-3.0-or-later

/**
 * The yard that built the demo ships: it makes the vessel folders from a handful of dimensions, with the program's own tabulation. All
 * of it is invented. Run {@link org.brassbob.demo.HeronYard} to build Saltmarsh Heron again.
 */
@NullMarked
package org.brassbob.demo;

import org.jspecify.annotations.NullMarked;
