// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.brassbob.core.geometry.ShapeException;
import org.brassbob.core.geometry.Solid;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.geometry.SpaceShape.Loop;
import org.brassbob.core.geometry.SpaceShape.Point;
import org.brassbob.core.geometry.SpaceShape.Station;
import org.brassbob.core.table.Origin;

/**
 * A shape file. Rows of one loop stand together; a loop number that comes again at the same x begins the second of two stations there
 * (a jump of the section). Where the rows of both follow each other with nothing between, {@link JumpSplitter} finds the seam.
 */
final class ShapeCsv {
    private static final Columns COLUMNS = Columns.of(List.of("x_m", "loop", "y_m", "z_m"));

    /** More points than any tank or hull has; guards the check of crossing edges, whose time goes with the square. */
    private static final int MOST_POINTS_IN_LOOP = 2000;

    private final List<Station> stations = new ArrayList<>();
    private final List<Integer> lines = new ArrayList<>();
    private List<Loop> loops = new ArrayList<>();
    private List<Point> points = new ArrayList<>();
    private double x = Double.NaN;
    private int loop;

    private ShapeCsv() {}

    static Optional<SpaceShape> read(String file, byte[] bytes, Problems problems) {
        return CsvTable.read(file, bytes, COLUMNS, problems).flatMap(csv -> new ShapeCsv().shape(csv, problems));
    }

    private Optional<SpaceShape> shape(CsvTable csv, Problems problems) {
        int before = problems.count();
        for (Row row : csv.rows()) {
            double rowX = row.number("x_m", -100, 700);
            int rowLoop = row.whole("loop", 0, 1000);
            Point point = new Point(row.number("y_m", -60, 60), row.number("z_m", -10, 100));
            take(row, rowX, rowLoop, point);
        }
        endStation();
        if (problems.count() > before) {
            return Optional.empty();
        }
        JumpSplitter.split(stations, lines);
        SpaceShape shape = new SpaceShape(
                stations, Origin.of(csv.file(), lines.stream().mapToInt(i -> i).toArray()));
        try {
            Solid.of(shape);
            return Optional.of(shape);
        } catch (ShapeException e) {
            int line = shape.origin().line(e.station());
            problems.add(csv.file(), line == 0 ? csv.headerLine() : line, e.getMessage());
            return Optional.empty();
        }
    }

    private void take(Row row, double rowX, int rowLoop, Point point) {
        boolean sameStation = !points.isEmpty() && rowX == x;
        if (!sameStation) {
            endStation();
            lines.add(row.line());
        } else if (rowLoop != loop) {
            endLoop();
            if (loops.stream().anyMatch(l -> l.number() == rowLoop)) {
                endStation();
                lines.add(row.line());
            }
        }
        x = rowX;
        loop = rowLoop;
        points.add(point);
        if (points.size() == MOST_POINTS_IN_LOOP + 1) {
            row.problem("more than " + MOST_POINTS_IN_LOOP + " points in a loop; expected fewer");
        }
    }

    private void endLoop() {
        if (!points.isEmpty()) {
            loops.add(new Loop(loop, points));
            points = new ArrayList<>();
        }
    }

    private void endStation() {
        endLoop();
        if (!loops.isEmpty()) {
            stations.add(new Station(x, loops));
            loops = new ArrayList<>();
        }
    }
}
