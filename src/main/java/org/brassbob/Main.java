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

    /** As where the input can't be used: nothing that was printed may be relied on. */
    private static final int FAULT = 2;

    private Main() {}

    /** Runs the call that the arguments name; without any, the demo ship's round in the terminal. */
    public static void main(String[] args) {
        List<String> call = args.length == 0 ? DEMO : List.of(args);
        System.exit(run(call, writer(System.out), writer(System.err)));
    }

    /** A fault of the program itself is told in a line like any other, and where it arose for whoever mends it. */
    private static int run(List<String> call, PrintWriter out, PrintWriter err) {
        try {
            return Cli.run(call, out, err);
        } catch (RuntimeException | OutOfMemoryError | StackOverflowError e) {
            StackTraceElement[] trace = e.getStackTrace();
            err.println("brassbob: a fault in the program itself, please report it: " + e
                    + (trace.length > 0 ? " at " + trace[0] : ""));
            err.flush();
            return FAULT;
        }
    }

    private static PrintWriter writer(PrintStream stream) {
        return new PrintWriter(new OutputStreamWriter(stream, StandardCharsets.UTF_8), false);
    }
}
