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
