// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import static org.brassbob.core.audit.Findings.show;

import org.brassbob.core.table.Axis;
import org.brassbob.core.table.SoundingTable;
import org.brassbob.core.table.SoundingTable.Argument;
import org.brassbob.core.table.VolumeTable;
import org.brassbob.core.vessel.Pipe;
import org.brassbob.core.vessel.Tank;

/**
 * Holds the volume table against the sounding table: upright, the layer between two volumes lies between the levels that the soundings
 * give for them, so {@code (V₂·vcg₂ − V₁·vcg₁)/(V₂ − V₁)} does too.
 */
final class LevelCheck {
    private LevelCheck() {}

    static void check(Tank tank, Findings findings) {
        SoundingTable soundings = tank.soundings();
        VolumeTable volumes = tank.volumes();
        Pipe pipe = tank.pipe();
        if (soundings == null || volumes == null || pipe == null) {
            return;
        }
        int trim = indexOfZero(soundings.trims());
        int heel = indexOfZero(soundings.heels());
        if (trim < 0 || heel < 0) {
            return;
        }
        Levels levels = new Levels(soundings, pipe, trim, heel);
        for (int i = 1; i < volumes.volumes().size(); i++) {
            compare(tank, volumes, levels, i, findings);
        }
    }

    private static void compare(Tank tank, VolumeTable volumes, Levels levels, int i, Findings findings) {
        double lowVolume = volumes.volumes().value(i - 1);
        double highVolume = volumes.volumes().value(i);
        if (lowVolume < levels.least || highVolume > levels.greatest) {
            return;
        }
        double layer = (highVolume * volumes.row(i).vcg()
                        - lowVolume * volumes.row(i - 1).vcg())
                / (highVolume - lowVolume);
        // The rounding of a vcg weighs as much as the layer is thin; a tank table gives millimetres at best.
        double rounding = 1e-3 + 1.01e-4 * (highVolume + lowVolume) / (highVolume - lowVolume);
        double bottom = levels.below(lowVolume) - rounding;
        double top = levels.above(highVolume) + rounding;
        if (layer < bottom || layer > top) {
            findings.error(
                    volumes.origin(),
                    i,
                    "layer between " + show(lowVolume) + " and " + show(highVolume) + " m3 of " + tank.id()
                            + " against the sounding table",
                    show(layer) + " m above the baseline",
                    show(bottom) + " to " + show(top) + " m");
        }
    }

    private static int indexOfZero(Axis axis) {
        for (int i = 0; i < axis.size(); i++) {
            if (axis.value(i) == 0) {
                return i;
            }
        }
        return -1;
    }

    /** The upright column turned round: between which levels a volume stands, row by row. */
    private static final class Levels {
        private final double[] levels;
        private final double[] contents;
        private final double least;
        private final double greatest;

        private Levels(SoundingTable table, Pipe pipe, int trim, int heel) {
            int n = table.readings().size();
            levels = new double[n];
            contents = new double[n];
            for (int r = 0; r < n; r++) {
                int at = table.argument() == Argument.SOUNDING ? r : n - 1 - r;
                double reading = table.readings().value(at);
                double sounding = table.argument() == Argument.SOUNDING ? reading : pipe.complement(reading);
                levels[r] = pipe.footZ() + sounding;
                contents[r] = table.volume(table.node(at, trim, heel));
            }
            least = contents[0];
            greatest = contents[n - 1];
        }

        /** The highest level of the table whose volume is at the most this. */
        private double below(double volume) {
            double level = levels[0];
            for (int r = 0; r < contents.length && contents[r] <= volume && contents[r] < greatest; r++) {
                level = levels[r];
            }
            return level;
        }

        /** The lowest level of the table whose volume is at least this. */
        private double above(double volume) {
            for (int r = 0; r < contents.length; r++) {
                if (contents[r] >= volume) {
                    return levels[r];
                }
            }
            return levels[levels.length - 1];
        }
    }
}
