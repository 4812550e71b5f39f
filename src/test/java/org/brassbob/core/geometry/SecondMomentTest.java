// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import static org.brassbob.core.geometry.Shapes.loop;
import static org.brassbob.core.geometry.Shapes.rectangle;
import static org.brassbob.core.geometry.Shapes.solid;
import static org.brassbob.core.geometry.Shapes.station;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Second moments of standard surfaces about their own centroid. The closed forms are those of any table of plane areas, for instance
 * Gere and Timoshenko, Mechanics of Materials, appendix D (from memory), and Derrett, Ship Stability for Masters and Mates, chapter on
 * second moments of areas (from memory).
 */
class SecondMomentTest {
    private static final double EXACT = 1e-13;

    private static void assertClose(double expected, double actual) {
        assertEquals(expected, actual, EXACT * Math.max(1, Math.abs(expected)) * 10);
    }

    private static LiquidSurface surface(Solid solid, Attitude attitude, double z0) {
        return solid.below(attitude, z0).surface();
    }

    private static void assertSurface(
            LiquidSurface s, double area, double x, double y, double transverse, double longitudinal) {
        assertClose(area, s.area());
        assertClose(x, s.x());
        assertClose(y, s.y());
        assertClose(transverse, s.transverse());
        assertClose(longitudinal, s.longitudinal());
    }

    @Test
    void rectangleUpright() {
        // l·b³/12 and b·l³/12
        Solid box = Shapes.box(20, 32, -3, 4, 0, 5);
        assertSurface(surface(box, Attitude.UPRIGHT, 2), 84, 26, 0.5, 12 * 343 / 12.0, 7 * 1728 / 12.0);
    }

    @Test
    void rectangleTrimmed() {
        // Along the slope the length is l·√(1 + p²).
        double p = 0.1;
        double l = 12 * Math.sqrt(1 + p * p);
        Solid box = Shapes.box(20, 32, -3, 4, 0, 5);
        assertSurface(
                surface(box, new Attitude(p, 0), 2.5 + 26 * p), 7 * l, 26, 0.5, l * 343 / 12.0, 7 * l * l * l / 12);
    }

    @Test
    void rectangleHeeled() {
        double q = 0.3;
        double b = 7 * Math.sqrt(1 + q * q);
        Solid box = Shapes.box(20, 32, -3, 4, 0, 5);
        assertSurface(
                surface(box, new Attitude(0, q), 2.5 - 0.5 * q), 12 * b, 26, 0.5, 12 * b * b * b / 12, b * 1728 / 12.0);
    }

    @Test
    void rectangleBothIsAParallelogram() {
        // The surface is the parallelogram of u = l·(1, 0, −p) and v = b·(0, 1, q). About its centroid a parallelogram
        // of area A with
        // sides u, v has the tensor A/12·(uu + vv) (from ∫∫ over −½..½ of (su + tv)(su + tv)).
        double p = 0.11;
        double q = 0.23;
        double l = 12;
        double b = 7;
        double[] u = {l, 0, -l * p};
        double[] v = {0, b, b * q};
        double area = Math.sqrt(sq(u[1] * v[2] - u[2] * v[1]) + sq(u[2] * v[0] - u[0] * v[2]) + sq(l * b));
        double along = Math.sqrt(1 + p * p);
        double[] e = {1 / along, 0, -p / along};
        double alongU = dot(u, e);
        double alongV = dot(v, e);
        double acrossU = dot(u, u) - sq(alongU);
        double acrossV = dot(v, v) - sq(alongV);
        Solid box = Shapes.box(20, 32, -3, 4, 0, 9);
        assertSurface(
                surface(box, new Attitude(p, q), 4.5 + 26 * p - 0.5 * q),
                area,
                26,
                0.5,
                area / 12 * (acrossU + acrossV),
                area / 12 * (sq(alongU) + sq(alongV)));
    }

    private static double sq(double a) {
        return a * a;
    }

    private static double dot(double[] a, double[] b) {
        return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
    }

    @Test
    void rightTriangle() {
        // Leg b across, leg l along: l·b³/36 and b·l³/36 about the centroid, which lies a third from the right angle.
        Solid wedge = solid(station(10, rectangle(1, 2, 8, 0, 4)), station(19, rectangle(1, 2, 2, 0, 4)));
        assertSurface(surface(wedge, Attitude.UPRIGHT, 1), 27, 13, 4, 9 * 216 / 36.0, 6 * 729 / 36.0);
    }

    @Test
    void isoscelesTriangleBaseAcross() {
        // Base b across, height h along: b³·h/48 and b·h³/36
        Solid wedge = solid(station(10, rectangle(1, -3, 3, 0, 4)), station(19, rectangle(1, 0, 0, 0, 4)));
        assertSurface(surface(wedge, Attitude.UPRIGHT, 1), 27, 13, 0, 216 * 9 / 48.0, 6 * 729 / 36.0);
    }

    @Test
    void trapezoid() {
        // Parallel sides a, b across, symmetrical, h along: h·(a + b)(a² + b²)/48 across; h³(a² + 4ab + b²)/(36(a + b))
        // along;
        // centroid h(2a + b)/(3(a + b)) from b, where a is the other side.
        double a = 4;
        double b = 10;
        double h = 6;
        Solid solid =
                solid(station(0, rectangle(1, -b / 2, b / 2, 0, 3)), station(h, rectangle(1, -a / 2, a / 2, 0, 3)));
        assertSurface(
                surface(solid, Attitude.UPRIGHT, 2),
                h * (a + b) / 2,
                h * (2 * a + b) / (3 * (a + b)),
                0,
                h * (a + b) * (a * a + b * b) / 48,
                h * h * h * (a * a + 4 * a * b + b * b) / (36 * (a + b)));
    }

    static Stream<Integer> sides() {
        return Stream.of(3, 4, 5, 6, 12, 48, 360);
    }

    @ParameterizedTest
    @MethodSource("sides")
    void circleAsARegularPolygon(int n) {
        // A regular n-gon of circumradius r: A = n/2·r²·sin(2π/n), I = A·r²/12·(2 + cos(2π/n)) about any axis through
        // its centre, which
        // tends to π·r⁴/4. A horizontal n-gon is laid as a section standing on end: stations are chords of it.
        double r = 3;
        double c = 2 * Math.PI / n;
        double area = n / 2.0 * r * r * Math.sin(c);
        double second = area * r * r / 12 * (2 + Math.cos(c));
        LiquidSurface s = surface(drum(n, r), Attitude.UPRIGHT, 1);
        assertEquals(area, s.area(), 1e-12 * area);
        assertEquals(second, s.transverse(), 1e-12 * second);
        assertEquals(second, s.longitudinal(), 1e-12 * second);
        assertEquals(5, s.x(), 1e-12);
        assertEquals(0, s.y(), 1e-12);
    }

    @Test
    void manySidesTendToTheCircle() {
        // π·r⁴/4. With c = 2π/n the polygon's is r⁴·n/24·sin c·(2 + cos c) = π·r⁴/4·(1 − c²/3 + …).
        double circle = Math.PI * 81 / 4;
        double c = 2 * Math.PI / 4000;
        double s = surface(drum(4000, 3), Attitude.UPRIGHT, 1).transverse();
        assertEquals(-c * c / 3, s / circle - 1, 1e-11);
    }

    /** An upright drum: a regular n-gon in plan, pointing forward, 2 m high, about x = 5. */
    private static Solid drum(int n, double r) {
        SpaceShape.Station[] stations = new SpaceShape.Station[n / 2 + 1];
        for (int i = 0; i < stations.length; i++) {
            // Corners at angles π/n·(1 + 2i) or 2πi/n from aft, so that both sides have corners at the same x.
            double angle = n % 2 == 0 ? 2 * Math.PI * i / n : Math.PI / n * (1 + 2 * i);
            double y = r * Math.sin(angle);
            boolean tip = i == stations.length - 1 || (n % 2 == 0 && i == 0);
            double half = tip ? 0 : y;
            stations[i] = station(5 - r * Math.cos(angle), rectangle(1, -half, half, 0, 2));
        }
        return solid(stations);
    }

    @Test
    void islandByParallelAxesNotByPlainSubtraction() {
        // A rectangle 10 across, 6 along about (3, 5), with a square 2 × 2 standing about (4, 8) in it: everything
        // moves to the
        // common centroid. Areas 60 and 4, y = (60·5 − 4·8)/56.
        double y = (60 * 5 - 4 * 8) / 56.0;
        double x = (60 * 3 - 4 * 4) / 56.0;
        double transverse = 6 * 1000 / 12.0 + 60 * sq(5 - y) - (16 / 12.0 + 4 * sq(8 - y));
        double longitudinal = 10 * 216 / 12.0 + 60 * sq(3 - x) - (16 / 12.0 + 4 * sq(4 - x));
        Solid outer = Shapes.box(0, 6, 0, 10, 0, 4);
        Solid inner = Shapes.box(3, 5, 7, 9, 1, 3);
        Solid net = outer.minus(inner);
        assertSurface(surface(net, Attitude.UPRIGHT, 2), 56, x, y, transverse, longitudinal);
        // Under and over the island, and at its flat bottom from below, the whole rectangle; at its top from below the
        // island counts.
        assertSurface(surface(net, Attitude.UPRIGHT, 0.5), 60, 3, 5, 500, 180);
        assertSurface(surface(net, Attitude.UPRIGHT, 1), 60, 3, 5, 500, 180);
        assertSurface(surface(net, Attitude.UPRIGHT, 3), 56, x, y, transverse, longitudinal);
        assertSurface(surface(net, Attitude.UPRIGHT, 3.5), 60, 3, 5, 500, 180);
        assertClose(240 - 8, net.volume());
    }

    @Test
    void holeGivenAsALoop() {
        // A pipe duct right through: two strips 3 and 5 wide, 12 along.
        Solid solid = Shapes.prism(0, 12, rectangle(1, 0, 10, 0, 4), rectangle(2, 3, 5, 1, 3));
        double y = (3 * 1.5 + 5 * 7.5) / 8;
        double transverse = 12 * (27 + 125) / 12.0 + 36 * sq(1.5 - y) + 60 * sq(7.5 - y);
        assertSurface(surface(solid, Attitude.UPRIGHT, 2), 96, 6, y, transverse, 8 * 1728 / 12.0);
        assertClose(12 * (40 - 4), solid.volume());
    }

    @Test
    void somethingSolidInsideTheHole() {
        Solid solid =
                Shapes.prism(0, 12, rectangle(1, 0, 10, 0, 10), rectangle(2, 2, 8, 2, 8), rectangle(3, 4, 6, 4, 6));
        assertClose(12 * (100 - 36 + 4), solid.volume());
        assertClose(12 * (2 + 2 + 2), surface(solid, Attitude.UPRIGHT, 5).area());
        assertClose(
                12 * (3 * 8 / 12.0 + 2 * 2 * 16),
                surface(solid, Attitude.UPRIGHT, 5).transverse());
    }

    @Test
    void twoLegsOfAUCountAsOneSurface() {
        // Legs 2 wide about y = ±4, joined below z = 1: freely communicating, so about the common centroid.
        Solid solid = Shapes.prism(0, 6, loop(1, -5, 0, 5, 0, 5, 4, 3, 4, 3, 1, -3, 1, -3, 4, -5, 4));
        assertSurface(surface(solid, Attitude.UPRIGHT, 2), 24, 3, 0, 2 * (6 * 8 / 12.0 + 12 * 16), 4 * 216 / 12.0);
        assertSurface(surface(solid, Attitude.UPRIGHT, 0.5), 60, 3, 0, 6 * 1000 / 12.0, 10 * 216 / 12.0);
        assertClose(6 * (10 + 12), solid.volume());
    }

    @Test
    void severalLoopsCountAsOneSurface() {
        Solid solid = Shapes.prism(0, 6, rectangle(1, -5, -3, 0, 4), rectangle(2, 3, 5, 0, 4));
        assertSurface(surface(solid, Attitude.UPRIGHT, 2), 24, 3, 0, 2 * (4 + 12 * 16.0), 4 * 216 / 12.0);
    }

    @Test
    void jumpStation() {
        // 4 along and 10 across, then suddenly 6 across for 5 along.
        Solid solid = solid(
                station(0, rectangle(1, 0, 10, 0, 3)),
                station(4, rectangle(1, 0, 10, 0, 3)),
                station(4, rectangle(1, 0, 6, 0, 3)),
                station(9, rectangle(1, 0, 6, 0, 3)));
        double y = (40 * 5 + 30 * 3) / 70.0;
        double x = (40 * 2 + 30 * 6.5) / 70.0;
        assertSurface(
                surface(solid, Attitude.UPRIGHT, 1),
                70,
                x,
                y,
                4 * 1000 / 12.0 + 40 * sq(5 - y) + 5 * 216 / 12.0 + 30 * sq(3 - y),
                10 * 64 / 12.0 + 40 * sq(2 - x) + 6 * 125 / 12.0 + 30 * sq(6.5 - x));
        assertClose(210, solid.volume());
    }

    @Test
    void pyramidEnd() {
        // A section that shrinks to a point: the surface half way up the axis is a triangle with base 6 and height 9; V
        // = base·h/3.
        Solid pyramid = solid(station(0, rectangle(1, -3, 3, 0, 4)), station(9, rectangle(1, 0, 0, 2, 2)));
        assertClose(24 * 9 / 3.0, pyramid.volume());
        assertSurface(surface(pyramid, Attitude.UPRIGHT, 2), 27, 3, 0, 216 * 9 / 48.0, 6 * 729 / 36.0);
        Immersed lower = pyramid.below(Attitude.UPRIGHT, 2);
        assertClose(36, lower.volume());
        assertClose(9 / 4.0, lower.lcg());
    }

    @Test
    void bothEndsToALine() {
        // A lens: line, square, line. In plan a rhombus with diagonals 6 across and 10 along: d³·D/48 each way.
        Solid lens = solid(
                station(0, rectangle(1, 0, 0, 0, 4)),
                station(5, rectangle(1, -3, 3, 0, 4)),
                station(10, rectangle(1, 0, 0, 0, 4)));
        assertSurface(surface(lens, Attitude.UPRIGHT, 1), 30, 5, 0, 216 * 10 / 48.0, 1000 * 6 / 48.0);
    }

    @Test
    void nothingAtAndUnderTheBottomAtAndOverTheTop() {
        Solid box = Shapes.box(20, 32, -3, 4, 1, 5);
        for (double z0 : new double[] {-1e6, 0, 1}) {
            assertEquals(Immersed.NOTHING, box.below(Attitude.UPRIGHT, z0));
            assertEquals(0, box.volumeBelow(Attitude.UPRIGHT, z0), 0);
        }
        for (double z0 : new double[] {5, 6, 1e6}) {
            Immersed full = box.below(Attitude.UPRIGHT, z0);
            assertEquals(LiquidSurface.NONE, full.surface());
            assertClose(336, full.volume());
            assertClose(3, full.vcg());
            assertClose(26, full.lcg());
            assertClose(0.5, full.tcg());
            assertEquals(box.volume(), box.volumeBelow(Attitude.UPRIGHT, z0), 0);
        }
        assertClose(84, surface(box, Attitude.UPRIGHT, 5 - 1e-12).area());
        assertClose(84, surface(box, Attitude.UPRIGHT, 1 + 1e-12).area());
    }

    @Test
    void nothingAtTheTopThatLiesInTheSurface() {
        // The top slopes exactly as the surface does, rounding apart.
        double p = 0.013;
        Solid solid = solid(station(30, rectangle(1, -3, 4, 0, 5)), station(47, rectangle(1, -3, 4, 0, 5 - 17 * p)));
        Attitude attitude = new Attitude(p, 0);
        assertEquals(LiquidSurface.NONE, surface(solid, attitude, solid.highest(attitude)));
        assertEquals(
                solid.volume(), solid.below(attitude, solid.highest(attitude)).volume(), 0);
        assertEquals(Immersed.NOTHING, solid.below(attitude, solid.lowest(attitude)));
    }

    @Test
    void aSurfaceTooSmallToTellFromRoundingIsNone() {
        // A nanometre of air in the corner of a tilted box: the surface is some 1e-16 m², what is left when 84 m²
        // cancel.
        Solid box = Shapes.box(20, 32, -3, 4, 1, 5);
        Attitude attitude = new Attitude(0.02, 0.05);
        Immersed i = box.below(attitude, box.highest(attitude) - 1e-9);
        assertEquals(LiquidSurface.NONE, i.surface());
        assertClose(336, i.volume());
        // A tenth of a millimetre shows.
        double side = 1e-4;
        assertEquals(
                side / 0.02 * side / 0.05 / 2,
                surface(box, attitude, box.highest(attitude) - side).area() / Math.sqrt(1 + 0.0004 + 0.0025),
                1e-12);
    }

    @Test
    void aFlatStepTakesTheAreaJustBelow() {
        // A top-hat section: 10 wide under z = 2, 4 wide over it; and the other way up.
        Solid hat = Shapes.prism(0, 1, loop(1, -5, 0, 5, 0, 5, 2, 2, 2, 2, 4, -2, 4, -2, 2, -5, 2));
        assertClose(10, surface(hat, Attitude.UPRIGHT, 2).area());
        assertClose(4, surface(hat, Attitude.UPRIGHT, Math.nextUp(2.0)).area());
        Solid turned = Shapes.prism(0, 1, loop(1, -2, 0, 2, 0, 2, 2, 5, 2, 5, 4, -5, 4, -5, 2, -2, 2));
        assertClose(4, surface(turned, Attitude.UPRIGHT, 2).area());
        assertClose(10, surface(turned, Attitude.UPRIGHT, Math.nextUp(2.0)).area());
    }
}
