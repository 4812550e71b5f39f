// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.bench;

import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.vessel.Pipe;
import org.brassbob.fixture.Hydrostatics;
import org.brassbob.fixture.Liquids;
import org.brassbob.fixture.RoundBuilder;
import org.brassbob.fixture.Shapes;
import org.brassbob.fixture.ShipBuilder;
import org.brassbob.fixture.Tables;
import org.brassbob.fixture.TankBuilder;

/** A ship of 42 tanks and 20 weights: every third tank consumable, port and starboard in turn. */
final class BenchShip {
    private static final int TANKS = 42;
    private static final double[] TRIMS = {-1, 0, 1, 2, 3};
    private static final double[] HEELS = {-3, 0, 3};

    private BenchShip() {}

    private static ShipBuilder hull() {
        ShipBuilder ship = ShipBuilder.ship()
                .hydrostatics(Hydrostatics.boxes(100, 17, 1, 9, 40))
                .lightship(2600, 47, 0, 6.2);
        for (int i = 0; i < 20; i++) {
            ship.weight("cargo " + i, 120, 20 + 3 * i, 0.1 * (i % 3 - 1), 4 + 0.1 * i);
        }
        return ship;
    }

    private static TankBuilder tank(int i) {
        int side = i % 2 == 0 ? 1 : -1;
        double x0 = 4 + 4.2 * Math.floorDiv(i, 2);
        SpaceShape shape = Shapes.ruledWing(x0, 4, 8, side);
        TankBuilder tank = TankBuilder.shaped("t" + i, shape)
                .pipe(x0 + 0.5, side * 2.2, 1.2, 3.9)
                .residue(0.5)
                .fillLimitPct(98);
        return i % 3 == 0 ? tank.consumable().liquid(Liquids.fuelOil(0.95)) : tank;
    }

    /** By shapes of 8 stations × 12 points only. */
    static ShipBuilder shaped() {
        ShipBuilder ship = hull();
        for (int i = 0; i < TANKS; i++) {
            ship.tanks(tank(i));
        }
        return ship;
    }

    /** By tables only: 40 readings × 5 trims × 3 heels, 40 volumes. */
    static ShipBuilder tabled() {
        ShipBuilder ship = hull();
        for (int i = 0; i < TANKS; i++) {
            TankBuilder tank = tank(i);
            SpaceShape own = tank.build().shape();
            Pipe pipe = tank.build().pipe();
            if (own == null || pipe == null) {
                throw new IllegalStateException("every tank of this ship has a shape and a pipe");
            }
            NetShape shape = Shapes.net(own);
            ship.tanks(tank.shape(null)
                    .soundings(Tables.soundingsOf(shape, pipe, TankBuilder.LBP, 40, TRIMS, HEELS))
                    .volumes(Tables.volumesOf(shape, 40)));
        }
        return ship;
    }

    /** All tanks sounded but the last so many. */
    static RoundBuilder round(RoundBuilder start, int unknown) {
        for (int i = 0; i < TANKS - unknown; i++) {
            if (i % 3 == 0) {
                start.temperature(45);
            }
            start.sounding("t" + i, 0.3 + (i * 37 % 32) / 10.0);
        }
        return start;
    }
}
