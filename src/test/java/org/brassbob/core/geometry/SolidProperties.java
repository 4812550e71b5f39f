// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Assume;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import net.jqwik.api.constraints.Scale;
import org.brassbob.core.geometry.SpaceShape.Loop;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.brassbob.core.geometry.SpaceShape.Station;
import org.brassbob.core.table.Origin;

/** What holds for every solid under every surface. */
class SolidProperties {
    private static final double TINY = 1e-10;

    /** Ruled spaces of 2 to 4 stations with simple, seldom convex sections. */
    @Provide
    Arbitrary<SpaceShape> spaces() {
        return Combinators.combine(
                        Arbitraries.longs(),
                        Arbitraries.integers().between(3, 9),
                        Arbitraries.integers().between(2, 4))
                .as(SolidProperties::space);
    }

    @Provide
    Arbitrary<Attitude> attitudes() {
        Arbitrary<Double> trims = Arbitraries.doubles().between(-4, 4).ofScale(9);
        Arbitrary<Double> heels = Arbitraries.doubles().between(-80, 80).ofScale(9);
        return Combinators.combine(trims, heels).as((trim, heel) -> Attitude.of(trim, 84, heel));
    }

    private static SpaceShape space(long seed, int corners, int stations) {
        Random random = new Random(seed);
        List<Station> all = new ArrayList<>();
        double x = 10;
        for (int s = 0; s < stations; s++) {
            List<Point> points = new ArrayList<>();
            double size = 1 + random.nextDouble();
            for (int i = 0; i < corners; i++) {
                double angle = 2 * Math.PI * (i + 0.6 * random.nextDouble()) / corners;
                double r = size * (0.5 + random.nextDouble());
                points.add(new Point(3 + r * Math.cos(angle), 4 + r * Math.sin(angle)));
            }
            all.add(new Station(x, List.of(new Loop(1, points))));
            x += 1 + 5 * random.nextDouble();
        }
        return new SpaceShape(all, Origin.computed("random"));
    }

    private static double height(Solid solid, Attitude attitude, double share) {
        double low = solid.lowest(attitude);
        return low + (solid.highest(attitude) - low) * share;
    }

    @Property(tries = 300)
    void volumeGrowsWithTheLevel(
            @ForAll("spaces") SpaceShape space,
            @ForAll("attitudes") Attitude attitude,
            @ForAll @Scale(9) @DoubleRange(min = -0.1, max = 1.1) double a,
            @ForAll @Scale(9) @DoubleRange(min = -0.1, max = 1.1) double b) {
        Solid solid = Shapes.solid(space);
        double lower = solid.volumeBelow(attitude, height(solid, attitude, Math.min(a, b)));
        double higher = solid.volumeBelow(attitude, height(solid, attitude, Math.max(a, b)));
        assertTrue(lower >= 0);
        assertTrue(higher >= lower - 1e-13 * solid.volume(), () -> lower + " " + higher);
        assertTrue(higher <= solid.volume() * (1 + 1e-13));
    }

    @Property(tries = 300)
    void inverseOfInverse(
            @ForAll("spaces") SpaceShape space,
            @ForAll("attitudes") Attitude attitude,
            @ForAll @Scale(9) @DoubleRange(min = 0, max = 1) double share) {
        Solid solid = Shapes.solid(space);
        double target = share * solid.volume();
        double z0 = solid.heightFor(attitude, target);
        assertEquals(target, solid.volumeBelow(attitude, z0), 1e-11 * solid.volume());
        double again = solid.heightFor(attitude, solid.volumeBelow(attitude, z0));
        assertEquals(solid.volumeBelow(attitude, z0), solid.volumeBelow(attitude, again), 2e-12 * solid.volume());
    }

    @Property(tries = 300)
    void centroidsLieInTheBoxAndBelowTheSurface(
            @ForAll("spaces") SpaceShape space,
            @ForAll("attitudes") Attitude attitude,
            @ForAll @Scale(9) @DoubleRange(min = 1e-4, max = 1.1) double share) {
        Solid solid = Shapes.solid(space);
        double z0 = height(solid, attitude, share);
        Immersed i = solid.below(attitude, z0);
        Assume.that(i.volume() > 0);
        assertTrue(solid.bounds().contains(i.lcg(), i.tcg(), i.vcg(), TINY), i::toString);
        assertTrue(attitude.heightThrough(i.lcg(), i.tcg(), i.vcg()) <= Math.min(z0, solid.highest(attitude)) + TINY);
        assertTrue(attitude.heightThrough(i.lcg(), i.tcg(), i.vcg()) >= solid.lowest(attitude) - TINY);
        LiquidSurface s = i.surface();
        if (s.area() > 1e-6) {
            double z = attitude.heightAt(z0, s.x(), s.y());
            assertTrue(solid.bounds().contains(s.x(), s.y(), z, 1e-7), s::toString);
        }
    }

    @Property(tries = 300)
    void secondMomentsAreNeverNegativeNorMoreThanTheBoxAllows(
            @ForAll("spaces") SpaceShape space,
            @ForAll("attitudes") Attitude attitude,
            @ForAll @Scale(9) @DoubleRange(min = -0.1, max = 1.1) double share) {
        Solid solid = Shapes.solid(space);
        LiquidSurface s = solid.below(attitude, height(solid, attitude, share)).surface();
        assertTrue(s.area() >= 0 && s.transverse() >= 0 && s.longitudinal() >= 0, s::toString);
        Bounds b = solid.bounds();
        double diagonal = Math.hypot(Math.hypot(b.maxX() - b.minX(), b.maxY() - b.minY()), b.maxZ() - b.minZ());
        assertTrue(s.transverse() + s.longitudinal() <= s.area() * diagonal * diagonal / 4 * (1 + TINY) + TINY);
    }

    @Property(tries = 200)
    void emptyAndFullHaveNoSurface(
            @ForAll("spaces") SpaceShape space,
            @ForAll("attitudes") Attitude attitude,
            @ForAll @Scale(9) @DoubleRange(min = 0, max = 1e5) double beyond) {
        Solid solid = Shapes.solid(space);
        assertEquals(Immersed.NOTHING, solid.below(attitude, solid.lowest(attitude) - beyond));
        Immersed full = solid.below(attitude, solid.highest(attitude) + beyond);
        assertEquals(LiquidSurface.NONE, full.surface());
        assertEquals(solid.volume(), full.volume(), 0);
    }

    @Property(tries = 200)
    void portMirrorsStarboard(
            @ForAll("spaces") SpaceShape space,
            @ForAll("attitudes") Attitude attitude,
            @ForAll @Scale(9) @DoubleRange(min = 0.01, max = 0.99) double share) {
        Solid starboard = Shapes.solid(space);
        Solid port = Shapes.solid(mapped(space, 1, p -> new Point(-p.y(), p.z())));
        Attitude other = new Attitude(attitude.trimSlope(), -attitude.heelSlope());
        double z0 = height(starboard, attitude, share);
        Immersed s = starboard.below(attitude, z0);
        Immersed p = port.below(other, z0);
        assertSame(s, p, 1e-12, -1);
    }

    /** The same figures, the transverse coordinate turned or not. */
    private static void assertSame(Immersed a, Immersed b, double tolerance, int side) {
        double scale = 1 + a.volume();
        assertEquals(a.volume(), b.volume(), tolerance * scale);
        assertEquals(a.lcg() * a.volume(), b.lcg() * b.volume(), tolerance * 100 * scale);
        assertEquals(a.tcg() * a.volume(), side * b.tcg() * b.volume(), tolerance * 100 * scale);
        assertEquals(a.vcg() * a.volume(), b.vcg() * b.volume(), tolerance * 100 * scale);
        double area = 1 + a.surface().area();
        assertEquals(a.surface().area(), b.surface().area(), tolerance * 10 * area);
        assertEquals(a.surface().transverse(), b.surface().transverse(), tolerance * 1000 * area * area);
        assertEquals(a.surface().longitudinal(), b.surface().longitudinal(), tolerance * 1000 * area * area);
    }

    private interface PointMap {
        Point of(Point point);
    }

    private static SpaceShape mapped(SpaceShape space, double stretch, PointMap map) {
        List<Station> stations = new ArrayList<>();
        for (Station station : space.stations()) {
            List<Loop> loops = station.loops().stream()
                    .map(l -> new Loop(
                            l.number(), l.points().stream().map(map::of).toList()))
                    .toList();
            stations.add(new Station(station.x() * stretch, loops));
        }
        return new SpaceShape(stations, space.origin());
    }

    @Property(tries = 200)
    void whereALoopBeginsAndWhichWayItRunsDoesNotMatter(
            @ForAll("spaces") SpaceShape space,
            @ForAll("attitudes") Attitude attitude,
            @ForAll @Scale(9) @DoubleRange(min = 0.01, max = 0.99) double share,
            @ForAll @IntRange(min = 0, max = 8) int shift) {
        Solid solid = Shapes.solid(space);
        List<Station> turned = new ArrayList<>();
        for (Station station : space.stations()) {
            List<Point> points = new ArrayList<>(station.loops().get(0).points());
            Collections.rotate(points, shift);
            Collections.reverse(points);
            turned.add(new Station(station.x(), List.of(new Loop(5, points))));
        }
        Solid other = Shapes.solid(new SpaceShape(turned, space.origin()));
        double z0 = height(solid, attitude, share);
        assertSame(solid.below(attitude, z0), other.below(attitude, z0), 1e-12, 1);
    }

    @Property(tries = 200)
    void movingTheSpaceMovesTheFigures(
            @ForAll("spaces") SpaceShape space,
            @ForAll("attitudes") Attitude attitude,
            @ForAll @Scale(9) @DoubleRange(min = 0.01, max = 0.99) double share,
            @ForAll @Scale(9) @DoubleRange(min = -100, max = 100) double by) {
        Solid solid = Shapes.solid(space);
        List<Station> moved = new ArrayList<>();
        for (Station s :
                mapped(space, 1, p -> new Point(p.y() - by, p.z() + by / 2)).stations()) {
            moved.add(new Station(s.x() + by, s.loops()));
        }
        Solid other = Shapes.solid(new SpaceShape(moved, space.origin()));
        double z0 = height(solid, attitude, share);
        Immersed a = solid.below(attitude, z0);
        Immersed b = other.below(attitude, attitude.heightThrough(by, -by, by / 2) + z0);
        Assume.that(a.volume() > 1e-6 * solid.volume());
        assertEquals(a.volume(), b.volume(), 1e-9 * solid.volume());
        assertEquals(a.lcg() + by, b.lcg(), 1e-6);
        assertEquals(a.tcg() - by, b.tcg(), 1e-6);
        assertEquals(a.vcg() + by / 2, b.vcg(), 1e-6);
        assertEquals(
                a.surface().transverse(),
                b.surface().transverse(),
                1e-7 * (1 + a.surface().transverse()));
    }

    @Property(tries = 200)
    void partsOfASpaceCutByABulkheadAddUp(
            @ForAll("spaces") SpaceShape space,
            @ForAll("attitudes") Attitude attitude,
            @ForAll @Scale(9) @DoubleRange(min = 0.05, max = 0.95) double share) {
        Assume.that(space.stations().size() > 2);
        Solid whole = Shapes.solid(space);
        double z0 = height(whole, attitude, share);
        List<Station> stations = space.stations();
        Solid aft = Shapes.solid(new SpaceShape(stations.subList(0, 2), space.origin()));
        Solid forward = Shapes.solid(new SpaceShape(stations.subList(1, stations.size()), space.origin()));
        assertAddUp(whole.below(attitude, z0), aft.below(attitude, z0), forward.below(attitude, z0), attitude);
    }

    @Property(tries = 200)
    void outerIsNetAndInner(
            @ForAll("attitudes") Attitude attitude,
            @ForAll @Scale(9) @DoubleRange(min = 0.05, max = 0.95) double share,
            @ForAll("spaces") SpaceShape space) {
        Solid inner = Shapes.solid(space);
        Solid outer = Shapes.box(5, 35, -4, 10, -2, 12);
        assertTrue(outer.bounds().encloses(inner.bounds(), 0));
        Solid net = outer.minus(inner);
        double z0 = height(outer, attitude, share);
        assertAddUp(outer.below(attitude, z0), net.below(attitude, z0), inner.below(attitude, z0), attitude);
        assertEquals(outer.volume(), net.volume() + inner.volume(), 1e-11 * outer.volume());
    }

    /** Volume, first moments, area, and second moments about the common centroid by parallel axes in the surface. */
    private static void assertAddUp(Immersed whole, Immersed a, Immersed b, Attitude attitude) {
        assertEquals(whole.volume(), a.volume() + b.volume(), TINY * whole.volume());
        assertEquals(
                whole.volume() * whole.lcg(), moment(a, a.lcg()) + moment(b, b.lcg()), 1e-9 * (1 + whole.volume()));
        assertEquals(
                whole.volume() * whole.tcg(), moment(a, a.tcg()) + moment(b, b.tcg()), 1e-9 * (1 + whole.volume()));
        assertEquals(
                whole.volume() * whole.vcg(), moment(a, a.vcg()) + moment(b, b.vcg()), 1e-9 * (1 + whole.volume()));
        LiquidSurface s = whole.surface();
        double scale = 1 + s.area() * s.area();
        assertEquals(s.area(), a.surface().area() + b.surface().area(), 1e-9 * scale);
        assertEquals(s.transverse(), across(a.surface(), s, attitude) + across(b.surface(), s, attitude), 1e-8 * scale);
        assertEquals(s.longitudinal(), along(a.surface(), s, attitude) + along(b.surface(), s, attitude), 1e-8 * scale);
    }

    private static double moment(Immersed i, double lever) {
        return i.volume() > 0 ? i.volume() * lever : 0;
    }

    private static double along(LiquidSurface part, LiquidSurface whole, Attitude attitude) {
        double lever = part.area() > 0 ? alongLever(part, whole, attitude) : 0;
        return part.longitudinal() + part.area() * lever * lever;
    }

    private static double across(LiquidSurface part, LiquidSurface whole, Attitude attitude) {
        if (!(part.area() > 0)) {
            return 0;
        }
        double dx = part.x() - whole.x();
        double dy = part.y() - whole.y();
        double dz = -dx * attitude.trimSlope() + dy * attitude.heelSlope();
        double along = alongLever(part, whole, attitude);
        return part.transverse() + part.area() * (dx * dx + dy * dy + dz * dz - along * along);
    }

    private static double alongLever(LiquidSurface part, LiquidSurface whole, Attitude attitude) {
        double p = attitude.trimSlope();
        double dx = part.x() - whole.x();
        double dy = part.y() - whole.y();
        return (dx + p * (p * dx - attitude.heelSlope() * dy)) / Math.sqrt(1 + p * p);
    }

    @Property(tries = 200)
    void aSectionMayBeGivenByMorePointsThanItNeeds(
            @ForAll("spaces") SpaceShape space,
            @ForAll("attitudes") Attitude attitude,
            @ForAll @Scale(9) @DoubleRange(min = 0.01, max = 0.99) double share) {
        // Prisms only: a middle of a warped quad's edge would change the skin.
        List<Point> points = space.stations().get(0).loops().get(0).points();
        List<Point> more = new ArrayList<>();
        for (int i = 0; i < points.size(); i++) {
            Point a = points.get(i);
            Point b = points.get((i + 1) % points.size());
            more.add(a);
            more.add(new Point((a.y() + b.y()) / 2, (a.z() + b.z()) / 2));
            more.add(b);
        }
        Solid plain = Shapes.prism(10, 17, new Loop(1, points));
        Solid given = Shapes.prism(10, 17, new Loop(1, more));
        double z0 = height(plain, attitude, share);
        assertSame(plain.below(attitude, z0), given.below(attitude, z0), 1e-12, 1);
    }
}
