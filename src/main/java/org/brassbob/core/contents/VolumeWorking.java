// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.contents;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.round.Reading;
import org.brassbob.core.table.SoundingTable;
import org.brassbob.core.table.VolumeTable;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.working.Step;
import org.brassbob.core.working.Step.Input;

/** Names what a tank's volume and centroid were taken from: the reading, and the rows of the tables or the shape. */
public final class VolumeWorking {
    private VolumeWorking() {}

    /** The step from a reading to a volume. */
    public static Step volume(
            TankModel model, Reading reading, double volume, double density, double trim, double listDeg) {
        Tank tank = model.tank();
        List<Input> inputs = new ArrayList<>();
        if (reading.kind().hasValue()) {
            inputs.add(Input.from(
                    reading.kind().code(), reading.value(), reading.origin().at(0)));
        }
        return switch (reading.kind()) {
            case SOUNDING, ULLAGE -> sounded(model, reading, volume, trim, listDeg, inputs);
            case VOLUME -> step(tank, "as stated", volume, inputs);
            case PERCENT -> {
                inputs.add(
                        Input.from("capacity_m3", tank.capacity(), tank.origin().at(0)));
                yield step(tank, "per cent of capacity", volume, inputs);
            }
            case MASS -> {
                inputs.add(Input.figure(tank.id(), "density_t_m3", density));
                yield step(tank, "mass / density", volume, inputs);
            }
            case EMPTY -> step(tank, "reported empty", volume, inputs);
            case FULL -> step(tank, "reported full: capacity", volume, inputs);
            case NOT_TAKEN -> step(tank, "not taken", volume, inputs);
        };
    }

    private static Step sounded(
            TankModel model, Reading reading, double volume, double trim, double listDeg, List<Input> inputs) {
        Tank tank = model.tank();
        inputs.add(Input.figure("ship", "trim_for_readings_m", trim));
        inputs.add(Input.figure("ship", "list_for_readings_deg", listDeg));
        double sounding = ReadingVolume.sounding(model, reading);
        SoundingTable table = tank.soundings();
        if (table != null && (model.tableCovers(sounding, trim, listDeg) || !model.hasSoundableShape())) {
            double argument = model.argument(table, sounding);
            addRows(inputs, table, argument, trim, listDeg);
            return step(tank, "sounding table, read linearly in reading, trim and heel", volume, inputs);
        }
        return step(tank, "shape, below the plane through the pipe at this trim and list", volume, inputs);
    }

    private static void addRows(List<Input> inputs, SoundingTable table, double argument, double trim, double listDeg) {
        for (int r : RowsRead.about(table.readings(), argument)) {
            for (int t : RowsRead.about(table.trims(), trim)) {
                for (int h : RowsRead.about(table.heels(), listDeg)) {
                    int node = table.node(r, t, h);
                    inputs.add(Input.from(
                            "volume_m3", table.volume(node), table.origin().at(node)));
                }
            }
        }
    }

    /**
     * The steps from a volume to its centroid (lcg, tcg, vcg) and second moment.
     *
     * @param keys what the four are called
     */
    public static List<Step> contents(
            TankModel model, String volumeKey, double volume, double trim, VolumeTable.Entry entry, List<String> keys) {
        String id = model.tank().id();
        Input held = Input.figure(id, volumeKey, volume);
        double[] values = {entry.lcg(), entry.tcg(), entry.vcg(), entry.secondMoment()};
        List<Step> steps = new ArrayList<>();
        for (int column = 0; column < values.length; column++) {
            List<Input> inputs = new ArrayList<>();
            inputs.add(held);
            String rule = "volume table, read linearly";
            if (model.tank().volumes() != null) {
                addColumn(inputs, model.tank().volumes(), volume, column, keys.get(column));
            } else {
                rule = "shape, for this volume at the trim of the readings, without list";
                inputs.add(Input.figure("ship", "trim_for_readings_m", trim));
            }
            steps.add(new Step(id + "/" + keys.get(column), rule, values[column], inputs));
        }
        return steps;
    }

    private static void addColumn(List<Input> inputs, VolumeTable table, double volume, int column, String key) {
        for (int row : RowsRead.about(table.volumes(), volume)) {
            VolumeTable.Entry entry = table.row(row);
            double[] values = {entry.lcg(), entry.tcg(), entry.vcg(), entry.secondMoment()};
            String source = table.origin().at(row);
            inputs.add(Input.from("volume_m3", table.volumes().value(row), source));
            inputs.add(Input.from(key, values[column], source));
        }
    }

    private static Step step(Tank tank, String rule, double volume, List<Input> inputs) {
        return new Step(tank.id() + "/volume_m3", rule, volume, inputs);
    }
}
