// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.geometry.Shapes;
import org.brassbob.core.geometry.Solid;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.geometry.SpaceShape.Loop;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.brassbob.core.geometry.SpaceShape.Station;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.table.HydrostaticTable.Entry;
import org.brassbob.core.table.Origin;
import org.junit.jupiter.api.Test;

class HydrostaticMakerTest {
    private static final double DENSITY = 1.025;

    /** Box barge, closed form: KB = T/2, BM = B²/(12·T), MCT = ρ·B·L³/(12·100·L). Common textbook formulas. */
    @Test
    void boxBarge() {
        double length = 60;
        double breadth = 12;
        Solid barge = Shapes.box(0, length, 0, breadth / 2, 0, 5).mirroredBothSides();
        Entry entry = new HydrostaticMaker(barge, DENSITY, length).entry(3, 0);
        assertEquals(DENSITY * length * breadth * 3, entry.displacement(), 1e-9);
        assertEquals(30, entry.lcb(), 1e-10);
        assertEquals(30, entry.lcf(), 1e-10);
        assertEquals(1.5, entry.kb(), 1e-10);
        assertEquals(1.5 + breadth * breadth / (12 * 3), entry.kmt(), 1e-10);
        assertEquals(DENSITY * breadth * Math.pow(length, 3) / 12 / (100 * length), entry.mct(), 1e-9);
        assertEquals(DENSITY * length * breadth / 100, entry.tpc(), 1e-10);
    }

    /** A box trimmed about its centre of flotation keeps its displacement; its buoyancy moves aft by I long·tan ψ / ∇. */
    @Test
    void trimmedBoxBarge() {
        Solid barge = Shapes.box(0, 60, 0, 6, 0, 5).mirroredBothSides();
        Entry entry = new HydrostaticMaker(barge, DENSITY, 60).entry(3, 1.2);
        double slope = 1.2 / 60;
        assertEquals(DENSITY * 60 * 12 * 3, entry.displacement(), 1e-8);
        assertEquals(30, entry.lcf(), 1e-9);
        assertEquals(30 - slope * 60 * 60 / (12 * 3), entry.lcb(), 1e-9);
    }

    /**
     * Wigley hull, closed form: ∇ = 4/9·L·B·T, Awp = 2/3·L·B, KB = 5/8·T, BM = 3·B²/(35·T), BM long = 3·L²/(40·T); derived by computer
     * algebra from y = (B/2)(1 − (2x/L)²)(1 − (z/T)²). The faceted hull converges with the square of the spacing, so two spacings
     * give the limit (Richardson).
     */
    @Test
    void wigleyHullInTheLimit() {
        double length = 100;
        double breadth = 10;
        double draught = 6.25;
        Entry coarse = wigley(40, 24, length, breadth, draught);
        Entry fine = wigley(80, 48, length, breadth, draught);
        double volume = 4.0 / 9 * length * breadth * draught;
        assertLimit(volume * DENSITY, coarse.displacement(), fine.displacement());
        assertLimit(5.0 / 8 * draught, coarse.kb(), fine.kb());
        assertLimit(5.0 / 8 * draught + 3 * breadth * breadth / (35 * draught), coarse.kmt(), fine.kmt());
        assertLimit(2.0 / 3 * length * breadth * DENSITY / 100, coarse.tpc(), fine.tpc());
        double inertia = breadth * Math.pow(length, 3) / 30;
        assertLimit(DENSITY * inertia / (100 * length), coarse.mct(), fine.mct());
    }

    private static void assertLimit(double exact, double coarse, double fine) {
        double limit = fine + (fine - coarse) / 3;
        assertEquals(exact, limit, 2e-6 * exact);
        assertEquals(4, (coarse - exact) / (fine - exact), 0.1, "second order");
    }

    private static Entry wigley(int stations, int levels, double length, double breadth, double draught) {
        List<Station> list = new ArrayList<>();
        for (int i = 0; i <= stations; i++) {
            double xi = 2.0 * i / stations - 1;
            List<Point> points = new ArrayList<>();
            points.add(new Point(0, 0));
            for (int k = 1; k <= levels; k++) {
                double zeta = 1 - (double) k / levels;
                points.add(new Point(breadth / 2 * (1 - xi * xi) * (1 - zeta * zeta), draught * k / levels));
            }
            points.add(new Point(0, draught));
            list.add(new Station(length * i / stations, List.of(new Loop(1, points))));
        }
        Solid hull =
                Shapes.solid(new SpaceShape(list, Origin.computed("wigley"))).mirroredBothSides();
        return new HydrostaticMaker(hull, DENSITY, length).entry(draught * (1 - 1e-9), 0);
    }

    @Test
    void aTableHasASetForEachTrimAndRisingRows() {
        Solid barge = Shapes.box(0, 60, 0, 6, 0, 5).mirroredBothSides();
        HydrostaticMaker maker = new HydrostaticMaker(barge, DENSITY, 60);
        HydrostaticTable table = maker.table(Axis.of(1, 2, 3, 4), Axis.of(-0.5, 0, 0.5));
        assertEquals(3, table.trims().size());
        assertEquals(4, table.rows(1).entries().size());
        assertEquals(maker.entry(2, 0.5), table.rows(2).entries().get(1));
        Entry at = maker.atDisplacement(table.rows(1).entries().get(2).displacement());
        assertEquals(3, at.draught(), 1e-9);
    }

    @Test
    void tablesOfTheDemoHullUseRoundSteps() {
        var heron = org.brassbob.data.VesselFolder.read(java.nio.file.Path.of("vessel-data/heron"))
                .orElseThrow();
        SpaceShape hull = java.util.Objects.requireNonNull(heron.hull());
        HullTables tables = HullTables.of(heron, hull);
        HydrostaticTable.Rows rows = tables.hydrostatics().rows(0);
        assertEquals(0.5, rows.draughts().value(1) - rows.draughts().value(0), 1e-12);
        assertTrue(rows.draughts().last() <= 8.2);
        assertTrue(
                tables.crossCurves().displacements().first() < heron.lightship().mass());
        assertEquals(
                tables.crossCurves().displacements().size(),
                tables.requiredGm().displacements().size());
    }

    @Test
    void aHullThatIsNoSolidIsRefused() {
        SpaceShape sheet = Shapes.shape(Shapes.station(0, Shapes.rectangle(1, 0, 1, 0, 1)));
        assertThrows(IllegalArgumentException.class, () -> HullTables.bothSides(sheet));
    }
}
