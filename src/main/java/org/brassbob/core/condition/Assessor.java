// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import java.time.OffsetDateTime;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.brassbob.core.condition.Settling.Settled;
import org.brassbob.core.contents.LiquidState;
import org.brassbob.core.contents.TankModel;
import org.brassbob.core.contents.TankShapes;
import org.brassbob.core.notice.Notice;
import org.brassbob.core.notice.NoticeCode;
import org.brassbob.core.round.Reading;
import org.brassbob.core.round.SoundingRound;
import org.brassbob.core.vessel.Policy;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.core.working.Step;
import org.brassbob.core.working.Working;
import org.jspecify.annotations.Nullable;

/**
 * Works out a round for one ship. Made once for a ship and then used for any number of rounds, by any number of threads.
 *
 * <p>Readings are turned into volumes at the trim and list observed. Where either was not observed, it is the one that the program
 * works out from those very readings, repeated until it agrees.
 */
public final class Assessor {
    private final Vessel vessel;
    private final List<TankModel> models;
    private final Flotation flotation;

    private Assessor(Vessel vessel, List<TankModel> models, Flotation flotation) {
        this.vessel = vessel;
        this.models = models;
        this.flotation = flotation;
    }

    /**
     * An assessor for a ship.
     *
     * @throws IllegalArgumentException if her data are incomplete, which a checked vessel folder never is
     */
    public static Assessor of(Vessel vessel) {
        TankShapes shapes = TankShapes.of(vessel);
        double lbp = vessel.particulars().lbp();
        List<TankModel> models = vessel.tanks().stream()
                .map(t -> new TankModel(t, shapes.net(t.id()).orElse(null), lbp))
                .toList();
        return new Assessor(vessel, models, new Flotation(vessel));
    }

    /** Works out a round; ages are counted to its last reading. */
    public Assessment assess(SoundingRound round) {
        return assess(round, null, Working.OFF);
    }

    /**
     * Works out a round.
     *
     * @param asOf the time that ages are counted to; the round's last reading where null
     * @param working takes the steps
     * @throws IllegalArgumentException if the round names a limit curve that the ship doesn't have
     */
    public Assessment assess(SoundingRound round, @Nullable OffsetDateTime asOf, Working working) {
        List<TankLoad> loads = loads(round, asOf);
        Double observedDensity = round.observed().seaDensity();
        ConditionMaker maker =
                new ConditionMaker(flotation, observedDensity == null ? vessel.seaDensity() : observedDensity);
        Settled settled = new Settling(vessel, round.observed(), loads, maker).settle();
        Condition condition = maker.of(settled.totals());
        List<TankFigures> tanks = new FiguresMaker(vessel, settled.totals()).of(loads);
        if (working.recording()) {
            record(working, settled, loads, maker, condition);
        }
        List<Notice> notices = new ArrayList<>();
        tanks.forEach(t -> notices.addAll(t.notes()));
        addShipNotices(notices, condition, settled, maker);
        Margin margin = MarginJudge.judge(vessel, round.curve(), condition, notices, working);
        if (notices.size() > 1) {
            notices.sort(Comparator.comparing(Notice::severity).reversed());
        }
        return new Assessment(vessel, round, tanks, condition, margin, notices);
    }

    private List<TankLoad> loads(SoundingRound round, @Nullable OffsetDateTime asOf) {
        ReadingsByTank readings = new ReadingsByTank(round);
        OffsetDateTime now = asOf != null ? asOf : readings.last().orElse(null);
        Double observedDensity = round.observed().seaDensity();
        double waterDensity = observedDensity == null ? vessel.seaDensity() : observedDensity;
        List<TankLoad> loads = new ArrayList<>(models.size());
        for (TankModel model : models) {
            Tank tank = model.tank();
            Reading reading = readings.of(tank.id());
            LiquidState liquid = LiquidState.of(tank, reading, vessel.policy().massIn());
            double age = reading == null || now == null ? Double.NaN : hoursBetween(reading.at(), now);
            loads.add(new TankLoad(model, reading, age, liquid, waterDensity));
        }
        return loads;
    }

    private static double hoursBetween(OffsetDateTime earlier, OffsetDateTime later) {
        return Math.max(0, (later.toEpochSecond() - earlier.toEpochSecond()) / 3600.0);
    }

    private void record(
            Working working, Settled settled, List<TankLoad> loads, ConditionMaker maker, Condition condition) {
        String rule = "observed, or worked out and repeated until the readings agree with it";
        working.step(Step.of("ship", "trim_for_readings_m", rule, settled.trim()));
        working.step(Step.of("ship", "list_for_readings_deg", rule, settled.listDeg()));
        TankWorking tanks =
                new TankWorking(vessel.policy().massIn(), settled.totals(), settled.trim(), settled.listDeg(), working);
        loads.forEach(tanks::record);
        new ConditionWorking(vessel, flotation, maker.seaDensity(), condition, working).record(settled.totals(), loads);
    }

    private void addShipNotices(List<Notice> notices, Condition condition, Settled settled, ConditionMaker maker) {
        if (!settled.accepted()) {
            notices.add(Notice.of(NoticeCode.NOT_SETTLED, "ship", settled.trim(), settled.listDeg()));
        }
        if (!maker.covers(condition.displacement())) {
            NoticeCode code = maker.hullCovers(condition.displacement())
                    ? NoticeCode.OUTSIDE_HYDROSTATICS_HULL
                    : NoticeCode.OUTSIDE_HYDROSTATICS_EDGE;
            notices.add(Notice.of(code, "ship", condition.displacement()));
        }
        if (!flotation.coversTrim(condition.trim())) {
            notices.add(Notice.of(NoticeCode.TRIM_OUTSIDE_HYDROSTATICS, "ship", condition.trim()));
        }
        if (condition.gm() < 0) {
            notices.add(Notice.of(NoticeCode.NEGATIVE_GM, "ship", condition.gm()));
        }
        if (Double.isNaN(condition.listDeg())) {
            notices.add(Notice.of(NoticeCode.LOLL_UNKNOWN, "ship"));
        }
        addLimitNotices(notices, condition);
    }

    private void addLimitNotices(List<Notice> notices, Condition condition) {
        Policy policy = vessel.policy();
        Double listLimit = policy.listLimitDeg();
        if (listLimit != null && Math.abs(condition.listDeg()) > listLimit) {
            notices.add(Notice.of(NoticeCode.LIST_BEYOND_LIMIT, "ship", condition.listDeg(), listLimit));
        }
        double least = policy.trimMin() == null ? Double.NEGATIVE_INFINITY : policy.trimMin();
        double most = policy.trimMax() == null ? Double.POSITIVE_INFINITY : policy.trimMax();
        if (condition.trim() < least || condition.trim() > most) {
            notices.add(Notice.of(NoticeCode.TRIM_BEYOND_LIMIT, "ship", condition.trim(), least, most));
        }
        double summer = vessel.particulars().summerDraught();
        if (condition.draughtMean() > summer) {
            notices.add(Notice.of(NoticeCode.DRAUGHT_BEYOND_SUMMER, "ship", condition.draughtMean(), summer));
        }
    }
}
