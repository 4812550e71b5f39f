// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.table;

/**
 * Volume against sounding (or ullage), trim and heel, read linearly in each. Outside, the edge's value is held; {@link #covers} tells.
 *
 * <p>Two adjoining rows read linearly can't follow a surface that meets a corner between them: the error is that of the booklet read by
 * hand, and falls with the square of the row spacing.
 */
public final class SoundingTable {
    /** What the first column is. */
    public enum Argument {
        SOUNDING,
        ULLAGE
    }

    private final Argument argument;
    private final Axis readings;
    private final Axis trims;
    private final Axis heels;
    private final double[] volumes;
    private final Origin origin;

    private SoundingTable(Argument argument, Axis readings, Axis trims, Axis heels, double[] volumes, Origin origin) {
        this.argument = argument;
        this.readings = readings;
        this.trims = trims;
        this.heels = heels;
        this.volumes = volumes;
        this.origin = origin;
    }

    /**
     * From columns already read.
     *
     * @param readings soundings or ullages (m)
     * @param trims trims (m); a single 0 where the table has no trim column
     * @param heels heels (°); a single 0 where the table has no heel column
     * @param volumes m3, the reading running fastest, then heel, then trim: index {@code (trim·heels + heel)·readings + reading}
     * @param origin lines in that same order
     * @throws IllegalArgumentException if the number of volumes isn't that of the grid
     */
    public static SoundingTable of(
            Argument argument, Axis readings, Axis trims, Axis heels, double[] volumes, Origin origin) {
        if (volumes.length != readings.size() * trims.size() * heels.size()) {
            throw new IllegalArgumentException("the grid of " + origin + " is not full");
        }
        return new SoundingTable(argument, readings, trims, heels, volumes.clone(), origin);
    }

    public Argument argument() {
        return argument;
    }

    public Axis readings() {
        return readings;
    }

    public Axis trims() {
        return trims;
    }

    public Axis heels() {
        return heels;
    }

    public Origin origin() {
        return origin;
    }

    /** The index of a node, for {@link #volume(int)} and {@link Origin#line}. */
    public int node(int reading, int trim, int heel) {
        return (trim * heels.size() + heel) * readings.size() + reading;
    }

    /** The volume (m3) at a node. */
    public double volume(int node) {
        return volumes[node];
    }

    /** Whether the grid reaches this trim (m) and heel (°). */
    public boolean covers(double trim, double heelDeg) {
        return trims.covers(trim) && heels.covers(heelDeg);
    }

    /** The volume (m3) at a reading (m), trim (m) and heel (°). */
    public double volume(double reading, double trim, double heelDeg) {
        int r = readings.cell(reading);
        double fr = readings.fraction(reading, r);
        int t = trims.cell(trim);
        double ft = trims.fraction(trim, t);
        double near = alongHeel(r, fr, t, heelDeg);
        return ft == 0 ? near : Axis.lerp(near, alongHeel(r, fr, trims.above(t), heelDeg), ft);
    }

    private double alongHeel(int r, double fr, int t, double heelDeg) {
        int h = heels.cell(heelDeg);
        double fh = heels.fraction(heelDeg, h);
        double near = alongReading(r, fr, node(r, t, h));
        return fh == 0 ? near : Axis.lerp(near, alongReading(r, fr, node(r, t, heels.above(h))), fh);
    }

    private double alongReading(int r, double fr, int node) {
        return fr == 0 ? volumes[node] : Axis.lerp(volumes[node], volumes[node + readings.above(r) - r], fr);
    }
}
