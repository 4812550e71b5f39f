// SPDX-License-Identifier: GPL-3.0-or-later

/**
 * How a figure came about. The calculation itself hands over each step as it takes it, so the working can't differ from the result;
 * where nobody asked for it, nothing is recorded.
 */
@NullMarked
package org.brassbob.core.working;

import org.jspecify.annotations.NullMarked;
