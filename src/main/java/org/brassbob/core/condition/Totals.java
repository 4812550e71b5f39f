// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import org.brassbob.core.vessel.MassPoint;

/** Running sums of mass, moments and free-surface moments (t, t·m). */
final class Totals {
    double mass;
    double momentX;
    double momentY;
    double momentZ;
    double fsmAsSounded;
    double fsmByCode;

    void add(MassPoint point) {
        mass += point.mass();
        momentX += point.mass() * point.lcg();
        momentY += point.mass() * point.tcg();
        momentZ += point.mass() * point.vcg();
    }

    /** Adds a tank's part, or takes it away with a factor of −1. */
    void add(TankLoad load, int factor) {
        mass += factor * load.mass();
        momentX += factor * load.momentX();
        momentY += factor * load.momentY();
        momentZ += factor * load.momentZ();
        fsmAsSounded += factor * load.fsmAsSounded();
        fsmByCode += factor * load.fsmByCode();
    }

    Totals plus(Totals other) {
        return sum(other, 1);
    }

    Totals minus(Totals other) {
        return sum(other, -1);
    }

    private Totals sum(Totals other, int factor) {
        Totals sum = new Totals();
        sum.mass = mass + factor * other.mass;
        sum.momentX = momentX + factor * other.momentX;
        sum.momentY = momentY + factor * other.momentY;
        sum.momentZ = momentZ + factor * other.momentZ;
        sum.fsmAsSounded = fsmAsSounded + factor * other.fsmAsSounded;
        sum.fsmByCode = fsmByCode + factor * other.fsmByCode;
        return sum;
    }

    /** All that tanks take from the corrected GM at a given displacement: vertical and free-surface moment (t·m). */
    double verticalAndFreeSurface() {
        return momentZ + fsmByCode;
    }

    double lcg() {
        return momentX / mass;
    }

    double tcg() {
        return momentY / mass;
    }

    double kg() {
        return momentZ / mass;
    }
}
