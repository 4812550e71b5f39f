// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

import java.io.PrintWriter;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import picocli.CommandLine;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;

/** Takes the arguments apart, runs the call they name, and keeps every message to a line. */
public final class Cli {
    private static final Map<String, Command> COMMANDS = commands();

    private Cli() {}

    private static Map<String, Command> commands() {
        Map<String, Command> commands = new LinkedHashMap<>();
        commands.put("assess", new AssessCommand());
        commands.put("audit", new AuditCommand());
        commands.put("tabulate", new TabulateCommand());
        return commands;
    }

    /**
     * Runs a call.
     *
     * @return the exit status: 0 done, 1 done and a limit is broken, 2 the input can't be used
     */
    public static int run(List<String> arguments, PrintWriter out, PrintWriter err) {
        CommandLine line = line();
        try {
            ParseResult given = line.parseArgs(arguments.toArray(new String[0]));
            ParseResult sub = given.subcommand();
            if (sub == null) {
                boolean asked = given.isUsageHelpRequested();
                line.usage(asked ? out : err, CommandLine.Help.Ansi.OFF);
                return asked ? ExitStatus.DONE : ExitStatus.UNUSABLE;
            }
            if (sub.isUsageHelpRequested()) {
                sub.commandSpec().commandLine().usage(out, CommandLine.Help.Ansi.OFF);
                return ExitStatus.DONE;
            }
            return command(sub.commandSpec().name()).run(sub, out);
        } catch (ParameterException e) {
            err.println("brassbob: "
                    + String.valueOf(e.getMessage()).lines().findFirst().orElse("") + "; see --help");
            return ExitStatus.UNUSABLE;
        } catch (UnusableInput e) {
            e.lines().forEach(err::println);
            return ExitStatus.UNUSABLE;
        } finally {
            out.flush();
            err.flush();
        }
    }

    private static Command command(String name) {
        Command command = COMMANDS.get(name);
        if (command == null) {
            throw new IllegalStateException("no command " + name);
        }
        return command;
    }

    private static CommandLine line() {
        CommandSpec spec = Options.command(
                        "Brassbob: from tank soundings to slack tanks and the corrected GM against its limit.",
                        "",
                        "Without arguments it works out the demo ship's round. "
                                + "COMMAND --help tells more about a call.",
                        "")
                .name("brassbob");
        COMMANDS.forEach((name, command) -> spec.addSubcommand(name, command.spec()));
        return new CommandLine(spec);
    }
}
