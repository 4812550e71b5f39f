// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import java.util.stream.IntStream;
import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.ShapeException;
import org.brassbob.core.geometry.Solid;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.CrossCurves;
import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.table.LimitCurve;
import org.brassbob.core.vessel.Vessel;

/**
 * The tables of a hull: hydrostatics from light draughts to the depth, cross curves from light ship to a little over the summer
 * draught, and the GM that the general criteria require.
 *
 * @param hydrostatics on even keel
 * @param crossCurves free to trim
 * @param requiredGm by 2008 IS Code part A 2.2
 */
public record HullTables(HydrostaticTable hydrostatics, CrossCurves crossCurves, LimitCurve requiredGm) {
    private static final int DRAUGHTS = 32;
    private static final int DISPLACEMENTS = 28;
    private static final Axis HEELS = Axis.of(5, 10, 15, 20, 25, 30, 35, 40, 50, 60);

    /** The heels of the required GM: every degree to 40°, for the angle of the greatest lever is judged on them. */
    private static final Axis CLOSE_HEELS =
            Axis.of(IntStream.concat(IntStream.rangeClosed(1, 40), IntStream.of(45, 50, 55, 60))
                    .mapToDouble(heel -> heel)
                    .toArray());

    /** How far beyond light ship and summer draught the cross curves reach, as a share. */
    private static final double BEYOND = 0.05;

    /** As deep as she is tabulated, as a share of the whole hull's buoyancy. */
    private static final double MOST_AFLOAT = 0.95;

    /** The least displacement is at most this share of the greatest. */
    private static final double NARROWEST = 0.9;

    /**
     * The tables of a ship's hull.
     *
     * @param half her hull shape, the starboard half
     * @throws IllegalArgumentException if the shape is no solid, which a checked one is
     */
    public static HullTables of(Vessel vessel, SpaceShape half) {
        Solid hull = bothSides(half);
        HydrostaticMaker hydrostatics = new HydrostaticMaker(
                hull, vessel.seaDensity(), vessel.particulars().lbp());
        Axis displacements = displacements(vessel, hull);
        CrossCurveMaker crossCurves = new CrossCurveMaker(hull, vessel.seaDensity());
        double[] km = new double[displacements.size()];
        for (int i = 0; i < km.length; i++) {
            km[i] = hydrostatics.atDisplacement(displacements.value(i)).kmt();
        }
        return new HullTables(
                hydrostatics(vessel, half, DRAUGHTS),
                crossCurves.curves(displacements, HEELS),
                new RequiredGm(crossCurves.curves(displacements, CLOSE_HEELS))
                        .curve("general criteria, 2008 IS Code part A 2.2", displacements, km));
    }

    /**
     * The hydrostatic table alone.
     *
     * @param rows about how many draughts at the most
     */
    public static HydrostaticTable hydrostatics(Vessel vessel, SpaceShape half, int rows) {
        Solid hull = bothSides(half);
        return new HydrostaticMaker(
                        hull, vessel.seaDensity(), vessel.particulars().lbp())
                .table(draughts(hull, vessel.particulars().depth(), rows), Axis.of(0));
    }

    /** The whole hull. */
    public static Solid bothSides(SpaceShape half) {
        try {
            return Solid.of(half).mirroredBothSides();
        } catch (ShapeException e) {
            throw new IllegalArgumentException("the hull: " + e.getMessage(), e);
        }
    }

    /** Round draughts between the keel and the depth, or the top of the hull where that is lower. */
    private static Axis draughts(Solid hull, double mouldedDepth, int rows) {
        double keel = hull.bounds().minZ();
        double top = hull.bounds().maxZ();
        double depth = mouldedDepth > keel ? Math.min(mouldedDepth, top) : top;
        double step = RoundSteps.atLeast((depth - Math.max(0, keel)) / rows);
        int first = (int) Math.floor(Math.max(0, keel) / step) + 1;
        // At the deck the waterplane goes under: the last row stands below it.
        int last = (int) Math.ceil(depth / step - 1e-9) - 1;
        double[] draughts = new double[last - first + 1];
        for (int i = 0; i < draughts.length; i++) {
            draughts[i] = RoundSteps.multiple(first + i, step);
        }
        return Axis.of(draughts);
    }

    /** Round displacements about the range between light ship and summer draught, whichever is the heavier, as far as the hull floats. */
    private static Axis displacements(Vessel vessel, Solid hull) {
        double light = vessel.lightship().mass();
        double summer = vessel.seaDensity()
                * hull.volumeBelow(Attitude.UPRIGHT, vessel.particulars().summerDraught());
        double deepest = MOST_AFLOAT * vessel.seaDensity() * hull.volume();
        double most = Math.min(Math.max(light, summer) * (1 + BEYOND), deepest);
        double least = Math.min(Math.min(light, summer) * (1 - BEYOND), NARROWEST * most);
        double step = RoundSteps.atLeast((most - least) / DISPLACEMENTS);
        int first = Math.max(1, (int) Math.floor(least / step));
        int last = (int) Math.min(Math.ceil(most / step), Math.floor(deepest / step));
        double[] displacements = new double[last - first + 1];
        for (int i = 0; i < displacements.length; i++) {
            displacements[i] = RoundSteps.multiple(first + i, step);
        }
        return Axis.of(displacements);
    }
}
