// SPDX-License-Identifier: GPL-3.0-or-later

/** The rules that the packages keep, as tests, each with its reason. */
@NullMarked
package org.brassbob.architecture;

import org.jspecify.annotations.NullMarked;
