// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import java.util.List;
import org.brassbob.core.contents.TankShapes;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Vessel;

/** Audits a ship's data. */
public final class Audit {
    private Audit() {}

    /** Everything that is wrong or doubtful, by file and line. */
    public static List<Finding> of(Vessel vessel) {
        Findings findings = new Findings();
        TankShapes shapes = TankShapes.of(vessel);
        for (Tank tank : vessel.tanks()) {
            NetShape shape = shapes.net(tank.id()).orElse(null);
            CapacityCheck.check(tank, shape, findings);
            PipeCheck.check(tank, shape, findings);
            SoundingCheck.check(tank, shape, vessel.particulars().lbp(), findings);
            VolumeCheck.check(tank, shape, findings);
            LevelCheck.check(tank, findings);
        }
        PairCheck.check(vessel, findings);
        OverlapCheck.check(vessel, findings);
        HydrostaticCheck.check(vessel, findings);
        CrossCurveCheck.check(vessel, findings);
        LimitCheck.check(vessel, findings);
        PlausibilityCheck.check(vessel, findings);
        return findings.list();
    }
}
