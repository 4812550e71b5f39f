// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.audit;

import static org.brassbob.core.audit.Findings.show;

import org.brassbob.core.table.SoundingTable;
import org.brassbob.core.table.VolumeTable;
import org.brassbob.core.vessel.Pipe;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Vessel;

/**
 * Holds the two tanks of a pair against each other. Port and starboard need not be the same; but where nearly every cell is mirrored, one
 * that isn't is a slip in one of the two.
 */
final class PairCheck {
    private static final double NEARLY_ALL = 0.9;

    private PairCheck() {}

    static void check(Vessel vessel, Findings findings) {
        for (Tank tank : vessel.tanks()) {
            String pair = tank.pair();
            if (pair != null && tank.id().compareTo(pair) < 0) {
                vessel.tank(pair).ifPresent(other -> check(tank, other, findings));
            }
        }
    }

    private static void check(Tank tank, Tank other, Findings findings) {
        if (Math.abs(tank.capacity() - other.capacity()) > Math.max(0.011, 0.001 * tank.capacity())) {
            findings.warning(
                    tank.origin(),
                    0,
                    "capacity of " + tank.id() + " against its pair " + other.id(),
                    show(tank.capacity()) + " m3",
                    show(other.capacity()) + " m3");
        }
        checkPipes(tank, other, findings);
        SoundingTable soundings = tank.soundings();
        SoundingTable otherSoundings = other.soundings();
        if (soundings != null && otherSoundings != null && sameGrid(soundings, otherSoundings)) {
            checkSoundings(tank, other, soundings, otherSoundings, findings);
        }
        VolumeTable volumes = tank.volumes();
        VolumeTable otherVolumes = other.volumes();
        if (volumes != null
                && otherVolumes != null
                && volumes.volumes().size() == otherVolumes.volumes().size()) {
            checkVolumes(tank, other, volumes, otherVolumes, findings);
        }
    }

    private static void checkPipes(Tank tank, Tank other, Findings findings) {
        Pipe a = tank.pipe();
        Pipe b = other.pipe();
        if (a == null || b == null) {
            return;
        }
        boolean mirrored = Math.abs(a.x() - b.x()) < 0.01
                && Math.abs(a.y() + b.y()) < 0.01
                && Math.abs(a.footZ() - b.footZ()) < 0.01
                && Math.abs(a.length() - b.length()) < 0.01;
        if (!mirrored) {
            findings.warning(
                    tank.origin(),
                    0,
                    "pipe of " + tank.id() + " against its pair " + other.id(),
                    "x " + show(a.x()) + ", y " + show(a.y()) + ", foot " + show(a.footZ()) + ", length "
                            + show(a.length()),
                    "x " + show(b.x()) + ", y " + show(-b.y()) + ", foot " + show(b.footZ()) + ", length "
                            + show(b.length()));
        }
    }

    private static boolean sameGrid(SoundingTable a, SoundingTable b) {
        boolean same = a.argument() == b.argument()
                && a.readings().size() == b.readings().size()
                && a.trims().size() == b.trims().size()
                && a.heels().size() == b.heels().size();
        for (int i = 0; same && i < a.readings().size(); i++) {
            same = a.readings().value(i) == b.readings().value(i);
        }
        for (int h = 0; same && h < a.heels().size(); h++) {
            same = a.heels().value(h) == -b.heels().value(a.heels().size() - 1 - h);
        }
        return same;
    }

    private static void checkSoundings(Tank tank, Tank other, SoundingTable a, SoundingTable b, Findings findings) {
        int heels = a.heels().size();
        int nodes = a.readings().size() * a.trims().size() * heels;
        double[] own = new double[nodes];
        double[] twin = new double[nodes];
        for (int t = 0; t < a.trims().size(); t++) {
            for (int h = 0; h < heels; h++) {
                for (int r = 0; r < a.readings().size(); r++) {
                    own[a.node(r, t, h)] = a.volume(a.node(r, t, h));
                    twin[a.node(r, t, h)] = b.volume(b.node(r, t, heels - 1 - h));
                }
            }
        }
        double unit = Precision.of(own);
        if (!nearlyAlike(own, twin, unit)) {
            findings.warning(
                    a.origin(),
                    0,
                    "sounding table of " + tank.id(),
                    "is no mirror of " + other.id(),
                    "mirrored tables");
            return;
        }
        for (int node = 0; node < nodes; node++) {
            if (Math.abs(own[node] - twin[node]) > 1.01 * unit) {
                findings.error(
                        a.origin(),
                        node,
                        "volume in " + tank.id() + " against the mirrored cell of its pair " + other.id(),
                        show(own[node]) + " m3",
                        show(twin[node]) + " m3");
            }
        }
    }

    private static void checkVolumes(Tank tank, Tank other, VolumeTable a, VolumeTable b, Findings findings) {
        String[] names = {"volume_m3", "lcg_m", "tcg_m", "vcg_m", "fs_m4"};
        for (int column = 0; column < names.length; column++) {
            double[] own = new double[a.volumes().size()];
            double[] twin = new double[own.length];
            for (int i = 0; i < own.length; i++) {
                own[i] = cell(a, i, column, 1);
                twin[i] = cell(b, i, column, -1);
            }
            double unit = Precision.of(own);
            boolean alike = nearlyAlike(own, twin, unit);
            for (int i = 0; alike && i < own.length; i++) {
                if (Math.abs(own[i] - twin[i]) > 1.01 * unit) {
                    findings.error(
                            a.origin(),
                            i,
                            names[column] + " in " + tank.id() + " against the mirrored cell of its pair " + other.id(),
                            show(own[i]),
                            show(twin[i]));
                }
            }
        }
    }

    private static double cell(VolumeTable table, int row, int column, int side) {
        VolumeTable.Entry entry = table.row(row);
        return switch (column) {
            case 0 -> table.volumes().value(row);
            case 1 -> entry.lcg();
            case 2 -> side * entry.tcg();
            case 3 -> entry.vcg();
            default -> entry.secondMoment();
        };
    }

    private static boolean nearlyAlike(double[] a, double[] b, double unit) {
        int alike = 0;
        for (int i = 0; i < a.length; i++) {
            if (Math.abs(a[i] - b[i]) <= 1.01 * unit) {
                alike++;
            }
        }
        return alike >= NEARLY_ALL * a.length;
    }
}
