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
 * <p>Ordinates stand every 5°, or closer, from 0 to 40°; areas are taken by Simpson's first rule. The greatest GZ stands at 25° or more
 * where an ordinate beyond 25° is not below any before 25°; for a curve with its crest near 25° that is the crest of the parabola
 * through 25° and its two neighbours, so close ordinates judge it closely. To ask only that the ordinate at 25° be the highest would
 * let the crest stand half a step before it.
 *
 * <p>No opening is taken to flood below 40°; curves that say otherwise are refused.
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

    private static final double WIDEST_STEP_DEG = 5;
    private static final double LAST_DEG = 40;

    private final CrossCurves curves;
    private final double step;
    private final int at25;
    private final int at30;
    private final int at40;

    /**
     * From cross curves.
     *
     * @param curves with heels in even steps of 5°, or a whole part of it, up to 40°; further ones count for 2.2.2 and 2.2.3 too
     * @throws IllegalArgumentException if they lack these heels, or flood below 40°
     */
    public RequiredGm(CrossCurves curves) {
        double stepDeg = curves.heels().first();
        long parts = Math.round(WIDEST_STEP_DEG / stepDeg);
        if (parts < 1 || !evenlyTo40(curves.heels(), WIDEST_STEP_DEG / parts)) {
            throw new IllegalArgumentException("cross curves need KN every 5°, or a whole part of it, from 0° to 40°");
        }
        if (curves.rows().stream().anyMatch(RequiredGm::floodsEarly)) {
            throw new IllegalArgumentException("openings that flood below 40° are not reckoned with");
        }
        this.curves = curves;
        this.step = Math.toRadians(stepDeg);
        this.at25 = (int) (5 * parts);
        this.at30 = (int) (6 * parts);
        this.at40 = (int) (8 * parts);
    }

    private static boolean evenlyTo40(Axis heels, double stepDeg) {
        long ordinates = Math.round(LAST_DEG / stepDeg);
        boolean even = heels.size() >= ordinates;
        for (int i = 0; even && i < ordinates; i++) {
            even = Math.abs(heels.value(i) - (i + 1) * stepDeg) < 1e-9;
        }
        return even;
    }

    private static boolean floodsEarly(CrossCurves.Row row) {
        Double flooding = row.floodingDeg();
        return flooding != null && flooding < LAST_DEG;
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
        greatest.add(new Governing(Criterion.AREA_TO_30, (simpson(kn, 0, at30) - 0.055) / sines(0, 30)));
        greatest.add(new Governing(Criterion.AREA_TO_40, (simpson(kn, 0, at40) - 0.090) / sines(0, 40)));
        greatest.add(new Governing(Criterion.AREA_30_TO_40, (simpson(kn, at30, at40) - 0.030) / sines(30, 40)));
        greatest.add(new Governing(Criterion.GZ_AT_30, leverAt30(kn)));
        greatest.add(new Governing(Criterion.ANGLE_OF_GREATEST_GZ, angleOfGreatest(kn, km)));
        greatest.add(new Governing(Criterion.INITIAL_GM, km - 0.15));
        return greatest.stream().min((a, b) -> Double.compare(a.kg(), b.kg())).orElseThrow();
    }

    private double simpson(double[] kn, int from, int to) {
        double sum = 0;
        for (int i = from; i < to; i += 2) {
            sum += kn[i] + 4 * kn[i + 1] + kn[i + 2];
        }
        return sum * step / 3;
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
        for (int i = at30; i < kn.length; i++) {
            kg = Math.max(kg, (kn[i] - 0.20) / Math.sin(heel(i)));
        }
        return kg;
    }

    /**
     * The greatest KG with a greatest GZ at 25° or more. For an ordinate j beyond 25° the lever there must not be less than at any
     * ordinate i before: {@code KNj − KG·sin j ≥ KNi − KG·sin i}, which bounds KG from above; one such j is enough.
     */
    private double angleOfGreatest(double[] kn, double km) {
        double best = Double.NEGATIVE_INFINITY;
        for (int j = at25 + 1; j < kn.length; j++) {
            double bound = km;
            for (int i = 1; i < at25; i++) {
                bound = Math.min(bound, (kn[j] - kn[i]) / (Math.sin(heel(j)) - Math.sin(heel(i))));
            }
            best = Math.max(best, bound);
        }
        return best;
    }
}
