// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.List;
import org.brassbob.core.audit.Audit;
import org.brassbob.core.audit.Finding;
import org.brassbob.core.vessel.Vessel;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParseResult;

/** {@code audit}: the vessel folder against itself. */
final class AuditCommand implements Command {
    @Override
    public CommandSpec spec() {
        return Options.command(
                        "Checks the vessel folder: every table against itself, its shape and its neighbours. Each finding names file "
                                + "and line, the figure, and what was expected.",
                        "",
                        "Exit status: 0 done; 1 done, and there is an error (warnings alone are 0); 2 the input can't be used.",
                        "")
                .addPositional(Options.vessel())
                .addOption(Options.json());
    }

    @Override
    public int run(ParseResult given, PrintWriter out) throws UnusableInput {
        String folder = Options.vessel(given);
        Vessel vessel = Inputs.vessel(folder);
        List<Finding> findings = Audit.of(vessel);
        long errors = findings.stream()
                .filter(f -> f.severity() == Finding.Severity.ERROR)
                .count();
        if (given.hasMatchedOption("--json")) {
            out.print(json(vessel, findings));
        } else {
            Path path = Inputs.path(folder);
            findings.forEach(f -> out.println(
                    path.resolve(f.file()) + f.text().substring(f.file().length())));
            out.println(vessel.name() + ": " + errors + " errors, " + (findings.size() - errors) + " warnings");
        }
        return errors > 0 ? ExitStatus.LIMIT_BROKEN : ExitStatus.DONE;
    }

    private static String json(Vessel vessel, List<Finding> findings) {
        return JsonText.document(json -> {
            json.object(
                    "vessel",
                    v -> v.put("id", vessel.id()).put("name", vessel.name()).put("data_sha256", vessel.dataSha256()));
            json.list("findings", findings, (j, f) -> j.put(
                            "severity", f.severity().code())
                    .put("file", f.file())
                    .put("line", f.line())
                    .put("what", f.what())
                    .put("figure", f.figure())
                    .put("expected", f.expected()));
        });
    }
}
