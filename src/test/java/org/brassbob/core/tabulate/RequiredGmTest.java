// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.CrossCurves;
import org.brassbob.core.table.LimitCurve;
import org.brassbob.core.table.Origin;
import org.brassbob.core.tabulate.RequiredGm.Criterion;
import org.hipparchus.analysis.integration.SimpsonIntegrator;
import org.junit.jupiter.api.Test;

/** 2008 IS Code (Res. MSC.267(85)) part A 2.2.1 to 2.2.4, on curves whose criteria can be worked out apart. */
class RequiredGmTest {
    private static final Axis HEELS = Axis.of(5, 10, 15, 20, 25, 30, 35, 40, 50, 60);

    private interface Kn {
        double at(double heel);
    }

    private static CrossCurves curves(Kn kn) {
        List<Double> row = new ArrayList<>();
        for (int i = 0; i < HEELS.size(); i++) {
            row.add(kn.at(Math.toRadians(HEELS.value(i))));
        }
        return CrossCurves.of(
                HEELS,
                List.of(
                        new CrossCurves.Row(1000, row, null, null, null),
                        new CrossCurves.Row(2000, row, null, null, null)),
                Origin.computed("test"));
    }

    private static double greatestKg(Kn kn, double km) {
        return new RequiredGm(curves(kn)).governing(1500, km).kg();
    }

    /** ∫ by a general-purpose library (Hipparchus, Simpson integrator to 1e-12). */
    private static double area(Kn kn, double kg, double fromDeg, double toDeg) {
        return new SimpsonIntegrator(1e-12, 1e-12, 3, 60)
                .integrate(
                        1_000_000,
                        heel -> kn.at(heel) - kg * Math.sin(heel),
                        Math.toRadians(fromDeg),
                        Math.toRadians(toDeg));
    }

    /** With the greatest KG, the least of the areas and levers is just what the code asks for. */
    @Test
    void atTheGreatestKgACriterionJustHolds() {
        Kn kn = heel -> 6.2 * Math.sin(heel) + 0.35 * Math.sin(2 * heel);
        double km = 6.2 + 0.7;
        double kg = greatestKg(kn, km);
        double spare = Math.min(
                Math.min(area(kn, kg, 0, 30) - 0.055, area(kn, kg, 0, 40) - 0.090),
                Math.min(area(kn, kg, 30, 40) - 0.030, 1));
        double lever = 0;
        for (double deg = 30; deg <= 60; deg += 5) {
            double heel = Math.toRadians(deg);
            lever = Math.max(lever, kn.at(heel) - kg * Math.sin(heel));
        }
        double least = Math.min(spare, lever - 0.20);
        assertEquals(0, least, 1e-5, "Simpson's rule on 5° ordinates is good to this");
        assertTrue(km - kg >= 0.15);
    }

    @Test
    void initialGmGovernsAStiffCurve() {
        // KN grows so fast that every other criterion is met with KG at KM.
        Kn kn = heel -> 5 * Math.sin(heel) + 3 * heel * heel;
        assertEquals(
                Criterion.INITIAL_GM,
                new RequiredGm(curves(kn)).governing(1500, 5).criterion());
        assertEquals(5 - 0.15, greatestKg(kn, 5), 1e-12);
    }

    @Test
    void anEarlyMaximumIsHeldTo25Degrees() {
        // KN levels off early, as of a ship with little freeboard: then 2.2.3 governs.
        Kn kn = heel -> 9 * Math.tanh(2.2 * heel);
        RequiredGm.Governing governing = new RequiredGm(curves(kn)).governing(1500, 19.8);
        assertEquals(Criterion.ANGLE_OF_GREATEST_GZ, governing.criterion());
        assertEquals("2.2.3", governing.criterion().paragraph());
        double before = 0;
        for (double deg = 5; deg < 25; deg += 5) {
            double heel = Math.toRadians(deg);
            before = Math.max(before, kn.at(heel) - governing.kg() * Math.sin(heel));
        }
        double at25 = kn.at(Math.toRadians(25)) - governing.kg() * Math.sin(Math.toRadians(25));
        assertEquals(before, at25, 1e-9, "the greatest lever is just not before 25°");
    }

    @Test
    void theLimitCurveIsKmLessTheGreatestKg() {
        Kn kn = heel -> 6.2 * Math.sin(heel) + 0.35 * Math.sin(2 * heel);
        LimitCurve curve = new RequiredGm(curves(kn)).curve("general", Axis.of(1000, 2000), new double[] {6.9, 6.9});
        assertEquals(6.9 - greatestKg(kn, 6.9), curve.at(1500), 1e-12);
        assertEquals(LimitCurve.Kind.GM_REQUIRED, curve.kind());
    }

    @Test
    void curvesWithoutTheOrdinatesAreRefused() {
        CrossCurves tens = CrossCurves.of(
                Axis.of(10, 20, 30),
                List.of(new CrossCurves.Row(1000, List.of(1.0, 2.0, 3.0), null, null, null)),
                Origin.computed("test"));
        assertThrows(IllegalArgumentException.class, () -> new RequiredGm(tens));
    }
}
