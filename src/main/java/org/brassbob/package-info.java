// SPDX-License-Identifier: GPL-3.0-or-later

/** The way in: {@link org.brassbob.Main}. */
@NullMarked
package org.brassbob;

import org.jspecify.annotations.NullMarked;
