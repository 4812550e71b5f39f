// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/** Reads the members of one JSON object and reports what is missing, of the wrong kind, out of range, or unknown. */
final class JsonReader {
    private final String file;
    private final String path;
    private final Json.Members object;
    private final Problems problems;
    private final Set<String> asked = new HashSet<>();

    JsonReader(String file, String path, Json.Members object, Problems problems) {
        this.file = file;
        this.path = path;
        this.object = object;
        this.problems = problems;
    }

    int line() {
        return object.line();
    }

    /** The line of a member, or of the object where it has none of that name. */
    int line(String key) {
        Json value = object.values().get(key);
        return value == null ? object.line() : value.line();
    }

    void problem(int line, String message) {
        problems.add(file, line, message);
    }

    String text(String key) {
        Json value = required(key);
        if (value instanceof Json.Words words && !words.value().isBlank()) {
            return words.value();
        }
        if (value != null) {
            problem(value.line(), path + key + " is not a text; expected one");
        }
        return "";
    }

    /** A number within a range; NaN, with a fault, where there is none. */
    double number(String key, double low, double high) {
        return required(key) == null ? Double.NaN : orNaN(optional(key, low, high));
    }

    private static double orNaN(@Nullable Double value) {
        return value == null ? Double.NaN : value;
    }

    /** A number within a range where there is one of that name. */
    @Nullable
    Double optional(String key, double low, double high) {
        asked.add(key);
        Json value = object.values().get(key);
        if (value == null) {
            return null;
        }
        double number = value instanceof Json.Figure figure ? Numbers.parse(figure.value()) : Double.NaN;
        if (Double.isNaN(number)) {
            problem(value.line(), path + key + " is not a number; expected one, without quotes");
            return null;
        }
        if (number < low || number > high) {
            problem(value.line(), path + key + " is " + number + "; expected " + low + " to " + high);
            return null;
        }
        return number;
    }

    /** The object of that name; an empty one, with a fault, where there is none. */
    JsonReader object(String key) {
        Json value = required(key);
        return value == null ? empty(key, object.line()) : asObject(key, value);
    }

    /** The object of that name, or an empty one. */
    JsonReader optionalObject(String key) {
        asked.add(key);
        Json value = object.values().get(key);
        return value == null ? empty(key, object.line()) : asObject(key, value);
    }

    private JsonReader asObject(String key, Json value) {
        if (value instanceof Json.Members members) {
            return new JsonReader(file, path + key + ".", members, problems);
        }
        problem(value.line(), path + key + " is not an object; expected {…}");
        return empty(key, value.line());
    }

    private JsonReader empty(String key, int line) {
        return new JsonReader(file, path + key + ".", new Json.Members(line, Map.of()), problems);
    }

    /** The items of the array of that name; none where there is no such array. */
    List<Json> items(String key) {
        asked.add(key);
        Json value = object.values().get(key);
        if (value == null) {
            return List.of();
        }
        if (value instanceof Json.Items items) {
            return items.values();
        }
        problem(value.line(), path + key + " is not a list; expected […]");
        return List.of();
    }

    /** The objects of the array of that name. */
    List<JsonReader> objects(String key) {
        return items(key).stream().map(item -> asObject(key, item)).toList();
    }

    Set<String> keys() {
        return object.values().keySet();
    }

    boolean has(String key) {
        return object.values().containsKey(key);
    }

    /** Reports members that nobody asked for. */
    void rejectUnknown() {
        object.values().forEach((key, value) -> {
            if (!asked.contains(key)) {
                problem(value.line(), "unknown key " + Numbers.shown(path + key) + "; check its spelling");
            }
        });
    }

    private @Nullable Json required(String key) {
        asked.add(key);
        Json value = object.values().get(key);
        if (value == null) {
            problem(object.line(), path + key + " is missing");
        }
        return value;
    }
}
