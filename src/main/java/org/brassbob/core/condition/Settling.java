// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.brassbob.core.contents.TankState;
import org.brassbob.core.round.SoundingRound.Observed;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.core.vessel.Weight;
import org.jspecify.annotations.Nullable;

/**
 * Finds the trim and list at which the readings were taken: those observed, or else those that the readings themselves make, pass by
 * pass until they agree; and with them what is in every tank.
 */
final class Settling {
    /** Trim and list have settled when a pass moves them by less than this (m, °); well inside the millimetre that is asked for. */
    private static final double SETTLED_TRIM = 1e-5;

    private static final double SETTLED_LIST_DEG = 1e-5;
    private static final double ACCEPTED_TRIM = 1e-3;
    private static final double ACCEPTED_LIST_DEG = 1e-2;
    private static final int PASSES = 80;

    /** From this pass on only half of each step is taken, in case the passes swing about the answer. */
    private static final int DAMPED_FROM = 20;

    /** Beyond this heel (°) a sounding says nothing; the search for the list is held within it. */
    private static final double STEEPEST_LIST_DEG = 60;

    /** Levels of a tank without a reading that she is let settle with, and once more as many about the worst of them. */
    private static final int LEVELS = 16;

    private final Vessel vessel;
    private final OptionalDouble observedTrim;
    private final @Nullable Double observedList;
    private final List<TankLoad> loads;
    private final ConditionMaker maker;

    Settling(Vessel vessel, Observed observed, List<TankLoad> loads, ConditionMaker maker) {
        this.vessel = vessel;
        this.observedTrim = ObservedTrim.of(observed, vessel);
        this.observedList = observed.listDeg();
        this.loads = loads;
        this.maker = maker;
    }

    /**
     * The outcome.
     *
     * @param totals sums of the ship
     * @param trim at which the readings were taken (m)
     * @param listDeg at which the readings were taken (°)
     * @param accepted whether the passes came to agree
     */
    record Settled(Totals totals, double trim, double listDeg, boolean accepted) {}

    /** Settles, and leaves every load as it is then. */
    Settled settle() {
        Settled first = from(observedTrim.orElse(0), observedList == null ? 0 : observedList);
        boolean follows = observedTrim.isEmpty() || observedList == null;
        return follows && loads.stream().anyMatch(TankLoad::isOpen) ? worst(first) : first;
    }

    /**
     * Where trim or list follow the readings, the level of one tank moves what is read in all the others, which the search at one trim
     * can't see. So each tank without a reading is held where that search left it, and she is let settle with many levels of one
     * after the other; the worst is kept.
     */
    private Settled worst(Settled first) {
        double lowest = maker.gm(first.totals);
        List<TankLoad> open = loads.stream().filter(TankLoad::isOpen).toList();
        open.forEach(load -> load.pin(load.volume()));
        for (TankLoad load : open) {
            double low = load.leastOpen();
            double high = load.tank().fillLimit();
            lowest = worst(load, first, low, high, lowest);
            double found = load.volume();
            double spacing = (high - low) / LEVELS;
            lowest = worst(load, first, Math.max(low, found - spacing), Math.min(high, found + spacing), lowest);
        }
        return from(first.trim, first.listDeg);
    }

    private double worst(TankLoad load, Settled start, double low, double high, double sofar) {
        double lowest = sofar;
        double found = load.volume();
        double nearlyFull = TankState.FULL_SHARE * load.tank().capacity() * (1 - 1e-9);
        for (int i = 0; i <= LEVELS + 1; i++) {
            double level = i <= LEVELS ? low + (high - low) * i / LEVELS : Math.max(low, Math.min(high, nearlyFull));
            load.pin(level);
            double gm = maker.gm(from(start.trim, start.listDeg).totals);
            if (gm < lowest) {
                lowest = gm;
                found = level;
            }
        }
        load.pin(found);
        return lowest;
    }

    private Settled from(double startTrim, double startList) {
        double trim = startTrim;
        double list = startList;
        for (int pass = 1; ; pass++) {
            Totals totals = pass(trim, list);
            Condition condition = maker.of(totals);
            double trimStep = observedTrim.isPresent() ? 0 : condition.trim() - trim;
            double listStep = observedList != null ? 0 : listOf(condition) - list;
            boolean settled = Math.abs(trimStep) < SETTLED_TRIM && Math.abs(listStep) < SETTLED_LIST_DEG;
            if (settled || pass == PASSES) {
                boolean accepted = Math.abs(trimStep) < ACCEPTED_TRIM && Math.abs(listStep) < ACCEPTED_LIST_DEG;
                return new Settled(totals, trim, list, accepted);
            }
            double share = pass < DAMPED_FROM ? 1 : 0.5;
            trim += share * trimStep;
            list += share * listStep;
        }
    }

    private static double listOf(Condition condition) {
        double list = Double.isNaN(condition.listDeg()) ? 0 : condition.listDeg();
        return Math.max(-STEEPEST_LIST_DEG, Math.min(STEEPEST_LIST_DEG, list));
    }

    private Totals pass(double trim, double listDeg) {
        Totals totals = new Totals();
        totals.add(vessel.lightship());
        for (Weight weight : vessel.weights()) {
            totals.add(weight.at());
        }
        for (TankLoad load : loads) {
            load.read(trim, listDeg);
            totals.add(load, 1);
        }
        List<TankLoad> open = new ArrayList<>();
        for (TankLoad load : loads) {
            if (load.intervalMatters()) {
                open.add(load);
            } else if (load.range().isInterval()) {
                takeWorseEnd(load, totals, trim);
            }
        }
        if (!open.isEmpty()) {
            WorstLevels.choose(open, totals, maker::gm, trim);
        }
        return totals;
    }

    /** Between two ends that both count as empty there is only a little mass to choose, and nothing for other tanks to wait for. */
    private void takeWorseEnd(TankLoad load, Totals totals, double trim) {
        double atLow = maker.gm(totals);
        totals.add(load, -1);
        load.fill(load.range().high(), trim);
        totals.add(load, 1);
        if (maker.gm(totals) > atLow) {
            totals.add(load, -1);
            load.fill(load.range().low(), trim);
            totals.add(load, 1);
        }
    }
}
