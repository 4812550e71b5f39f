// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.table;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.table.CrossCurves.Row;
import org.brassbob.core.table.LimitCurve.Kind;
import org.brassbob.core.table.VolumeTable.Entry;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Volume table, limit curve, cross curves and where rows came from. */
class ColumnTablesTest {
    private static final Origin ORIGIN = Origin.of("x.csv", 2, 4, 5);

    private final VolumeTable volumes = VolumeTable.of(
            Axis.of(0, 10, 30),
            new double[] {40, 41, 42},
            new double[] {-1, 0, 3},
            new double[] {0.5, 1.0, 2.0},
            new double[] {0, 100, 60},
            ORIGIN);

    @ParameterizedTest
    @CsvSource({
        "-1, 40, -1, 0.5, 0",
        "0, 40, -1, 0.5, 0",
        "5, 40.5, -0.5, 0.75, 50",
        "10, 41, 0, 1, 100",
        "15, 41.25, 0.75, 1.25, 90",
        "30, 42, 3, 2, 60",
        "31, 42, 3, 2, 60"
    })
    void volumeTable(double volume, double lcg, double tcg, double vcg, double secondMoment) {
        Entry e = volumes.at(volume);
        assertEquals(lcg, e.lcg(), 1e-12);
        assertEquals(tcg, e.tcg(), 1e-12);
        assertEquals(vcg, e.vcg(), 1e-12);
        assertEquals(secondMoment, e.secondMoment(), 1e-12);
    }

    @Test
    void volumeTableRows() {
        assertEquals(new Entry(41, 0, 1, 100), volumes.row(1));
        assertEquals(3, volumes.volumes().size());
        assertSame(ORIGIN, volumes.origin());
    }

    @Test
    void volumeTableOfOneRow() {
        double[] one = {1};
        VolumeTable table = VolumeTable.of(Axis.of(7), one, one, one, one, ORIGIN);
        for (double v : new double[] {0, 7, 9}) {
            assertEquals(new Entry(1, 1, 1, 1), table.at(v));
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 1, 2, 3})
    void volumeTableColumnsAreAsLong(int shortened) {
        List<double[]> columns = new ArrayList<>();
        for (int i = 0; i < 4; i++) {
            columns.add(new double[i == shortened ? 1 : 2]);
        }
        IllegalArgumentException e = assertThrows(
                IllegalArgumentException.class,
                () -> VolumeTable.of(
                        Axis.of(0, 1), columns.get(0), columns.get(1), columns.get(2), columns.get(3), ORIGIN));
        assertEquals("the columns of x.csv differ in length", e.getMessage());
    }

    @ParameterizedTest
    @CsvSource({"1999, 0.15", "2000, 0.15", "2500, 0.20", "3000, 0.25", "3250, 0.325", "4000, 0.55", "4001, 0.55"})
    void limitOfGm(double displacement, double gm) {
        LimitCurve curve = limit(Kind.GM_REQUIRED, 0.15, 0.25, 0.55);
        assertEquals(gm, curve.at(displacement), 1e-12);
        assertEquals(gm, curve.requiredGm(displacement, 8), 1e-12);
    }

    @Test
    void limitOfKgIsTakenFromKm() {
        LimitCurve curve = limit(Kind.KG_LIMIT, 6.5, 6.4, 6.2);
        assertEquals(7.0 - 6.45, curve.requiredGm(2500, 7.0), 1e-12);
        assertEquals(6.45, curve.at(2500), 1e-12);
        assertEquals("intact", curve.name());
        assertSame(Kind.KG_LIMIT, curve.kind());
        assertEquals(6.4, curve.value(1), 0);
        assertEquals(3000, curve.displacements().value(1), 0);
        assertSame(ORIGIN, curve.origin());
    }

    @Test
    void limitColumnsAreAsLong() {
        IllegalArgumentException e = assertThrows(
                IllegalArgumentException.class,
                () -> LimitCurve.of("a", Kind.KG_LIMIT, Axis.of(1, 2), new double[] {1}, ORIGIN));
        assertEquals("the columns of x.csv differ in length", e.getMessage());
    }

    private static LimitCurve limit(Kind kind, double... values) {
        return LimitCurve.of("intact", kind, Axis.of(2000, 3000, 4000), values, ORIGIN);
    }

    @ParameterizedTest
    @CsvSource({
        "900, 0, 1.0",
        "1000, 0, 1.0",
        "1000, 1, 2.0",
        "1500, 0, 0.95",
        "1500, 1, 2.05",
        "2000, 0, 0.9",
        "2000, 1, 2.1",
        "2500, 1, 2.0",
        "3000, 1, 1.9",
        "3100, 0, 0.8"
    })
    void crossCurves(double displacement, int heel, double kn) {
        assertEquals(kn, curves().kn(displacement, heel), 1e-12);
    }

    @Test
    void crossCurvesKeepTheirRows() {
        CrossCurves curves = curves();
        assertEquals(3, curves.displacements().size());
        assertEquals(20, curves.heels().value(1), 0);
        assertEquals(41.0, curves.rows().get(0).floodingDeg());
        assertEquals(300.0, curves.rows().get(0).windArea());
        assertEquals(5.5, curves.rows().get(0).windLever());
        assertSame(ORIGIN, curves.origin());
    }

    @Test
    void crossCurvesNeedAFigureForEachHeel() {
        List<Row> rows = List.of(new Row(1, List.of(1.0), null, null, null));
        IllegalArgumentException e =
                assertThrows(IllegalArgumentException.class, () -> CrossCurves.of(Axis.of(10, 20), rows, ORIGIN));
        assertEquals("each row of x.csv needs a KN for each heel", e.getMessage());
    }

    @Test
    void crossCurvesAscend() {
        List<Row> rows =
                List.of(new Row(2, List.of(1.0), null, null, null), new Row(1, List.of(1.0), null, null, null));
        assertThrows(IllegalArgumentException.class, () -> CrossCurves.of(Axis.of(10), rows, ORIGIN));
    }

    private static CrossCurves curves() {
        return CrossCurves.of(
                Axis.of(10, 20),
                List.of(
                        new Row(1000, List.of(1.0, 2.0), 41.0, 300.0, 5.5),
                        new Row(2000, List.of(0.9, 2.1), null, null, null),
                        new Row(3000, List.of(0.8, 1.9), null, null, null)),
                ORIGIN);
    }

    @Test
    void originsNameTheLine() {
        assertEquals("x.csv:2", ORIGIN.at(0));
        assertEquals("x.csv:5", ORIGIN.at(2));
        assertEquals("x.csv", ORIGIN.at(3));
        assertEquals("x.csv", ORIGIN.at(-1));
        assertEquals(0, ORIGIN.line(3));
        assertEquals(0, ORIGIN.line(-1));
        assertEquals("x.csv", ORIGIN.file());
        assertEquals("x.csv", ORIGIN.toString());
        assertEquals("worked out", Origin.computed("worked out").at(0));
        int[] lines = {3};
        Origin own = Origin.of("y.csv", lines);
        lines[0] = 8;
        assertEquals(3, own.line(0));
    }
}
