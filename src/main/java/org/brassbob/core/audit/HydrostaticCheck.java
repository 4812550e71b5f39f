// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import static org.brassbob.core.audit.Findings.show;

import java.util.List;
import java.util.function.ToDoubleFunction;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.table.HydrostaticTable.Entry;
import org.brassbob.core.table.HydrostaticTable.Rows;
import org.brassbob.core.tabulate.HullTables;
import org.brassbob.core.tabulate.HydrostaticMaker;
import org.brassbob.core.vessel.Vessel;

/**
 * Holds the hydrostatic table against the hull; without one, against itself: dΔ = 100·TPC·dT, d(Δ·LCB) = LCF·dΔ, d(Δ·KB) = T·dΔ, and
 * every column smooth.
 */
final class HydrostaticCheck {
    private static final String[] NAMES = {
        "draught_m", "displacement_t", "lcb_m", "lcf_m", "kmt_m", "mct_tm_per_cm", "tpc_t_per_cm", "kb_m"
    };
    private static final List<ToDoubleFunction<Entry>> COLUMNS = List.of(
            Entry::draught, Entry::displacement, Entry::lcb, Entry::lcf, Entry::kmt, Entry::mct, Entry::tpc, Entry::kb);

    private final Rows rows;
    private final double trim;
    private final Findings findings;

    private HydrostaticCheck(Rows rows, double trim, Findings findings) {
        this.rows = rows;
        this.trim = trim;
        this.findings = findings;
    }

    static void check(Vessel vessel, Findings findings) {
        HydrostaticTable table = vessel.hydrostatics();
        if (table == null) {
            return;
        }
        SpaceShape hull = vessel.hull();
        for (int t = 0; t < table.trims().size(); t++) {
            HydrostaticCheck check =
                    new HydrostaticCheck(table.rows(t), table.trims().value(t), findings);
            if (hull == null) {
                check.againstItself();
            } else {
                check.againstHull(new HydrostaticMaker(
                        HullTables.bothSides(hull),
                        vessel.seaDensity(),
                        vessel.particulars().lbp()));
            }
            check.reaches(vessel);
        }
    }

    private double[] column(ToDoubleFunction<Entry> part) {
        return rows.entries().stream().mapToDouble(part).toArray();
    }

    private void againstHull(HydrostaticMaker maker) {
        List<Entry> entries = rows.entries();
        Entry[] exact =
                entries.stream().map(e -> maker.entry(e.draught(), trim)).toArray(Entry[]::new);
        for (int c = 1; c < COLUMNS.size(); c++) {
            double[] own = column(COLUMNS.get(c));
            if (Double.isNaN(own[0])) {
                continue;
            }
            double[] reference = new double[own.length];
            for (int i = 0; i < own.length; i++) {
                reference[i] = COLUMNS.get(c).applyAsDouble(exact[i]);
            }
            Residuals residuals = Residuals.of(own, reference, 1e-6);
            for (int i = 0; i < own.length; i++) {
                if (residuals.standsOut(i)) {
                    report(
                            i,
                            NAMES[c] + " against the hull, at draught "
                                    + show(entries.get(i).draught()) + " m",
                            own[i],
                            show(reference[i]));
                }
            }
        }
    }

    private void againstItself() {
        double[] draughts = column(Entry::draught);
        for (int c = 1; c < COLUMNS.size(); c++) {
            double[] own = column(COLUMNS.get(c));
            if (Double.isNaN(own[0])) {
                continue;
            }
            double[] errors = Series.errors(draughts, own);
            for (int i = 0; i < errors.length; i++) {
                if (errors[i] != 0) {
                    report(
                            i,
                            NAMES[c] + " out of line with its neighbours",
                            own[i],
                            "about " + show(own[i] - errors[i]));
                }
            }
        }
        for (int i = 1; i < draughts.length; i++) {
            steps(i);
        }
    }

    /** The mean of a column over a step lies near the mean of its ends; how near, the column's own change over the step tells. */
    private void steps(int i) {
        Entry low = rows.entries().get(i - 1);
        Entry high = rows.entries().get(i);
        double step = high.displacement() - low.displacement();
        double tpc = step / (100 * (high.draught() - low.draught()));
        within(i, "TPC over the step of displacement", tpc, low.tpc(), high.tpc(), 2e-3);
        double layerX = (high.displacement() * high.lcb() - low.displacement() * low.lcb()) / step;
        double rounding = 1e-4 * (high.displacement() + low.displacement()) / step;
        within(i, "LCF over the step of LCB", layerX, low.lcf(), high.lcf(), rounding + 2e-3);
        double layerZ = (high.displacement() * high.kb() - low.displacement() * low.kb()) / step;
        within(i, "draught over the step of KB", layerZ, low.draught(), high.draught(), rounding + 2e-3);
    }

    private void within(int row, String what, double value, double a, double b, double rounding) {
        double reach = 0.1 * Math.abs(b - a) + rounding;
        boolean outside = value < Math.min(a, b) - reach || value > Math.max(a, b) + reach;
        if (outside) {
            report(row, what, value, show(Math.min(a, b)) + " to " + show(Math.max(a, b)));
        }
    }

    private void reaches(Vessel vessel) {
        double light = vessel.lightship().mass();
        if (rows.displacements().first() > light) {
            findings.warning(
                    rows.origin(),
                    0,
                    "first displacement",
                    show(rows.displacements().first()) + " t",
                    "at the most the light ship of " + show(light) + " t");
        }
        double summer = vessel.particulars().summerDraught();
        if (rows.draughts().last() < summer) {
            findings.warning(
                    rows.origin(),
                    rows.entries().size() - 1,
                    "last draught",
                    show(rows.draughts().last()) + " m",
                    "at least the summer draught of " + show(summer) + " m");
        }
    }

    private void report(int row, String what, double figure, String expected) {
        findings.error(rows.origin(), row, what, show(figure), expected);
    }
}
