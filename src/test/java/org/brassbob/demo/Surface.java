// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

/**
 * A level liquid's surface as the ship's frame sees it.
 *
 * @param x of a point on it (m)
 * @param y of that point (m)
 * @param z of that point (m)
 * @param slopeX rise per metre forward: minus the trim over the length between perpendiculars
 * @param slopeY rise per metre to starboard: the tangent of the heel
 */
record Surface(double x, double y, double z, double slopeX, double slopeY) {
    double heightAt(double otherX, double otherY) {
        return z + (otherX - x) * slopeX + (otherY - y) * slopeY;
    }
}
