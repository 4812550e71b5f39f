// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.vessel;

/**
 * Main dimensions.
 *
 * @param lbp length between perpendiculars (m)
 * @param breadth moulded breadth (m)
 * @param depth moulded depth (m)
 * @param summerDraught summer load draught (m)
 */
public record Particulars(double lbp, double breadth, double depth, double summerDraught) {}
