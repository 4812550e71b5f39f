// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.SoundingTable;
import org.brassbob.core.table.SoundingTable.Argument;
import org.brassbob.core.vessel.Gauge;
import org.brassbob.core.vessel.Pipe;
import org.brassbob.core.vessel.Tank;
import org.brassbob.fixture.Shapes;
import org.brassbob.fixture.TankBuilder;
import org.junit.jupiter.api.Test;

/** Sounding and ullage tables of plain shapes: where their rows stand, and how near linear reading comes between them. */
class CalibrationShapesTest {
    private static final double LBP = TankBuilder.LBP;
    private static final SpaceShape BOX = Shapes.box(10, 22, 1, 7, 0.5, 4.5);

    private static SoundingTable table(SpaceShape shape, Pipe pipe, Gauge gauge, CalibrationGrid grid) {
        Tank tank = TankBuilder.shaped("t", shape)
                .pipe(pipe.x(), pipe.y(), pipe.footZ(), pipe.length())
                .build();
        Tank gauged = gauge == Gauge.SOUNDING ? tank : by(gauge, tank);
        return new CalibrationMaker(LBP, grid)
                .soundings(gauged, Shapes.net(shape))
                .orElseThrow();
    }

    private static Tank by(Gauge gauge, Tank t) {
        return new Tank(
                t.id(),
                t.name(),
                t.liquid(),
                t.mayHold(),
                t.walk(),
                gauge,
                t.pipe(),
                t.capacity(),
                t.fillLimitPct(),
                t.residue(),
                t.use(),
                t.pair(),
                t.encloses(),
                t.steelPct(),
                t.rateM3PerHour(),
                t.space(),
                t.soundings(),
                t.volumes(),
                t.shape(),
                t.origin());
    }

    private static CalibrationGrid grid(int readings, Axis trims, Axis heels) {
        return new CalibrationGrid(trims, heels, readings);
    }

    private static boolean has(Axis axis, double value) {
        return axis.value(axis.cell(value)) == value || axis.last() == value;
    }

    /** Rows from 0 in even steps, one at the top of the tank, and on to where the steepest trim and heel are full. */
    @Test
    void rowsReachFromDryOverTheTopToFull() {
        Pipe pipe = new Pipe(11, 2, 0.5, 9);
        SoundingTable table = table(BOX, pipe, Gauge.SOUNDING, CalibrationGrid.USUAL);
        Axis readings = table.readings();
        assertEquals(0, readings.first());
        assertTrue(has(readings, 4), "the top of the tank at the pipe");
        // By the head, by 0.5 m over 100 m, the forward end (11 m away) is the lower; heeled 2° to port the port side
        // (1 m away).
        // By the stern, by 2 m, the forward end is the last to fill: 11·0.02; and 5 m to starboard heeled 2° the other
        // way.
        double full = 4 + 11 * 2 / LBP + Math.max(5 * Math.tan(Math.toRadians(2)), Math.tan(Math.toRadians(2)));
        assertEquals(full, readings.last(), 1.0001e-4);
        assertTrue(readings.last() >= full - 1e-9);
        assertTrue(readings.size() <= 42, "rows " + readings.size());
    }

    /** A short pipe ends the table at its rim. */
    @Test
    void rowsEndAtTheRim() {
        Axis readings = table(BOX, new Pipe(11, 2, 0.5, 4.1), Gauge.SOUNDING, CalibrationGrid.USUAL)
                .readings();
        assertEquals(4.1, readings.last());
        assertTrue(has(readings, 4));
        Axis inside = table(BOX, new Pipe(11, 2, 0.5, 3.2), Gauge.SOUNDING, CalibrationGrid.USUAL)
                .readings();
        assertEquals(3.2, inside.last());
    }

    /** A pipe that begins above the tank reads nothing but dry: one row, of a tank that is full. */
    @Test
    void aPipeAboveTheTankHasOneRow() {
        SoundingTable table = table(BOX, new Pipe(11, 2, 6, 2), Gauge.SOUNDING, CalibrationGrid.USUAL);
        assertEquals(1, table.readings().size());
        assertEquals(288, table.volume(0, 0, 0), 1e-9);
    }

    /** An ullage is measured from the rim: the reading l − s has the volume that the sounding s has. */
    @Test
    void ullages() {
        Pipe pipe = new Pipe(11, 2, 0.5, 4.75);
        SoundingTable soundings = table(BOX, pipe, Gauge.SOUNDING, CalibrationGrid.USUAL);
        SoundingTable ullages = table(BOX, pipe, Gauge.ULLAGE, CalibrationGrid.USUAL);
        assertEquals(Argument.SOUNDING, soundings.argument());
        assertEquals(Argument.ULLAGE, ullages.argument());
        assertEquals(soundings.readings().size(), ullages.readings().size());
        for (int i = 0; i < soundings.readings().size(); i++) {
            double sounding = soundings.readings().value(i);
            assertTrue(has(ullages.readings(), Math.rint((4.75 - sounding) * 1e4) / 1e4), "at " + sounding);
            assertEquals(soundings.volume(sounding, 1.5, -1), ullages.volume(4.75 - sounding, 1.5, -1), 1e-9);
        }
        // A reference height between the tenths of a millimetre of the file: the readings are round, the volumes
        // theirs.
        SoundingTable odd = table(BOX, new Pipe(11, 2, 0.5, 4.75004), Gauge.ULLAGE, CalibrationGrid.USUAL);
        assertEquals(72 * (4.75004 - 2.75), odd.volume(2.75, 0, 0), 1e-9);
    }

    /** A tank read remotely that has a pipe gets soundings; see {@link CalibrationMakerTest} for one that has none. */
    @Test
    void aRemoteTankWithAPipeGetsSoundings() {
        SoundingTable table = table(BOX, new Pipe(11, 2, 0.5, 4), Gauge.REMOTE, CalibrationGrid.USUAL);
        assertEquals(Argument.SOUNDING, table.argument());
    }

    /**
     * In a box the volume is linear in sounding, trim and heel slope as long as the surface meets its four sides only. Heels are 1°
     * apart, and tan φ is linear between them to 3·10⁻⁶: over 2 m from the pipe to the centroid and 72 m² that is 0.4 litres, and all there is to lose.
     */
    @Test
    void linearReadingIsExactInsideABox() {
        Pipe pipe = new Pipe(11, 2, 0.5, 9);
        SoundingTable table = table(BOX, pipe, Gauge.SOUNDING, CalibrationGrid.USUAL);
        NetShape shape = Shapes.net(BOX);
        Random random = new Random(1);
        for (int i = 0; i < 500; i++) {
            double trim = -0.5 + 2.5 * random.nextDouble();
            double heel = -2 + 4 * random.nextDouble();
            double sounding = 0.75 + 2.5 * random.nextDouble();
            assertEquals(exact(shape, pipe, sounding, trim, heel), table.volume(sounding, trim, heel), 4e-4);
        }
    }

    private static double exact(NetShape shape, Pipe pipe, double sounding, double trim, double heel) {
        Attitude attitude = Attitude.of(trim, LBP, heel);
        return shape.volumeBelow(attitude, attitude.heightThrough(pipe.x(), pipe.y(), pipe.footZ() + sounding));
    }

    private static double worst(SpaceShape space, Pipe pipe, CalibrationGrid grid) {
        NetShape shape = Shapes.net(space);
        SoundingTable table = table(space, pipe, Gauge.SOUNDING, grid);
        double worst = 0;
        for (int t = 0; t < 2 * grid.trims().size() - 1; t++) {
            double trim = middle(grid.trims(), t);
            for (int h = 0; h < 2 * grid.heels().size() - 1; h++) {
                double heel = middle(grid.heels(), h);
                for (int r = 0; r < 2 * table.readings().size() - 1; r++) {
                    double sounding = middle(table.readings(), r);
                    double error = table.volume(sounding, trim, heel) - exact(shape, pipe, sounding, trim, heel);
                    worst = Math.max(worst, Math.abs(error) / shape.capacity());
                }
            }
        }
        return worst;
    }

    /** The nodes of an axis and the points halfway between them. */
    private static double middle(Axis axis, int half) {
        int i = half / 2;
        return half % 2 == 0 ? axis.value(i) : (axis.value(i) + axis.value(i + 1)) / 2;
    }

    /**
     * The worst error of linear reading in the middle between rows, trims and heels, as a share of capacity: measured, and held here. A box
     * has none on even keel; with trims 0.5 m apart and heels 1° apart it comes where the surface passes the bottom or the top. A wedge
     * and a warped wing tank; for that, half the steps leave about a quarter of the error.
     */
    @Test
    void theWorstErrorIsKnown() {
        Axis even = Axis.of(0);
        CalibrationGrid evenKeel = grid(40, even, even);
        Pipe mid = new Pipe(16, 4, 0.5, 9);
        assertEquals(0, worst(BOX, mid, evenKeel), 1e-12);
        assertEquals(0.00354, worst(BOX, mid, grid(40, CalibrationGrid.USUAL.trims(), even)), 1e-5);
        assertEquals(0.00374, worst(BOX, mid, CalibrationGrid.USUAL), 1e-5);
        SpaceShape wedge = Shapes.prism(10, 22, 1, 0.5, 7, 4.5, 1, 4.5);
        Pipe deep = new Pipe(16, 1.1, 0.57, 9);
        assertEquals(0.000156, worst(wedge, deep, evenKeel), 1e-6);
        assertEquals(0.00919, worst(wedge, deep, CalibrationGrid.USUAL), 1e-5);
        SpaceShape wing = Shapes.ruledWing(20, 12, 8, 1);
        Pipe inboard = new Pipe(21, 2.2, 1.3, 6);
        assertEquals(0.00152, worst(wing, inboard, evenKeel), 1e-5);
        assertEquals(0.00707, worst(wing, inboard, CalibrationGrid.USUAL), 1e-5);
        assertEquals(0.00195, worst(wing, inboard, grid(80, steps(-0.5, 0.25, 2), steps(-2, 0.5, 2))), 1e-5);
    }

    private static Axis steps(double first, double step, double last) {
        double[] values = new double[(int) Math.round((last - first) / step) + 1];
        for (int i = 0; i < values.length; i++) {
            values[i] = first + i * step;
        }
        return Axis.of(values);
    }
}
