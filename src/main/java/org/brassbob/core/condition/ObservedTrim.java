// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import org.brassbob.core.round.SoundingRound.Observed;
import org.brassbob.core.vessel.DraughtMark;
import org.brassbob.core.vessel.Vessel;

/** The trim that was observed: stated, or from draughts read at the marks and carried to the perpendiculars. */
final class ObservedTrim {
    private ObservedTrim() {}

    static OptionalDouble of(Observed observed, Vessel vessel) {
        Double stated = observed.trim();
        if (stated != null) {
            return OptionalDouble.of(stated);
        }
        Double aft = observed.draughtAft();
        Double forward = observed.draughtForward();
        if (aft == null || forward == null) {
            return OptionalDouble.empty();
        }
        double lbp = vessel.particulars().lbp();
        return OptionalDouble.of((aft - forward) * lbp / betweenMarks(vessel.draughtMarks(), lbp));
    }

    /** Length between the outermost marks; without two marks the draughts are taken as read at the perpendiculars. */
    private static double betweenMarks(List<DraughtMark> marks, double lbp) {
        if (marks.size() < 2) {
            return lbp;
        }
        Comparator<DraughtMark> byX = Comparator.comparingDouble(DraughtMark::x);
        return marks.stream().max(byX).orElseThrow().x()
                - marks.stream().min(byX).orElseThrow().x();
    }
}
