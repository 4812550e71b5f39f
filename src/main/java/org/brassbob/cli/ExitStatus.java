// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

/** What the program tells its caller. */
final class ExitStatus {
    static final int DONE = 0;
    /** Done, and the answer is a limit broken. */
    static final int LIMIT_BROKEN = 1;
    /** The input can't be used. */
    static final int UNUSABLE = 2;

    private ExitStatus() {}
}
