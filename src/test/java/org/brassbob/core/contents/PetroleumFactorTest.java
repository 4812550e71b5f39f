// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.contents;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The petroleum volume-correction factor; its published examples are in {@link QuantityExamplesTest}. */
class PetroleumFactorTest {
    @ParameterizedTest
    @CsvSource({"0.653", "0.700", "0.7702", "0.775", "0.7877", "0.800", "0.8387", "0.840", "0.991", "1.075"})
    void isOneAtFifteenDegrees(double density) {
        assertEquals(1, PetroleumFactor.of(density, 15), 0);
        assertTrue(PetroleumFactor.of(density, 14) > 1);
        assertTrue(PetroleumFactor.of(density, 16) < 1);
    }

    /**
     * Worked by hand with the published constants of ASTM D1250-80 (from memory) in four steps: α·Δt, its square, the exponent, the
     * factor; rounded to five decimals.
     */
    @ParameterizedTest
    @CsvSource({
        // Heavy fuel oil: α = 186.9696/991² + 0.48618/991 = 6.80966e-4; α·Δt = 0.0306435; exp(−0.0313947).
        "0.991, 60, 0.96909",
        // Gas oil: α = 186.9696/850² + 0.48618/850 = 8.30754e-4; α·Δt = 0.00830754; exp(−0.00836275).
        "0.850, 25, 0.99167",
        // Jet: α = 594.5418/800² = 9.28972e-4; α·Δt = 0.01393457; exp(−0.01408992).
        "0.800, 30, 0.98601",
        // Between: α = −0.00336312 + 2680.3206/780² = 1.0423854e-3; α·Δt = 0.0052119; exp(−0.0052337).
        "0.780, 20, 0.99478",
        // Gasoline: α = 346.4228/740² + 0.43884/740 = 1.2256374e-3; α·Δt = −0.01225637; exp(0.0121362).
        "0.740, 5, 1.01221"
    })
    void factorsWorkedByHand(double density, double temperature, double factor) {
        assertEquals(factor, PetroleumFactor.of(density, temperature), 6e-6);
    }

    @Test
    void lubricants() {
        // Worked by hand: α = 0.6278/890 = 7.053933e-4; α·Δt = 0.02468876; exp(−0.02517639) = 0.975138.
        assertEquals(0.975138, PetroleumFactor.ofLubricant(0.890, 50), 1e-6);
        assertEquals(Double.NaN, PetroleumFactor.ofLubricant(0.79, 50));
        assertEquals(Double.NaN, PetroleumFactor.ofLubricant(1.17, 50));
    }

    @Test
    void densitiesOfNoGroupHaveNoFactor() {
        assertEquals(Double.NaN, PetroleumFactor.of(0.652, 20));
        assertEquals(Double.NaN, PetroleumFactor.of(1.076, 20));
        assertEquals(Double.NaN, PetroleumFactor.of(Double.NaN, 20));
    }

    @ParameterizedTest
    @CsvSource({"0.77025", "0.78775", "0.83875"})
    void groupsMeetWithoutAStepThatMatters(double boundary) {
        double below = PetroleumFactor.of(boundary - 1e-6, 45);
        double above = PetroleumFactor.of(boundary + 1e-6, 45);
        assertEquals(below, above, 5e-4);
    }
}
