// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

import static org.brassbob.core.geometry.Shapes.loop;
import static org.brassbob.core.geometry.Shapes.rectangle;
import static org.brassbob.core.geometry.Shapes.solid;
import static org.brassbob.core.geometry.Shapes.station;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;

import java.time.Duration;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.brassbob.core.geometry.SpaceShape.Station;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** The surface for a volume: found to 1e-9 of the capacity, always, and soon. */
class HeightForTest {
    private static final double[] SHARES = {
        1e-15, 1e-12, 1e-9, 1e-6, 0.01, 0.3, 0.5, 0.77, 0.98, 1 - 1e-6, 1 - 1e-9, 1 - 1e-12
    };

    private static final List<Attitude> ATTITUDES = List.of(
            Attitude.UPRIGHT,
            Attitude.of(1.5, 84, 2),
            Attitude.of(-0.3, 84, -3),
            Attitude.of(0, 84, 80),
            Attitude.of(0, 84, -80),
            Attitude.of(84, 84, 0),
            Attitude.of(840, 84, 60),
            Attitude.of(-2, 84, 89.9));

    static Stream<Arguments> solids() {
        return Stream.of(
                Arguments.of("box", Shapes.box(20, 30, -3, 4, 0, 5)),
                Arguments.of("a millimetre deep", Shapes.box(20, 40, -8, 8, 1, 1.001)),
                Arguments.of("a millimetre wide", Shapes.box(20, 40, 3, 3.001, 0, 9)),
                Arguments.of("a millimetre long", Shapes.box(20, 20.001, -8, 8, 0, 9)),
                Arguments.of("the size of a thimble", Shapes.box(50, 50.02, 3, 3.02, 4, 4.02)),
                Arguments.of("a whole dock", Shapes.box(0, 400, -40, 40, 0, 30)),
                Arguments.of(
                        "flat step",
                        Shapes.prism(0, 9, loop(1, -5, 0, 5, 0, 5, 1, 0.01, 1, 0.01, 4, -0.01, 4, -0.01, 1, -5, 1))),
                Arguments.of(
                        "flat step, wide on top",
                        Shapes.prism(0, 9, loop(1, 0, 0, 0.01, 0, 0.01, 3, 9, 3, 9, 4, 0, 4))),
                Arguments.of("wedge", Shapes.prism(2, 7, loop(1, 0, 0, 3, 4, -3, 4))),
                Arguments.of("roof", Shapes.prism(2, 7, loop(1, 0, 4, -3, 0, 3, 0))),
                Arguments.of(
                        "pyramid", solid(station(0, rectangle(1, -3, 3, 0, 4)), station(9, rectangle(1, 0, 0, 2, 2)))),
                Arguments.of(
                        "two legs", Shapes.prism(0, 6, loop(1, -5, 0, 5, 0, 5, 4, 3, 4, 3, 1, -3, 1, -3, 4, -5, 4))),
                Arguments.of(
                        "two apart at different heights",
                        Shapes.prism(0, 6, rectangle(1, -5, -3, 0, 1), rectangle(2, 3, 5, 8, 9))),
                Arguments.of("stacked ledges", Shapes.prism(0, 6, ledges())),
                Arguments.of("island", Shapes.box(0, 9, 0, 9, 0, 9).minus(Shapes.box(1, 8, 1, 8, 1, 8))));
    }

    /** Ten ledges, each four times as wide as the one below. */
    private static SpaceShape.Loop ledges() {
        List<Double> up = new ArrayList<>();
        List<Double> down = new ArrayList<>();
        double half = 1e-5;
        for (int i = 0; i < 10; i++) {
            up.addAll(List.of(half, (double) i, half, i + 1.0));
            down.addAll(0, List.of(-half, i + 1.0, -half, (double) i));
            half *= 4;
        }
        up.addAll(down);
        return loop(1, up.stream().mapToDouble(Double::doubleValue).toArray());
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("solids")
    void heightIsFound(String name, Solid solid) {
        double capacity = solid.volume();
        for (Attitude attitude : ATTITUDES) {
            for (double share : SHARES) {
                double target = share * capacity;
                double z0 =
                        assertTimeoutPreemptively(Duration.ofSeconds(2), () -> solid.heightFor(attitude, target), name);
                assertEquals(target, solid.volumeBelow(attitude, z0), 1e-9 * capacity, () -> name + " " + attitude);
            }
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("solids")
    void emptyAndFullAreTheEnds(String name, Solid solid) {
        for (Attitude attitude : ATTITUDES) {
            double low = solid.lowest(attitude);
            double high = solid.highest(attitude);
            for (double none : new double[] {0, -1, Double.NEGATIVE_INFINITY}) {
                assertEquals(low, solid.heightFor(attitude, none), 0, name);
            }
            for (double all : new double[] {solid.volume(), 2 * solid.volume(), Double.POSITIVE_INFINITY}) {
                assertEquals(high, solid.heightFor(attitude, all), 0, name);
            }
            assertEquals(Immersed.NOTHING, solid.below(attitude, low));
            assertEquals(LiquidSurface.NONE, solid.below(attitude, high).surface());
            assertEquals(solid.volume(), solid.below(attitude, high).volume(), 0);
        }
    }

    @Test
    void randomSolidsAndAttitudes() {
        Random random = new Random(20);
        for (int trial = 0; trial < 300; trial++) {
            double[] a = random.doubles(6, 0.2, 5).toArray();
            Solid solid = solid(
                    station(10, rectangle(1, -a[0], a[1], 0, a[2])),
                    station(10 + a[3], rectangle(1, -a[4], a[4], 1, 1 + a[5])));
            Attitude attitude = Attitude.of(random.nextDouble() * 40 - 20, 84, random.nextDouble() * 178 - 89);
            double target = solid.volume() * random.nextDouble();
            double z0 = solid.heightFor(attitude, target);
            assertEquals(target, solid.volumeBelow(attitude, z0), 1e-11 * solid.volume());
        }
    }

    @Test
    void areaThatDoublesFromStepToStepTakesNoLonger() {
        // Area that doubles from ledge to ledge is Newton's worst case: each step gets past one of them.
        List<Station> stations = new ArrayList<>();
        for (int i = 0; i <= 36; i++) {
            stations.add(station(i, rectangle(1, 0, 1, -Math.pow(0.5, i), 0)));
        }
        Solid solid = solid(Shapes.shape(stations.toArray(new Station[0])));
        for (double share : SHARES) {
            double target = share * solid.volume();
            double z0 =
                    assertTimeoutPreemptively(Duration.ofSeconds(2), () -> solid.heightFor(Attitude.UPRIGHT, target));
            assertEquals(target, solid.volumeBelow(Attitude.UPRIGHT, z0), 1e-11 * solid.volume());
        }
    }

    @Test
    void aStepInTheSlopeIsMetExactly() {
        // Volume at the flat step: 10 × 1 × 9; above it the width falls from 10 to 0.02.
        Solid solid = Shapes.prism(0, 9, loop(1, -5, 0, 5, 0, 5, 1, 0.01, 1, 0.01, 4, -0.01, 4, -0.01, 1, -5, 1));
        assertEquals(1, solid.heightFor(Attitude.UPRIGHT, 90), 1e-9);
        assertEquals(0.5, solid.heightFor(Attitude.UPRIGHT, 45), 1e-12);
        assertEquals(2, solid.heightFor(Attitude.UPRIGHT, 90.18), 1e-9);
    }

    @Test
    void aVolumeThatIsNoNumberIsRefused() {
        Solid box = Shapes.box(0, 1, 0, 1, 0, 1);
        IllegalArgumentException e =
                assertThrows(IllegalArgumentException.class, () -> box.heightFor(Attitude.UPRIGHT, Double.NaN));
        assertEquals("no height for a volume that is not a number", e.getMessage());
    }

    @Test
    void cornerHeightsAscendEachOnce() {
        Solid box = Shapes.box(10, 20, 0, 4, 1, 3);
        assertEquals(List.of(1.0, 3.0), boxed(box.cornerHeights(Attitude.UPRIGHT)));
        assertEquals(
                List.of(1 + 10 * 0.5, 3 + 10 * 0.5, 1 + 20 * 0.5, 3 + 20 * 0.5),
                boxed(box.cornerHeights(new Attitude(0.5, 0))));
        assertEquals(List.of(-1.0, 1.0, 3.0), boxed(box.cornerHeights(new Attitude(0, 0.5))));
        assertEquals(-1, box.lowest(new Attitude(0, 0.5)), 0);
        assertEquals(3, box.highest(new Attitude(0, 0.5)), 0);
    }

    private static List<Double> boxed(double[] values) {
        return Arrays.stream(values).boxed().toList();
    }
}
