// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.geometry;

/**
 * The room a liquid has in a space: the moulded solid less what stands in it, less a share for structure.
 *
 * <p>Structure is spread evenly: it takes its share of every volume and leaves centroids alone. It does not reduce the free surface,
 * which is the less favourable choice and the one that tank tables commonly make.
 */
public final class NetShape {
    private final Solid solid;
    private final double share;

    /**
     * A solid and the share of it that liquid can fill.
     *
     * @param solid moulded, less what stands in it
     * @param steelPct structure, per cent of the solid's volume, from 0 to below 100
     * @throws IllegalArgumentException outside that range
     */
    public NetShape(Solid solid, double steelPct) {
        if (!(steelPct >= 0) || !(steelPct < 100)) {
            throw new IllegalArgumentException("structure of " + steelPct + " %; expected 0 to below 100");
        }
        this.solid = solid;
        this.share = 1 - steelPct / 100;
    }

    public Solid solid() {
        return solid;
    }

    /** The whole net volume (m3). */
    public double capacity() {
        return solid.volume() * share;
    }

    /** The net volume (m3) below a surface; see {@link Solid#volumeBelow}. */
    public double volumeBelow(Attitude attitude, double z0) {
        return solid.volumeBelow(attitude, z0) * share;
    }

    /** What lies below a surface, the volume net; see {@link Solid#below}. */
    public Immersed below(Attitude attitude, double z0) {
        Immersed gross = solid.below(attitude, z0);
        return new Immersed(gross.volume() * share, gross.lcg(), gross.tcg(), gross.vcg(), gross.surface());
    }

    /** The height z0 of the surface below which lies a net volume (m3); see {@link Solid#heightFor}. */
    public double heightFor(Attitude attitude, double volume) {
        return solid.heightFor(attitude, volume / share);
    }

    /** What a net volume (m3) makes at an attitude. */
    public Immersed holding(Attitude attitude, double volume) {
        return below(attitude, heightFor(attitude, volume));
    }
}
