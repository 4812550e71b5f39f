// SPDX-License-Identifier: GPL-3.0-or-later

/**
 * Tables as they stand in a booklet, read linearly between their rows. Every table says what it does at its edges: it holds the edge
 * value, and tells the caller that it did, so that nobody extrapolates by accident.
 */
@NullMarked
package org.brassbob.core.table;

import org.jspecify.annotations.NullMarked;
