// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

import java.io.IOException;
import java.nio.file.Path;
import org.brassbob.core.contents.TankShapes;
import org.brassbob.core.geometry.NetShape;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.tabulate.CalibrationGrid;
import org.brassbob.core.tabulate.CalibrationMaker;
import org.brassbob.core.tabulate.HullTables;
import org.brassbob.core.tabulate.VolumeTableMaker;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.data.MemoryFolder;
import org.brassbob.data.TableFiles;
import org.brassbob.data.VesselFolder;

/** Tabulates Saltmarsh Heron from the shapes that {@link HeronYard} drew, with the program's own tabulation. */
public final class HeronTables {
    private static final String CURVE = "gm-required-intact.csv";

    /** Stands in for the curve while it isn't made yet: her papers name it. */
    private static final String NO_CURVE_YET = "displacement_t,gm_required_m\n1,0\n2,0\n";

    private HeronTables() {}

    /** Writes her tables into the folder named by the first argument. */
    public static void main(String[] args) throws IOException {
        Path folder = Path.of(args[0]);
        Vessel heron = VesselFolder.read(MemoryFolder.of(folder).with(CURVE, NO_CURVE_YET))
                .orElseThrow();
        TableFiles files = new TableFiles(folder);
        TankShapes shapes = TankShapes.of(heron);
        CalibrationMaker maker = new CalibrationMaker(heron.particulars().lbp(), CalibrationGrid.USUAL);
        for (Tank tank : heron.tanks()) {
            NetShape shape = shapes.net(tank.id()).orElseThrow();
            var soundings = maker.soundings(tank, shape);
            if (soundings.isPresent()) {
                files.write("tanks/" + tank.id() + ".sounding.csv", soundings.get());
            }
            files.write("tanks/" + tank.id() + ".volume.csv", VolumeTableMaker.of(shape, tank.id()));
        }
        SpaceShape hull = heron.hull();
        if (hull != null) {
            HullTables tables = HullTables.of(heron, hull);
            files.write("hydrostatics.csv", tables.hydrostatics());
            files.write("kn.csv", tables.crossCurves());
            files.write(CURVE, tables.requiredGm());
        }
    }
}
