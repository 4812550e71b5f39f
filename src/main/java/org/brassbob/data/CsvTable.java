// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import de.siegmar.fastcsv.reader.CommentStrategy;
import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import java.io.IOException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** A CSV file (RFC 4180) with a header row and comment lines, its header checked against the columns that it may have. */
final class CsvTable {
    private final String file;
    private final List<String> header;
    private final Map<String, Integer> columns = new HashMap<>();
    private final List<Row> rows = new ArrayList<>();
    private final List<Comment> comments = new ArrayList<>();
    private final Problems problems;
    private int headerLine = 1;

    /** A comment line: its number and its text after the mark. */
    record Comment(int line, String text) {}

    private CsvTable(String file, List<String> header, Problems problems) {
        this.file = file;
        this.header = header;
        this.problems = problems;
    }

    /** The table; empty, with a fault, where the file can't be understood as one with these columns. */
    static Optional<CsvTable> read(String file, byte[] bytes, Columns allowed, Problems problems) {
        return Text.decode(file, bytes, problems).flatMap(text -> parse(file, text, allowed, problems));
    }

    private static Optional<CsvTable> parse(String file, String text, Columns allowed, Problems problems) {
        CsvTable table = null;
        List<Comment> comments = new ArrayList<>();
        int line = 1;
        try (CsvReader<CsvRecord> reader = CsvReader.builder()
                .commentStrategy(CommentStrategy.READ)
                .allowExtraFields(true)
                .allowMissingFields(true)
                .ofCsvRecord(text)) {
            for (CsvRecord csv : reader) {
                line = (int) csv.getStartingLineNumber();
                if (csv.isComment()) {
                    comments.add(new Comment(line, csv.getField(0)));
                } else if (table == null) {
                    table = new CsvTable(file, csv.getFields(), problems);
                    table.headerLine = line;
                    if (!table.checkHeader(line, allowed)) {
                        return Optional.empty();
                    }
                } else {
                    table.addRow(line, csv);
                }
            }
        } catch (CsvParseException | IOException e) {
            problems.add(file, line, "not CSV from here on: unmatched quotes or a cell too long; expected RFC 4180");
            return Optional.empty();
        }
        if (table == null) {
            problems.add(file, 1, "no header row; expected " + String.join(",", allowed.required()));
            return Optional.empty();
        }
        table.comments.addAll(comments);
        return Optional.of(table);
    }

    private boolean checkHeader(int line, Columns allowed) {
        int before = problems.count();
        for (int i = 0; i < header.size(); i++) {
            String name = header.get(i);
            if (!allowed.allows(name)) {
                problems.add(
                        file,
                        line,
                        "unknown column " + Numbers.shown(name) + "; expected " + String.join(",", allowed.required())
                                + (allowed.optional().isEmpty()
                                        ? ""
                                        : "[," + String.join(",", allowed.optional()) + "]"));
            } else if (columns.putIfAbsent(name, i) != null) {
                problems.add(file, line, "column " + name + " given twice; expected it once");
            }
        }
        for (String name : allowed.required()) {
            if (!columns.containsKey(name) && !header.contains(name)) {
                problems.add(file, line, "column " + name + " is missing");
            }
        }
        return problems.count() == before;
    }

    private void addRow(int line, CsvRecord csv) {
        if (csv.getFieldCount() != header.size()) {
            problems.add(file, line, csv.getFieldCount() + " cells; expected " + header.size() + " as in the header");
            return;
        }
        rows.add(new Row(this, line, csv.getFields()));
    }

    String file() {
        return file;
    }

    int headerLine() {
        return headerLine;
    }

    List<String> header() {
        return header;
    }

    List<Row> rows() {
        return rows;
    }

    List<Comment> comments() {
        return comments;
    }

    Problems problems() {
        return problems;
    }

    boolean has(String column) {
        return columns.containsKey(column);
    }

    /** The index of a column, or -1. */
    int index(String column) {
        return columns.getOrDefault(column, -1);
    }
}
