// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import static org.brassbob.core.audit.Findings.show;

import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.table.CrossCurves;
import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.tabulate.CrossCurveMaker;
import org.brassbob.core.tabulate.HullTables;
import org.brassbob.core.vessel.Vessel;

/** Holds the cross curves against KM at small angles, against the hull where there is one, and against themselves. */
final class CrossCurveCheck {
    /** Up to this heel (°) KN = KM·sin φ holds nearly; by how much it may differ grows with the square of the angle. */
    private static final double SMALL = 12;

    private static final double LEAST_TOLERANCE = 0.01;

    /** MSC.1/Circ.1229 section 4: cross curves within 5 cm. */
    private static final double CODE_TOLERANCE = 0.05;

    private final CrossCurves curves;
    private final Findings findings;

    private CrossCurveCheck(CrossCurves curves, Findings findings) {
        this.curves = curves;
        this.findings = findings;
    }

    static void check(Vessel vessel, Findings findings) {
        CrossCurves curves = vessel.crossCurves();
        if (curves == null) {
            return;
        }
        CrossCurveCheck check = new CrossCurveCheck(curves, findings);
        HydrostaticTable hydrostatics = vessel.hydrostatics();
        SpaceShape hull = vessel.hull();
        if (hydrostatics != null && hull == null) {
            check.againstMetacentre(hydrostatics);
        }
        if (hull != null) {
            check.againstHull(new CrossCurveMaker(HullTables.bothSides(hull), vessel.seaDensity()));
        } else {
            check.againstItself();
        }
    }

    private double kn(int row, int heel) {
        return curves.rows().get(row).kn().get(heel);
    }

    private void againstMetacentre(HydrostaticTable hydrostatics) {
        for (int row = 0; row < curves.rows().size(); row++) {
            double displacement = curves.displacements().value(row);
            for (int h = 0; h < curves.heels().size() && curves.heels().value(h) <= SMALL; h++) {
                double heel = Math.toRadians(curves.heels().value(h));
                double expected = hydrostatics.at(displacement, 0).kmt() * Math.sin(heel);
                double tolerance = LEAST_TOLERANCE + 3 * heel * heel * expected;
                if (hydrostatics.covers(displacement, 0) && Math.abs(kn(row, h) - expected) > tolerance) {
                    report(row, h, "KN against KM·sin φ", "about " + show(expected) + " m");
                }
            }
        }
    }

    private void againstHull(CrossCurveMaker maker) {
        int heels = curves.heels().size();
        int n = curves.rows().size() * heels;
        double[] own = new double[n];
        double[] reference = new double[n];
        for (int i = 0; i < n; i++) {
            own[i] = kn(i / heels, i % heels);
            reference[i] = maker.kn(
                    curves.displacements().value(i / heels), curves.heels().value(i % heels));
        }
        Residuals residuals = Residuals.of(own, reference, 1e-6);
        for (int i = 0; i < n; i++) {
            boolean beyondCode = Math.abs(own[i] - reference[i]) > CODE_TOLERANCE;
            if (residuals.standsOut(i) || beyondCode) {
                report(i / heels, i % heels, "KN against the hull", show(reference[i]) + " m");
            }
        }
    }

    private void againstItself() {
        double[] displacements = new double[curves.displacements().size()];
        for (int row = 0; row < displacements.length; row++) {
            displacements[row] = curves.displacements().value(row);
        }
        for (int h = 0; h < curves.heels().size(); h++) {
            double[] column = new double[displacements.length];
            for (int row = 0; row < column.length; row++) {
                column[row] = kn(row, h);
            }
            double[] errors = Series.errors(displacements, column);
            for (int row = 0; row < errors.length; row++) {
                if (errors[row] != 0) {
                    findings.doubt(
                            Math.abs(errors[row]) > CODE_TOLERANCE,
                            curves.origin(),
                            row,
                            "KN out of line with its neighbours at "
                                    + show(curves.heels().value(h)) + "°",
                            show(column[row]) + " m",
                            "about " + show(column[row] - errors[row]) + " m");
                }
            }
        }
    }

    private void report(int row, int heel, String what, String expected) {
        findings.error(
                curves.origin(),
                row,
                what + " at " + show(curves.heels().value(heel)) + "°",
                show(kn(row, heel)) + " m",
                expected);
    }
}
