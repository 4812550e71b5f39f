// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.contents;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.Immersed;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.table.SoundingTable;
import org.brassbob.core.table.SoundingTable.Argument;
import org.brassbob.core.table.VolumeTable;
import org.brassbob.core.vessel.Pipe;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Use;
import org.jspecify.annotations.Nullable;

/**
 * One tank ready for calculation. The calibration decides where there is one; the shape serves what the tables can't: heels and trims
 * outside them, and everything where there are none.
 */
public final class TankModel {
    /** Below this share of capacity the centroid of the limit is given, since nothing has none. */
    private static final double NEXT_TO_NOTHING = 1e-6;

    /** What two subtractions may do to a reading (m). */
    private static final double ROUNDING = 1e-9;

    /** Trims (m) for which the greatest surface of a shape is worked out. */
    private static final double TRIM_BETWEEN_KNOTS = 0.05;

    private final Tank tank;
    private final @Nullable NetShape shape;
    private final double lbp;
    private final double greatestInTable;

    /** By the number of the knot; the search takes far longer than all else of a tank, and rounds come at ever new trims. */
    private final Map<Long, Double> greatestAtKnot = new ConcurrentHashMap<>();

    /**
     * A tank with its net shape.
     *
     * @param shape where it has one
     * @param lbp the ship's length between perpendiculars (m)
     * @throws IllegalArgumentException if it has neither a volume table nor a shape
     */
    public TankModel(Tank tank, @Nullable NetShape shape, double lbp) {
        if (tank.volumes() == null && shape == null) {
            throw new IllegalArgumentException("tank " + tank.id() + " has neither a volume table nor a shape");
        }
        this.tank = tank;
        this.shape = shape;
        this.lbp = lbp;
        VolumeTable table = tank.volumes();
        this.greatestInTable =
                table == null ? Double.NaN : SurfaceRange.greatest(table, tank.residue(), codeLimit(tank));
    }

    public Tank tank() {
        return tank;
    }

    /** The most that counts as slack in service: the lesser of fill limit and 98 % (m3). */
    private static double codeLimit(Tank tank) {
        return Math.min(tank.fillLimit(), TankState.FULL_SHARE * tank.capacity());
    }

    /** How a volume (m3) counts. */
    public TankState stateOf(double volume) {
        if (volume <= tank.residue()) {
            return TankState.EMPTY;
        }
        // A tank read as 98 % must count as full whatever the last binary digit of its capacity.
        double full = TankState.FULL_SHARE * tank.capacity() * (1 - 1e-12);
        return volume >= full ? TankState.FULL : TankState.SLACK;
    }

    /** Whether soundings can be turned into volumes. */
    public boolean canBeSounded() {
        SoundingTable table = tank.soundings();
        return hasSoundableShape() || (table != null && (table.argument() == Argument.SOUNDING || tank.pipe() != null));
    }

    /** Whether ullages can be turned into volumes. */
    public boolean canBeUllaged() {
        SoundingTable table = tank.soundings();
        return hasSoundableShape() || (table != null && (table.argument() == Argument.ULLAGE || tank.pipe() != null));
    }

    /** The sounding (m) that belongs to an ullage, or the ullage that belongs to a sounding. */
    public double complement(double reading) {
        return height() - reading;
    }

    /**
     * What a sounding and an ullage add up to (m): the reference height of the pipe. A tank with an ullage table and no pipe is
     * only ever ullaged; there the table's last ullage stands for the bottom.
     */
    private double height() {
        Pipe pipe = tank.pipe();
        SoundingTable table = tank.soundings();
        if (pipe != null) {
            return pipe.length();
        }
        return table != null && table.argument() == Argument.ULLAGE
                ? table.readings().last()
                : Double.POSITIVE_INFINITY;
    }

    /** The depth of the pipe that a sounding can reach in the tables or the tank (m): from there on it reads brim-full. */
    public double brim() {
        SoundingTable table = tank.soundings();
        if (shape == null && table != null) {
            double last = table.argument() == Argument.SOUNDING
                    ? table.readings().last()
                    : complement(table.readings().first());
            return Math.min(height(), last);
        }
        return height();
    }

    /** Whether the table reaches this sounding (m) at this trim (m) and list (°). */
    public boolean tableCovers(double sounding, double trim, double listDeg) {
        SoundingTable table = tank.soundings();
        return table != null && table.covers(trim, listDeg) && table.readings().covers(argument(table, sounding));
    }

    /** Whether it can be sounded by its shape. */
    public boolean hasSoundableShape() {
        return shape != null && tank.pipe() != null;
    }

    /** Whether soundings and ullages are looked up in a table first. */
    public boolean hasSoundingTable() {
        return tank.soundings() != null;
    }

    /**
     * The volume (m3) for a sounding (m) at a trim (m) and list (°): from the table where it reaches, else from the shape, else from
     * the table's nearest edge.
     *
     * @throws IllegalStateException if the tank {@linkplain #canBeSounded can't be sounded}
     */
    public double volumeAtSounding(double sounding, double trim, double listDeg) {
        SoundingTable table = tank.soundings();
        if (table != null && (tableCovers(sounding, trim, listDeg) || !hasSoundableShape())) {
            return withinCapacity(table.volume(argument(table, sounding), trim, listDeg));
        }
        Pipe pipe = tank.pipe();
        if (shape == null || pipe == null) {
            throw new IllegalStateException("tank " + tank.id() + " can't be sounded");
        }
        Attitude attitude = Attitude.of(trim, lbp, listDeg);
        double z0 = attitude.heightThrough(pipe.x(), pipe.y(), pipe.footZ() + sounding);
        return withinCapacity(shape.volumeBelow(attitude, z0));
    }

    private double withinCapacity(double volume) {
        return Math.min(volume, tank.capacity());
    }

    /** What a table is entered with for a sounding (m). An ullage worked back from a sounding must not miss the table's end by rounding. */
    double argument(SoundingTable table, double sounding) {
        if (table.argument() == Argument.SOUNDING) {
            return sounding;
        }
        double ullage = complement(sounding);
        double first = table.readings().first();
        return Math.abs(ullage - first) < ROUNDING ? first : ullage;
    }

    /**
     * Centroid and transverse second moment of the surface for a volume (m3): from the volume table, upright, where there is one; else
     * from the shape at a trim (m) without list, since the list enters through GM.
     */
    public VolumeTable.Entry contents(double volume, double trim) {
        VolumeTable table = tank.volumes();
        if (table != null) {
            return table.at(volume);
        }
        NetShape solid = requiredShape();
        double least = NEXT_TO_NOTHING * solid.capacity();
        Immersed held = solid.holding(Attitude.of(trim, lbp, 0), Math.max(volume, least));
        return new VolumeTable.Entry(
                held.lcg(), held.tcg(), held.vcg(), held.surface().transverse());
    }

    /**
     * The greatest second moment (m4) of the surface between residue and the lesser of fill limit and 98 % (2008 IS Code part B 3.1.3),
     * at a trim (m) where the shape serves. From a shape it is worked out every 5 cm of trim and read linearly between, as a table
     * would be.
     */
    public double greatestSecondMoment(double trim) {
        if (tank.volumes() != null) {
            return greatestInTable;
        }
        double knots = trim / TRIM_BETWEEN_KNOTS;
        long knot = Math.round(knots);
        if (Math.abs(knots - knot) < ROUNDING) {
            return greatestAtKnot(knot);
        }
        long below = (long) Math.floor(knots);
        double near = greatestAtKnot(below);
        return near + (greatestAtKnot(below + 1) - near) * (knots - below);
    }

    private double greatestAtKnot(long knot) {
        return greatestAtKnot.computeIfAbsent(knot, k -> {
            Attitude attitude = Attitude.of(k * TRIM_BETWEEN_KNOTS, lbp, 0);
            return SurfaceRange.greatest(requiredShape(), attitude, tank.residue(), codeLimit(tank));
        });
    }

    /**
     * The second moment (m4) that counts by the code for a slack tank: a fixed tank's own at its level; a consumable tank's greatest,
     * and never less than its own.
     *
     * @param own second moment at the level (m4)
     * @param trim m
     */
    public double secondMomentByCode(double own, double trim) {
        return tank.use() == Use.FIXED ? own : Math.max(own, greatestSecondMoment(trim));
    }

    private NetShape requiredShape() {
        if (shape == null) {
            throw new IllegalStateException("tank " + tank.id() + " has no shape");
        }
        return shape;
    }
}
