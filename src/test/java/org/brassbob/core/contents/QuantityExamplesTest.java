// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.contents;

import static org.brassbob.fixture.Published.check;
import static org.junit.jupiter.api.Assertions.assertEquals;

import org.brassbob.core.condition.TankFigures;
import org.brassbob.core.table.SoundingTable.Argument;
import org.brassbob.core.vessel.Liquid;
import org.brassbob.fixture.Liquids;
import org.brassbob.fixture.RoundBuilder;
import org.brassbob.fixture.ShipBuilder;
import org.brassbob.fixture.Tables;
import org.brassbob.fixture.TankBuilder;
import org.junit.jupiter.api.Test;

/** Published worked examples of volumes, temperature correction and mass, from the reading to the tonnes. */
class QuantityExamplesTest {
    private static TankFigures bunker(Liquid liquid, RoundBuilder round) {
        TankBuilder tank = TankBuilder.tabled("fo", Tables.constant(400, 50, 0, 3, 10))
                .liquid(liquid)
                .soundings(Tables.soundings(new double[] {0, 3.20, 3.30, 8}, new double[] {0, 157.20, 163.60, 400}));
        return ShipBuilder.ship()
                .massInAir()
                .tanks(tank)
                .assess(round.build())
                .tank("fo")
                .orElseThrow();
    }

    @Test
    void fuelOilInAir() {
        // An older copy states the density as 0.9870, which is the factor: a misprint.
        String source = "Bunker calculation onboard ships (Tyagi) and its corrected copy";
        TankFigures tank = bunker(
                Liquids.fuelOil(0.9903), RoundBuilder.upright().temperature(34).sounding("fo", 3.27));
        check(source + ", volume", 161.68, 5e-3, 161.68, tank.volume());
        check(source + ", factor", 0.9870, 5e-5, 0.9870008057332749, PetroleumFactor.of(0.9903, 34));
        check(source + ", mass in air", 157.85, 1e-2, 157.85484473602955, tank.mass());
    }

    @Test
    void heavyFuelOilInAir() {
        String source = "Bunker calculation (scribd 370250180)";
        TankFigures tank = bunker(
                Liquids.fuelOil(0.9920), RoundBuilder.upright().temperature(36).volume("fo", 161.28));
        check(source + ", factor", 0.9857, 5e-5, 0.985658587830727, PetroleumFactor.of(0.9920, 36));
        // The factor is rounded to four decimals in print: half of the last is 0.008 t.
        check(source + ", mass in air", 157.53, 5e-3 + 8e-3, 157.52041719022705, tank.mass());
    }

    @Test
    void cargoTankByUllage() {
        // The paper gives 8 255.5, 8 007.8, 1 192.5 and 7 063.1 t to choose from, and no key.
        TankFigures tank = ShipBuilder.ship()
                .tanks(TankBuilder.box("c", 40, 61, -13, 13, 0, 18).liquid(Liquids.ofDensity(0.84)))
                .assess(RoundBuilder.upright().ullage("c", 2.6).build())
                .tank("c")
                .orElseThrow();
        check("F2 cargo handling questions, tank 21 × 26 × 18 m", 7063.1, 0.05, 7063.056, tank.mass());
    }

    @Test
    void tableReadInSoundingAndTrim() {
        // Worked by hand, in either order of reading.
        TankModel model = TankBuilder.tabled("t", Tables.constant(100, 50, 0, 3, 10))
                .soundings(Tables.soundings(
                        Argument.SOUNDING,
                        new double[] {1.00, 1.20},
                        new double[] {0, 1, 2},
                        new double[] {0},
                        new double[] {52.0, 63.0, 50.4, 61.6, 48.8, 60.2}))
                .model();
        check("worked by hand", 58.121, 5e-4, 58.121, model.volumeAtSounding(1.13, 0.7, 0));
    }

    @Test
    void ullageAndSoundingAddUpToTheReferenceHeight() {
        // Worked by hand: 12.350 − 3.420 = 8.930 m.
        TankBuilder tank = TankBuilder.box("t", 40, 50, -5, 5, 0, 12.35);
        double byUllage = volume(tank, RoundBuilder.upright().ullage("t", 3.420));
        double bySounding = volume(tank, RoundBuilder.upright().sounding("t", 8.930));
        assertEquals(893.0, bySounding, 1e-9);
        assertEquals(bySounding, byUllage, 1e-9);
    }

    private static double volume(TankBuilder tank, RoundBuilder round) {
        return ShipBuilder.ship()
                .tanks(tank)
                .assess(round.build())
                .tanks()
                .get(0)
                .volume();
    }
}
