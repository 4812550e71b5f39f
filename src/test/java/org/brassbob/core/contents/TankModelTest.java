// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.contents;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.brassbob.core.table.SoundingTable.Argument;
import org.brassbob.core.table.VolumeTable;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.fixture.Shapes;
import org.brassbob.fixture.ShipBuilder;
import org.brassbob.fixture.Tables;
import org.brassbob.fixture.TankBuilder;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class TankModelTest {
    /** product.md rule 2 and 2008 IS Code part B 3.1.2: empty up to the residue, full from 98 % of capacity. */
    @ParameterizedTest
    @CsvSource({"0, EMPTY", "4.999, EMPTY", "5, EMPTY", "5.000001, SLACK", "489.99, SLACK", "490, FULL", "500, FULL"})
    void statesMeetAtTheResidueAndAt98PerCent(double volume, TankState state) {
        TankModel model = TankBuilder.box("t", 40, 50, -5, 5, 0, 5).residue(5).model();
        assertEquals(state, model.stateOf(volume));
    }

    @Test
    void contentsOfABoxInClosedForm() {
        TankModel model = TankBuilder.box("t", 40, 50, 1, 7, 2, 7).model();
        VolumeTable.Entry half = model.contents(150, 0);
        assertEquals(45, half.lcg(), 1e-9);
        assertEquals(4, half.tcg(), 1e-9);
        assertEquals(3.25, half.vcg(), 1e-9);
        assertEquals(10 * 216 / 12.0, half.secondMoment(), 1e-8);
        // By the stern the centroid goes aft by i/V·tan ψ and up by half of that times tan ψ (closed form, wall-sided).
        VolumeTable.Entry trimmed = model.contents(150, 2);
        double shift = 6 * 1000 / 12.0 / 150 * 0.02;
        assertEquals(45 - shift, trimmed.lcg(), 1e-9);
        assertEquals(3.25 + shift * 0.02 / 2, trimmed.vcg(), 1e-9);
    }

    @Test
    void nothingAndEverythingHaveACentroidToo() {
        TankModel model = TankBuilder.box("t", 40, 50, 1, 7, 2, 7).model();
        assertEquals(2, model.contents(0, 0).vcg(), 1e-5);
        assertEquals(45, model.contents(0, 0).lcg(), 1e-9);
        assertEquals(4.5, model.contents(300, 0).vcg(), 1e-12);
        assertEquals(4.5, model.contents(300, 1.7).vcg(), 1e-12);
    }

    @Test
    void tableIsReadWhereThereIsOne() {
        VolumeTable table = Tables.volumes(
                new double[] {0, 100, 200},
                new double[] {40, 42, 43},
                new double[] {1, 2, 4},
                new double[] {0, 1, 3},
                new double[] {10, 30, 20});
        TankModel model =
                TankBuilder.box("t", 40, 50, 1, 7, 2, 7).volumes(table).model();
        VolumeTable.Entry entry = model.contents(150, 1);
        assertEquals(42.5, entry.lcg(), 1e-12);
        assertEquals(3, entry.tcg(), 1e-12);
        assertEquals(2, entry.vcg(), 1e-12);
        assertEquals(25, entry.secondMoment(), 1e-12);
    }

    @Test
    void surfaceOfATableReadFromABoxIsTheBoxes() {
        TankModel shaped = TankBuilder.box("t", 40, 50, 1, 7, 2, 7).model();
        TankModel tabled = TankBuilder.tabled("t", Tables.volumesOf(Shapes.net(Shapes.box(40, 50, 1, 7, 2, 7)), 5))
                .model();
        for (double volume : new double[] {1, 40, 150, 290}) {
            assertEquals(
                    shaped.contents(volume, 0).vcg(), tabled.contents(volume, 0).vcg(), 1e-5);
            assertEquals(
                    shaped.contents(volume, 0).secondMoment(),
                    tabled.contents(volume, 0).secondMoment(),
                    1e-6);
        }
    }

    @Test
    void whatCanBeReadHow() {
        TankBuilder remote = TankBuilder.tabled("t", Tables.constant(400, 50, 0, 3, 10));
        assertFalse(remote.model().canBeSounded());
        assertFalse(remote.model().canBeUllaged());
        TankBuilder shape = TankBuilder.box("t", 40, 50, 1, 7, 2, 7);
        assertTrue(shape.model().canBeSounded());
        assertTrue(shape.model().canBeUllaged());
        assertFalse(shape.withoutPipe().model().canBeSounded());
        remote.soundings(Tables.soundings(Argument.ULLAGE, new double[] {0, 4}, new double[] {400, 0}));
        assertFalse(remote.model().canBeSounded());
        assertTrue(remote.model().canBeUllaged());
        assertTrue(remote.pipe(50, 0, 0, 4).model().canBeSounded());
    }

    @Test
    void brimIsWhereThePipeOrTheTableEnds() {
        TankBuilder tabled = TankBuilder.tabled("t", Tables.constant(400, 50, 0, 3, 10));
        tabled.soundings(Tables.soundings(new double[] {0, 4}, new double[] {0, 400}));
        assertEquals(4, tabled.model().brim(), 0);
        assertEquals(3.8, tabled.pipe(50, 0, 0, 3.8).model().brim(), 0);
        tabled.soundings(Tables.soundings(Argument.ULLAGE, new double[] {0.3, 3.8}, new double[] {400, 0}));
        assertEquals(3.5, tabled.model().brim(), 1e-12);
        assertEquals(5, TankBuilder.box("t", 40, 50, 1, 7, 2, 7).model().brim(), 0);
    }

    @Test
    void tankOfNothingIsRefused() {
        Tank bare = TankBuilder.tank("t").capacity(10).build();
        assertThrows(IllegalArgumentException.class, () -> new TankModel(bare, null, 100));
        TankModel tabled =
                TankBuilder.tabled("t", Tables.constant(400, 50, 0, 3, 10)).model();
        assertThrows(IllegalStateException.class, () -> tabled.volumeAtSounding(1, 0, 0));
    }

    @Test
    void tanksInsideTanksAreTakenOut() {
        Vessel vessel = ShipBuilder.ship()
                .tanks(
                        TankBuilder.box("outer", 40, 50, -6, 6, 1, 6)
                                .encloses("inner")
                                .steelPct(2),
                        TankBuilder.box("inner", 43, 47, -2, 3, 3, 5))
                .build();
        TankShapes shapes = TankShapes.of(vessel);
        assertEquals(0.98 * (600 - 40), shapes.net("outer").orElseThrow().capacity(), 1e-9);
        assertEquals(40, shapes.net("inner").orElseThrow().capacity(), 1e-9);
        assertEquals(600, shapes.moulded("outer").orElseThrow().volume(), 1e-9);
        assertTrue(shapes.net("nowhere").isEmpty());
        assertTrue(shapes.moulded("nowhere").isEmpty());
    }

    @Test
    void shapesThatAreNoSolidAreRefusedByName() {
        Vessel crossed = ShipBuilder.ship()
                .tanks(TankBuilder.tank("bow-tie").capacity(1).shape(Shapes.prism(0, 1, 0, 0, 2, 2, 2, 0, 0, 2)))
                .build();
        Exception e = assertThrows(IllegalArgumentException.class, () -> TankShapes.of(crossed));
        assertTrue(String.valueOf(e.getMessage()).startsWith("tank bow-tie: "), e::toString);
        Vessel unshaped = ShipBuilder.ship()
                .tanks(
                        TankBuilder.box("outer", 40, 50, -6, 6, 1, 6).encloses("inner"),
                        TankBuilder.tabled("inner", Tables.constant(10, 45, 0, 3, 1)))
                .build();
        Exception missing = assertThrows(IllegalArgumentException.class, () -> TankShapes.of(unshaped));
        assertEquals("tank outer encloses inner, which has no shape", missing.getMessage());
    }
}
