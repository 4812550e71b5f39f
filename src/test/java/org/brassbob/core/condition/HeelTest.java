// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Against the closed forms of a wall-sided ship: GZ = (GM + ½·BM·tan²φ)·sin φ (from memory, in every stability textbook). */
class HeelTest {
    @Test
    void smallListIsThatOfTheTextbook() {
        assertEquals(Math.toDegrees(Math.atan(0.1)), Heel.listDeg(0.05, 0.5, 4), 1e-12);
        assertEquals(-Math.toDegrees(Math.atan(0.1)), Heel.listDeg(-0.05, 0.5, 4), 1e-12);
        assertEquals(0, Heel.listDeg(0, 0.5, Double.NaN), 0);
    }

    @ParameterizedTest
    @CsvSource({
        "0.05, -0.2, 4",
        "-0.05, -0.2, 4",
        "0.001, -0.5, 6",
        "0.3, -0.01, 3",
        "0.02, 0, 5",
        "-0.4, -1.2, 8",
        "1e-9, -0.3, 5"
    })
    void whereGmIsNotPositiveTheLeverOfTheListIsBalanced(double tcg, double gm, double bm) {
        double list = Math.toRadians(Heel.listDeg(tcg, gm, bm));
        double lever = (gm + 0.5 * bm * Math.pow(Math.tan(list), 2)) * Math.sin(list);
        assertEquals(tcg * Math.cos(list), lever, 1e-9);
        assertEquals(Math.signum(tcg), Math.signum(list));
        // It is a stable one: a little further over the lever is larger than the heeling one.
        double over = list + Math.signum(list) * 1e-3;
        double further = (gm + 0.5 * bm * Math.pow(Math.tan(over), 2)) * Math.sin(over) - tcg * Math.cos(over);
        assertTrue(further * Math.signum(list) > 0);
    }

    @Test
    void withoutAListingMomentSheLiesAtTheAngleOfLoll() {
        assertEquals(Heel.lollDeg(-0.3, 5), Heel.listDeg(0, -0.3, 5), 1e-6);
        assertEquals(0, Heel.listDeg(0, 0, 5), 1e-4);
    }

    @Test
    void lollNeedsANegativeGmAndABm() {
        assertEquals(0, Heel.lollDeg(0, 5), 0);
        assertEquals(0, Heel.lollDeg(0.3, Double.NaN), 0);
        assertEquals(Double.NaN, Heel.lollDeg(-0.3, Double.NaN));
        assertEquals(Double.NaN, Heel.listDeg(0.1, -0.3, Double.NaN));
        assertEquals(Double.NaN, Heel.listDeg(0.1, -0.3, 0));
    }
}
