// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

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

    /** How far beyond light ship and summer draught the cross curves reach, as a share. */
    private static final double BEYOND = 0.05;

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
        CrossCurves curves = new CrossCurveMaker(hull, vessel.seaDensity()).curves(displacements, HEELS);
        double[] km = new double[displacements.size()];
        for (int i = 0; i < km.length; i++) {
            km[i] = hydrostatics.atDisplacement(displacements.value(i)).kmt();
        }
        return new HullTables(
                hydrostatics(vessel, half, DRAUGHTS),
                curves,
                new RequiredGm(curves).curve("general criteria, 2008 IS Code part A 2.2", displacements, km));
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
                .table(draughts(hull, rows), Axis.of(0));
    }

    /** The whole hull. */
    public static Solid bothSides(SpaceShape half) {
        try {
            return Solid.of(half).mirroredBothSides();
        } catch (ShapeException e) {
            throw new IllegalArgumentException("the hull: " + e.getMessage(), e);
        }
    }

    private static Axis draughts(Solid hull, int rows) {
        double keel = hull.bounds().minZ();
        double depth = hull.bounds().maxZ();
        double step = RoundSteps.atLeast((depth - Math.max(0, keel)) / rows);
        int first = (int) Math.floor(Math.max(0, keel) / step) + 1;
        // At the deck there is no waterplane left: the last row stands below it.
        int last = (int) Math.ceil(depth / step - 1e-9) - 1;
        double[] draughts = new double[last - first + 1];
        for (int i = 0; i < draughts.length; i++) {
            draughts[i] = RoundSteps.multiple(first + i, step);
        }
        return Axis.of(draughts);
    }

    private static Axis displacements(Vessel vessel, Solid hull) {
        double least = vessel.lightship().mass() * (1 - BEYOND);
        double most = vessel.seaDensity()
                * hull.volumeBelow(Attitude.UPRIGHT, vessel.particulars().summerDraught())
                * (1 + BEYOND);
        double whole = vessel.seaDensity() * hull.volume();
        double step = RoundSteps.atLeast((most - least) / DISPLACEMENTS);
        int first = Math.max(1, (int) Math.floor(least / step));
        int last = Math.max(first + 1, (int) Math.min(Math.ceil(most / step), Math.floor(0.95 * whole / step)));
        double[] displacements = new double[last - first + 1];
        for (int i = 0; i < displacements.length; i++) {
            displacements[i] = RoundSteps.multiple(first + i, step);
        }
        return Axis.of(displacements);
    }
}
