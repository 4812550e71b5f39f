// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.brassbob.core.geometry.SpaceShape.Point;

/** Lays the triangles of a skin between stations that have been checked. */
final class SkinBuilder {
    /** A quad counts as flat when its corners lie within this of a plane, relative to its size. */
    private static final double FLAT = 1e-12;

    private final List<Strip> strips;
    private final Bounds bounds;
    private final double originX;
    private final double originY;
    private final Map<Corner, Integer> corners = new LinkedHashMap<>();
    private final List<Integer> facets = new ArrayList<>();

    SkinBuilder(List<Strip> strips) {
        this.strips = strips;
        this.bounds = boundsOf(strips);
        this.originX = (bounds.minX() + bounds.maxX()) / 2;
        this.originY = (bounds.minY() + bounds.maxY()) / 2;
    }

    Solid solid() throws ShapeException {
        for (Strip strip : strips) {
            int n = strip.aft().size();
            for (int i = 0; i < n; i++) {
                int j = (i + 1) % n;
                Corner a = corner(strip.aftX(), strip.aft().get(i));
                Corner b = corner(strip.aftX(), strip.aft().get(j));
                Corner c = corner(strip.forwardX(), strip.forward().get(j));
                Corner d = corner(strip.forwardX(), strip.forward().get(i));
                quad(a, b, c, d);
            }
        }
        Solid solid = new Solid(originX, originY, skin(), bounds);
        if (!(solid.volume() > 0)) {
            throw new ShapeException(0, "the shape holds no volume; expected a closed solid");
        }
        return solid;
    }

    private Skin skin() {
        return new Skin(
                corners.keySet().stream().mapToDouble(Corner::x).toArray(),
                corners.keySet().stream().mapToDouble(Corner::y).toArray(),
                corners.keySet().stream().mapToDouble(Corner::z).toArray(),
                facets.stream().mapToInt(Integer::intValue).toArray());
    }

    private Corner corner(double x, Point point) {
        return new Corner(x - originX, point.y() - originY, point.z());
    }

    private void quad(Corner a, Corner b, Corner c, Corner d) {
        if (isFlat(a, b, c, d)) {
            triangle(a, b, c);
            triangle(a, c, d);
            return;
        }
        Corner mean = new Corner((a.x + b.x + c.x + d.x) / 4, (a.y + b.y + c.y + d.y) / 4, (a.z + b.z + c.z + d.z) / 4);
        triangle(a, b, mean);
        triangle(b, c, mean);
        triangle(c, d, mean);
        triangle(d, a, mean);
    }

    private static boolean isFlat(Corner a, Corner b, Corner c, Corner d) {
        double ux = b.x - a.x;
        double uy = b.y - a.y;
        double uz = b.z - a.z;
        double vx = c.x - a.x;
        double vy = c.y - a.y;
        double vz = c.z - a.z;
        double wx = d.x - a.x;
        double wy = d.y - a.y;
        double wz = d.z - a.z;
        double triple = ux * (vy * wz - vz * wy) - uy * (vx * wz - vz * wx) + uz * (vx * wy - vy * wx);
        double size = Math.max(
                Math.max(Math.abs(vx) + Math.abs(vy) + Math.abs(vz), Math.abs(ux) + Math.abs(uy) + Math.abs(uz)),
                Math.abs(wx) + Math.abs(wy) + Math.abs(wz));
        return Math.abs(triple) <= FLAT * size * size * size;
    }

    private void triangle(Corner a, Corner b, Corner c) {
        double projected = (b.x - a.x) * (c.y - a.y) - (c.x - a.x) * (b.y - a.y);
        if (projected == 0) {
            return;
        }
        for (Corner corner : List.of(a, b, c)) {
            facets.add(corners.computeIfAbsent(corner, k -> corners.size()));
        }
    }

    private static Bounds boundsOf(List<Strip> strips) {
        double minX = Double.POSITIVE_INFINITY;
        double maxX = Double.NEGATIVE_INFINITY;
        double minY = minX;
        double maxY = maxX;
        double minZ = minX;
        double maxZ = maxX;
        for (Strip strip : strips) {
            minX = Math.min(minX, strip.aftX());
            maxX = Math.max(maxX, strip.forwardX());
            for (List<Point> section : List.of(strip.aft(), strip.forward())) {
                for (Point point : section) {
                    minY = Math.min(minY, point.y());
                    maxY = Math.max(maxY, point.y());
                    minZ = Math.min(minZ, point.z());
                    maxZ = Math.max(maxZ, point.z());
                }
            }
        }
        return new Bounds(minX, maxX, minY, maxY, minZ, maxZ);
    }

    private record Corner(double x, double y, double z) {}
}
