// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.contents;

/** A polynomial of the fourth degree, by Newton's divided differences. */
final class Quartic {
    private final double[] nodes;
    private final double[] coefficients;

    private Quartic(double[] nodes, double[] coefficients) {
        this.nodes = nodes;
        this.coefficients = coefficients;
    }

    /** The one that takes these five values at these five places. */
    static Quartic through(double[] nodes, double[] values) {
        double[] c = values.clone();
        for (int order = 1; order < c.length; order++) {
            for (int i = c.length - 1; i >= order; i--) {
                c[i] = (c[i] - c[i - 1]) / (nodes[i] - nodes[i - order]);
            }
        }
        return new Quartic(nodes, c);
    }

    double at(double s) {
        double value = coefficients[4];
        for (int i = 3; i >= 0; i--) {
            value = value * (s - nodes[i]) + coefficients[i];
        }
        return value;
    }
}
