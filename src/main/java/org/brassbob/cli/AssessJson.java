// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

import java.io.IOException;
import java.time.OffsetDateTime;
import java.util.Comparator;
import java.util.List;
import org.brassbob.core.condition.Assessment;
import org.brassbob.core.condition.Condition;
import org.brassbob.core.condition.Margin;
import org.brassbob.core.condition.TankFigures;
import org.brassbob.core.notice.Notice;
import org.brassbob.core.round.Reading;
import org.brassbob.core.working.Step;
import org.jspecify.annotations.Nullable;

/** An assessment as JSON; every key carries its unit. */
final class AssessJson {
    private AssessJson() {}

    /**
     * The document.
     *
     * @param working the steps, or null where nobody asked for them
     */
    static String of(Assessment assessment, @Nullable List<Step> working) {
        return JsonText.document(json -> {
            json.object("vessel", v -> v.put("id", assessment.vessel().id())
                    .put("name", assessment.vessel().name())
                    .put("data_sha256", assessment.vessel().dataSha256()));
            json.object("round", r -> round(r, assessment));
            json.list("tanks", assessment.tanks(), AssessJson::tank);
            json.object("condition", c -> condition(c, assessment.condition()));
            json.object("margin", m -> margin(m, assessment.margin()));
            json.list("criteria", List.of(), (j, nothing) -> {});
            json.list("notices", assessment.notices(), AssessJson::notice);
            if (working != null) {
                json.list("working", working, AssessJson::step);
            }
        });
    }

    private static void round(JsonText json, Assessment assessment) throws IOException {
        List<OffsetDateTime> times = assessment.round().readings().stream()
                .map(Reading::at)
                .sorted(Comparator.comparing(OffsetDateTime::toInstant))
                .toList();
        json.put("file", assessment.round().name())
                .put("taken_from", Times.iso(times.get(0)))
                .put("taken_to", Times.iso(times.get(times.size() - 1)));
    }

    private static void tank(JsonText json, TankFigures tank) throws IOException {
        json.put("tank", tank.tank().id())
                .put("name", tank.tank().name())
                .put("liquid", tank.tank().liquid().id());
        Reading reading = tank.reading();
        if (reading == null) {
            json.nothing("reading");
        } else {
            json.object("reading", r -> r.put("kind", reading.kind().code())
                    .put("value", reading.value())
                    .put("at", Times.iso(reading.at()))
                    .put("age_h", tank.ageHours()));
        }
        json.put("volume_m3", tank.volume())
                .put("fill_pct", tank.fillPct())
                .put("density_t_m3", tank.density())
                .put("mass_t", tank.mass())
                .put("lcg_m", tank.lcg())
                .put("tcg_m", tank.tcg())
                .put("vcg_m", tank.vcg())
                .put("state", tank.state().code())
                .put("stale", tank.stale())
                .put("fsm_as_sounded_tm", tank.fsmAsSounded())
                .put("fsm_by_code_tm", tank.fsmByCode())
                .put("gm_loss_m", tank.gmLoss())
                .put("share_pct", tank.sharePct())
                .put("rank", tank.rank() == 0 ? Double.NaN : tank.rank())
                .put("negligible", tank.negligible())
                .words("notes", tank.notes().stream().map(Notice::text).toList());
    }

    static void condition(JsonText json, Condition c) throws IOException {
        json.put("displacement_t", c.displacement())
                .put("lcg_m", c.lcg())
                .put("tcg_m", c.tcg())
                .put("kg_m", c.kg())
                .put("kmt_m", c.kmt())
                .put("gm_solid_m", c.gmSolid())
                .put("fs_as_sounded_m", c.fsAsSounded())
                .put("gm_as_sounded_m", c.gmAsSounded())
                .put("fs_by_code_m", c.fsByCode())
                .put("gm_m", c.gm())
                .put("kg_fluid_m", c.kgFluid())
                .put("draught_aft_m", c.draughtAft())
                .put("draught_forward_m", c.draughtForward())
                .put("draught_mean_m", c.draughtMean())
                .put("trim_m", c.trim())
                .put("list_deg", c.listDeg())
                .put("loll_deg", c.lollDeg());
    }

    static void margin(JsonText json, Margin m) throws IOException {
        json.put("curve", m.curve().isEmpty() ? null : m.curve())
                .put("gm_required_m", m.gmRequired())
                .put("margin_m", m.margin())
                .nothing("uncertainty_m")
                .put("band_m", m.band())
                .put("state", m.state().code());
    }

    static void notice(JsonText json, Notice notice) throws IOException {
        json.put("severity", notice.severity().code())
                .put("about", notice.about())
                .put("text", notice.text());
    }

    private static void step(JsonText json, Step step) throws IOException {
        json.put("figure", step.figure()).put("rule", step.rule()).put("value", step.value());
        json.list("inputs", step.inputs(), (j, input) -> j.put("name", input.name())
                .put("value", input.value())
                .put("source", input.source()));
    }
}
