// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import de.siegmar.fastcsv.writer.CsvWriter;
import java.io.IOException;
import java.io.StringWriter;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.List;
import org.brassbob.core.table.CrossCurves;
import org.brassbob.core.table.HydrostaticTable;
import org.brassbob.core.table.LimitCurve;
import org.brassbob.core.table.SoundingTable;
import org.brassbob.core.table.VolumeTable;

/** Writes tables in the form of the vessel folder, each file whole or not at all. */
public final class TableFiles {
    private final Path folder;

    /** Writes below a folder, which is made where it is missing. */
    public TableFiles(Path folder) {
        this.folder = folder;
    }

    /** Writes a sounding table: reading, volume, and trim and heel where the table has several of either. */
    public void write(String file, SoundingTable table) throws IOException {
        boolean trims = table.trims().size() > 1 || table.trims().first() != 0;
        boolean heels = table.heels().size() > 1 || table.heels().first() != 0;
        List<String> header = new ArrayList<>();
        header.add(table.argument() == SoundingTable.Argument.SOUNDING ? "sounding_m" : "ullage_m");
        header.add("volume_m3");
        if (trims) {
            header.add("trim_m");
        }
        if (heels) {
            header.add("heel_deg");
        }
        List<List<String>> rows = new ArrayList<>();
        rows.add(header);
        for (int t = 0; t < table.trims().size(); t++) {
            for (int h = 0; h < table.heels().size(); h++) {
                for (int r = 0; r < table.readings().size(); r++) {
                    List<String> row = new ArrayList<>();
                    row.add(plain(table.readings().value(r), 4));
                    row.add(plain(table.volume(table.node(r, t, h)), 3));
                    if (trims) {
                        row.add(plain(table.trims().value(t), 3));
                    }
                    if (heels) {
                        row.add(plain(table.heels().value(h), 3));
                    }
                    rows.add(row);
                }
            }
        }
        write(file, rows);
    }

    /** Writes a volume table. */
    public void write(String file, VolumeTable table) throws IOException {
        List<List<String>> rows = new ArrayList<>();
        rows.add(List.of("volume_m3", "lcg_m", "tcg_m", "vcg_m", "fs_m4"));
        for (int i = 0; i < table.volumes().size(); i++) {
            VolumeTable.Entry e = table.row(i);
            rows.add(List.of(
                    plain(table.volumes().value(i), 3),
                    plain(e.lcg(), 4),
                    plain(e.tcg(), 4),
                    plain(e.vcg(), 4),
                    plain(e.secondMoment(), 3)));
        }
        write(file, rows);
    }

    /** Writes a hydrostatic table, with a trim column where it has several trims. */
    public void write(String file, HydrostaticTable table) throws IOException {
        boolean trims = table.trims().size() > 1;
        List<List<String>> rows = new ArrayList<>();
        List<String> header = new ArrayList<>(List.of(
                "draught_m", "displacement_t", "lcb_m", "lcf_m", "kmt_m", "mct_tm_per_cm", "tpc_t_per_cm", "kb_m"));
        if (trims) {
            header.add("trim_m");
        }
        rows.add(header);
        for (int t = 0; t < table.trims().size(); t++) {
            for (HydrostaticTable.Entry e : table.rows(t).entries()) {
                List<String> row = new ArrayList<>(List.of(
                        plain(e.draught(), 4),
                        plain(e.displacement(), 3),
                        plain(e.lcb(), 4),
                        plain(e.lcf(), 4),
                        plain(e.kmt(), 4),
                        plain(e.mct(), 4),
                        plain(e.tpc(), 4),
                        plain(e.kb(), 4)));
                if (trims) {
                    row.add(plain(table.trims().value(t), 3));
                }
                rows.add(row);
            }
        }
        write(file, rows);
    }

    /** Writes cross curves, with their heels only. */
    public void write(String file, CrossCurves curves) throws IOException {
        List<List<String>> rows = new ArrayList<>();
        List<String> header = new ArrayList<>(List.of("displacement_t"));
        for (int h = 0; h < curves.heels().size(); h++) {
            header.add("kn_" + plain(curves.heels().value(h), 2) + "deg_m");
        }
        rows.add(header);
        for (CrossCurves.Row curve : curves.rows()) {
            List<String> row = new ArrayList<>(List.of(plain(curve.displacement(), 3)));
            curve.kn().forEach(kn -> row.add(plain(kn, 4)));
            rows.add(row);
        }
        write(file, rows);
    }

    /** Writes a limit curve. */
    public void write(String file, LimitCurve curve) throws IOException {
        List<List<String>> rows = new ArrayList<>();
        rows.add(List.of(
                "displacement_t", curve.kind() == LimitCurve.Kind.GM_REQUIRED ? "gm_required_m" : "kg_limit_m"));
        for (int i = 0; i < curve.displacements().size(); i++) {
            rows.add(List.of(plain(curve.displacements().value(i), 3), plain(curve.value(i), 4)));
        }
        write(file, rows);
    }

    /** A number with at the most so many decimals, without trailing zeros, exponent or minus nought. */
    static String plain(double value, int decimals) {
        BigDecimal rounded = new BigDecimal(value).setScale(decimals, RoundingMode.HALF_EVEN);
        return rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString();
    }

    private void write(String file, List<List<String>> rows) throws IOException {
        StringWriter text = new StringWriter();
        try (CsvWriter csv = CsvWriter.builder()
                .lineDelimiter(de.siegmar.fastcsv.writer.LineDelimiter.LF)
                .build(text)) {
            rows.forEach(csv::writeRecord);
        }
        Path target = folder.resolve(file);
        Path parent = target.getParent();
        Files.createDirectories(parent == null ? folder : parent);
        Path whole = target.resolveSibling(target.getFileName() + ".new");
        try {
            Files.writeString(whole, text.toString(), StandardCharsets.UTF_8);
            move(whole, target);
        } finally {
            // Gone once it is moved; left over where the disk was full or the target can't be replaced.
            Files.deleteIfExists(whole);
        }
    }

    private static void move(Path whole, Path target) throws IOException {
        try {
            Files.move(whole, target, StandardCopyOption.ATOMIC_MOVE);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(whole, target, StandardCopyOption.REPLACE_EXISTING);
        }
    }
}
