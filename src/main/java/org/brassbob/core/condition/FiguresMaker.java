// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.brassbob.core.notice.Notice;
import org.brassbob.core.notice.NoticeCode;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Vessel;

/** From the loads to the figures of each tank: losses, shares, ranks and notes. */
final class FiguresMaker {
    /**
     * A tank may be left out where its free-surface moment over the least displacement is below this (m; 2008 IS Code part B 3.1.12,
     * from memory). The code's moment is that at 30° of heel; the upright moment used here is the greater, and the light ship stands
     * for the least displacement, so no tank is called negligible that the code would count.
     */
    private static final double NEGLIGIBLE_GM = 0.01;

    private final Vessel vessel;
    private final Totals totals;

    FiguresMaker(Vessel vessel, Totals totals) {
        this.vessel = vessel;
        this.totals = totals;
    }

    List<TankFigures> of(List<TankLoad> loads) {
        int[] ranks = ranks(loads);
        List<TankFigures> figures = new ArrayList<>(loads.size());
        for (int i = 0; i < loads.size(); i++) {
            TankLoad load = loads.get(i);
            figures.add(figures(load, ranks[i]));
        }
        return figures;
    }

    /** 1 for the largest moment by the code; of equal ones the earlier in the walk comes first; 0 for none. */
    private static int[] ranks(List<TankLoad> loads) {
        int[] ranks = new int[loads.size()];
        List<Integer> slack = new ArrayList<>();
        for (int i = 0; i < ranks.length; i++) {
            if (loads.get(i).fsmByCode() > 0) {
                slack.add(i);
            }
        }
        slack.sort(Comparator.comparingDouble((Integer i) -> -loads.get(i).fsmByCode()));
        for (int rank = 0; rank < slack.size(); rank++) {
            ranks[slack.get(rank)] = rank + 1;
        }
        return ranks;
    }

    private TankFigures figures(TankLoad load, int rank) {
        Tank tank = load.tank();
        double fsm = load.fsmByCode();
        boolean stale = isStale(load);
        return new TankFigures(
                tank,
                load.reading(),
                load.ageHours(),
                load.volume(),
                100 * load.volume() / tank.capacity(),
                load.liquid().density(),
                load.mass(),
                load.lcg(),
                load.tcg(),
                load.vcg(),
                load.shownState(),
                stale,
                load.fsmAsSounded(),
                fsm,
                fsm / totals.mass,
                totals.fsmByCode > 0 ? 100 * fsm / totals.fsmByCode : 0,
                rank,
                rank > 0 && fsm / vessel.lightship().mass() < NEGLIGIBLE_GM,
                notes(load, stale));
    }

    private boolean isStale(TankLoad load) {
        return load.ageHours() > vessel.policy().staleAfterHours(load.tank());
    }

    private List<Notice> notes(TankLoad load, boolean stale) {
        Tank tank = load.tank();
        List<Notice> notes = new ArrayList<>(load.range().notices());
        if (load.reading() == null) {
            notes.add(
                    tank.isVoid()
                            ? Notice.of(NoticeCode.VOID_NOT_READ, tank.id())
                            : Notice.of(NoticeCode.READING_MISSING, tank.id(), load.volume()));
        } else if (load.intervalMatters()) {
            notes.add(intervalNote(load));
        }
        if (stale) {
            double limit = vessel.policy().staleAfterHours(tank);
            notes.add(Notice.of(NoticeCode.READING_STALE, tank.id(), load.ageHours(), limit));
        }
        Notice ofLiquid = load.liquid().notice();
        if (ofLiquid != null && load.volume() > 0) {
            notes.add(ofLiquid);
        }
        if (tank.isVoid() && load.range().low() > tank.residue()) {
            notes.add(Notice.of(NoticeCode.VOID_NOT_DRY, tank.id(), load.volume()));
        }
        if (load.volume() > tank.fillLimit() * (1 + 1e-9) && !tank.isVoid()) {
            notes.add(Notice.of(NoticeCode.ABOVE_FILL_LIMIT, tank.id(), load.volume(), tank.fillLimit()));
        }
        if (load.water() > 0) {
            notes.add(Notice.of(NoticeCode.FREE_WATER, tank.id(), load.water(), load.waterDensity()));
        }
        return notes;
    }

    private static Notice intervalNote(TankLoad load) {
        boolean dry = load.range().low() == 0;
        return dry
                ? Notice.of(NoticeCode.PIPE_DRY, load.tank().id(), load.range().high(), load.volume())
                : Notice.of(
                        NoticeCode.PIPE_BRIM_FULL,
                        load.tank().id(),
                        load.range().low(),
                        load.volume());
    }
}
