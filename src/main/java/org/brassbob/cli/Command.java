// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

import java.io.PrintWriter;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParseResult;

/** One call of the command line. */
interface Command {
    /** Its name, options and help. */
    CommandSpec spec();

    /**
     * Runs it.
     *
     * @return the exit status
     * @throws UnusableInput where the input can't be used
     */
    int run(ParseResult given, PrintWriter out) throws UnusableInput;
}
