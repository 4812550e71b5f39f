// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import static org.brassbob.core.audit.Findings.show;

import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.SoundingTable;
import org.brassbob.core.table.SoundingTable.Argument;
import org.brassbob.core.vessel.Pipe;
import org.brassbob.core.vessel.Tank;
import org.jspecify.annotations.Nullable;

/** Holds a sounding table against the shape; without one, against itself along readings, trims and heels. */
final class SoundingCheck {
    /** MSC.1/Circ.1229 section 4: compartment volumes within 2 %. */
    private static final double CODE_TOLERANCE = 0.02;

    /** A tenth of a millimetre of reading or pipe, which files round to, moves the reference by so much surface (m). */
    private static final double READING_ROUNDING = 1e-9;

    private final Tank tank;
    private final SoundingTable table;
    private final Findings findings;

    private SoundingCheck(Tank tank, SoundingTable table, Findings findings) {
        this.tank = tank;
        this.table = table;
        this.findings = findings;
    }

    static void check(Tank tank, @Nullable NetShape shape, double lbp, Findings findings) {
        SoundingTable table = tank.soundings();
        if (table == null) {
            return;
        }
        SoundingCheck check = new SoundingCheck(tank, table, findings);
        check.rises();
        Pipe pipe = tank.pipe();
        if (shape != null && pipe != null) {
            check.againstShape(shape, pipe, lbp);
        } else {
            check.againstItself();
        }
    }

    private void rises() {
        double sign = table.argument() == Argument.SOUNDING ? 1 : -1;
        for (int t = 0; t < table.trims().size(); t++) {
            for (int h = 0; h < table.heels().size(); h++) {
                for (int r = 1; r < table.readings().size(); r++) {
                    double before = table.volume(table.node(r - 1, t, h));
                    double now = table.volume(table.node(r, t, h));
                    if (sign * (now - before) < 0) {
                        report(
                                table.node(r, t, h),
                                "volume must " + (sign > 0 ? "rise with the sounding" : "fall with the ullage"),
                                (sign > 0 ? "at least " : "at the most ") + show(before) + " m3");
                    }
                }
            }
        }
    }

    private void againstShape(NetShape shape, Pipe pipe, double lbp) {
        int nodes =
                table.readings().size() * table.trims().size() * table.heels().size();
        double[] volumes = new double[nodes];
        double[] reference = new double[nodes];
        for (int t = 0; t < table.trims().size(); t++) {
            for (int h = 0; h < table.heels().size(); h++) {
                Attitude attitude =
                        Attitude.of(table.trims().value(t), lbp, table.heels().value(h));
                for (int r = 0; r < table.readings().size(); r++) {
                    double reading = table.readings().value(r);
                    double sounding = table.argument() == Argument.SOUNDING ? reading : pipe.complement(reading);
                    int node = table.node(r, t, h);
                    volumes[node] = table.volume(node);
                    reference[node] = shape.volumeBelow(
                            attitude, attitude.heightThrough(pipe.x(), pipe.y(), pipe.footZ() + sounding));
                }
            }
        }
        Residuals residuals = Residuals.of(volumes, reference, READING_ROUNDING);
        for (int node = 0; node < nodes; node++) {
            if (residuals.standsOut(node)) {
                report(node, "volume against the shape", show(reference[node]) + " m3");
            }
        }
        if (residuals.usual() > CODE_TOLERANCE * tank.capacity()) {
            findings.error(
                    table.origin(),
                    0,
                    "the whole table of " + tank.id() + " against the shape",
                    "differs by " + show(residuals.usual()) + " m3 and more",
                    "within 2 % of capacity (MSC.1/Circ.1229)");
        }
    }

    private void againstItself() {
        for (int t = 0; t < table.trims().size(); t++) {
            for (int h = 0; h < table.heels().size(); h++) {
                int trim = t;
                int heel = h;
                along(table.readings(), r -> table.node(r, trim, heel));
            }
            for (int r = 0; r < table.readings().size(); r++) {
                int trim = t;
                int reading = r;
                along(table.heels(), h -> table.node(reading, trim, h));
            }
        }
        for (int h = 0; h < table.heels().size(); h++) {
            for (int r = 0; r < table.readings().size(); r++) {
                int heel = h;
                int reading = r;
                along(table.trims(), t -> table.node(reading, t, heel));
            }
        }
    }

    private interface Line {
        int node(int i);
    }

    private void along(Axis axis, Line line) {
        double[] x = new double[axis.size()];
        double[] y = new double[axis.size()];
        for (int i = 0; i < x.length; i++) {
            x[i] = axis.value(i);
            y[i] = table.volume(line.node(i));
        }
        double[] errors = Series.errors(x, y);
        for (int i = 0; i < errors.length; i++) {
            if (errors[i] != 0) {
                findings.doubt(
                        Math.abs(errors[i]) > CODE_TOLERANCE * tank.capacity(),
                        table.origin(),
                        line.node(i),
                        "volume out of line with its neighbours",
                        show(y[i]) + " m3",
                        "about " + show(y[i] - errors[i]) + " m3");
            }
        }
    }

    private void report(int node, String what, String expected) {
        findings.error(table.origin(), node, what, show(table.volume(node)) + " m3", expected);
    }
}
