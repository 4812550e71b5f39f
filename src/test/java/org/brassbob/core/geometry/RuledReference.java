// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.function.ToDoubleFunction;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.hipparchus.analysis.integration.IterativeLegendreGaussIntegrator;

/**
 * A second opinion on what lies below a surface, by another way altogether: the space is sliced into sections square to x, each section
 * is clipped by the surface's line in it (Sutherland and Hodgman, 1974), its plane moments are summed by the shoelace rule, and an
 * adaptive Gauss integrator of Hipparchus goes along x, from break to break. Between breaks the integrands are polynomials, so the
 * reference is good to about 1e-11 of the whole.
 *
 * <p>For one loop between two stations, run from y towards z.
 */
final class RuledReference {
    private final double x0;
    private final double x1;
    private final List<Point> aft;
    private final List<Point> forward;
    private final Attitude attitude;
    private final double z0;

    RuledReference(double x0, List<Point> aft, double x1, List<Point> forward, Attitude attitude, double z0) {
        this.x0 = x0;
        this.x1 = x1;
        this.aft = aft;
        this.forward = forward;
        this.attitude = attitude;
        this.z0 = z0;
    }

    double volume() {
        return integral(x -> moments(x)[0]);
    }

    double momentX() {
        return integral(x -> moments(x)[0] * x);
    }

    double momentY() {
        return integral(x -> moments(x)[1]);
    }

    double momentZ() {
        return integral(x -> moments(x)[2]);
    }

    /** Area, first and second moments of the surface projected on xy, about x = y = 0: of 1, x, y, xx, xy, yy. */
    double[] projectedSurface() {
        return new double[] {
            integral(x -> waterline(x, 0)),
            integral(x -> waterline(x, 0) * x),
            integral(x -> waterline(x, 1)),
            integral(x -> waterline(x, 0) * x * x),
            integral(x -> waterline(x, 1) * x),
            integral(x -> waterline(x, 2))
        };
    }

    private double integral(ToDoubleFunction<Double> of) {
        double sum = 0;
        double last = Double.NaN;
        for (double x : breaks()) {
            if (x - last > 1e-9) {
                double from = last;
                sum += new IterativeLegendreGaussIntegrator(5, 1e-11, 1e-10, 1, 12)
                        .integrate(100_000, of::applyAsDouble, from, x);
                last = x;
            } else if (Double.isNaN(last)) {
                last = x;
            }
        }
        return sum;
    }

    /** Where the surface passes a corner or cuts an edge of the skin. */
    private SortedSet<Double> breaks() {
        SortedSet<Double> breaks = new TreeSet<>(List.of(x0, x1, (x0 + x1) / 2));
        double middle = (x0 + x1) / 2;
        int n = aft.size();
        for (int i = 0; i < n; i++) {
            Point mean = mean(i);
            int j = (i + 1) % n;
            addBreak(breaks, x0, aft.get(i), x1, forward.get(i));
            addBreak(breaks, x0, aft.get(i), middle, mean);
            addBreak(breaks, x0, aft.get(j), middle, mean);
            addBreak(breaks, middle, mean, x1, forward.get(i));
            addBreak(breaks, middle, mean, x1, forward.get(j));
        }
        return breaks;
    }

    private void addBreak(Set<Double> breaks, double xa, Point a, double xb, Point b) {
        double ha = height(xa, a);
        double hb = height(xb, b);
        if (ha * hb < 0) {
            breaks.add(xa + (xb - xa) * ha / (ha - hb));
        }
    }

    private double height(double x, Point p) {
        return p.z() - attitude.heightAt(z0, x, p.y());
    }

    /** The skin's section: a warped quad is four triangles about the mean of its corners, so its section bends at most twice. */
    private List<Point> section(double x) {
        double t = (x - x0) / (x1 - x0);
        List<Point> points = new ArrayList<>();
        int n = aft.size();
        for (int i = 0; i < n; i++) {
            int j = (i + 1) % n;
            points.add(lerp(aft.get(i), forward.get(i), t));
            Point mean = mean(i);
            if (t < 0.5) {
                points.add(lerp(aft.get(i), mean, 2 * t));
                points.add(lerp(aft.get(j), mean, 2 * t));
            } else {
                points.add(lerp(mean, forward.get(i), 2 * t - 1));
                points.add(lerp(mean, forward.get(j), 2 * t - 1));
            }
        }
        return points;
    }

    private Point mean(int i) {
        int j = (i + 1) % aft.size();
        return lerp(lerp(aft.get(i), aft.get(j), 0.5), lerp(forward.get(i), forward.get(j), 0.5), 0.5);
    }

    private static Point lerp(Point a, Point b, double t) {
        return new Point(a.y() + (b.y() - a.y()) * t, a.z() + (b.z() - a.z()) * t);
    }

    /** Area and first moments (y, z) of the wet part of the section at x. */
    private double[] moments(double x) {
        List<Point> wet = new ArrayList<>();
        List<Point> section = section(x);
        for (int i = 0; i < section.size(); i++) {
            Point a = section.get(i);
            Point b = section.get((i + 1) % section.size());
            double ha = height(x, a);
            double hb = height(x, b);
            if (ha <= 0) {
                wet.add(a);
            }
            if (ha * hb < 0) {
                wet.add(lerp(a, b, ha / (ha - hb)));
            }
        }
        double[] m = new double[3];
        for (int i = 0; i < wet.size(); i++) {
            Point a = wet.get(i);
            Point b = wet.get((i + 1) % wet.size());
            double cross = a.y() * b.z() - b.y() * a.z();
            m[0] += cross / 2;
            m[1] += cross * (a.y() + b.y()) / 6;
            m[2] += cross * (a.z() + b.z()) / 6;
        }
        return m;
    }

    /** ∫ y^power dy over the wet width at x: signed by whether the section's edge comes up through the surface or goes down. */
    private double waterline(double x, int power) {
        double sum = 0;
        List<Point> section = section(x);
        for (int i = 0; i < section.size(); i++) {
            Point a = section.get(i);
            Point b = section.get((i + 1) % section.size());
            double ha = height(x, a);
            double hb = height(x, b);
            if ((ha < 0) != (hb < 0)) {
                double y = lerp(a, b, ha / (ha - hb)).y();
                sum += Math.pow(y, power + 1) / (power + 1) * (ha < 0 ? 1 : -1);
            }
        }
        return sum;
    }
}
