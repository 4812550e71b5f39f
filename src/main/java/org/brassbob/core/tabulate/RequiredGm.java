// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.CrossCurves;
import org.brassbob.core.table.LimitCurve;
import org.brassbob.core.table.Origin;

/**
 * The least GM at which the general criteria hold: 2008 IS Code (Res. MSC.267(85)) part A 2.2.1 to 2.2.4. GZ is
 * {@code KN − KG·sin φ}, so each criterion gives a greatest KG, and the least of them governs.
 *
 * <p>Ordinates stand every 5° from 0 to 40°; areas are taken by Simpson's first rule. The angle of the greatest GZ is judged on the
 * ordinates. No opening is taken to flood below 40°: where one does, these figures are too favourable.
 */
public final class RequiredGm {
    /** The criteria, in the order of the code's paragraphs. */
    public enum Criterion {
        AREA_TO_30("2.2.1"),
        AREA_TO_40("2.2.1"),
        AREA_30_TO_40("2.2.1"),
        GZ_AT_30("2.2.2"),
        ANGLE_OF_GREATEST_GZ("2.2.3"),
        INITIAL_GM("2.2.4");

        private final String paragraph;

        Criterion(String paragraph) {
            this.paragraph = paragraph;
        }

        /** The paragraph of part A. */
        public String paragraph() {
            return paragraph;
        }
    }

    /**
     * The greatest KG and the criterion that governs it.
     *
     * @param kg m
     */
    public record Governing(Criterion criterion, double kg) {}

    /** The heels that the curves must have (°); further ones count for 2.2.2 and 2.2.3 too. */
    public static final List<Double> HEELS = List.of(5.0, 10.0, 15.0, 20.0, 25.0, 30.0, 35.0, 40.0);

    private static final double STEP = Math.toRadians(5);
    private static final int AT_30 = 6;
    private static final int AT_40 = 8;

    private final CrossCurves curves;

    /**
     * From cross curves.
     *
     * @throws IllegalArgumentException if they lack the heels of {@link #HEELS}
     */
    public RequiredGm(CrossCurves curves) {
        for (int i = 0; i < HEELS.size(); i++) {
            if (curves.heels().size() <= i || curves.heels().value(i) != HEELS.get(i)) {
                throw new IllegalArgumentException("cross curves need KN every 5° from 5° to 40°");
            }
        }
        this.curves = curves;
    }

    /** The limit curve; {@code km} gives KM (m) for each displacement of the axis. */
    public LimitCurve curve(String name, Axis displacements, double[] km) {
        double[] required = new double[displacements.size()];
        for (int i = 0; i < required.length; i++) {
            double displacement = displacements.value(i);
            required[i] = km[i] - governing(displacement, km[i]).kg();
        }
        return LimitCurve.of(
                name,
                LimitCurve.Kind.GM_REQUIRED,
                displacements,
                required,
                Origin.computed("worked out from the cross curves"));
    }

    /** The greatest KG (m) at a displacement (t), and what governs it. */
    public Governing governing(double displacement, double km) {
        double[] kn = new double[curves.heels().size() + 1];
        for (int i = 1; i < kn.length; i++) {
            kn[i] = curves.kn(displacement, i - 1);
        }
        List<Governing> greatest = new ArrayList<>();
        greatest.add(new Governing(Criterion.AREA_TO_30, (simpson(kn, 0, AT_30) - 0.055) / sines(0, 30)));
        greatest.add(new Governing(Criterion.AREA_TO_40, (simpson(kn, 0, AT_40) - 0.090) / sines(0, 40)));
        greatest.add(new Governing(Criterion.AREA_30_TO_40, (simpson(kn, AT_30, AT_40) - 0.030) / sines(30, 40)));
        greatest.add(new Governing(Criterion.GZ_AT_30, leverAt30(kn)));
        greatest.add(new Governing(Criterion.ANGLE_OF_GREATEST_GZ, angleOfGreatest(kn, km)));
        greatest.add(new Governing(Criterion.INITIAL_GM, km - 0.15));
        return greatest.stream().min((a, b) -> Double.compare(a.kg(), b.kg())).orElseThrow();
    }

    private static double simpson(double[] kn, int from, int to) {
        double sum = 0;
        for (int i = from; i < to; i += 2) {
            sum += kn[i] + 4 * kn[i + 1] + kn[i + 2];
        }
        return sum * STEP / 3;
    }

    /** ∫ sin φ dφ. */
    private static double sines(double fromDeg, double toDeg) {
        return Math.cos(Math.toRadians(fromDeg)) - Math.cos(Math.toRadians(toDeg));
    }

    private double heel(int ordinate) {
        return ordinate == 0 ? 0 : Math.toRadians(curves.heels().value(ordinate - 1));
    }

    private double leverAt30(double[] kn) {
        double kg = Double.NEGATIVE_INFINITY;
        for (int i = AT_30; i < kn.length; i++) {
            kg = Math.max(kg, (kn[i] - 0.20) / Math.sin(heel(i)));
        }
        return kg;
    }

    /**
     * The greatest KG with a greatest GZ at 25° or more. For each ordinate j at or beyond 25° the lever there must not be less than at
     * any ordinate i below: {@code KNj − KG·sin j ≥ KNi − KG·sin i}, which bounds KG from above; one such j is enough.
     */
    private double angleOfGreatest(double[] kn, double km) {
        double best = Double.NEGATIVE_INFINITY;
        for (int j = 5; j < kn.length; j++) {
            double bound = km;
            for (int i = 1; i < 5; i++) {
                bound = Math.min(bound, (kn[j] - kn[i]) / (Math.sin(heel(j)) - Math.sin(heel(i))));
            }
            best = Math.max(best, bound);
        }
        return best;
    }
}
