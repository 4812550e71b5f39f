// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.contents;

/**
 * The volume-correction factor of petroleum liquids: API MPMS chapter 11.1 (ASTM D1250-80 tables 54B and 54D, ISO 91-1).
 *
 * <p>α15 = K0/ρ² + K1/ρ (in the range between gasoline and jet fuel α15 = K0/ρ² + A), VCF = exp(−α15·Δt·(1 + 0.8·α15·Δt)), with ρ the
 * density at 15 °C in kg/m3 and Δt the temperature less 15 °C. Constants from memory, confirmed by the published worked examples in
 * the tests. The printed tables round VCF to four decimals; here it is not rounded. They step the density by 0.5 kg/m3, so the groups meet midway
 * between the last density of one and the first of the next.
 */
public final class PetroleumFactor {
    /** Coefficients of a product group and the densities at 15 °C (kg/m3) that belong to it. */
    private enum Group {
        GASOLINE(653, 770.25, 346.4228, 0.43884, 0),
        TRANSITION(770.25, 787.75, 2680.3206, 0, -0.00336312),
        JET(787.75, 838.75, 594.5418, 0, 0),
        FUEL_OIL(838.75, 1075, 186.9696, 0.48618, 0),
        LUBRICANT(800, 1164, 0, 0.6278, 0);

        private final double from;
        private final double to;
        private final double k0;
        private final double k1;
        private final double constant;

        Group(double from, double to, double k0, double k1, double constant) {
            this.from = from;
            this.to = to;
            this.k0 = k0;
            this.k1 = k1;
            this.constant = constant;
        }

        private boolean holds(double rho) {
            return rho >= from && rho <= to;
        }

        private double factor(double rho, double temperatureC) {
            double alpha = k0 / (rho * rho) + k1 / rho + constant;
            double dt = temperatureC - 15;
            return Math.exp(-alpha * dt * (1 + 0.8 * alpha * dt));
        }
    }

    private PetroleumFactor() {}

    /**
     * The factor by which a volume at a temperature is multiplied to give its volume at 15 °C, for the product group (54B) that the density falls into.
     *
     * @param density15 t/m3 at 15 °C
     * @param temperatureC °C
     * @return the factor, or NaN where the density belongs to no group
     */
    public static double of(double density15, double temperatureC) {
        double rho = 1000 * density15;
        for (Group group : new Group[] {Group.FUEL_OIL, Group.JET, Group.TRANSITION, Group.GASOLINE}) {
            if (group.holds(rho)) {
                return group.factor(rho, temperatureC);
            }
        }
        return Double.NaN;
    }

    /**
     * The same for lubricating and hydraulic oils (54D).
     *
     * @param density15 t/m3 at 15 °C
     * @param temperatureC °C
     * @return the factor, or NaN where the density is outside the table
     */
    public static double ofLubricant(double density15, double temperatureC) {
        double rho = 1000 * density15;
        return Group.LUBRICANT.holds(rho) ? Group.LUBRICANT.factor(rho, temperatureC) : Double.NaN;
    }
}
