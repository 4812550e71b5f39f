// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.contents;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.geometry.ShapeException;
import org.brassbob.core.geometry.Solid;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Vessel;
import org.jspecify.annotations.Nullable;

/** The net shapes of a ship's tanks: each less the tanks that stand inside it, less its structure. */
public final class TankShapes {
    private final Map<String, Solid> moulded;
    private final Map<String, NetShape> net;

    private TankShapes(Map<String, Solid> moulded, Map<String, NetShape> net) {
        this.moulded = moulded;
        this.net = net;
    }

    /**
     * The shapes of all tanks that have one.
     *
     * @throws IllegalArgumentException if a shape is no solid, or encloses a tank without one; a checked vessel has neither
     */
    public static TankShapes of(Vessel vessel) {
        Map<String, Solid> moulded = new LinkedHashMap<>();
        for (Tank tank : vessel.tanks()) {
            SpaceShape shape = tank.shape();
            if (shape != null) {
                moulded.put(tank.id(), solid(tank, shape));
            }
        }
        Map<String, NetShape> net = new LinkedHashMap<>();
        for (Tank tank : vessel.tanks()) {
            Solid solid = moulded.get(tank.id());
            if (solid != null) {
                net.put(tank.id(), new NetShape(without(solid, tank, moulded), tank.steelPct()));
            }
        }
        return new TankShapes(moulded, net);
    }

    /** The room for liquid in a tank, where it has a shape. */
    public Optional<NetShape> net(String tank) {
        return Optional.ofNullable(net.get(tank));
    }

    /** The outer skin of a tank, with nothing taken off, where it has a shape. */
    public Optional<Solid> moulded(String tank) {
        return Optional.ofNullable(moulded.get(tank));
    }

    private static Solid solid(Tank tank, SpaceShape shape) {
        try {
            return Solid.of(shape);
        } catch (ShapeException e) {
            throw new IllegalArgumentException("tank " + tank.id() + ": " + e.getMessage(), e);
        }
    }

    private static Solid without(Solid solid, Tank tank, Map<String, Solid> moulded) {
        Solid net = solid;
        for (String inner : tank.encloses()) {
            @Nullable Solid taken = moulded.get(inner);
            if (taken == null) {
                throw new IllegalArgumentException("tank " + tank.id() + " encloses " + inner + ", which has no shape");
            }
            net = net.minus(taken);
        }
        return net;
    }
}
