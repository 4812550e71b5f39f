// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.TreeSet;
import org.brassbob.core.geometry.SpaceShape.Point;

/**
 * The area that two sections have in common, exactly: between the heights of all corners and crossings the edges are straight and in one
 * order, so the width in common changes evenly and its middle stands for the strip. Loops count by even and odd, so that one inside
 * another is a hole.
 */
final class ScanLines {
    private ScanLines() {}

    /** The area (m2) within both sections. */
    static double common(List<List<Point>> a, List<List<Point>> b) {
        double[] heights = heights(a, b);
        double area = 0;
        for (int i = 0; i + 1 < heights.length; i++) {
            double middle = (heights[i] + heights[i + 1]) / 2;
            area += (heights[i + 1] - heights[i]) * commonWidth(crossings(a, middle), crossings(b, middle));
        }
        return area;
    }

    /** The area (m2) of a section. */
    static double area(List<List<Point>> a) {
        return common(a, a);
    }

    private static double[] heights(List<List<Point>> a, List<List<Point>> b) {
        TreeSet<Double> heights = new TreeSet<>();
        List<Point[]> edgesA = edges(a);
        List<Point[]> edgesB = edges(b);
        edgesA.forEach(e -> heights.add(e[0].z()));
        edgesB.forEach(e -> heights.add(e[0].z()));
        for (Point[] e : edgesA) {
            for (Point[] f : edgesB) {
                double z = crossing(e, f);
                if (!Double.isNaN(z)) {
                    heights.add(z);
                }
            }
        }
        return heights.stream().mapToDouble(z -> z).toArray();
    }

    private static List<Point[]> edges(List<List<Point>> loops) {
        List<Point[]> edges = new ArrayList<>();
        for (List<Point> loop : loops) {
            for (int i = 0; i < loop.size(); i++) {
                edges.add(new Point[] {loop.get(i), loop.get((i + 1) % loop.size())});
            }
        }
        return edges;
    }

    /** The height at which two edges cross, or NaN. */
    private static double crossing(Point[] e, Point[] f) {
        double ey = e[1].y() - e[0].y();
        double ez = e[1].z() - e[0].z();
        double fy = f[1].y() - f[0].y();
        double fz = f[1].z() - f[0].z();
        double cross = ey * fz - ez * fy;
        if (cross == 0) {
            return Double.NaN;
        }
        double dy = f[0].y() - e[0].y();
        double dz = f[0].z() - e[0].z();
        double s = (dy * fz - dz * fy) / cross;
        double t = (dy * ez - dz * ey) / cross;
        return s > 0 && s < 1 && t > 0 && t < 1 ? e[0].z() + s * ez : Double.NaN;
    }

    private static double[] crossings(List<List<Point>> loops, double z) {
        double[] ys = new double[16];
        int n = 0;
        for (Point[] e : edges(loops)) {
            if ((e[0].z() > z) != (e[1].z() > z)) {
                if (n == ys.length) {
                    ys = Arrays.copyOf(ys, 2 * n);
                }
                ys[n++] = e[0].y() + (e[1].y() - e[0].y()) * (z - e[0].z()) / (e[1].z() - e[0].z());
            }
        }
        double[] sorted = Arrays.copyOf(ys, n);
        Arrays.sort(sorted);
        return sorted;
    }

    private static double commonWidth(double[] a, double[] b) {
        double width = 0;
        for (int i = 0; i + 1 < a.length; i += 2) {
            for (int j = 0; j + 1 < b.length; j += 2) {
                width += Math.max(0, Math.min(a[i + 1], b[j + 1]) - Math.max(a[i], b[j]));
            }
        }
        return width;
    }
}
