// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import static org.brassbob.core.audit.Findings.show;

import org.brassbob.core.table.Origin;
import org.brassbob.core.vessel.Liquid;
import org.brassbob.core.vessel.MassPoint;
import org.brassbob.core.vessel.Particulars;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.core.vessel.Weight;

/** Doubts that no table can settle: centres outside the ship, densities that a class of liquid doesn't have. */
final class PlausibilityCheck {
    private PlausibilityCheck() {}

    static void check(Vessel vessel, Findings findings) {
        centre(vessel, "light ship", vessel.lightship(), Origin.computed("vessel.json"), findings);
        for (Weight weight : vessel.weights()) {
            centre(vessel, weight.name(), weight.at(), Origin.computed("weights.csv"), findings);
        }
        if (vessel.weights().isEmpty()) {
            findings.warning(
                    Origin.computed("weights.csv"), 0, "weights", "none", "at least the ship's constant and stores");
        }
        for (Liquid liquid : vessel.liquids()) {
            density(liquid, findings);
        }
    }

    private static void centre(Vessel vessel, String name, MassPoint at, Origin origin, Findings findings) {
        Particulars p = vessel.particulars();
        boolean inside = at.lcg() > -0.1 * p.lbp()
                && at.lcg() < 1.1 * p.lbp()
                && Math.abs(at.tcg()) <= p.breadth() / 2
                && at.vcg() >= 0
                && at.vcg() < 4 * p.depth();
        if (!inside) {
            findings.warning(
                    origin,
                    0,
                    "centre of " + name,
                    "x " + show(at.lcg()) + ", y " + show(at.tcg()) + ", z " + show(at.vcg()) + " m",
                    "a place aboard");
        }
    }

    private static void density(Liquid liquid, Findings findings) {
        double[] range =
                switch (liquid.liquidClass()) {
                    case SEA_WATER -> new double[] {0.995, 1.035};
                    case FRESH_WATER, GREY_WATER, BLACK_WATER -> new double[] {0.99, 1.03};
                    case FUEL_OIL -> new double[] {0.85, 1.01};
                    case GAS_OIL -> new double[] {0.80, 0.90};
                    case LUBE_OIL, HYDRAULIC_OIL -> new double[] {0.82, 1.0};
                    case OILY_WATER -> new double[] {0.85, 1.03};
                    case UREA -> new double[] {1.05, 1.15};
                    case CARGO, NONE -> new double[] {0, 3};
                };
        if (liquid.density() < range[0] || liquid.density() > range[1]) {
            findings.warning(
                    Origin.computed("liquids.csv"),
                    0,
                    "density of " + liquid.id() + ", a " + liquid.liquidClass().code(),
                    show(liquid.density()) + " t/m3",
                    show(range[0]) + " to " + show(range[1]) + " t/m3 (common practice)");
        }
    }
}
