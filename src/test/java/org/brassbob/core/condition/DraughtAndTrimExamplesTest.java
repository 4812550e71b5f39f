// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import static org.brassbob.fixture.Published.check;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.table.HydrostaticTable.Entry;
import org.brassbob.fixture.Hydrostatics;
import org.brassbob.fixture.RoundBuilder;
import org.brassbob.fixture.ShipBuilder;
import org.junit.jupiter.api.Test;

/** Published worked examples of trim and draughts, and box ships in closed form. */
class DraughtAndTrimExamplesTest {
    /** MCT 250 t·m/cm, TPC 10 t/cm, LCF and LCB amidships at 50 m; 7 000 t at 7.0 m. */
    private static HydrostaticTable evenShip() {
        return Hydrostatics.evenKeel(
                new Entry(6, 6000, 50, 50, 8, 250, 10, 3), new Entry(8, 8000, 50, 50, 8, 250, 10, 4));
    }

    @Test
    void dischargeForwardOfTheCentreOfFlotation() {
        String source = "Trim or longitudinal stability (sailorsknowit)";
        // F 6.7, A 7.3 at 7 000 t; 220 t go from 24 m forward of the centre of flotation.
        double lcgBefore = 50 - 0.6 * 100 * 250 / 7000;
        ShipBuilder ship = ShipBuilder.ship().hydrostatics(evenShip()).lightship(7000, lcgBefore, 0, 6);
        Condition before = ship.assess(RoundBuilder.upright().build()).condition();
        check(source + ", given", 7.3, 1e-9, 7.3, before.draughtAft());
        check(source + ", given", 6.7, 1e-9, 6.7, before.draughtForward());
        Condition after =
                discharged(lcgBefore, 0).assess(RoundBuilder.upright().build()).condition();
        check(source + ", rise", 0.22, 5e-4, 0.22, before.draughtMean() - after.draughtMean());
        check(source + ", change of trim", 0.2112, 5e-5, 0.2112, after.trim() - before.trim());
        check(source + ", aft", 7.19, 5e-3, 7.1856, after.draughtAft());
        check(source + ", forward", 6.37, 5e-3, 6.3744, after.draughtForward());
        // The source goes on with 380 t (from a figure rounded to 19 cm) and a forward draught of 6.75 m, which is
        // wrong: it takes
        // the whole change of trim for one end. Worked by hand: 371.2 t brought 25 m forward bring A to 7.00 m and F to
        // 6.56 m.
        Condition levelled = discharged(lcgBefore, 371.2 * 25)
                .assess(RoundBuilder.upright().build())
                .condition();
        check("worked by hand, aft", 7.00, 5e-4, 7.000000000000001, levelled.draughtAft());
        check("worked by hand, forward", 6.56, 5e-4, 6.5600000000000005, levelled.draughtForward());
    }

    private static ShipBuilder discharged(double lcgBefore, double momentForward) {
        double lcg = (7000 * lcgBefore - 220 * (50 + 24) + momentForward) / 6780;
        return ShipBuilder.ship().hydrostatics(evenShip()).lightship(6780, lcg, 0, 6);
    }

    @Test
    void weightForADragOfTwoFeet() {
        double foot = 0.3048;
        double longTon = 1.0160469088;
        double mct = 1000 * foot * longTon / 2.54;
        HydrostaticTable table = Hydrostatics.evenKeel(
                new Entry(6, 6000, 50, 50, 8, mct, 10, 3), new Entry(8, 8000, 50, 50, 8, mct, 10, 4));
        Condition condition = ShipBuilder.ship()
                .hydrostatics(table)
                .lightship(6500, 6)
                .weight("w", 240 * longTon, 50 - 100 * foot, 0, 6)
                .assess(RoundBuilder.upright().build())
                .condition();
        // The page gives 90, 100, 130 and 240 t to choose from, and no key.
        check("USCG safety questions, MT1 1 000 ft·t, 240 t 100 ft abaft", 2, 5e-4, 2, condition.trim() / foot);
    }

    @Test
    void boxShipInSeaAndFreshWater() {
        // Closed form: T = Δ/(ρ·L·B), KM = T/2 + B²/(12·T), MCT = Δ·BML/(100·L) with BML = L²/(12·T).
        double draughtAtSea = 4;
        double displacement = 100 * 16 * draughtAtSea * 1.025;
        double draughtInFresh = draughtAtSea * 1.025;
        ShipBuilder ship = ShipBuilder.ship()
                .hydrostatics(Hydrostatics.evenKeel(
                        Hydrostatics.box(100, 16, draughtAtSea), Hydrostatics.box(100, 16, draughtInFresh)))
                .lightship(displacement - 100, 50, 0, 6)
                .weight("aft", 100, 10, 0, 6);
        Condition sea = ship.assess(RoundBuilder.upright().build()).condition();
        Condition fresh =
                ship.assess(RoundBuilder.upright().seaDensity(1.0).build()).condition();
        assertEquals(4.0, sea.draughtMean(), 1e-9);
        assertEquals(2 + 256 / 48.0, sea.kmt(), 1e-9);
        assertEquals(4.1, fresh.draughtMean(), 1e-9);
        assertEquals(2.05 + 256 / (12 * 4.1), fresh.kmt(), 1e-9);
        // Trim by 100 t·40 m over Δ·L²/(12·T)/(100·L): Δ is the same, T is not.
        double lever = 100 * 40.0;
        assertEquals(lever / (displacement * 100 / (12 * 4.0)), sea.trim(), 1e-9);
        assertEquals(lever / (displacement * 100 / (12 * 4.1)), fresh.trim(), 1e-9);
        assertEquals(fresh.draughtMean() + fresh.trim() / 2, fresh.draughtAft(), 1e-9);
        assertEquals(fresh.draughtMean() - fresh.trim() / 2, fresh.draughtForward(), 1e-9);
    }

    @Test
    void draughtsAreLaidOffThroughTheCentreOfFlotation() {
        HydrostaticTable table = Hydrostatics.evenKeel(
                new Entry(6, 6000, 50, 45, 8, 100, 20, 3), new Entry(8, 8000, 50, 45, 8, 100, 20, 4));
        Condition trimmed = ShipBuilder.ship()
                .hydrostatics(table)
                .lightship(7000, 50 - 1.2 * 100 * 100 / 7000, 0, 6)
                .assess(RoundBuilder.upright().build())
                .condition();
        assertEquals(1.2, trimmed.trim(), 1e-9);
        // 7 m at 45 m from aft: 7 + 1.2·45/100 aft, 7 − 1.2·55/100 forward.
        assertEquals(7.54, trimmed.draughtAft(), 1e-9);
        assertEquals(6.34, trimmed.draughtForward(), 1e-9);
        assertEquals(6.94, trimmed.draughtMean(), 1e-9);
    }

    @Test
    void tableWithTrimsIsReadAtTheTrim() {
        HydrostaticTable table = HydrostaticTable.of(
                Axis.of(0, 2),
                List.of(
                        Hydrostatics.rows(
                                new Entry(6, 6000, 50, 50, 8, 100, 20, 3), new Entry(8, 8000, 50, 50, 8, 100, 20, 4)),
                        Hydrostatics.rows(
                                new Entry(5.9, 6000, 49, 46, 8.4, 100, 20, 3),
                                new Entry(7.9, 8000, 49, 46, 8.4, 100, 20, 4))));
        Condition halfway = ShipBuilder.ship()
                .hydrostatics(table)
                .lightship(7000, 50 - 1.0 * 100 * 100 / 7000, 0, 6)
                .assess(RoundBuilder.round().build())
                .condition();
        assertEquals(1.0, halfway.trim(), 1e-9);
        assertEquals(8.2, halfway.kmt(), 1e-9);
        // 6.95 m at 48 m from aft.
        assertEquals(6.95 + 0.48, halfway.draughtAft(), 1e-9);
        assertEquals(6.95 - 0.52, halfway.draughtForward(), 1e-9);
    }
}
