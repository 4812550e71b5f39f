// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.brassbob.core.notice.Notice;
import org.brassbob.core.notice.NoticeCode;
import org.brassbob.core.round.SoundingRound;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.table.HydrostaticTable.Entry;
import org.brassbob.core.table.LimitCurve;
import org.brassbob.core.table.LimitCurve.Kind;
import org.brassbob.fixture.Hydrostatics;
import org.brassbob.fixture.Liquids;
import org.brassbob.fixture.RoundBuilder;
import org.brassbob.fixture.ShipBuilder;
import org.brassbob.fixture.Tables;
import org.brassbob.fixture.TankBuilder;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The verdict (product.md rule 7) and what is told of limits of the ship. */
class MarginTest {
    private static final SoundingRound NO_TANKS = RoundBuilder.upright().build();

    private static List<NoticeCode> codes(Assessment assessment) {
        return assessment.notices().stream().map(Notice::code).toList();
    }

    /** KM 8, KG 6: GM 2.0 m, with a band of 0.10 m. */
    @ParameterizedTest
    @CsvSource({"1.8, CLEAR", "1.9, CLEAR", "1.9001, CAUTION", "2.0, CAUTION", "2.0001, BELOW"})
    void statesMeetAtTheBandAndAtTheLimit(double required, Margin.State state) {
        Assessment assessment =
                ShipBuilder.ship().gmRequired(required).allowance(0.0999999999).assess(NO_TANKS);
        assertEquals(state, assessment.margin().state());
        assertEquals(2 - required, assessment.margin().margin(), 1e-12);
        assertEquals(required, assessment.margin().gmRequired(), 1e-12);
        assertEquals(state == Margin.State.BELOW, codes(assessment).contains(NoticeCode.BELOW_LIMIT));
    }

    @Test
    void permissibleKgJudgesTheFluidKg() {
        // The same limit told both ways; the correction raises the fluid KG as it lowers GM.
        TankBuilder tank =
                TankBuilder.tabled("t", Tables.constant(100, 50, 0, 6, 1000)).liquid(Liquids.FRESH_WATER);
        ShipBuilder ship = ShipBuilder.ship()
                .tanks(tank)
                .curve("gm", Kind.GM_REQUIRED, 0.5, 1000, 9000)
                .curve("kg", Kind.KG_LIMIT, 7.5, 1000, 9000);
        RoundBuilder round = RoundBuilder.upright().volume("t", 50);
        Assessment byGm = ship.assess(round.build());
        Assessment byKg = ship.assess(round.curve("kg").build());
        assertEquals("gm", byGm.margin().curve());
        assertEquals("kg", byKg.margin().curve());
        assertEquals(byGm.margin().margin(), byKg.margin().margin(), 1e-12);
        assertEquals(7.5 - byKg.condition().kgFluid(), byKg.margin().margin(), 1e-12);
        assertEquals(6 + 1000 / 5050.0, byKg.condition().kgFluid(), 1e-12);
    }

    @Test
    void curveIsReadLinearly() {
        LimitCurve curve = LimitCurve.of(
                "c", Kind.GM_REQUIRED, Axis.of(4000, 6000), new double[] {0.2, 0.6}, Tables.lines("c.csv", 2));
        assertEquals(
                0.4, ShipBuilder.ship().curve(curve).assess(NO_TANKS).margin().gmRequired(), 1e-12);
    }

    @ParameterizedTest
    @CsvSource({"3999", "6001"})
    void outsideTheLimitCurveIsBelow(double displacement) {
        Assessment assessment = ShipBuilder.ship()
                .lightship(displacement, 6)
                .curve("c", Kind.GM_REQUIRED, 0.1, 4000, 6000)
                .assess(NO_TANKS);
        assertEquals(Margin.State.BELOW, assessment.margin().state());
        assertEquals(List.of(NoticeCode.OUTSIDE_LIMIT_CURVE), codes(assessment));
        assertEquals("c", assessment.notices().get(0).about());
    }

    @Test
    void withoutACurveNothingIsClear() {
        Assessment assessment = ShipBuilder.ship().withoutCurve().assess(NO_TANKS);
        assertEquals(Margin.State.CAUTION, assessment.margin().state());
        assertEquals(List.of(NoticeCode.NO_LIMIT_CURVE), codes(assessment));
        assertEquals(Double.NaN, assessment.margin().margin());
        assertEquals("", assessment.margin().curve());
    }

    @Test
    void curveThatTheShipDoesNotHaveIsRefused() {
        ShipBuilder ship = ShipBuilder.ship().gmRequired(0.2);
        SoundingRound round = RoundBuilder.upright().curve("timber").build();
        Exception e = assertThrows(IllegalArgumentException.class, () -> ship.assess(round));
        assertEquals("no limit curve 'timber'; expected one of [intact]", e.getMessage());
    }

    @Test
    void outsideTheHydrostaticsIsToldAndNeverClear() {
        HydrostaticTable table = Hydrostatics.evenKeel(
                new Entry(2, 2000, 50, 50, 8, 100, 20, 1), new Entry(4, 4000, 50, 50, 9, 100, 20, 2));
        Assessment above = ShipBuilder.ship().hydrostatics(table).assess(NO_TANKS);
        assertEquals(List.of(NoticeCode.OUTSIDE_HYDROSTATICS_EDGE), codes(above));
        assertEquals(9, above.condition().kmt(), 0);
        assertEquals(Margin.State.CAUTION, above.margin().state());
        // 4 050 t in sea water of 1.025 are outside, in 1.04 they are 3 991 t of the table's.
        ShipBuilder ship = ShipBuilder.ship().hydrostatics(table).lightship(4050, 6);
        assertEquals(List.of(NoticeCode.OUTSIDE_HYDROSTATICS_EDGE), codes(ship.assess(NO_TANKS)));
        assertEquals(
                List.of(),
                codes(ship.assess(RoundBuilder.upright().seaDensity(1.04).build())));
        Exception e = assertThrows(
                IllegalArgumentException.class,
                () -> ShipBuilder.ship().hydrostatics(null).assessor());
        assertEquals("vessel test has neither hydrostatic table nor hull shape", e.getMessage());
    }

    @Test
    void trimBeyondTheHydrostaticsIsTold() {
        Entry[] rows = {new Entry(2, 2000, 50, 50, 8, 100, 20, 1), new Entry(9, 9000, 50, 50, 8, 100, 20, 2)};
        HydrostaticTable table =
                HydrostaticTable.of(Axis.of(-1, 1), List.of(Hydrostatics.rows(rows), Hydrostatics.rows(rows)));
        ShipBuilder ship = ShipBuilder.ship().hydrostatics(table);
        assertEquals(List.of(), codes(ship.assess(NO_TANKS)));
        ship.lightship(5000, 45, 0, 6);
        assertEquals(List.of(NoticeCode.TRIM_OUTSIDE_HYDROSTATICS), codes(ship.assess(NO_TANKS)));
    }

    @Test
    void limitsOfTheShipInService() {
        // 5 000 t: list 2.9°, trim 0.5 m, draught 2.5 m in the table of the fixture.
        ShipBuilder ship = ShipBuilder.ship().lightship(5000, 48, 0.1, 6);
        assertEquals(List.of(), codes(ship.limits(3, -1, 1, 3).assess(NO_TANKS)));
        assertEquals(
                List.of(NoticeCode.LIST_BEYOND_LIMIT),
                codes(ship.limits(2, -1, 1, 3).assess(NO_TANKS)));
        assertEquals(
                List.of(NoticeCode.TRIM_BEYOND_LIMIT),
                codes(ship.limits(3, -1, 0.4, 3).assess(NO_TANKS)));
        assertEquals(
                List.of(NoticeCode.TRIM_BEYOND_LIMIT),
                codes(ship.limits(3, 0.6, 1, 3).assess(NO_TANKS)));
        assertEquals(
                List.of(NoticeCode.DRAUGHT_BEYOND_SUMMER),
                codes(ship.limits(3, -1, 1, 2.4).assess(NO_TANKS)));
        ship.lightship(5000, 48, -0.1, 6);
        assertTrue(codes(ship.limits(2, -1, 1, 3).assess(NO_TANKS)).contains(NoticeCode.LIST_BEYOND_LIMIT));
        assertEquals(
                Margin.State.CLEAR,
                ship.gmRequired(0.15).assess(NO_TANKS).margin().state());
    }
}
