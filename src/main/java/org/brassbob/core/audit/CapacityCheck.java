// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import static org.brassbob.core.audit.Findings.show;

import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.table.SoundingTable;
import org.brassbob.core.table.VolumeTable;
import org.brassbob.core.vessel.Tank;
import org.jspecify.annotations.Nullable;

/** Holds the stated capacity against the shape and the last rows of the tables. */
final class CapacityCheck {
    /** MSC.1/Circ.1229 section 4: compartment volumes within 2 %. */
    private static final double CODE_TOLERANCE = 0.02;

    /** What a plan's capacity and a table's last row may differ by without a word. */
    private static final double USUAL = 0.002;

    private CapacityCheck() {}

    static void check(Tank tank, @Nullable NetShape shape, Findings findings) {
        boolean shapeAgrees = false;
        if (shape != null) {
            compare(tank, shape.capacity(), "the shape's net volume", findings);
            shapeAgrees = Math.abs(tank.capacity() - shape.capacity()) <= usual(shape.capacity());
        }
        VolumeTable volumes = tank.volumes();
        if (volumes != null) {
            int last = volumes.volumes().size() - 1;
            compare(tank, volumes.volumes().last(), "the last row of the volume table", findings);
            if (shapeAgrees && Math.abs(tank.capacity() - volumes.volumes().last()) > usual(tank.capacity())) {
                // Plan and shape are of one mind: it is the table that is wrong.
                findings.error(
                        volumes.origin(),
                        last,
                        "last volume of " + tank.id() + " against capacity and shape",
                        show(volumes.volumes().last()) + " m3",
                        show(tank.capacity()) + " m3");
            }
        }
        SoundingTable soundings = tank.soundings();
        if (soundings != null) {
            compare(tank, greatest(soundings), "the greatest volume of the sounding table", findings);
        }
    }

    private static double usual(double volume) {
        return Math.max(0.011, USUAL * volume);
    }

    private static double greatest(SoundingTable table) {
        double greatest = 0;
        int nodes =
                table.readings().size() * table.trims().size() * table.heels().size();
        for (int node = 0; node < nodes; node++) {
            greatest = Math.max(greatest, table.volume(node));
        }
        return greatest;
    }

    private static void compare(Tank tank, double other, String what, Findings findings) {
        double difference = Math.abs(tank.capacity() - other);
        if (difference <= usual(other)) {
            return;
        }
        String text = "capacity of " + tank.id() + " against " + what;
        String figure = show(tank.capacity()) + " m3";
        String expected = show(other) + " m3";
        if (difference > Math.max(0.011, CODE_TOLERANCE * other)) {
            findings.error(tank.origin(), 0, text, figure, expected);
        } else {
            findings.warning(tank.origin(), 0, text, figure, expected);
        }
    }
}
