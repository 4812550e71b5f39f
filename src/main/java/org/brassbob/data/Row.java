// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;

/** A row of a CSV table. Each of its readers reports what is wrong with a cell and goes on. */
final class Row {
    private final CsvTable table;
    private final int line;
    private final List<String> cells;

    Row(CsvTable table, int line, List<String> cells) {
        this.table = table;
        this.line = line;
        this.cells = cells;
    }

    int line() {
        return line;
    }

    void problem(String message) {
        table.problems().add(table.file(), line, message);
    }

    /** How many faults have been found so far, in any file. */
    int problemCount() {
        return table.problems().count();
    }

    /** The cell; empty where the column or the cell is. */
    String text(String column) {
        int i = table.index(column);
        return i < 0 ? "" : cells.get(i);
    }

    /** The cell, which must not be empty. */
    String required(String column) {
        String text = text(column);
        if (text.isBlank()) {
            problem(column + " is empty; expected a value");
        }
        return text;
    }

    /** A number within a range; NaN, with a fault, where there is none. */
    double number(String column, double low, double high) {
        String text = text(column);
        if (text.isEmpty()) {
            problem(column + " is empty; expected a number");
            return Double.NaN;
        }
        return within(column, text, low, high);
    }

    private double within(String column, String text, double low, double high) {
        double value = Numbers.parse(text);
        if (Double.isNaN(value)) {
            problem(column + " is " + Numbers.shown(text) + "; expected a number" + Numbers.hint(text));
        } else if (value < low || value > high) {
            problem(column + " is " + text + "; expected " + plain(low) + " to " + plain(high));
            return Double.NaN;
        }
        return value;
    }

    /** A number within a range where the cell gives one; null otherwise, with a fault where it is no such number. */
    @Nullable
    Double optional(String column, double low, double high) {
        String text = text(column);
        double value = text.isEmpty() ? Double.NaN : within(column, text, low, high);
        return Double.isNaN(value) ? null : value;
    }

    double optional(String column, double low, double high, double otherwise) {
        Double value = optional(column, low, high);
        return value == null ? otherwise : value;
    }

    /** A whole number. */
    int whole(String column, int low, int high) {
        double value = number(column, low, high);
        if (!Double.isNaN(value) && value != Math.rint(value)) {
            problem(column + " is " + text(column) + "; expected a whole number");
        }
        return Double.isNaN(value) ? low : (int) value;
    }

    /** One of the words of an enum; empty, with a fault, where it is none. */
    <E extends Enum<E>> Optional<E> word(String column, E[] values, Function<E, String> code) {
        String text = text(column);
        Optional<E> found =
                Arrays.stream(values).filter(v -> code.apply(v).equals(text)).findFirst();
        if (found.isEmpty()) {
            List<String> codes = Arrays.stream(values).map(code).toList();
            problem(column + " is " + Numbers.shown(text) + "; expected one of " + String.join(", ", codes));
        }
        return found;
    }

    /** Words separated by spaces. */
    List<String> words(String column) {
        List<String> words = new ArrayList<>();
        for (String word : text(column).split(" ", -1)) {
            if (!word.isEmpty()) {
                words.add(word);
            }
        }
        return words;
    }

    private static String plain(double value) {
        return value == Math.rint(value) && Math.abs(value) < 1e9
                ? Long.toString((long) value)
                : Double.toString(value);
    }
}
