// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.brassbob.core.geometry.SpaceShape.Point;

/**
 * Cuts a tank's section out of the half hull: from an inner wall outwards to the shell or an outer wall, from a floor or the shell up
 * to a crown. The shell is drawn in by the thickness of its structure, so that tanks lie inside the moulded hull.
 */
final class HullCut {
    private static final double SHELL = 0.02;
    private static final int ALONG_SHELL = 9;

    private final List<Point> shell;

    HullCut(double x) {
        List<Point> half = HeronLines.section(x);
        shell = new ArrayList<>();
        // The last point is the deck at the centreline, which is no shell.
        for (Point p : half.subList(0, half.size() - 1)) {
            shell.add(new Point(Math.max(0, p.y() - SHELL), p.z() + SHELL));
        }
    }

    /** The half section between walls at y inner and outer, floor and crown; always the same number of points. */
    List<Point> between(double inner, double outer, double floor, double crown) {
        double bottom = Math.max(floor, heightAt(inner));
        double top = Math.min(outer, breadthAt(crown));
        List<Point> outline = new ArrayList<>();
        outline.add(new Point(inner, bottom));
        // Where the floor reaches the outer wall inside the shell, the shell has no part in the outline.
        boolean clear = bottom == floor && breadthAt(floor) >= outer;
        outline.addAll(
                clear
                        ? Collections.nCopies(ALONG_SHELL, new Point(outer, floor))
                        : along(position(inner, bottom), exit(top, crown)));
        outline.add(new Point(top, crown));
        outline.add(new Point(inner, crown));
        return outline;
    }

    /** The half section of a hopper: between the shell and a plate that slopes from (inner, floor) to the shell at the crown. */
    List<Point> hopper(double inner, double floor, double crown) {
        List<Point> outline = new ArrayList<>();
        outline.add(new Point(inner, floor));
        outline.addAll(along(positionAtHeight(floor), positionAtHeight(crown)));
        return outline;
    }

    /** Both sides of a half section that begins at the centreline and ends there. */
    static List<Point> bothSides(List<Point> half) {
        List<Point> starboard = half.subList(0, half.size() - 1);
        List<Point> port = new ArrayList<>();
        for (Point p : starboard.subList(1, starboard.size())) {
            port.add(new Point(-p.y(), p.z()));
        }
        Collections.reverse(port);
        List<Point> whole = new ArrayList<>(starboard);
        whole.addAll(port);
        return whole;
    }

    private double position(double inner, double bottom) {
        return heightAt(inner) >= bottom - 1e-9 ? positionAtBreadth(inner) : positionAtHeight(bottom);
    }

    private double exit(double top, double crown) {
        return heightAt(top) < crown - 1e-9 && top < breadthAt(crown) - 1e-9
                ? positionAtBreadth(top)
                : positionAtHeight(crown);
    }

    /** Points of the shell between two positions, a position being an index into its points with a fraction. */
    private List<Point> along(double from, double to) {
        List<Point> points = new ArrayList<>();
        for (int i = 0; i < ALONG_SHELL; i++) {
            points.add(at(from + (to - from) * i / (ALONG_SHELL - 1)));
        }
        return points;
    }

    private Point at(double position) {
        int i = (int) Math.min(shell.size() - 2, Math.floor(position));
        double f = position - i;
        Point a = shell.get(i);
        Point b = shell.get(i + 1);
        return new Point(a.y() + f * (b.y() - a.y()), a.z() + f * (b.z() - a.z()));
    }

    private double heightAt(double y) {
        return at(positionAtBreadth(y)).z();
    }

    private double breadthAt(double z) {
        return at(positionAtHeight(z)).y();
    }

    private double positionAtBreadth(double y) {
        for (int i = 0; i + 1 < shell.size(); i++) {
            Point a = shell.get(i);
            Point b = shell.get(i + 1);
            if (b.y() >= y && b.y() > a.y()) {
                return i + Math.max(0, (y - a.y()) / (b.y() - a.y()));
            }
        }
        return shell.size() - 1.0;
    }

    private double positionAtHeight(double z) {
        for (int i = 0; i + 1 < shell.size(); i++) {
            Point a = shell.get(i);
            Point b = shell.get(i + 1);
            if (b.z() >= z && b.z() > a.z()) {
                return i + Math.max(0, (z - a.z()) / (b.z() - a.z()));
            }
        }
        return shell.size() - 1.0;
    }
}
