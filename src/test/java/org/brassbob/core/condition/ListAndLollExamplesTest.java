// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import static org.brassbob.fixture.Published.check;
import static org.junit.jupiter.api.Assertions.assertEquals;

import org.brassbob.core.round.SoundingRound;
import org.brassbob.fixture.Liquids;
import org.brassbob.fixture.RoundBuilder;
import org.brassbob.fixture.ShipBuilder;
import org.brassbob.fixture.Tables;
import org.brassbob.fixture.TankBuilder;
import org.junit.jupiter.api.Test;

/** Published worked examples of list, of moving weights and liquids, and of loll. */
class ListAndLollExamplesTest {
    private static final String CHAPTER_11 = "Stability I, chapter 11 (marineteacher, marinegyaan)";
    private static final String MASTERS_AND_MATES = "Ship Stability for Masters and Mates";
    private static final String LOLL_TUTORIAL = "Angle of loll tutorial";
    private static final String CHAPTER_21 = "Stability II, chapter 21 angle of loll";

    private static final SoundingRound NO_TANKS = RoundBuilder.upright().build();

    private static Condition of(ShipBuilder ship) {
        return ship.assess(NO_TANKS).condition();
    }

    /** A weight moved across: the same mass taken from the centreline and put at y (m). */
    private static ShipBuilder shifted(ShipBuilder ship, double mass, double y) {
        return ship.weight("shifted", mass, 50, y, 6);
    }

    @Test
    void weightsMovedAcross() {
        Condition one = of(shifted(ShipBuilder.ship().lightship(4980, 6).km(6.3), 20, 5));
        check(CHAPTER_11 + ", 20 t by 5 m", 3.8, 0.05, 3.814074834290357, one.listDeg());
        ShipBuilder ship = ShipBuilder.ship().lightship(8000 - 450, 6).km(8);
        shifted(ship, 200, 4);
        shifted(ship, 100, -2);
        shifted(ship, 100, -4);
        Condition several = of(shifted(ship, 50, 20));
        check(CHAPTER_11 + ", four weights, moment", 1200, 0.5, 1200, several.tcg() * several.displacement());
        check(CHAPTER_11 + ", four weights", 4.29, 5e-3, 4.289153328819018, several.listDeg());
    }

    @Test
    void weightsMovedDownAndAcross() {
        // 200 t, at first at 10 m above where it ends; the rest so that KG was 7.0.
        double rest = (10_000 * 7.0 - 200 * 12) / 9800;
        Condition down = of(ShipBuilder.ship().lightship(9800, rest).km(7.4).weight("w", 200, 50, 5, 2));
        check(CHAPTER_11 + ", 200 t down 10 m, KG", 6.8, 5e-4, 6.8, down.kg());
        check(CHAPTER_11 + ", 200 t down 10 m and 5 m to starboard", 9.46, 0.01, 9.46232220802561, down.listDeg());
        // 100 t across by 12 m and up by 1.5 m; the angle is cut off in the source and worked by hand.
        double below = (12_000 * 6.0 - 100 * 6) / 11_900;
        Condition up = of(ShipBuilder.ship().lightship(11_900, below).km(7.2).weight("w", 100, 50, 12, 7.5));
        check(CHAPTER_11 + ", 100 t up 1.5 m", 1.1875, 1e-4, 1.1875, up.gm());
        check("worked by hand", 4.814, 1e-3, 4.813550893706532, up.listDeg());
    }

    @Test
    void loadingAndDischarging() {
        // 8 000 t at 7.6 m, of which 50 t of water at 1.2 m, 4.6 m to port, go; a parcel and fuel come. The angle is
        // cut off in the source.
        double rest = (8000 * 7.6 - 50 * 1.2) / 7950;
        Condition after = of(ShipBuilder.ship()
                .lightship(7950, 50, 50 * 4.6 / 7950, rest)
                .km(8.7)
                .weight("cargo", 250, 50, 7.6, 6.1)
                .weight("fuel", 300, 50, -6.1, 0.6));
        String source = MASTERS_AND_MATES + ", pp. 116-117";
        check(source + ", KG", 7.35, 5e-3, 7.346470588235294, after.kg());
        check(source + ", GM", 1.35, 5e-3, 1.353529411764705, after.gm());
        check(source + ", moment", 300, 0.5, 300, after.tcg() * after.displacement());
        check(source + ", GG1", 0.035, 5e-4, 0.03529411764705882, after.tcg());
        check("worked by hand", 1.49, 5e-3, 1.4936844576404056, after.listDeg());
    }

    /** 10 000 t at 9.0 m listed by 3 173.88 t·m with the starboard wing tank, 12 × 12 × 9 m, full of fresh water and port empty. */
    private static ShipBuilder wingTanks() {
        double water = 12 * 12 * 9;
        double rest = 10_000 - water;
        double kgOfRest = (10_000 * 9.0 - water * 4.5) / rest;
        double tcgOfRest = (3173.88 - water * 6) / rest;
        return ShipBuilder.ship()
                .lightship(rest, 50, tcgOfRest, kgOfRest)
                .km(10.8)
                .tanks(
                        TankBuilder.box("s", 44, 56, 0, 12, 0, 9).liquid(Liquids.FRESH_WATER),
                        TankBuilder.box("p", 44, 56, -12, 0, 0, 9).liquid(Liquids.FRESH_WATER));
    }

    @Test
    void waterMovedBetweenWingTanks() {
        String source = "Stability I, chapter 11, p. 21 (marinegyaan)";
        Condition before = wingTanks()
                .assess(RoundBuilder.upright().full("s").empty("p").build())
                .condition();
        check(source + ", list at first (from the moment)", 10.0, 5e-3, 9.999982549292893, before.listDeg());
        // The printed formula shows the surface of one tank, the printed value is that of two; 'corrections' by readers
        // are wrong.
        Condition after = wingTanks()
                .assess(RoundBuilder.upright()
                        .volume("s", 1296 - 432)
                        .volume("p", 432)
                        .build())
                .condition();
        check(source + ", KG", 8.741, 1e-3, 8.7408, after.kg());
        check(source + ", correction", 0.3456, 1e-4, 0.3456, after.fsByCode());
        check(source + ", GM", 1.7134, 1e-3, 1.7136000000000005, after.gm());
        check(source + ", list to port", -6.69, 0.01, -6.690444120045549, after.listDeg());
        Condition upright = wingTanks()
                .assess(RoundBuilder.upright()
                        .volume("s", 1296 - 264.49)
                        .volume("p", 264.49)
                        .build())
                .condition();
        check(source + ", upright after moving 264.49 t", 0, 1e-3, -1.5849941880726444E-15, upright.listDeg());
    }

    @Test
    void finalKg() {
        Condition moments =
                of(ShipBuilder.ship().lightship(7000, 44_330 / 7000.0).km(7.33));
        check(MASTERS_AND_MATES + ", p. 96", 6.33, 5e-3, 6.332857142857143, moments.kg());
        check(MASTERS_AND_MATES + ", p. 96", 1.00, 5e-3, 0.9971428571428573, moments.gm());
        Condition deckCargo = of(ShipBuilder.ship()
                .lightship(5000, 4.5)
                .km(5.3)
                .weight(2000, 3.7)
                .weight(1000, 7.5)
                .weight(650, 9));
        check(
                MASTERS_AND_MATES + ", p. 96: 650 t of deck cargo for a GM of 0.3 m",
                0.3,
                5e-4,
                0.2999999999999998,
                deckCargo.gm());
    }

    /** A ship of this KM and KB whose solid GM is given. */
    private static Condition tender(double gm, double km, double kb) {
        return of(ShipBuilder.ship().lightship(10_000, km - gm).km(km, kb).gmRequired(0));
    }

    @Test
    void anglesOfLoll() {
        double bm = 75_000 * 1.025 / 20_000;
        check(
                LOLL_TUTORIAL + ", I = 7.5e4 m4",
                33.31,
                0.01,
                33.31164113484426,
                tender(-0.83, 8, 8 - bm).lollDeg());
        // The GM is printed to two decimals: 0.005 m either way is 0.2° of loll.
        check(
                LOLL_TUTORIAL + ", box 100 × 12 × 4 m",
                25,
                0.2,
                25.12852992370854,
                tender(-0.33, 5, 2).lollDeg());
        check(CHAPTER_21, 19.107, 5e-4, 19.106605350869117, tender(-0.300, 8, 3).lollDeg());
        check(
                CHAPTER_21,
                16,
                0.02,
                15.99037204312617,
                tender(-0.200, 8, 8 - 4.871).lollDeg());
        check(
                CHAPTER_21 + ", box 100 × 12 m, draught 4 m",
                18,
                0.03,
                17.98088896615441,
                tender(5 - 5.158, 5, 2).lollDeg());
        double loll = tender(4.26 + 2.84 - 7.15, 4.26 + 2.84, 4.26).lollDeg();
        check("Angle of loll examples", 0.18765, 1e-5, 0.18764665626020172, Math.tan(Math.toRadians(loll)));
    }

    @Test
    void weightMovedDownTakesTheLollAway() {
        // Printed 140.8 t from a GM rounded to 0.101; 140.35 t from the loll of 12° itself.
        double kg = 8.076 + 0.101;
        Condition lolled = of(ShipBuilder.ship().lightship(13_943, kg).km(8.076, 3.62));
        check(CHAPTER_21 + ", loll", 12, 0.03, 12.019562758785101, lolled.lollDeg());
        double rest = (13_943 * kg - 140.8 * 12) / (13_943 - 140.8);
        Condition stiffened = of(ShipBuilder.ship()
                .lightship(13_943 - 140.8, rest)
                .km(8.076, 3.62)
                .weight(140.8, 2));
        check(CHAPTER_21 + ", GM after moving 140.8 t down 10 m", 0, 5e-4, -1.7428100122174328E-5, stiffened.gm());
    }

    @Test
    void consumptionFromDoubleBottom() {
        // Worked by hand: 10 000 t, KG 7.20, KM 8.00; 300 t burned from 0.8 m leave a surface of 900 t·m in the pair.
        double rest = (10_000 * 7.2 - 300 * 0.8 - 100 * 0.8) / 9600;
        Condition arrival = ShipBuilder.ship()
                .lightship(9600, rest)
                .km(8)
                .tanks(TankBuilder.tabled("db", Tables.constant(400, 50, 0, 0.8, 900))
                        .liquid(Liquids.FRESH_WATER))
                .assess(RoundBuilder.upright().volume("db", 100).build())
                .condition();
        check("worked by hand, KG", 7.3979, 1e-4, 7.397938144329897, arrival.kg());
        check("worked by hand, solid GM", 0.6021, 1e-4, 0.6020618556701027, arrival.gmSolid());
        check("worked by hand, correction", 0.0928, 1e-4, 0.09278350515463918, arrival.fsByCode());
        check("worked by hand, GM", 0.5093, 1e-4, 0.5092783505154636, arrival.gm());
    }

    @Test
    void timberThatTakesUpWater() {
        // Worked by hand: 9 000 t, KG 7.0, KM 7.6; 120 t of water in the deck cargo at 12 m, 400 t burned from 0.7 m,
        // 600 t·m.
        double rest = (9000 * 7.0 - 400 * 0.7 - 50 * 7.0) / 8550;
        ShipBuilder ship = ShipBuilder.ship()
                .lightship(8550, rest)
                .km(7.6)
                .weight(120, 12)
                .tanks(TankBuilder.tabled("slack", Tables.constant(100, 50, 0, 7.0, 600))
                        .liquid(Liquids.FRESH_WATER));
        Condition arrival =
                ship.assess(RoundBuilder.upright().volume("slack", 50).build()).condition();
        check("worked by hand, solid GM", 0.2422, 1e-4, 0.2422018348623851, arrival.gmSolid());
        check("worked by hand, GM", 0.1734, 1e-4, 0.17339449541284382, arrival.gm());
        assertEquals(0, arrival.listDeg(), 1e-12);
    }
}
