// SPDX-License-Identifier: GPL-3.0-or-later

/**
 * Reads and writes the vessel folder and rounds. Every fault of every file is reported, as a file, a line, what is wrong and what was
 * expected; a value comes out only where there is none.
 */
@NullMarked
package org.brassbob.data;

import org.jspecify.annotations.NullMarked;
