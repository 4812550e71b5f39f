// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

/**
 * An upright cylinder.
 *
 * @param x of its axis (m)
 * @param y of its axis (m)
 * @param z from its bottom to its top
 * @param radius m
 */
record StandingCylinder(double x, double y, Range z, double radius) implements PlainTank {
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
        double area = Math.PI * radius * radius;
        return new Contents(area * (level - bottom()), x, y, (bottom() + level) / 2, area * radius * radius / 4);
    }
}
