// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.contents.RowsRead;
import org.brassbob.core.notice.Notice;
import org.brassbob.core.notice.NoticeCode;
import org.brassbob.core.table.LimitCurve;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.core.working.Step;
import org.brassbob.core.working.Step.Input;
import org.brassbob.core.working.Working;
import org.jspecify.annotations.Nullable;

/** Holds the corrected GM against the limit curve in force. */
final class MarginJudge {
    private MarginJudge() {}

    /**
     * The verdict.
     *
     * @param curve name of the curve chosen, or null for the ship's first
     * @param notices what is known so far; the judge adds its own
     * @throws IllegalArgumentException if the ship has no curve of that name
     */
    static Margin judge(
            Vessel vessel, @Nullable String curve, Condition condition, List<Notice> notices, Working working) {
        double band = vessel.policy().gmAllowance();
        if (working.recording()) {
            Input allowance = Input.from("gm_allowance_m", band, "vessel.json: policy");
            working.step(Step.of("ship", "band_m", "the ship's allowance", band, allowance));
        }
        if (curve == null && vessel.limitCurves().isEmpty()) {
            notices.add(Notice.of(NoticeCode.NO_LIMIT_CURVE, "ship"));
            return new Margin("", Double.NaN, Double.NaN, band, Margin.State.CAUTION);
        }
        LimitCurve limit = chosen(vessel, curve);
        double displacement = condition.displacement();
        double required = limit.requiredGm(displacement, condition.kmt());
        double margin = condition.gm() - required;
        boolean outside = !limit.displacements().covers(displacement);
        if (outside) {
            notices.add(Notice.of(
                    NoticeCode.OUTSIDE_LIMIT_CURVE,
                    limit.name(),
                    displacement,
                    limit.displacements().first(),
                    limit.displacements().last()));
        }
        if (margin < 0) {
            notices.add(Notice.of(NoticeCode.BELOW_LIMIT, "ship", condition.gm(), required));
        }
        if (working.recording()) {
            record(working, limit, condition, required, margin);
        }
        return new Margin(limit.name(), required, margin, band, state(outside || margin < 0, margin < band, notices));
    }

    private static LimitCurve chosen(Vessel vessel, @Nullable String curve) {
        if (curve == null) {
            return vessel.limitCurves().get(0);
        }
        return vessel.limitCurve(curve)
                .orElseThrow(() -> new IllegalArgumentException("no limit curve '" + curve + "'; expected one of "
                        + vessel.limitCurves().stream().map(LimitCurve::name).toList()));
    }

    private static Margin.State state(boolean below, boolean withinBand, List<Notice> notices) {
        if (below) {
            return Margin.State.BELOW;
        }
        boolean held = notices.stream().anyMatch(n -> n.code().holdsAtCaution());
        return withinBand || held ? Margin.State.CAUTION : Margin.State.CLEAR;
    }

    private static void record(Working working, LimitCurve limit, Condition condition, double required, double margin) {
        String rule = limit.kind() == LimitCurve.Kind.GM_REQUIRED
                ? "limit curve, read linearly at the displacement"
                : "KM − permissible KG, read linearly at the displacement";
        List<Input> inputs = new ArrayList<>();
        inputs.add(Input.figure("ship", "displacement_t", condition.displacement()));
        if (limit.kind() == LimitCurve.Kind.KG_LIMIT) {
            inputs.add(Input.figure("ship", "kmt_m", condition.kmt()));
        }
        for (int row : RowsRead.about(limit.displacements(), condition.displacement())) {
            String source = limit.origin().at(row);
            inputs.add(Input.from("displacement_t", limit.displacements().value(row), source));
            inputs.add(Input.from("limit_m", limit.value(row), source));
        }
        working.step(new Step("ship/gm_required_m", rule, required, inputs));
        working.step(Step.of(
                "ship",
                "margin_m",
                "corrected GM − required GM",
                margin,
                Input.figure("ship", "gm_m", condition.gm()),
                Input.figure("ship", "gm_required_m", required)));
    }
}
