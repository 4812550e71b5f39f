// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

import java.time.OffsetDateTime;
import java.util.Comparator;
import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.stream.Collectors;
import org.brassbob.core.condition.Assessment;
import org.brassbob.core.condition.Condition;
import org.brassbob.core.condition.Margin;
import org.brassbob.core.condition.TankFigures;
import org.brassbob.core.contents.TankState;
import org.brassbob.core.notice.Notice;
import org.brassbob.core.notice.NoticeCode;
import org.brassbob.core.notice.Severity;
import org.brassbob.core.round.Reading;
import org.brassbob.core.round.ReadingKind;

/** An assessment as a page of text, the verdict last, where the eye of somebody at a terminal is. */
final class AssessText {
    /** From so many on, notices of one kind are told once. */
    private static final int MANY = 4;

    private final Assessment assessment;
    private final StringBuilder text = new StringBuilder();

    private AssessText(Assessment assessment) {
        this.assessment = assessment;
    }

    static String of(Assessment assessment) {
        return new AssessText(assessment).page();
    }

    private String page() {
        head();
        tanks();
        slack();
        condition();
        notices();
        verdict();
        return text.toString();
    }

    private void head() {
        List<OffsetDateTime> times = assessment.round().readings().stream()
                .map(Reading::at)
                .sorted(Comparator.comparing(OffsetDateTime::toInstant))
                .toList();
        line("%s: %s", assessment.vessel().name(), assessment.round().name());
        line("readings from %s to %s", Times.plain(times.get(0)), Times.plain(times.get(times.size() - 1)));
        line("data %s", assessment.vessel().dataSha256().substring(0, 16));
        assessment.vessel().sources().stream()
                .filter(s -> s.toLowerCase(Locale.ROOT).contains("demo"))
                .findFirst()
                .ifPresent(s -> line("%s", s));
        line("");
    }

    private void tanks() {
        line("TANKS, in the order of the walk");
        line("  %-22s %-17s %-16s %9s %6s %9s  %s", "", "liquid", "reading", "m3", "%", "t", "state");
        for (TankFigures tank : assessment.tanks()) {
            line(
                    "  %-22s %-17s %-16s %9.1f %6.1f %9.1f  %s",
                    cut(tank.tank().name(), 22),
                    cut(tank.tank().liquid().name(), 17),
                    reading(tank),
                    tank.volume(),
                    tank.fillPct(),
                    tank.mass(),
                    state(tank));
        }
        line("");
    }

    private static String state(TankFigures tank) {
        return tank.state().code() + (tank.stale() ? String.format(Locale.ROOT, ", %.0f h old", tank.ageHours()) : "");
    }

    private static String reading(TankFigures tank) {
        Reading reading = tank.reading();
        if (reading == null) {
            return "none";
        }
        return switch (reading.kind()) {
            case SOUNDING, ULLAGE ->
                String.format(
                        Locale.ROOT,
                        "%s %.3f m",
                        reading.kind() == ReadingKind.SOUNDING ? "snd" : "ull",
                        reading.value());
            case VOLUME -> String.format(Locale.ROOT, "%.1f m3", reading.value());
            case PERCENT -> String.format(Locale.ROOT, "%.1f %%", reading.value());
            case MASS -> String.format(Locale.ROOT, "%.1f t", reading.value());
            case EMPTY, FULL, NOT_TAKEN -> reading.kind().code();
        };
    }

    private void slack() {
        List<TankFigures> slack = assessment.slackest();
        if (slack.isEmpty()) {
            line("No tank is slack: no free surface.");
            line("");
            return;
        }
        line("WHAT EACH FREE SURFACE TAKES FROM GM, the largest first");
        line("  %3s %-22s %8s %7s %12s %12s", "", "", "GM m", "share", "by code t·m", "sounded t·m");
        for (TankFigures tank : slack) {
            line(
                    "  %3d %-22s %8.3f %5.1f %% %12.1f %12.1f%s",
                    tank.rank(),
                    cut(tank.tank().name(), 22),
                    tank.gmLoss(),
                    tank.sharePct(),
                    tank.fsmByCode(),
                    tank.fsmAsSounded(),
                    tank.negligible() ? "  small by the code" : tank.state() == TankState.UNKNOWN ? "  not known" : "");
        }
        line("");
    }

    private void condition() {
        Condition c = assessment.condition();
        line("CONDITION");
        line("  displacement  %9.1f t      draught aft  %7.3f m", c.displacement(), c.draughtAft());
        line("  KG, solid     %9.3f m      forward      %7.3f m", c.kg(), c.draughtForward());
        line("  KM            %9.3f m      mean         %7.3f m", c.kmt(), c.draughtMean());
        line(
                "  LCG           %9.3f m      trim         %7.3f m %s",
                c.lcg(), c.trim(), side(c.trim(), "by the stern", "by the head"));
        line(
                "  TCG           %9.3f m      list         %7.2f° %s",
                c.tcg(), c.listDeg(), side(c.listDeg(), "to starboard", "to port"));
        if (c.lollDeg() != 0) {
            line("  angle of loll %9.1f°", c.lollDeg());
        }
        line("");
        line("  solid GM                %8.3f m", c.gmSolid());
        line(
                "  free surface by code    %8.3f m   (as sounded %.3f m, GM %.3f m)",
                -c.fsByCode(), c.fsAsSounded(), c.gmAsSounded());
        line("  corrected GM            %8.3f m", c.gm());
        line("");
    }

    private static String side(double value, String positive, String negative) {
        if (Double.isNaN(value) || Math.abs(value) < 5e-4) {
            return "";
        }
        return value > 0 ? positive : negative;
    }

    private void notices() {
        if (assessment.notices().isEmpty()) {
            return;
        }
        line("TO KNOW");
        Set<NoticeCode> told = EnumSet.noneOf(NoticeCode.class);
        for (Notice notice : assessment.notices()) {
            List<Notice> alike = assessment.notices().stream()
                    .filter(n -> n.code() == notice.code())
                    .toList();
            if (alike.size() < MANY || notice.severity() == Severity.STOP) {
                line("  %-8s%s: %s", notice.severity().code(), about(notice), notice.text());
            } else if (told.add(notice.code())) {
                String names = alike.stream().map(this::about).collect(Collectors.joining(", "));
                line("  %-8s%s: alike, the first: %s", notice.severity().code(), names, notice.text());
            }
        }
        line("");
    }

    private String about(Notice notice) {
        return assessment.tank(notice.about()).map(t -> t.tank().name()).orElse(notice.about());
    }

    private void verdict() {
        Margin m = assessment.margin();
        if (m.curve().isEmpty()) {
            line("MARGIN  not to be judged: the ship's data has no limit curve");
        } else {
            line(
                    "MARGIN  %+.3f m above the required %.3f m (%s), band %.3f m: %s",
                    m.margin(),
                    m.gmRequired(),
                    m.curve(),
                    m.band(),
                    m.state().code().toUpperCase(Locale.ROOT));
        }
        line("%s", Safety.WORDS);
    }

    private static String cut(String words, int width) {
        return words.length() <= width ? words : words.substring(0, width - 1) + "…";
    }

    private void line(String format, Object... values) {
        text.append(String.format(Locale.ROOT, format, values).stripTrailing()).append(System.lineSeparator());
    }
}
