// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

import java.io.PrintWriter;
import java.time.OffsetDateTime;
import org.brassbob.core.condition.Assessment;
import org.brassbob.core.condition.Assessor;
import org.brassbob.core.condition.Margin;
import org.brassbob.core.round.SoundingRound;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.core.working.Working;
import org.brassbob.core.working.WorkingRecord;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParseResult;

/** {@code assess}: the condition from a round's readings. */
final class AssessCommand implements Command {
    @Override
    public CommandSpec spec() {
        return Options.command(
                        "Works out a round of soundings: what is in every tank, which are slack, what each free surface takes from GM, "
                                + "and the corrected GM against its limit.",
                        "",
                        "Exit status: 0 done; 1 done, and the corrected GM is below the limit; 2 the input can't be used.",
                        "")
                .addPositional(Options.vessel())
                .addOption(Options.text(
                        "--round",
                        "FILE",
                        true,
                        "the round's readings, such as vessel-data/heron/rounds/departure.csv"))
                .addOption(Options.text(
                        "--as-of",
                        "TIME",
                        false,
                        "count the age of readings to this time, such as 2026-03-04T12:00:00+01:00;",
                        "without it, to the round's last reading"))
                .addOption(Options.flag(
                        "--working", "show how every figure came about, down to the table rows and the reading"))
                .addOption(Options.json());
    }

    @Override
    public int run(ParseResult given, PrintWriter out) throws UnusableInput {
        Vessel vessel = Inputs.vessel(Options.vessel(given));
        SoundingRound round = Inputs.round(given.matchedOptionValue("--round", ""), vessel);
        String asOf = given.matchedOptionValue("--as-of", "");
        OffsetDateTime time = asOf.isEmpty() ? null : Inputs.time("--as-of", asOf);
        boolean showWorking = given.hasMatchedOption("--working");
        WorkingRecord working = new WorkingRecord();
        Assessment assessment = Assessor.of(vessel).assess(round, time, showWorking ? working : Working.OFF);
        if (given.hasMatchedOption("--json")) {
            out.print(AssessJson.of(assessment, showWorking ? working.steps() : null));
        } else {
            out.print(AssessText.of(assessment));
            out.print(showWorking ? System.lineSeparator() + WorkingText.of(working.steps()) : "");
        }
        return assessment.margin().state() == Margin.State.BELOW ? ExitStatus.LIMIT_BROKEN : ExitStatus.DONE;
    }
}
