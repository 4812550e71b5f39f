// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import org.brassbob.core.geometry.Shapes;
import org.brassbob.core.geometry.Solid;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.CrossCurves;
import org.brassbob.core.table.LimitCurve;
import org.brassbob.core.table.Origin;
import org.brassbob.core.tabulate.RequiredGm.Criterion;
import org.hipparchus.analysis.integration.SimpsonIntegrator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** 2008 IS Code (Res. MSC.267(85)) part A 2.2.1 to 2.2.4, on curves whose criteria can be worked out apart. */
class RequiredGmTest {
    private static final Axis HEELS = Axis.of(5, 10, 15, 20, 25, 30, 35, 40, 50, 60);

    private interface Kn {
        double at(double heel);
    }

    private static CrossCurves curves(Kn kn) {
        return curves(kn, HEELS);
    }

    private static CrossCurves curves(Kn kn, Axis heels) {
        List<Double> row = new ArrayList<>();
        for (int i = 0; i < heels.size(); i++) {
            row.add(kn.at(Math.toRadians(heels.value(i))));
        }
        return CrossCurves.of(
                heels,
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

    /** KN that levels off early, as of a ship with little freeboard: 2.2.3 governs. */
    private static final Kn EARLY = heel -> 9 * Math.tanh(2.2 * heel);

    private static final double EARLY_KM = 9 * 2.2;

    /** On 5° ordinates the parabola through 20°, 25° and 30° has its crest at 25°: the levers at 20° and 30° are equal. */
    @Test
    void anEarlyMaximumIsHeldTo25Degrees() {
        RequiredGm.Governing governing = new RequiredGm(curves(EARLY)).governing(1500, EARLY_KM);
        assertEquals(Criterion.ANGLE_OF_GREATEST_GZ, governing.criterion());
        assertEquals("2.2.3", governing.criterion().paragraph());
        assertEquals(lever(EARLY, governing.kg(), 20), lever(EARLY, governing.kg(), 30), 1e-12);
    }

    /**
     * Closed form: GZ' = KN' − KG·cos φ is nought at 25° where KG = KN'(25°)/cos 25°, with KN' = 19.8·sech²(2.2·φ). To ask that the
     * ordinate at 25° be no lower than that at 20° would allow KG to be 1.16 m higher, with the crest near 22.6°.
     */
    @Test
    void closeOrdinatesFindTheKgWhoseCrestStandsAt25Degrees() {
        double at25 = Math.toRadians(25);
        double exact = EARLY_KM / Math.pow(Math.cosh(2.2 * at25), 2) / Math.cos(at25);
        double close = new RequiredGm(curves(EARLY, closeHeels(1)))
                .governing(1500, EARLY_KM)
                .kg();
        assertEquals(exact, close, 0.004);
        double crest = 0;
        for (double deg = 1; deg < 60; deg += 0.01) {
            crest = lever(EARLY, close, deg) > lever(EARLY, close, crest) ? deg : crest;
        }
        assertEquals(25, crest, 0.02);
    }

    private static double lever(Kn kn, double kg, double deg) {
        return kn.at(Math.toRadians(deg)) - kg * Math.sin(Math.toRadians(deg));
    }

    /** Every so many degrees to 60°. */
    private static Axis closeHeels(double step) {
        double[] heels = new double[(int) Math.round(60 / step)];
        for (int i = 0; i < heels.length; i++) {
            heels[i] = (i + 1) * step;
        }
        return Axis.of(heels);
    }

    /**
     * A box barge of breadth 10 m, draught 5 m, depth 10 m, whose deck and bilge stay where they are to 45°. By the wall-sided formula GZ =
     * (GM + ½·BM·tan²φ)·sin φ with BM = 10²/(12·5) = 5/3 m. Since ∫tan²φ·sin φ dφ = 1/cos φ + cos φ − 2 from 0 to φ,
     *
     * <pre>
     * to 30°:  0.055 = GM·0.1339746 + ⅚·0.0207259   GM ≥ 0.2816 m
     * to 40°:  0.090 = GM·0.2339556 + ⅚·0.0714517   GM ≥ 0.1302 m
     * 30-40°:  0.030 = GM·0.0999810 + ⅚·0.0507258   GM ≥ −0.1227 m
     * 40°:     0.20 = (GM + ⅚·0.7040881)·0.6427876  GM ≥ −0.2756 m
     * </pre>
     *
     * and 0.15 m at the start: the area to 30° governs, with 0.2816 m.
     */
    @Test
    void boxBargeByHand() {
        Solid barge = Shapes.box(0, 60, 0, 5, 0, 10).mirroredBothSides();
        double displacement = 60 * 10 * 5;
        double km = 2.5 + 5.0 / 3;
        double to30 = 1 / Math.cos(Math.PI / 6) + Math.cos(Math.PI / 6) - 2;
        double required = (0.055 - 5.0 / 6 * to30) / (1 - Math.cos(Math.PI / 6));
        assertEquals(0.2816, required, 5e-5);
        CrossCurveMaker maker = new CrossCurveMaker(barge, 1);
        Axis displacements = Axis.of(displacement - 1, displacement, displacement + 1);
        RequiredGm.Governing fives =
                new RequiredGm(maker.curves(displacements, closeHeels(5))).governing(displacement, km);
        assertEquals(Criterion.AREA_TO_30, fives.criterion());
        assertEquals("2.2.1", fives.criterion().paragraph());
        assertEquals(required, km - fives.kg(), 5e-5, "Simpson's rule on 5° ordinates");
        RequiredGm.Governing ones =
                new RequiredGm(maker.curves(displacements, closeHeels(1))).governing(displacement, km);
        assertEquals(required, km - ones.kg(), 1e-7, "Simpson's rule on 1° ordinates");
    }

    /**
     * Over random curves each criterion governs some; with half a millimetre less than the greatest KG, integration by Hipparchus and a
     * search in tenths of a degree find every criterion met, and with half a millimetre more the one that governs is broken; 1 cm for the
     * angle of the crest, which the search itself finds to a tenth of a degree only.
     */
    @Test
    void whatGovernsIsWhatBreaksFirst() {
        Random random = new Random(2008);
        Set<Criterion> seen = EnumSet.noneOf(Criterion.class);
        for (int i = 0; i < 250; i++) {
            double a = 3 + 4 * random.nextDouble();
            double b = 3 * (random.nextDouble() - 0.35);
            double c = 1.5 * (random.nextDouble() - 0.5);
            Kn kn = heel -> a * Math.sin(heel)
                    + b * Math.sin(heel) * Math.pow(Math.tan(heel), 2)
                    - Math.max(0, heel - 0.35) * Math.max(0, heel - 0.35) * (2 + 3 * c)
                    + c * Math.pow(Math.sin(2 * heel), 3);
            RequiredGm.Governing governing = new RequiredGm(curves(kn, closeHeels(1))).governing(1500, a);
            seen.add(governing.criterion());
            String where = i + " " + governing;
            double within = governing.criterion() == Criterion.ANGLE_OF_GREATEST_GZ ? 0.01 : 5e-4;
            assertEquals(Set.of(), broken(kn, a, governing.kg() - within), where);
            assertTrue(broken(kn, a, governing.kg() + within).contains(governing.criterion()), where);
        }
        assertEquals(EnumSet.allOf(Criterion.class), seen);
    }

    private static Set<Criterion> broken(Kn kn, double km, double kg) {
        Set<Criterion> broken = EnumSet.noneOf(Criterion.class);
        breaks(broken, Criterion.AREA_TO_30, area(kn, kg, 0, 30) < 0.055);
        breaks(broken, Criterion.AREA_TO_40, area(kn, kg, 0, 40) < 0.090);
        breaks(broken, Criterion.AREA_30_TO_40, area(kn, kg, 30, 40) < 0.030);
        breaks(broken, Criterion.INITIAL_GM, km - kg < 0.15);
        breaks(broken, Criterion.GZ_AT_30, greatest(kn, kg, 300, 600) < 0.20);
        breaks(
                broken,
                Criterion.ANGLE_OF_GREATEST_GZ,
                greatest(kn, kg, 250, 600) <= greatest(kn, kg, 1, 249) || km < kg);
        return broken;
    }

    private static void breaks(Set<Criterion> broken, Criterion criterion, boolean so) {
        if (so) {
            broken.add(criterion);
        }
    }

    /** Over tenths of a degree. */
    private static double greatest(Kn kn, double kg, int from, int to) {
        double greatest = Double.NEGATIVE_INFINITY;
        for (int tenth = from; tenth <= to; tenth++) {
            greatest = Math.max(greatest, lever(kn, kg, tenth / 10.0));
        }
        return greatest;
    }

    @Test
    void theLimitCurveIsKmLessTheGreatestKg() {
        Kn kn = heel -> 6.2 * Math.sin(heel) + 0.35 * Math.sin(2 * heel);
        LimitCurve curve = new RequiredGm(curves(kn)).curve("general", Axis.of(1000, 2000), new double[] {6.9, 6.9});
        assertEquals(6.9 - greatestKg(kn, 6.9), curve.at(1500), 1e-12);
        assertEquals(LimitCurve.Kind.GM_REQUIRED, curve.kind());
    }

    @ParameterizedTest
    @MethodSource("unfitHeels")
    void curvesWithoutTheOrdinatesAreRefused(Axis heels) {
        CrossCurves unfit = curves(Math::sin, heels);
        assertThrows(IllegalArgumentException.class, () -> new RequiredGm(unfit));
    }

    static List<Axis> unfitHeels() {
        return List.of(
                Axis.of(10, 20, 30, 40),
                Axis.of(5, 10, 15, 20, 25, 30, 35),
                Axis.of(5, 10, 15, 20, 26, 30, 35, 40),
                Axis.of(4, 8, 12, 16, 20, 24, 28, 32, 36, 40),
                Axis.of(12, 20, 30, 40, 50, 60, 70, 75));
    }

    /** Areas end at the flooding angle where it comes before 40° (2.2.1); curves that flood so early are refused, not flattered. */
    @Test
    void curvesThatFloodBefore40DegreesAreRefused() {
        assertThrows(IllegalArgumentException.class, () -> new RequiredGm(flooding(39.9)));
        double dry = new RequiredGm(curves(Math::sin)).governing(1500, 1).kg();
        assertEquals(dry, new RequiredGm(flooding(40)).governing(1500, 1).kg());
    }

    private static CrossCurves flooding(double deg) {
        CrossCurves dry = curves(Math::sin);
        CrossCurves.Row row = dry.rows().get(0);
        return CrossCurves.of(
                dry.heels(),
                List.of(row, new CrossCurves.Row(2000, row.kn(), deg, null, null)),
                Origin.computed("test"));
    }
}
