// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import java.util.Arrays;
import java.util.Optional;
import java.util.TreeSet;
import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.Origin;
import org.brassbob.core.table.SoundingTable;
import org.brassbob.core.table.SoundingTable.Argument;
import org.brassbob.core.vessel.Gauge;
import org.brassbob.core.vessel.Pipe;
import org.brassbob.core.vessel.Tank;

/** Makes a tank's sounding (or ullage) table from its shape. */
public final class CalibrationMaker {
    private final double lbp;
    private final CalibrationGrid grid;

    /**
     * For a ship.
     *
     * @param lbp length between perpendiculars (m)
     */
    public CalibrationMaker(double lbp, CalibrationGrid grid) {
        this.lbp = lbp;
        this.grid = grid;
    }

    /** The table, by ullage for a tank whose gauge is ullage, else by sounding; none without a pipe. */
    public Optional<SoundingTable> soundings(Tank tank, NetShape shape) {
        Pipe pipe = tank.pipe();
        return pipe == null ? Optional.empty() : Optional.of(table(tank, pipe, shape));
    }

    private SoundingTable table(Tank tank, Pipe pipe, NetShape shape) {
        Argument argument = tank.gauge() == Gauge.ULLAGE ? Argument.ULLAGE : Argument.SOUNDING;
        double[] soundings = soundings(pipe, shape);
        double[] readings = argument == Argument.SOUNDING
                ? soundings
                : Arrays.stream(soundings)
                        .map(pipe::complement)
                        .map(CalibrationMaker::toTenth)
                        .sorted()
                        .toArray();
        Axis axis = Axis.of(readings);
        double[] volumes =
                new double[axis.size() * grid.trims().size() * grid.heels().size()];
        int node = 0;
        for (int t = 0; t < grid.trims().size(); t++) {
            for (int h = 0; h < grid.heels().size(); h++) {
                Attitude attitude =
                        Attitude.of(grid.trims().value(t), lbp, grid.heels().value(h));
                for (int r = 0; r < axis.size(); r++) {
                    double sounding = argument == Argument.SOUNDING ? axis.value(r) : pipe.complement(axis.value(r));
                    double z0 = attitude.heightThrough(pipe.x(), pipe.y(), pipe.footZ() + sounding);
                    volumes[node++] = shape.volumeBelow(attitude, z0);
                }
            }
        }
        return SoundingTable.of(
                argument, axis, grid.trims(), grid.heels(), volumes, Origin.computed("tabulated from " + tank.id()));
    }

    /**
     * From a dry pipe up to where the tank is full at every trim and heel of the grid, or to the rim of the pipe: in even steps, with
     * the top of the tank at the pipe as a row of its own.
     */
    private double[] soundings(Pipe pipe, NetShape shape) {
        double last = Math.min(pipe.length(), reach(pipe, shape));
        double step = RoundSteps.atLeast(last / grid.readings());
        TreeSet<Double> soundings = new TreeSet<>();
        for (int i = 0; i * step < last - step / 4; i++) {
            soundings.add(RoundSteps.multiple(i, step));
        }
        double top = toTenth(shape.solid().bounds().maxZ() - pipe.footZ());
        if (top > 0 && top < last) {
            soundings.add(top);
        }
        soundings.add(Math.min(pipe.length(), toTenth(last + 0.00005)));
        return soundings.stream().mapToDouble(s -> s).toArray();
    }

    private double reach(Pipe pipe, NetShape shape) {
        double reach = 0;
        for (int t = 0; t < grid.trims().size(); t++) {
            for (int h = 0; h < grid.heels().size(); h++) {
                Attitude attitude =
                        Attitude.of(grid.trims().value(t), lbp, grid.heels().value(h));
                double full = attitude.heightAt(shape.solid().highest(attitude), pipe.x(), pipe.y());
                reach = Math.max(reach, full - pipe.footZ());
            }
        }
        return reach;
    }

    /** To a tenth of a millimetre, as the files carry it. */
    private static double toTenth(double metres) {
        return Math.rint(metres * 1e4) / 1e4;
    }
}
