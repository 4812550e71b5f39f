// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.table;

import java.util.List;

/**
 * Hydrostatic particulars by draught, in water of the density that the table is made for; one set of rows for each trim, or a single
 * even-keel set. Entered with a displacement and read linearly.
 */
public final class HydrostaticTable {
    private final Axis trims;
    private final List<Rows> sets;

    private HydrostaticTable(Axis trims, List<Rows> sets) {
        this.trims = trims;
        this.sets = sets;
    }

    /**
     * From columns already read.
     *
     * @param trims trims (m); a single 0 for an even-keel table
     * @param sets the rows for each trim, in that order
     * @throws IllegalArgumentException if their numbers differ
     */
    public static HydrostaticTable of(Axis trims, List<Rows> sets) {
        if (trims.size() != sets.size()) {
            throw new IllegalArgumentException("a set of rows is needed for each trim");
        }
        return new HydrostaticTable(trims, List.copyOf(sets));
    }

    public Axis trims() {
        return trims;
    }

    /** The rows at one trim. */
    public Rows rows(int trim) {
        return sets.get(trim);
    }

    /** Whether the table reaches this displacement (t, in the table's water) at this trim (m): at each trim that is read for it. */
    public boolean covers(double displacement, double trim) {
        int i = trims.cell(trim);
        double f = trims.fraction(trim, i);
        return trims.covers(trim)
                && (f == 1 || sets.get(i).displacements.covers(displacement))
                && (f == 0 || sets.get(trims.above(i)).displacements.covers(displacement));
    }

    /**
     * The entry for a displacement (t, in the table's water) and a trim (m).
     */
    public Entry at(double displacement, double trim) {
        int i = trims.cell(trim);
        double f = trims.fraction(trim, i);
        Entry near = sets.get(i).at(displacement);
        return f == 0 ? near : near.towards(sets.get(trims.above(i)).at(displacement), f);
    }

    /** Hydrostatics at one trim by rising draught. */
    public static final class Rows {
        private final Axis draughts;
        private final Axis displacements;
        private final List<Entry> entries;
        private final Origin origin;

        private Rows(Axis draughts, Axis displacements, List<Entry> entries, Origin origin) {
            this.draughts = draughts;
            this.displacements = displacements;
            this.entries = entries;
            this.origin = origin;
        }

        /**
         * From columns already read.
         *
         * @param entries by rising draught and displacement
         * @throws IllegalArgumentException if draughts or displacements do not ascend
         */
        public static Rows of(List<Entry> entries, Origin origin) {
            return new Rows(
                    Axis.of(entries.stream().mapToDouble(Entry::draught).toArray()),
                    Axis.of(entries.stream().mapToDouble(Entry::displacement).toArray()),
                    List.copyOf(entries),
                    origin);
        }

        public Axis draughts() {
            return draughts;
        }

        public Axis displacements() {
            return displacements;
        }

        public List<Entry> entries() {
            return entries;
        }

        public Origin origin() {
            return origin;
        }

        Entry at(double displacement) {
            int i = displacements.cell(displacement);
            Entry low = entries.get(i);
            return low.towards(entries.get(displacements.above(i)), displacements.fraction(displacement, i));
        }
    }

    /**
     * One row.
     *
     * @param draught even-keel draught, or at the centre of flotation when trimmed (m)
     * @param displacement t, in the table's water
     * @param lcb longitudinal centre of buoyancy (m forward of the aft perpendicular)
     * @param lcf longitudinal centre of flotation (m forward of the aft perpendicular)
     * @param kmt height of the transverse metacentre above the keel (m)
     * @param mct moment to change trim one centimetre (t·m/cm)
     * @param tpc tonnes per centimetre of immersion (t/cm)
     * @param kb height of the centre of buoyancy (m), NaN where the table does not give it
     */
    public record Entry(
            double draught,
            double displacement,
            double lcb,
            double lcf,
            double kmt,
            double mct,
            double tpc,
            double kb) {
        Entry towards(Entry other, double f) {
            return new Entry(
                    Axis.lerp(draught, other.draught, f),
                    Axis.lerp(displacement, other.displacement, f),
                    Axis.lerp(lcb, other.lcb, f),
                    Axis.lerp(lcf, other.lcf, f),
                    Axis.lerp(kmt, other.kmt, f),
                    Axis.lerp(mct, other.mct, f),
                    Axis.lerp(tpc, other.tpc, f),
                    Axis.lerp(kb, other.kb, f));
        }
    }
}
