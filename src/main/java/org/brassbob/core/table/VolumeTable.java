// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.table;

/** Centroid and transverse second moment of the free surface against volume, upright, read linearly in volume. */
public final class VolumeTable {
    private final Axis volumes;
    private final double[] lcg;
    private final double[] tcg;
    private final double[] vcg;
    private final double[] secondMoment;
    private final Origin origin;

    private VolumeTable(Axis volumes, double[] lcg, double[] tcg, double[] vcg, double[] secondMoment, Origin origin) {
        this.volumes = volumes;
        this.lcg = lcg;
        this.tcg = tcg;
        this.vcg = vcg;
        this.secondMoment = secondMoment;
        this.origin = origin;
    }

    /**
     * From columns already read.
     *
     * @param volumes m3
     * @param lcg m forward of the aft perpendicular
     * @param tcg m to starboard of the centreline
     * @param vcg m above the baseline
     * @param secondMoment transverse second moment of the surface about its own centroid (m4)
     * @throws IllegalArgumentException if the columns differ in length
     */
    public static VolumeTable of(
            Axis volumes, double[] lcg, double[] tcg, double[] vcg, double[] secondMoment, Origin origin) {
        int n = volumes.size();
        if (lcg.length != n || tcg.length != n || vcg.length != n || secondMoment.length != n) {
            throw new IllegalArgumentException("the columns of " + origin + " differ in length");
        }
        return new VolumeTable(volumes, lcg.clone(), tcg.clone(), vcg.clone(), secondMoment.clone(), origin);
    }

    public Axis volumes() {
        return volumes;
    }

    public Origin origin() {
        return origin;
    }

    /** A row as it stands. */
    public Entry row(int i) {
        return new Entry(lcg[i], tcg[i], vcg[i], secondMoment[i]);
    }

    /** The entry for a volume (m3); the end's entry outside. */
    public Entry at(double volume) {
        int i = volumes.cell(volume);
        int j = volumes.above(i);
        double f = volumes.fraction(volume, i);
        return new Entry(
                Axis.lerp(lcg[i], lcg[j], f),
                Axis.lerp(tcg[i], tcg[j], f),
                Axis.lerp(vcg[i], vcg[j], f),
                Axis.lerp(secondMoment[i], secondMoment[j], f));
    }

    /**
     * What a tank's table says of one volume.
     *
     * @param lcg m forward of the aft perpendicular
     * @param tcg m to starboard of the centreline
     * @param vcg m above the baseline
     * @param secondMoment transverse second moment of the surface about its own centroid (m4)
     */
    public record Entry(double lcg, double tcg, double vcg, double secondMoment) {}
}
