// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * For every displacement that the open tanks together can make, the levels that give the greatest sum of vertical and free-surface
 * moment. At a given displacement nothing else of theirs enters the corrected GM (but for a trim that moves KM), so the worst set of
 * levels is among them, however KM runs: going from tank to tank alone would miss levels that are bad only together.
 */
final class MomentByMass {
    private static final int BINS = 256;

    private final List<Level[]> levels;
    private final double width;

    private MomentByMass(List<Level[]> levels) {
        this.levels = levels;
        double range = 0;
        for (Level[] all : levels) {
            range += greatestMass(all) - leastMass(all);
        }
        this.width = Math.max(range, 1e-9) / BINS;
    }

    /** A choice for the tanks so far. */
    private record Choice(Totals sums, @Nullable Choice before, int level) {}

    /**
     * The worst levels by this measure: an index into the levels of each tank.
     *
     * @param levels of each tank
     * @param rest sums of the ship without them
     */
    static int[] worst(List<Level[]> levels, Totals rest, WorstLevels.Gm gm) {
        return new MomentByMass(levels).worst(rest, gm);
    }

    private int[] worst(Totals rest, WorstLevels.Gm gm) {
        List<Choice> choices = List.of(new Choice(rest, null, 0));
        double least = rest.mass;
        for (Level[] tank : levels) {
            least += leastMass(tank);
            choices = extended(choices, tank, least);
        }
        Choice worst = choices.get(0);
        double lowest = Double.POSITIVE_INFINITY;
        for (Choice choice : choices) {
            double value = gm.of(choice.sums);
            if (value < lowest) {
                lowest = value;
                worst = choice;
            }
        }
        return indices(worst);
    }

    private List<Choice> extended(List<Choice> choices, Level[] tank, double least) {
        @Nullable Choice[] bins = new Choice[BINS + 2];
        for (Choice choice : choices) {
            double moment = choice.sums.verticalAndFreeSurface();
            for (int i = 0; i < tank.length; i++) {
                Totals part = tank[i].part();
                int bin = (int) Math.round((choice.sums.mass + part.mass - least) / width);
                Choice held = bins[bin];
                if (held == null || moment + part.verticalAndFreeSurface() > held.sums.verticalAndFreeSurface()) {
                    bins[bin] = new Choice(choice.sums.plus(part), choice, i);
                }
            }
        }
        List<Choice> next = new ArrayList<>(bins.length);
        for (Choice choice : bins) {
            if (choice != null) {
                next.add(choice);
            }
        }
        return next;
    }

    private int[] indices(Choice worst) {
        int[] indices = new int[levels.size()];
        Choice choice = worst;
        for (int i = indices.length - 1; i >= 0; i--) {
            indices[i] = choice.level;
            Choice before = choice.before;
            if (before != null) {
                choice = before;
            }
        }
        return indices;
    }

    private static double leastMass(Level[] tank) {
        return Arrays.stream(tank).mapToDouble(l -> l.part().mass).min().orElse(0);
    }

    private static double greatestMass(Level[] tank) {
        return Arrays.stream(tank).mapToDouble(l -> l.part().mass).max().orElse(0);
    }
}
