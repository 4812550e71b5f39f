// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import static org.brassbob.core.audit.Findings.show;

import java.util.Arrays;
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

    /** MSC.1/Circ.1229 section 4: displacement and moments within 2 %. */
    private static final double CODE_TOLERANCE = 0.02;

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
        double[] displacements = column(Entry::displacement);
        for (int c = 1; c < COLUMNS.size(); c++) {
            double[] own = column(COLUMNS.get(c));
            // Where a transom meets the water, the waterplane jumps: LCF and TPC are held to their integrals alone.
            boolean jumps = NAMES[c].equals("lcf_m") || NAMES[c].equals("tpc_t_per_cm");
            if (!jumps && !Double.isNaN(own[0])) {
                smooth(c, draughts, displacements, own);
            }
        }
        double[] tpc = column(Entry::tpc);
        double[] lcf = column(Entry::lcf);
        double[] flotation = new double[tpc.length];
        double[] levels = new double[tpc.length];
        for (int i = 0; i < tpc.length; i++) {
            flotation[i] = tpc[i] * lcf[i];
            levels[i] = tpc[i] * draughts[i];
        }
        integral("displacement_t and tpc_t_per_cm", tpc, displacements);
        integral("lcb_m, lcf_m and displacement_t", flotation, times(displacements, column(Entry::lcb)));
        integral("kb_m and displacement_t", levels, times(displacements, column(Entry::kb)));
    }

    private static double[] times(double[] a, double[] b) {
        double[] product = new double[a.length];
        for (int i = 0; i < a.length; i++) {
            product[i] = a[i] * b[i];
        }
        return product;
    }

    /** KM grows without bound at small draughts; times displacement it is smooth. */
    private void smooth(int c, double[] draughts, double[] displacements, double[] own) {
        boolean km = NAMES[c].equals("kmt_m");
        double unit = Math.min(0.001, Precision.of(own)) * (km ? displacements[displacements.length / 2] : 1);
        double[] errors = Smooth.errors(draughts, km ? times(displacements, own) : own, unit);
        for (int i = 0; i < errors.length; i++) {
            if (errors[i] != 0) {
                double error = km ? errors[i] / displacements[i] : errors[i];
                findings.doubt(
                        Math.abs(error) > tolerance(c, own[i]),
                        rows.origin(),
                        i,
                        NAMES[c] + " out of line with its neighbours",
                        show(own[i]),
                        "about " + show(own[i] - error));
            }
        }
    }

    /**
     * What a column gains over two steps is 100 times the integral of another (Simpson's first rule; the steps must be even). Where one
     * gain misses by far more than the others, a cell of the two columns is wrong there.
     */
    private void integral(String what, double[] rate, double[] sum) {
        int n = rate.length - 2;
        // With trim, the draught at the centre of flotation rises by less than the ship: the integrals have one term
        // more.
        if (n < 6 || Double.isNaN(sum[0]) || trim != 0 || !isEven()) {
            return;
        }
        double step = rows.draughts().value(1) - rows.draughts().value(0);
        double[] misses = new double[n];
        double[] sizes = new double[n];
        for (int i = 0; i < n; i++) {
            double gain = 100 * step / 3 * (rate[i] + 4 * rate[i + 1] + rate[i + 2]);
            misses[i] = (sum[i + 2] - sum[i]) - gain;
            sizes[i] = Math.abs(misses[i]);
        }
        Arrays.sort(sizes);
        double usual = sizes[n / 2];
        double scale =
                1e-4 * Math.abs(sum[rate.length / 2]) / rows.displacements().value(rate.length / 2);
        for (int i = 0; i < n; i++) {
            if (Math.abs(misses[i]) > 12 * usual + scale) {
                double gain = Math.abs(sum[i + 2] - sum[i]);
                findings.doubt(
                        Math.abs(misses[i]) > CODE_TOLERANCE * gain,
                        rows.origin(),
                        i + 1,
                        what + " against each other over the steps about draught "
                                + show(rows.draughts().value(i + 1)) + " m",
                        show(misses[i]),
                        "0 within " + show(12 * usual + scale));
            }
        }
    }

    /** MSC.1/Circ.1229 section 4: LCB and LCF within 50 cm, KM and KB within 5 cm, the rest within 2 %. */
    private static double tolerance(int column, double value) {
        return switch (NAMES[column]) {
            case "lcb_m", "lcf_m" -> 0.5;
            case "kmt_m", "kb_m" -> 0.05;
            default -> CODE_TOLERANCE * value;
        };
    }

    private boolean isEven() {
        double step = rows.draughts().value(1) - rows.draughts().value(0);
        for (int i = 1; i < rows.draughts().size(); i++) {
            if (Math.abs(rows.draughts().value(i) - rows.draughts().value(i - 1) - step) > 1e-6) {
                return false;
            }
        }
        return true;
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
