// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.condition;

import java.util.List;
import org.brassbob.core.contents.LiquidState;
import org.brassbob.core.contents.ReadingVolume;
import org.brassbob.core.contents.TankModel;
import org.brassbob.core.contents.TankState;
import org.brassbob.core.contents.VolumeRange;
import org.brassbob.core.round.Reading;
import org.brassbob.core.table.VolumeTable;
import org.brassbob.core.vessel.Tank;
import org.jspecify.annotations.Nullable;

/** One tank while a round is worked out: its reading, the volumes that it allows, and what the volume chosen makes of it. */
final class TankLoad {
    private final TankModel model;
    private final @Nullable Reading reading;
    private final double ageHours;
    private final LiquidState liquid;
    private final double waterDensity;

    /** Where a tank without a reading is held (m3); NaN where it is free. */
    private double pinned = Double.NaN;

    private VolumeRange range = VolumeRange.of(0);
    private double volume;
    private double water;
    private VolumeTable.Entry contents = new VolumeTable.Entry(0, 0, 0, 0);
    private TankState state = TankState.EMPTY;
    private double mass;
    private double momentX;
    private double momentY;
    private double momentZ;
    private double fsmAsSounded;
    private double fsmByCode;

    TankLoad(TankModel model, @Nullable Reading reading, double ageHours, LiquidState liquid, double waterDensity) {
        this.model = model;
        this.reading = reading;
        this.ageHours = ageHours;
        this.liquid = liquid;
        this.waterDensity = waterDensity;
    }

    /** Whether nobody knows what is in it. A void that nobody sounded counts as dry, not as open. */
    boolean isOpen() {
        return reading == null && !tank().isVoid();
    }

    /** Whether the reading leaves a choice that tells: between two volumes that both count as empty there is none worth a word. */
    boolean intervalMatters() {
        return range.isInterval() && model.stateOf(range.high()) != TankState.EMPTY;
    }

    /** Holds a tank without a reading at a volume (m3). */
    void pin(double held) {
        pinned = held;
        volume = held;
    }

    /** The least (m3) that a tank without a reading may hold. */
    double leastOpen() {
        return Math.min(tank().residue(), tank().fillLimit());
    }

    /** Works out the volumes that the reading allows at a trim (m) and list (°), and starts from the least. */
    void read(double trim, double listDeg) {
        Reading taken = reading;
        if (taken != null) {
            range = ReadingVolume.of(model, taken, trim, listDeg, liquid.density());
        } else if (tank().isVoid()) {
            range = VolumeRange.of(0);
        } else if (!Double.isNaN(pinned)) {
            range = VolumeRange.of(pinned);
        } else {
            range = new VolumeRange(leastOpen(), tank().fillLimit(), List.of());
        }
        water = ReadingVolume.freeWater(model, taken, range.low(), trim, listDeg);
        fill(range.low(), trim);
    }

    /** Puts a volume (m3) in it: state, mass, moments and free surface at a trim (m). */
    void fill(double newVolume, double trim) {
        volume = newVolume;
        contents = model.contents(volume, trim);
        mass = volume * liquid.density();
        momentX = mass * contents.lcg();
        momentY = mass * contents.tcg();
        momentZ = mass * contents.vcg();
        state = isOpen() && model.stateOf(volume) == TankState.EMPTY ? TankState.SLACK : model.stateOf(volume);
        fsmAsSounded = 0;
        fsmByCode = 0;
        if (state == TankState.SLACK) {
            fsmAsSounded = liquid.density() * contents.secondMoment();
            fsmByCode = liquid.density() * model.secondMomentByCode(contents.secondMoment(), trim);
        }
        if (water > 0) {
            addWater(trim);
        }
    }

    /** Water under the oil: it displaces oil of its own volume, and where it is the heavier, the interface is a second surface. */
    private void addWater(double trim) {
        double heavier = waterDensity - liquid.density();
        VolumeTable.Entry under = model.contents(water, trim);
        double extra = water * heavier;
        mass += extra;
        momentX += extra * under.lcg();
        momentY += extra * under.tcg();
        momentZ += extra * under.vcg();
        if (heavier > 0) {
            fsmAsSounded += heavier * under.secondMoment();
            fsmByCode += heavier * under.secondMoment();
        }
    }

    Tank tank() {
        return model.tank();
    }

    TankModel model() {
        return model;
    }

    @Nullable
    Reading reading() {
        return reading;
    }

    double ageHours() {
        return ageHours;
    }

    LiquidState liquid() {
        return liquid;
    }

    VolumeRange range() {
        return range;
    }

    double volume() {
        return volume;
    }

    double waterDensity() {
        return waterDensity;
    }

    double water() {
        return water;
    }

    VolumeTable.Entry contents() {
        return contents;
    }

    /** Centroid of all that is in it, m forward of the aft perpendicular. */
    double lcg() {
        return water > 0 ? momentX / mass : contents.lcg();
    }

    /** Centroid of all that is in it, m to starboard of the centreline. */
    double tcg() {
        return water > 0 ? momentY / mass : contents.tcg();
    }

    /** Centroid of all that is in it, m above the baseline. */
    double vcg() {
        return water > 0 ? momentZ / mass : contents.vcg();
    }

    /** Whether its liquid has a free surface that counts. */
    boolean hasSurface() {
        return state == TankState.SLACK;
    }

    /** The state as shown: unknown where there is no reading. */
    TankState shownState() {
        return reading == null ? TankState.UNKNOWN : state;
    }

    double mass() {
        return mass;
    }

    double momentX() {
        return momentX;
    }

    double momentY() {
        return momentY;
    }

    double momentZ() {
        return momentZ;
    }

    double fsmAsSounded() {
        return fsmAsSounded;
    }

    double fsmByCode() {
        return fsmByCode;
    }
}
