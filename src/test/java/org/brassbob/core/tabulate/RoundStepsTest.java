// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RoundStepsTest {
    @ParameterizedTest
    @CsvSource({
        "0.1, 0.1",
        "0.1001, 0.2",
        "0.2, 0.2",
        "0.21, 0.25",
        "0.26, 0.5",
        "0.51, 1",
        "1, 1",
        "9.9, 10",
        "0.999999999, 1",
        "0.003, 0.005",
        "167, 200",
        "1e-3, 0.001"
    })
    void theNextRoundStepUpwards(double size, double step) {
        assertEquals(step, RoundSteps.atLeast(size));
    }

    @Test
    void multiplesCarryNoDust() {
        assertEquals(0.3, RoundSteps.multiple(3, 0.1));
        assertEquals(1.1, RoundSteps.multiple(11, 0.1));
        assertEquals(-0.75, RoundSteps.multiple(-3, 0.25));
    }
}
