// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.util.List;

/**
 * A call of the command line and what came of it.
 *
 * @param status exit status
 * @param out standard output
 * @param err standard error
 */
record Call(int status, String out, String err) {
    static Call of(String... arguments) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        int status = Cli.run(List.of(arguments), new PrintWriter(out), new PrintWriter(err));
        return new Call(status, out.toString(), err.toString());
    }

    List<String> errorLines() {
        return err.lines().toList();
    }
}
