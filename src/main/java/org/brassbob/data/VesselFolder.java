// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;
import org.brassbob.core.geometry.SpaceShape;
import org.brassbob.core.table.CrossCurves;
import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.table.LimitCurve;
import org.brassbob.core.vessel.Liquid;
import org.brassbob.core.vessel.Tank;
import org.brassbob.core.vessel.Vessel;
import org.brassbob.core.vessel.Weight;
import org.jspecify.annotations.Nullable;

/** Reads a vessel folder: vessel.json and the tables beside it. */
public final class VesselFolder {
    private static final String HULL = "hull.shape.csv";
    private static final String TANKS = "tanks/";

    private final FolderSource source;
    private final Problems problems = new Problems();
    private final Fingerprint fingerprint = new Fingerprint();
    private final TreeSet<String> unread = new TreeSet<>();
    private boolean tankFilesKnown;

    private VesselFolder(FolderSource source) {
        this.source = source;
    }

    /** The ship that a folder on disk describes. */
    public static Loaded<Vessel> read(Path folder) {
        return read(new DiskFolder(folder));
    }

    /** The ship that a folder describes. */
    public static Loaded<Vessel> read(FolderSource source) {
        return new VesselFolder(source).read();
    }

    private Loaded<Vessel> read() {
        try {
            unread.addAll(source.paths());
        } catch (IOException e) {
            problems.add(VesselJson.FILE, 1, "the folder can't be read; expected a vessel folder");
            return new Loaded<>(null, problems.list());
        }
        Optional<VesselJson.Content> head = required(VesselJson.FILE).flatMap(b -> VesselJson.read(b, problems));
        HydrostaticTable hydrostatics = optional(HydrostaticsCsv.FILE)
                .flatMap(b -> HydrostaticsCsv.read(b, problems))
                .orElse(null);
        CrossCurves kn =
                optional(KnCsv.FILE).flatMap(b -> KnCsv.read(b, problems)).orElse(null);
        SpaceShape hull = shape(HULL);
        if (!source(HydrostaticsCsv.FILE) && !source(HULL)) {
            problems.add(HydrostaticsCsv.FILE, 1, "no such file; expected it, or " + HULL + " to work it out from");
        }
        List<LimitCurve> curves = head.map(this::curves).orElse(List.of());
        List<Weight> weights =
                optional(WeightsCsv.FILE).map(b -> WeightsCsv.read(b, problems)).orElse(List.of());
        Map<String, Liquid> liquids =
                required(LiquidsCsv.FILE).map(b -> LiquidsCsv.read(b, problems)).orElse(Map.of());
        List<Tank> tanks = tanks(liquids);
        reportStrangers();
        if (!problems.isEmpty() || head.isEmpty()) {
            return new Loaded<>(null, problems.list());
        }
        VesselJson.Content own = head.get();
        Vessel vessel = new Vessel(
                own.id(),
                own.name(),
                own.particulars(),
                own.lightship(),
                own.seaDensity(),
                own.draughtMarks(),
                own.policy(),
                own.sources(),
                hydrostatics,
                curves,
                kn,
                weights,
                List.copyOf(liquids.values()),
                tanks,
                hull,
                fingerprint.whole());
        return new Loaded<>(vessel, List.of());
    }

    private List<LimitCurve> curves(VesselJson.Content head) {
        List<LimitCurve> curves = new ArrayList<>();
        for (VesselJson.CurveFile curve : head.curves()) {
            Optional<byte[]> bytes = optional(curve.file());
            if (bytes.isEmpty() && !curve.file().isEmpty()) {
                problems.add(
                        VesselJson.FILE,
                        curve.line(),
                        "limit curve file " + Numbers.shown(curve.file()) + " is not in the folder; expected it there");
            }
            bytes.flatMap(b -> LimitCsv.read(curve.name(), curve.file(), b, problems))
                    .ifPresent(curves::add);
        }
        return curves;
    }

    private List<Tank> tanks(Map<String, Liquid> liquids) {
        Optional<CsvTable> csv = required(TanksCsv.FILE).flatMap(b -> TanksCsv.open(b, problems));
        if (csv.isEmpty()) {
            return List.of();
        }
        tankFilesKnown = true;
        Map<String, TankTables> tables = new HashMap<>();
        return TanksCsv.read(csv.get(), liquids, id -> tables.computeIfAbsent(id, this::tables));
    }

    private TankTables tables(String tank) {
        String base = TANKS + tank;
        int before = problems.count();
        return new TankTables(
                table(base + ".sounding.csv", SoundingCsv::read),
                table(base + ".volume.csv", VolumeCsv::read),
                shape(base + ".shape.csv"),
                problems.count() > before);
    }

    private interface TableReader<T> {
        Optional<T> read(String file, byte[] bytes, Problems problems);
    }

    private <T> @Nullable T table(String file, TableReader<T> reader) {
        return optional(file).flatMap(b -> reader.read(file, b, problems)).orElse(null);
    }

    private @Nullable SpaceShape shape(String file) {
        return table(file, ShapeCsv::read);
    }

    /** A file in tanks/ that belongs to no tank is most likely a mistyped name: its table would be missed without a word. */
    private void reportStrangers() {
        for (String path : unread) {
            if (tankFilesKnown && path.startsWith(TANKS) && path.endsWith(".csv")) {
                problems.add(
                        path,
                        1,
                        "belongs to no tank of tanks.csv; expected TANK.sounding.csv, TANK.volume.csv or TANK.shape.csv");
            }
            Misnamed.meant(path)
                    .ifPresent(name ->
                            problems.add(path, 1, "no file of a vessel folder; expected it to be named " + name));
        }
    }

    private boolean source(String file) {
        return fingerprint.byFile().containsKey(file);
    }

    private Optional<byte[]> required(String file) {
        Optional<byte[]> bytes = optional(file);
        if (bytes.isEmpty()) {
            problems.add(file, 1, "no such file, or it can't be read; expected it in the vessel folder");
        }
        return bytes;
    }

    private Optional<byte[]> optional(String file) {
        unread.remove(file);
        try {
            Optional<byte[]> bytes = source.bytes(file);
            bytes.ifPresent(b -> fingerprint.add(file, b));
            return bytes;
        } catch (IOException e) {
            problems.add(
                    file,
                    1,
                    "can't be read; expected a readable file of at most " + FolderSource.LARGEST_FILE / (1024 * 1024)
                            + " MB");
            return Optional.empty();
        }
    }

    /** The SHA-256 of each file of a vessel folder, as {@link #read} takes them in. */
    public static Map<String, String> fingerprints(FolderSource source) {
        VesselFolder folder = new VesselFolder(source);
        Loaded<Vessel> read = folder.read();
        return read.value() == null ? Map.of() : folder.fingerprint.byFile();
    }
}
