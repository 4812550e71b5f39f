// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import org.brassbob.bench.RandomTanks;
import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.Bounds;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.table.SoundingTable;
import org.brassbob.core.table.VolumeTable;
import org.brassbob.core.vessel.Tank;
import org.brassbob.fixture.Shapes;
import org.brassbob.fixture.TankBuilder;

/** What holds for the tables of every tank: random ruled spaces of 6 to 12 stations with 8 to 16 points each. */
class TabulateProperties {
    @Provide
    Arbitrary<RandomTanks.Drawn> tanks() {
        return Arbitraries.longs().map(seed -> RandomTanks.draw(new Random(seed)));
    }

    private static NetShape net(RandomTanks.Drawn drawn, double steel) {
        return new NetShape(Shapes.solid(drawn.shape()), steel);
    }

    @Property(tries = 40)
    void volumesRiseWithTheSoundingAndStayWithinCapacity(
            @ForAll("tanks") RandomTanks.Drawn drawn, @ForAll @Scale(3) @DoubleRange(min = 0, max = 5) double steel) {
        NetShape shape = net(drawn, steel);
        Tank tank = TankBuilder.shaped("t", drawn.shape())
                .pipe(
                        drawn.pipe().x(),
                        drawn.pipe().y(),
                        drawn.pipe().footZ(),
                        drawn.pipe().length())
                .build();
        SoundingTable table = new CalibrationMaker(TankBuilder.LBP, CalibrationGrid.USUAL)
                .soundings(tank, shape)
                .orElseThrow();
        for (int t = 0; t < table.trims().size(); t++) {
            for (int h = 0; h < table.heels().size(); h++) {
                double before = 0;
                for (int r = 0; r < table.readings().size(); r++) {
                    double volume = table.volume(table.node(r, t, h));
                    assertTrue(volume >= before - 1e-12 * shape.capacity());
                    assertTrue(litres(volume) >= litres(before), "as the file has it");
                    before = volume;
                }
                assertTrue(before <= shape.capacity());
            }
        }
    }

    /** To the file's three decimals. */
    private static long litres(double volume) {
        return Math.round(volume * 1000);
    }

    /** Between two rows the moment about the baseline grows by the volume times a height between the two levels: d(V·vcg) = z·dV. */
    @Property(tries = 40)
    void centroidsAreTheIntegralOfTheLevel(@ForAll("tanks") RandomTanks.Drawn drawn) {
        NetShape shape = net(drawn, 0);
        VolumeTable table = VolumeTableMaker.of(shape, "t");
        for (int i = 1; i < table.volumes().size() - 1; i++) {
            double below = table.volumes().value(i - 1);
            double above = table.volumes().value(i);
            double slice = above - below;
            double moment =
                    above * table.row(i).vcg() - below * table.row(i - 1).vcg();
            assertTrue(moment >= slice * shape.heightFor(Attitude.UPRIGHT, below) - 1e-9 * shape.capacity());
            assertTrue(moment <= slice * shape.heightFor(Attitude.UPRIGHT, above) + 1e-9 * shape.capacity());
        }
    }

    @Property(tries = 40)
    void rowsAscendFromNothingToCapacityWithCentroidsInsideTheBox(@ForAll("tanks") RandomTanks.Drawn drawn) {
        NetShape shape = net(drawn, 0);
        VolumeTable table = VolumeTableMaker.of(shape, "t");
        Bounds box = shape.solid().bounds();
        assertEquals(0, table.volumes().first());
        assertEquals(shape.capacity(), table.volumes().last(), 5.01e-4);
        double widest = Math.pow(box.maxY() - box.minY(), 3) * (box.maxX() - box.minX()) / 12;
        for (int i = 0; i < table.volumes().size(); i++) {
            VolumeTable.Entry e = table.row(i);
            assertTrue(e.lcg() >= box.minX() && e.lcg() <= box.maxX());
            assertTrue(e.tcg() >= box.minY() && e.tcg() <= box.maxY());
            assertTrue(e.vcg() >= box.minZ() && e.vcg() <= box.maxZ());
            assertTrue(e.secondMoment() >= 0 && e.secondMoment() <= widest);
            assertTrue(i == 0 || e.vcg() >= table.row(i - 1).vcg() - 1e-9, "the centroid rises");
        }
    }
}
