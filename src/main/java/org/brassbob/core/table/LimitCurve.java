// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.table;

/** A stability limit by displacement: the least GM required, or the greatest KG permitted. */
public final class LimitCurve {
    /** What the curve limits. */
    public enum Kind {
        GM_REQUIRED,
        KG_LIMIT
    }

    private final String name;
    private final Kind kind;
    private final Axis displacements;
    private final double[] values;
    private final Origin origin;

    private LimitCurve(String name, Kind kind, Axis displacements, double[] values, Origin origin) {
        this.name = name;
        this.kind = kind;
        this.displacements = displacements;
        this.values = values;
        this.origin = origin;
    }

    /**
     * From columns already read.
     *
     * @param displacements t
     * @param values m, one for each displacement
     * @throws IllegalArgumentException if their numbers differ
     */
    public static LimitCurve of(String name, Kind kind, Axis displacements, double[] values, Origin origin) {
        if (values.length != displacements.size()) {
            throw new IllegalArgumentException("the columns of " + origin + " differ in length");
        }
        return new LimitCurve(name, kind, displacements, values.clone(), origin);
    }

    public String name() {
        return name;
    }

    public Kind kind() {
        return kind;
    }

    public Axis displacements() {
        return displacements;
    }

    public Origin origin() {
        return origin;
    }

    public double value(int row) {
        return values[row];
    }

    /** The limit (m) at a displacement (t); the end's value outside, see {@link Axis#covers}. */
    public double at(double displacement) {
        return displacements.read(values, displacement);
    }

    /** The least corrected GM (m) that the curve allows at this displacement (t) and KM (m). */
    public double requiredGm(double displacement, double km) {
        return kind == Kind.GM_REQUIRED ? at(displacement) : km - at(displacement);
    }
}
