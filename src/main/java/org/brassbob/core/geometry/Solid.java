// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

/** A solid bounded by the sections of a space. */
public final class Solid {
    private Solid() {}

    public static Solid of(SpaceShape shape) throws ShapeException {
        if (shape.stations().size() < 2) {
            throw new ShapeException(0, "one station only; expected two or more");
        }
        return new Solid();
    }
}
