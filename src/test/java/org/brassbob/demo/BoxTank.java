// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

/** A box with its sides along the ship's axes. */
record BoxTank(Range x, Range y, Range z) implements PlainTank {
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
        double breadth = y.to() - y.from();
        return new Contents(
                length * breadth * (level - bottom()),
                (x.from() + x.to()) / 2,
                (y.from() + y.to()) / 2,
                (bottom() + level) / 2,
                length * breadth * breadth * breadth / 12);
    }

    /** The volume (m3) below an inclined surface. */
    double below(Surface surface) {
        return above(surface, bottom()) - above(surface, top());
    }

    /** ∫∫ max(0, surface − floor) over the box's plan; the third integral of a ramp, taken between its corners. */
    private double above(Surface surface, double floor) {
        double slopeX = surface.slopeX();
        double slopeY = surface.slopeY();
        double aftPort = surface.heightAt(x.from(), y.from()) - floor;
        double aftStarboard = surface.heightAt(x.from(), y.to()) - floor;
        double forwardPort = surface.heightAt(x.to(), y.from()) - floor;
        double forwardStarboard = surface.heightAt(x.to(), y.to()) - floor;
        double length = x.to() - x.from();
        double breadth = y.to() - y.from();
        if (slopeX == 0 && slopeY == 0) {
            return length * breadth * ramp(aftPort, 1);
        }
        if (slopeY == 0) {
            return breadth * (ramp(forwardPort, 2) - ramp(aftPort, 2)) / (2 * slopeX);
        }
        if (slopeX == 0) {
            return length * (ramp(aftStarboard, 2) - ramp(aftPort, 2)) / (2 * slopeY);
        }
        double corners = ramp(forwardStarboard, 3) - ramp(aftStarboard, 3) - ramp(forwardPort, 3) + ramp(aftPort, 3);
        return corners / (6 * slopeX * slopeY);
    }

    private static double ramp(double value, int power) {
        return value <= 0 ? 0 : Math.pow(value, power);
    }
}
