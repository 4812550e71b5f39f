// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

/**
 * A cylinder lying fore and aft.
 *
 * @param x its ends
 * @param axis its axis across the ship
 * @param radius m
 */
record LyingCylinder(Range x, Point axis, double radius) implements PlainTank {
    @Override
    public double bottom() {
        return axis.z() - radius;
    }

    @Override
    public double top() {
        return axis.z() + radius;
    }

    /** From the circular segment of half-angle θ: area r²(θ − sin θ cos θ), its centroid 2/3·(r sin θ)³ / area below the centre. */
    @Override
    public Contents upTo(double level) {
        double length = x.to() - x.from();
        double cosine = Math.max(-1, Math.min(1, (axis.z() - level) / radius));
        double theta = Math.acos(cosine);
        double halfChord = radius * Math.sin(theta);
        double area = radius * radius * (theta - Math.sin(theta) * cosine);
        double below = area > 0 ? 2.0 / 3 * halfChord * halfChord * halfChord / area : radius;
        double chord = 2 * halfChord;
        return new Contents(
                length * area,
                (x.from() + x.to()) / 2,
                axis.y(),
                axis.z() - below,
                length * chord * chord * chord / 12);
    }
}
