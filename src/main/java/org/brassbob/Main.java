// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob;

import java.io.OutputStreamWriter;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.brassbob.cli.Cli;

/** Where the program starts. */
public final class Main {
    /** What is worked out where nothing else is asked for. */
    private static final List<String> DEMO =
            List.of("assess", "vessel-data/heron", "--round", "vessel-data/heron/rounds/departure.csv");

    private Main() {}

    /** Runs the call that the arguments name; without any, the demo ship's round in the terminal. */
    public static void main(String[] args) {
        List<String> call = args.length == 0 ? DEMO : List.of(args);
        System.exit(Cli.run(call, writer(System.out), writer(System.err)));
    }

    private static PrintWriter writer(PrintStream stream) {
        return new PrintWriter(new OutputStreamWriter(stream, StandardCharsets.UTF_8), false);
    }
}
