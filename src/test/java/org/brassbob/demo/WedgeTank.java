// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

/**
 * A trough on the centreline with an upright V for its section.
 *
 * @param x its ends
 * @param z from its edge below to its top
 * @param breadth at the top (m)
 */
record WedgeTank(Range x, Range z, double breadth) implements PlainTank {
    @Override
    public double bottom() {
        return z.from();
    }

    @Override
    public double top() {
        return z.to();
    }

    @Override
    public Contents upTo(double level) {
        double length = x.to() - x.from();
        double height = level - bottom();
        double wide = breadth * height / (top() - bottom());
        return new Contents(
                length * wide * height / 2,
                (x.from() + x.to()) / 2,
                0,
                bottom() + height * 2 / 3,
                length * wide * wide * wide / 12);
    }
}
