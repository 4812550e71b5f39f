// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.Shapes;
import org.brassbob.core.geometry.Solid;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.CrossCurves;
import org.brassbob.core.table.HydrostaticTable.Entry;
import org.brassbob.core.vessel.MassPoint;
import org.brassbob.core.vessel.Particulars;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.data.VesselFolder;
import org.brassbob.fixture.ShipBuilder;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The range and the figures of a ship's tables, whatever her particulars say. */
class HullTablesTest {
    private static final double LENGTH = 60;

    /** A barge 12 m broad. */
    private static SpaceShape barge(double depth) {
        return Shapes.shape(
                Shapes.station(0, Shapes.rectangle(1, 0, 6, 0, depth)),
                Shapes.station(LENGTH, Shapes.rectangle(1, 0, 6, 0, depth)));
    }

    private static Vessel ship(double light, double summerDraught, double depth) {
        Vessel any = ShipBuilder.ship().lbp(LENGTH).build();
        return new Vessel(
                any.id(),
                any.name(),
                new Particulars(LENGTH, 12, depth, summerDraught),
                new MassPoint(light, LENGTH / 2, 0, 3),
                any.seaDensity(),
                any.draughtMarks(),
                any.policy(),
                any.sources(),
                null,
                any.limitCurves(),
                null,
                any.weights(),
                any.liquids(),
                any.tanks(),
                null,
                any.dataSha256());
    }

    /**
     * A right range; a deck on a whole step of draught; a light ship heavier than the summer displacement, then than the whole hull; summer
     * draught at or under the keel, over the deck; a depth given too small or too great, or nought.
     */
    @ParameterizedTest
    @CsvSource({
        "800, 3.5, 5, 5",
        "800, 3.5, 5.03, 5.03",
        "800, 3.5, 4.96, 5.1",
        "2900, 3.5, 5, 5",
        "90000, 3.5, 5, 5",
        "800, 0, 5, 5",
        "800, -1, 5, 5",
        "800, 9, 5, 5",
        "0, 3.5, 5, 5",
        "800, 3.5, 0, 5",
        "800, 3.5, 60, 5",
        "2583, 3.5, 5, 5"
    })
    void everyFigureIsANumber(double light, double summer, double depth, double hullDepth) {
        HullTables tables = HullTables.of(ship(light, summer, depth), barge(hullDepth));
        double previous = 0;
        for (Entry e : tables.hydrostatics().rows(0).entries()) {
            double volume = LENGTH * 12 * e.draught();
            assertEquals(1.025 * volume, e.displacement(), 1e-5);
            assertTrue(e.displacement() > previous);
            assertEquals(e.draught() / 2 + 144 / (12 * e.draught()), e.kmt(), 1e-7);
            assertEquals(LENGTH / 2, e.lcf(), 1e-9);
            assertEquals(LENGTH / 2, e.lcb(), 1e-9);
            assertEquals(1.025 * 720 / 100, e.tpc(), 1e-9);
            previous = e.displacement();
        }
        assertTrue(tables.hydrostatics().rows(0).draughts().last() < hullDepth);
        Axis displacements = tables.crossCurves().displacements();
        assertTrue(displacements.size() >= 2);
        assertTrue(displacements.last() < 1.025 * 720 * hullDepth);
        for (CrossCurves.Row row : tables.crossCurves().rows()) {
            row.kn().forEach(kn -> assertTrue(kn > 0 && kn < 20));
        }
        for (int i = 0; i < displacements.size(); i++) {
            assertTrue(tables.requiredGm().value(i) >= 0.15 - 1e-9);
        }
    }

    @Test
    void theCurvesReachFromLightShipToBeyondTheSummerDraught() {
        HullTables tables = HullTables.of(ship(800, 3.5, 5), barge(5));
        assertTrue(tables.crossCurves().displacements().first() <= 0.95 * 800);
        assertTrue(tables.crossCurves().displacements().last() >= 1.05 * 1.025 * 720 * 3.5);
    }

    /** A forecastle above the moulded depth: the table ends short of the depth. */
    @Test
    void aForecastleDoesNotLengthenTheTable() {
        SpaceShape hull = Shapes.shape(
                Shapes.station(0, Shapes.rectangle(1, 0, 6, 0, 5)),
                Shapes.station(50, Shapes.rectangle(1, 0, 6, 0, 5)),
                Shapes.station(50, Shapes.rectangle(1, 0, 6, 0, 8)),
                Shapes.station(LENGTH, Shapes.rectangle(1, 0, 6, 0, 8)));
        HullTables tables = HullTables.of(ship(800, 3.5, 5), hull);
        double last = tables.hydrostatics().rows(0).draughts().last();
        assertTrue(last < 5 && last > 4.6, () -> "last " + last);
    }

    /**
     * The required GM is what the hull's own levers ask for: at KG = KM − GM required, levers taken every tenth of a degree crest at 25° or
     * more. Saltmarsh Heron light and deep, where 2.2.3 governs.
     */
    @Test
    void theDemoHullCrestsAt25DegreesOrMore() {
        Vessel heron = VesselFolder.read(Path.of("vessel-data/heron")).orElseThrow();
        SpaceShape half = java.util.Objects.requireNonNull(heron.hull());
        HullTables tables = HullTables.of(heron, half);
        Solid hull = HullTables.bothSides(half);
        CrossCurveMaker maker = new CrossCurveMaker(hull, heron.seaDensity());
        HydrostaticMaker hydrostatics = new HydrostaticMaker(
                hull, heron.seaDensity(), heron.particulars().lbp());
        int last = tables.requiredGm().displacements().size() - 1;
        for (int row : new int[] {0, last}) {
            double displacement = tables.requiredGm().displacements().value(row);
            double kg = hydrostatics.atDisplacement(displacement).kmt()
                    - tables.requiredGm().value(row);
            double crest = 20;
            double greatest = 0;
            for (double heel = 20; heel < 30; heel += 0.1) {
                double lever = maker.kn(displacement, heel) - kg * Math.sin(Math.toRadians(heel));
                crest = lever > greatest ? heel : crest;
                greatest = Math.max(greatest, lever);
            }
            assertEquals(25, crest, 0.11, "at " + displacement + " t");
        }
    }

    @Test
    void figuresAtTheTopOfTheHullAreThoseJustUnderIt() {
        Solid hull = HullTables.bothSides(barge(5));
        HydrostaticMaker maker = new HydrostaticMaker(hull, 1, LENGTH);
        Entry top = maker.entry(5, 0);
        assertEquals(hull.volume(), top.displacement(), 1e-5);
        assertEquals(2.5 + 144 / 60.0, top.kmt(), 1e-8);
        assertEquals(7.2, top.tpc(), 1e-9);
        Entry trimmed = maker.entry(8, 0.6);
        assertTrue(Double.isFinite(trimmed.lcf()) && Double.isFinite(trimmed.kmt()));
    }

    @Test
    void underTheKeelThereIsNothing() {
        Entry nothing = new HydrostaticMaker(HullTables.bothSides(barge(5)), 1, LENGTH).entry(0, 0);
        assertEquals(0, nothing.displacement());
        assertTrue(Double.isNaN(nothing.kmt()));
    }

    /** Trim about the centre of flotation, for a hull whose centre moves as she trims: the draught there is the one asked for. */
    @Test
    void trimmedDraughtsAreThoseAtTheCentreOfFlotation() {
        Solid hull = Shapes.solid(
                        Shapes.station(0, Shapes.loop(1, 0, 1, 6, 3, 7, 6, 0, 6)),
                        Shapes.station(30, Shapes.loop(1, 0, 0, 7, 0, 7, 6, 0, 6)),
                        Shapes.station(LENGTH, Shapes.loop(1, 0, 0, 1, 0, 5, 6, 0, 6)))
                .mirroredBothSides();
        HydrostaticMaker maker = new HydrostaticMaker(hull, 1.025, LENGTH);
        double even = maker.entry(3.4, 0).lcf();
        for (double trim : new double[] {-1.5, 0.7, 2.5}) {
            Entry entry = maker.entry(3.4, trim);
            assertTrue(Math.abs(entry.lcf() - even) > 0.01, "the centre moves");
            Attitude attitude = Attitude.of(trim, LENGTH, 0);
            double volume = entry.displacement() / 1.025;
            double z0 = hull.heightFor(attitude, volume);
            assertEquals(3.4, attitude.heightAt(z0, entry.lcf(), 0), 1e-8);
            assertEquals(hull.below(attitude, z0).lcg(), entry.lcb(), 1e-8);
        }
    }

    /** V sections, closed form: ∇ = L·T²·k, KB = 2T/3, BM = 2·k²·T/3 for a half breadth of k·z. */
    @Test
    void wedge() {
        double k = 0.8;
        Solid hull =
                Shapes.prism(0, LENGTH, Shapes.loop(1, 0, 0, 6 * k, 6, 0, 6)).mirroredBothSides();
        Entry entry = new HydrostaticMaker(hull, 1, LENGTH).entry(4, 0);
        assertEquals(LENGTH * 16 * k, entry.displacement(), 1e-9);
        assertEquals(8.0 / 3, entry.kb(), 1e-10);
        assertEquals(8.0 / 3 * (1 + k * k), entry.kmt(), 1e-10);
    }
}
