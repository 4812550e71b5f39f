// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import static org.brassbob.core.audit.Findings.show;

import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.Bounds;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.vessel.Pipe;
import org.brassbob.core.vessel.Tank;
import org.jspecify.annotations.Nullable;

/** Holds a sounding pipe against the shape that it stands in. */
final class PipeCheck {
    /** A pipe's place is measured on deck, not at its foot (m). */
    private static final double ABOUT = 0.05;

    private PipeCheck() {}

    static void check(Tank tank, @Nullable NetShape shape, Findings findings) {
        Pipe pipe = tank.pipe();
        if (pipe == null || shape == null) {
            return;
        }
        Bounds box = shape.solid().bounds();
        String id = tank.id();
        if (!box.contains(pipe.x(), pipe.y(), (box.minZ() + box.maxZ()) / 2, ABOUT)) {
            findings.error(
                    tank.origin(),
                    0,
                    "place of the pipe of " + id,
                    "x " + show(pipe.x()) + " m, y " + show(pipe.y()) + " m",
                    "x " + show(box.minX()) + " to " + show(box.maxX()) + " m, y " + show(box.minY()) + " to "
                            + show(box.maxY()) + " m");
        }
        double bottom = shape.solid().lowest(Attitude.UPRIGHT);
        if (pipe.footZ() < bottom - ABOUT || pipe.footZ() > box.maxZ()) {
            findings.error(
                    tank.origin(),
                    0,
                    "foot of the pipe of " + id,
                    show(pipe.footZ()) + " m above the baseline",
                    show(bottom) + " to " + show(box.maxZ()) + " m, inside the tank");
        }
        double unsounded = shape.volumeBelow(Attitude.UPRIGHT, pipe.footZ());
        if (unsounded > Math.max(tank.residue(), 0.02 * tank.capacity())) {
            findings.warning(
                    tank.origin(),
                    0,
                    "volume below the foot of the pipe of " + id,
                    show(unsounded) + " m3 upright",
                    "no more than the residue of " + show(tank.residue()) + " m3");
        }
        if (pipe.footZ() + pipe.length() < box.maxZ() - ABOUT) {
            findings.warning(
                    tank.origin(),
                    0,
                    "rim of the pipe of " + id,
                    show(pipe.footZ() + pipe.length()) + " m above the baseline",
                    "at or above the top of the tank at " + show(box.maxZ()) + " m");
        }
    }
}
