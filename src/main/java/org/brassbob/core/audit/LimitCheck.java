// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import static org.brassbob.core.audit.Findings.show;

import org.brassbob.core.table.LimitCurve;
import org.brassbob.core.vessel.Vessel;

/** Limit curves are smooth and reach from light ship to the summer draught. */
final class LimitCheck {
    private LimitCheck() {}

    static void check(Vessel vessel, Findings findings) {
        for (LimitCurve curve : vessel.limitCurves()) {
            double[] displacements = new double[curve.displacements().size()];
            double[] values = new double[displacements.length];
            for (int i = 0; i < values.length; i++) {
                displacements[i] = curve.displacements().value(i);
                values[i] = curve.value(i);
            }
            double[] errors = Series.errors(displacements, values);
            for (int i = 0; i < errors.length; i++) {
                if (errors[i] != 0) {
                    findings.warning(
                            curve.origin(),
                            i,
                            "limit '" + curve.name() + "' out of line with its neighbours",
                            show(values[i]) + " m",
                            "about " + show(values[i] - errors[i]) + " m");
                }
            }
            double light = vessel.lightship().mass();
            if (!curve.displacements().covers(light)) {
                findings.warning(
                        curve.origin(),
                        0,
                        "range of limit '" + curve.name() + "'",
                        show(curve.displacements().first()) + " to "
                                + show(curve.displacements().last()) + " t",
                        "to reach the light ship of " + show(light) + " t");
            }
        }
    }
}
