// SPDX-License-Identifier: GPL-3.0-or-later

/**
 * The command line: reads the files, asks the core, prints the answer as text or JSON. Exit status 0 done, 1 done and a limit is
 * broken, 2 the input can't be used.
 */
@NullMarked
package org.brassbob.cli;

import org.jspecify.annotations.NullMarked;
