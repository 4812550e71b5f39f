// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

import java.util.List;
import java.util.Locale;
import org.brassbob.core.working.Step;

/** The working of an assessment as text: each figure, its rule, and what went in. */
final class WorkingText {
    private WorkingText() {}

    static String of(List<Step> steps) {
        StringBuilder text = new StringBuilder("WORKING" + System.lineSeparator());
        for (Step step : steps) {
            text.append(String.format(Locale.ROOT, "  %s = %.6g   %s%n", step.figure(), step.value(), step.rule()));
            for (Step.Input input : step.inputs()) {
                text.append(String.format(
                        Locale.ROOT,
                        "      %s = %.6g%s%n",
                        input.name(),
                        input.value(),
                        input.source().isEmpty() ? "" : "   " + input.source()));
            }
        }
        return text.toString();
    }
}
