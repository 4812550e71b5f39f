// SPDX-License-Identifier: GPL-3.0-or-later

/** A sounding round as taken: readings, and what was observed of trim, list, draughts and sea density. */
@NullMarked
package org.brassbob.core.round;

import org.jspecify.annotations.NullMarked;
