// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

/** A shape that is no solid. Carries the station (from 0) where that shows, and what is wrong in one line. */
public final class ShapeException extends Exception {
    private static final long serialVersionUID = 1L;

    private final int station;

    ShapeException(int station, String message) {
        super(message);
        this.station = station;
    }

    /** Index of the station, in the order given, where the fault shows. */
    public int station() {
        return station;
    }

    /** What is wrong and what was expected, in one line. */
    @Override
    public String getMessage() {
        return String.valueOf(super.getMessage());
    }
}
