// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import java.util.Arrays;
import java.util.List;
import java.util.TreeSet;
import org.brassbob.core.geometry.SpaceShape.Point;

/**
 * When, on the way from one station to the next, a corner of a section meets an edge. Corners and edges move evenly along straight
 * lines, so that a corner comes into line with an edge where an expression of second degree is nought. Between two meetings nothing
 * can begin or cease to cross: looking once between each two meetings is enough to know the whole way.
 */
final class Meetings {
    /** Meetings closer than this (share of the way), to each other or to a station, are one. */
    private static final double SAME = 1e-6;
    /** Below this share of its terms an expression is nought. */
    private static final double ROUNDING = 1e-12;

    /** How much further than an edge's way a corner is still taken to reach it (share of the way's size). */
    private static final double BOX_MARGIN = 1e-9;

    private final TreeSet<Double> shares = new TreeSet<>();

    private Meetings() {}

    /** Shares of the way, one between each two meetings: a single one half way where nothing meets. */
    static double[] between(List<Strip> strips) {
        Meetings meetings = new Meetings();
        meetings.shares.add(0.0);
        meetings.shares.add(1.0);
        for (Strip corners : strips) {
            for (Strip edges : strips) {
                meetings.find(corners, edges);
            }
        }
        return meetings.gaps();
    }

    private double[] gaps() {
        double[] gaps = new double[shares.size()];
        int n = 0;
        double last = 0;
        for (double share : shares) {
            if (share - last > SAME) {
                gaps[n++] = (last + share) / 2;
                last = share;
            }
        }
        return Arrays.copyOf(gaps, n);
    }

    private void find(Strip corners, Strip edges) {
        if (isStill(corners) && isStill(edges)) {
            return;
        }
        int n = edges.aft().size();
        for (int c = 0; c < corners.aft().size(); c++) {
            for (int e = 0; e < n; e++) {
                int f = (e + 1) % n;
                boolean own = corners.number() == edges.number() && (c == e || c == f);
                if (!own && reach(corners, c, edges, e, f)) {
                    find(
                            new Path(corners.aft().get(c), corners.forward().get(c)),
                            new Path(edges.aft().get(e), edges.forward().get(e)),
                            new Path(edges.aft().get(f), edges.forward().get(f)));
                }
            }
        }
    }

    private static boolean isStill(Strip strip) {
        return strip.aft().equals(strip.forward());
    }

    /** Whether the box about a corner's way and the one about an edge's way have anything in common: most have not. */
    private static boolean reach(Strip corners, int c, Strip edges, int e, int f) {
        Point aft = corners.aft().get(c);
        Point forward = corners.forward().get(c);
        Point p = edges.aft().get(e);
        Point q = edges.aft().get(f);
        Point r = edges.forward().get(e);
        Point s = edges.forward().get(f);
        return overlap(aft.y(), forward.y(), p.y(), q.y(), r.y(), s.y())
                && overlap(aft.z(), forward.z(), p.z(), q.z(), r.z(), s.z());
    }

    private static boolean overlap(double a, double b, double p, double q, double r, double s) {
        double low = Math.min(Math.min(p, q), Math.min(r, s));
        double high = Math.max(Math.max(p, q), Math.max(r, s));
        double margin = BOX_MARGIN * (high - low);
        return Math.max(a, b) >= low - margin && Math.min(a, b) <= high + margin;
    }

    private void find(Path corner, Path start, Path end) {
        Path along = end.from(start);
        Path to = corner.from(start);
        // (along × to) as c0 + c1·t + c2·t²
        double c0 = cross(along.aft, to.aft);
        double c2 = cross(along.change(), to.change());
        double c1 = cross(along.aft, to.change()) + cross(along.change(), to.aft);
        double scale = (size(along.aft) + size(along.change())) * (size(to.aft) + size(to.change()));
        for (double share : roots(c2, c1, c0, ROUNDING * scale)) {
            if (share > 0 && share < 1 && isOn(to.at(share), along.at(share))) {
                shares.add(share);
            }
        }
    }

    private static double[] roots(double c2, double c1, double c0, double nought) {
        if (Math.abs(c2) <= nought) {
            return Math.abs(c1) <= nought ? new double[0] : new double[] {-c0 / c1};
        }
        double square = c1 * c1 - 4 * c2 * c0;
        if (square < 0) {
            return new double[0];
        }
        double q = -(c1 + Math.copySign(Math.sqrt(square), c1)) / 2;
        return q == 0 ? new double[] {0} : new double[] {q / c2, c0 / q};
    }

    /** Whether a point in line with an edge lies on it, to a millionth of its length. */
    private static boolean isOn(Point to, Point along) {
        double length = along.y() * along.y() + along.z() * along.z();
        double share = to.y() * along.y() + to.z() * along.z();
        return share >= -SAME * length && share <= (1 + SAME) * length;
    }

    private static double cross(Point a, Point b) {
        return a.y() * b.z() - a.z() * b.y();
    }

    private static double size(Point p) {
        return Math.abs(p.y()) + Math.abs(p.z());
    }

    /** The way of a point, or of the difference of two. */
    private record Path(Point aft, Point forward) {
        Path from(Path other) {
            return new Path(less(aft, other.aft), less(forward, other.forward));
        }

        Point change() {
            return less(forward, aft);
        }

        Point at(double share) {
            return new Point(aft.y() + (forward.y() - aft.y()) * share, aft.z() + (forward.z() - aft.z()) * share);
        }

        private static Point less(Point a, Point b) {
            return new Point(a.y() - b.y(), a.z() - b.z());
        }
    }
}
