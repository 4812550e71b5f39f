// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.tabulate;

import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.geometry.Attitude;
import org.brassbob.core.geometry.Immersed;
import org.brassbob.core.geometry.Solid;
import org.brassbob.core.table.Axis;
import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.table.HydrostaticTable.Entry;
import org.brassbob.core.table.Origin;

/**
 * Hydrostatic particulars of a hull, exactly for its shape. KM = KB + I/∇; MCT is {@code ρ·I long/(100·LBP)}, which takes BM long for
 * GM long as hydrostatic tables commonly do (common practice: KB − KG is a few metres where BM long is the ship's length or more).
 */
public final class HydrostaticMaker {
    private static final double JUST_UNDER = 1e-9;

    private final Solid hull;
    private final double density;
    private final double lbp;

    /**
     * For a hull.
     *
     * @param hull both sides of it
     * @param density of the water (t/m3)
     * @param lbp length between perpendiculars (m)
     */
    public HydrostaticMaker(Solid hull, double density, double lbp) {
        this.hull = hull;
        this.density = density;
        this.lbp = lbp;
    }

    /**
     * A table.
     *
     * @param draughts at the centre of flotation (m)
     * @param trims m; a single 0 for even keel
     */
    public HydrostaticTable table(Axis draughts, Axis trims) {
        List<HydrostaticTable.Rows> sets = new ArrayList<>();
        for (int t = 0; t < trims.size(); t++) {
            List<Entry> entries = new ArrayList<>();
            for (int d = 0; d < draughts.size(); d++) {
                entries.add(entry(draughts.value(d), trims.value(t)));
            }
            sets.add(HydrostaticTable.Rows.of(entries, Origin.computed("tabulated from the hull")));
        }
        return HydrostaticTable.of(trims, sets);
    }

    /**
     * The particulars at a draught at the centre of flotation (m) and a trim (m). From the top of the hull upwards those just under the
     * top, where the surface still is one; at the lowest point of the keel and under it, where nothing is immersed, all but the
     * displacement are NaN or 0.
     */
    public Entry entry(double draught, double trim) {
        Attitude attitude = Attitude.of(trim, lbp, 0);
        double z0 = attitude.heightThrough(lbp / 2, 0, draught);
        Immersed below = below(attitude, z0);
        // The surface's centroid moves with the surface; a few passes settle where the draught is measured.
        for (int i = 0; i < 50 && trim != 0; i++) {
            double next = attitude.heightThrough(below.surface().x(), 0, draught);
            below = below(attitude, next);
            if (Math.abs(next - z0) < 1e-9) {
                break;
            }
            z0 = next;
        }
        return entry(below, draught);
    }

    /** The particulars on even keel at a displacement (t). */
    public Entry atDisplacement(double displacement) {
        double draught = hull.heightFor(Attitude.UPRIGHT, displacement / density);
        return entry(hull.below(Attitude.UPRIGHT, draught), draught);
    }

    private Immersed below(Attitude attitude, double z0) {
        double top = hull.highest(attitude);
        return hull.below(attitude, Math.min(z0, top - JUST_UNDER * (top - hull.lowest(attitude))));
    }

    private Entry entry(Immersed below, double draught) {
        double volume = below.volume();
        return new Entry(
                draught,
                volume * density,
                below.lcg(),
                below.surface().x(),
                below.vcg() + below.surface().transverse() / volume,
                density * below.surface().longitudinal() / (100 * lbp),
                density * below.surface().area() / 100,
                below.vcg());
    }
}
