// SPDX-License-Identifier: GPL-3.0-or-later

/** Makes tables from shapes: calibration of tanks, hydrostatics and cross curves of the hull, and the GM that criteria require. */
@NullMarked
package org.brassbob.core.tabulate;

import org.jspecify.annotations.NullMarked;
