// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.brassbob.core.table.HydrostaticTable.Entry;
import org.brassbob.core.vessel.Tank;
import org.brassbob.fixture.Hydrostatics;
import org.brassbob.fixture.RoundBuilder;
import org.brassbob.fixture.ShipBuilder;
import org.brassbob.fixture.Tables;
import org.brassbob.fixture.TankBuilder;

/** Tanks without a reading, of random tables in ships of a random, even unlikely, run of KM. */
class WorstLevelsProperties {
    private static final int[] STEPS = {0, 200, 40, 14};

    @Property(tries = 60, seed = "20260301")
    void noLevelsOfOneTwoOrThreeTanksAreWorse(@ForAll long seed) {
        Random random = new Random(seed);
        ShipBuilder ship = ShipBuilder.ship().lightship(2000, 5.5 + random.nextDouble());
        Entry[] rows = new Entry[12];
        for (int i = 0; i < rows.length; i++) {
            double km = 7.5 + 1.5 * random.nextDouble() - 0.08 * i;
            rows[i] = new Entry(1 + 0.5 * i, 1900 + 250 * i, 50, 50, km, 100, 20, 1);
        }
        ship.hydrostatics(Hydrostatics.evenKeel(rows));
        List<Tank> tanks = new ArrayList<>();
        int count = 1 + random.nextInt(3);
        for (int i = 0; i < count; i++) {
            tanks.add(tank("t" + i, random));
        }
        tanks.forEach(ship::tanks);
        Assessor assessor = ship.assessor();
        double unknown =
                assessor.assess(RoundBuilder.upright().build()).condition().gm();
        double lowest = lowest(assessor, tanks, RoundBuilder.upright(), 0, STEPS[count]);
        assertTrue(unknown <= lowest + 1e-6, () -> unknown + " against " + lowest + " with " + tanks.size() + " tanks");
    }

    private static Tank tank(String id, Random random) {
        double capacity = 50 + 500 * random.nextDouble();
        double foot = 6 * random.nextDouble();
        double height = 1 + 5 * random.nextDouble();
        double[] volumes = new double[5];
        double[] same = {50, 50, 50, 50, 50};
        double[] vcg = new double[5];
        double[] moments = new double[5];
        for (int i = 0; i < volumes.length; i++) {
            volumes[i] = capacity * i / 4;
            vcg[i] = foot + height * i / 8;
            moments[i] = 800 * random.nextDouble();
        }
        TankBuilder tank = TankBuilder.tabled(id, Tables.volumes(volumes, same, same, vcg, moments))
                .residue(capacity * 0.02 * random.nextDouble())
                .fillLimitPct(90 + 10 * random.nextDouble());
        return random.nextBoolean() ? tank.consumable().build() : tank.build();
    }

    private static double lowest(Assessor assessor, List<Tank> tanks, RoundBuilder round, int n, int steps) {
        if (n == tanks.size()) {
            return assessor.assess(round.build()).condition().gm();
        }
        Tank tank = tanks.get(n);
        double low = Math.min(tank.residue() + 1e-6, tank.fillLimit());
        double lowest = Double.POSITIVE_INFINITY;
        for (int i = 0; i <= steps; i++) {
            round.volume(tank.id(), low + (tank.fillLimit() - low) * i / steps);
            lowest = Math.min(lowest, lowest(assessor, tanks, round, n + 1, steps));
        }
        return lowest;
    }
}
