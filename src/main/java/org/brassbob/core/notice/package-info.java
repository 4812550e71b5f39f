// SPDX-License-Identifier: GPL-3.0-or-later

/** What the officer must be told beside the figures, as data: a code and its values, put into words only where they are shown. */
@NullMarked
package org.brassbob.core.notice;

import org.jspecify.annotations.NullMarked;
