// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.contents;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.notice.Notice;
import org.brassbob.core.notice.NoticeCode;
import org.brassbob.core.round.Reading;
import org.brassbob.core.round.ReadingKind;
import org.brassbob.core.vessel.Pipe;
import org.brassbob.core.vessel.Tank;
import org.jspecify.annotations.Nullable;

/** Turns a reading into the volume that it states, at the trim and list at which it was taken. */
public final class ReadingVolume {
    /** What the arithmetic of a shape may add or lose, as a share of capacity. */
    private static final double ROUNDING = 1e-9;

    private ReadingVolume() {}

    /**
     * The volume that a reading states.
     *
     * @param reading one that states a level
     * @param trim m
     * @param listDeg °
     * @param density of the liquid (t/m3), for a reading in tonnes
     * @throws IllegalStateException if the tank has neither table nor shape that could turn it into a volume, which a checked round
     *     never has
     */
    public static VolumeRange of(TankModel model, Reading reading, double trim, double listDeg, double density) {
        Tank tank = model.tank();
        return switch (reading.kind()) {
            case SOUNDING, ULLAGE -> sounded(model, sounding(model, reading), reading.value(), trim, listDeg);
            case VOLUME -> stated(tank, reading.value());
            case PERCENT -> stated(tank, reading.value() * tank.capacity() / 100);
            case MASS -> stated(tank, reading.value() / density);
            case EMPTY -> VolumeRange.of(0);
            case FULL -> VolumeRange.of(tank.capacity());
            case NOT_TAKEN -> throw new IllegalArgumentException("a reading that was not taken states no volume");
        };
    }

    /** The sounding (m) that a sounding or ullage states. */
    static double sounding(TankModel model, Reading reading) {
        boolean ullage = reading.kind() == ReadingKind.ULLAGE;
        if (ullage ? !model.canBeUllaged() : !model.canBeSounded()) {
            throw new IllegalStateException("tank " + reading.tank() + " has nothing to turn this "
                    + reading.kind().code() + " into a volume");
        }
        return ullage ? model.complement(reading.value()) : reading.value();
    }

    private static VolumeRange stated(Tank tank, double volume) {
        if (volume <= tank.capacity()) {
            return VolumeRange.of(volume);
        }
        Notice notice = Notice.of(NoticeCode.ABOVE_CAPACITY, tank.id(), volume, tank.capacity());
        return new VolumeRange(tank.capacity(), tank.capacity(), List.of(notice));
    }

    private static VolumeRange sounded(TankModel model, double sounding, double read, double trim, double listDeg) {
        double depth = Math.max(0, sounding);
        double volume = model.volumeAtSounding(Math.min(depth, model.brim()), trim, listDeg);
        if (depth > 0 && depth < model.brim() && model.tableCovers(depth, trim, listDeg)) {
            return VolumeRange.of(volume);
        }
        return withNotices(model, sounding, read, volume, trim, listDeg);
    }

    private static VolumeRange withNotices(
            TankModel model, double sounding, double read, double volume, double trim, double listDeg) {
        Tank tank = model.tank();
        List<Notice> notices = new ArrayList<>();
        Pipe pipe = tank.pipe();
        if (pipe != null && (read > pipe.length() || sounding < 0)) {
            notices.add(Notice.of(NoticeCode.LONGER_THAN_PIPE, tank.id(), read, pipe.length()));
        }
        double depth = Math.max(0, sounding);
        boolean beyondItsLastUllage = pipe == null && sounding < 0;
        if (model.hasSoundingTable() && (beyondItsLastUllage || !model.tableCovers(depth, trim, listDeg))) {
            addOutside(notices, model, read, volume, trim, listDeg);
        }
        double low = sounding <= 0 ? 0 : volume;
        double high = depth >= model.brim() ? Math.max(volume, tank.capacity()) : volume;
        if (high - low <= ROUNDING * tank.capacity()) {
            // A trace left by rounding is no choice, and must not make an empty tank slack or a full one not quite so.
            double only = sounding <= 0 ? low : high;
            return new VolumeRange(only, only, notices);
        }
        return new VolumeRange(low, high, notices);
    }

    private static void addOutside(
            List<Notice> notices, TankModel model, double read, double volume, double trim, double listDeg) {
        Tank tank = model.tank();
        boolean brimFull = volume >= tank.capacity() && !model.hasSoundableShape();
        if (!brimFull) {
            NoticeCode code =
                    model.hasSoundableShape() ? NoticeCode.OUTSIDE_TABLE_SHAPE : NoticeCode.OUTSIDE_TABLE_EDGE;
            notices.add(Notice.of(code, tank.id(), trim, listDeg, read));
        }
    }

    /** The volume of free water (m3) under a liquid whose volume is given; 0 where none was found or looked for. */
    public static double freeWater(
            TankModel model, @Nullable Reading reading, double volume, double trim, double listDeg) {
        Double water = reading == null ? null : reading.waterSounding();
        if (water == null || water <= 0 || !model.canBeSounded()) {
            return 0;
        }
        return Math.min(volume, model.volumeAtSounding(water, trim, listDeg));
    }
}
