// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import java.util.List;

/**
 * Chooses, where readings leave a choice, the volumes that give the lowest corrected GM. It looks at many levels of every tank: at the
 * worst set for each displacement that they can make ({@link MomentByMass}), and from there, from all at their least and from all at
 * their greatest tank by tank until none can be made worse. Then it looks in the same way more closely about the worst.
 */
final class WorstLevels {
    private static final int ROUNDS = 12;
    private static final double SETTLED_GM = 1e-9;
    private static final int REFINEMENTS = 3;

    /** The corrected GM (m) of a set of sums. */
    interface Gm {
        double of(Totals totals);
    }

    private final List<TankLoad> open;
    private final Totals totals;
    private final Gm gm;
    private final double trim;

    private WorstLevels(List<TankLoad> open, Totals totals, Gm gm, double trim) {
        this.open = open;
        this.totals = totals;
        this.gm = gm;
        this.trim = trim;
    }

    /**
     * Fills the tanks that have a choice.
     *
     * @param open those tanks, already part of the sums
     * @param totals sums of the whole ship; kept up to date
     * @param gm the corrected GM of any sums
     * @param trim m, at which the tanks' surfaces are taken
     */
    static void choose(List<TankLoad> open, Totals totals, Gm gm, double trim) {
        new WorstLevels(open, totals, gm, trim).choose();
    }

    private void choose() {
        open.forEach(load -> totals.add(load, -1));
        List<Level[]> levels =
                open.stream().map(load -> Level.allOf(load, trim)).toList();
        fill(levels, worst(levels, List.of(new int[open.size()], greatest(levels))));
        for (int i = 0; i < REFINEMENTS; i++) {
            double share = Math.pow(2.0 / Level.SPREAD, i) / Level.SPREAD;
            List<Level[]> closer = open.stream()
                    .map(load -> Level.about(
                            load, share * (load.range().high() - load.range().low()), trim))
                    .toList();
            fill(closer, worst(closer, List.of(new int[open.size()])));
        }
        open.forEach(load -> totals.add(load, 1));
    }

    private void fill(List<Level[]> levels, int[] chosen) {
        for (int i = 0; i < chosen.length; i++) {
            open.get(i).fill(levels.get(i)[chosen[i]].volume(), trim);
        }
    }

    /** The worst choice reached from the starts given, or from the worst for each displacement. */
    private int[] worst(List<Level[]> levels, List<int[]> starts) {
        int[] worst = MomentByMass.worst(levels, totals, gm);
        double lowest = descend(worst, levels);
        for (int[] start : starts) {
            double value = descend(start, levels);
            if (value < lowest) {
                lowest = value;
                worst = start;
            }
        }
        return worst;
    }

    private static int[] greatest(List<Level[]> levels) {
        return levels.stream()
                .mapToInt(tank -> tank.length == 2 ? 1 : Level.SPREAD)
                .toArray();
    }

    /** Goes round the tanks until no other level of any one of them is worse. */
    private double descend(int[] chosen, List<Level[]> levels) {
        Totals sums = totals;
        for (int i = 0; i < chosen.length; i++) {
            sums = sums.plus(levels.get(i)[chosen[i]].part());
        }
        double lowest = gm.of(sums);
        for (int round = 0; round < ROUNDS; round++) {
            double before = lowest;
            for (int i = 0; i < chosen.length; i++) {
                Totals others = sums.minus(levels.get(i)[chosen[i]].part());
                lowest = worsen(chosen, i, levels.get(i), others, lowest);
                sums = others.plus(levels.get(i)[chosen[i]].part());
            }
            if (before - lowest < SETTLED_GM) {
                break;
            }
        }
        return lowest;
    }

    private double worsen(int[] chosen, int i, Level[] levels, Totals others, double sofar) {
        double lowest = sofar;
        for (int k = 0; k < levels.length; k++) {
            double value = gm.of(others.plus(levels[k].part()));
            if (value < lowest) {
                lowest = value;
                chosen[i] = k;
            }
        }
        return lowest;
    }
}
