// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/** A JSON document read back, as maps, lists, texts, numbers and nulls. */
final class JsonTree {
    private final @Nullable Object value;

    private JsonTree(@Nullable Object value) {
        this.value = value;
    }

    static JsonTree parse(String text) {
        try (JsonParser parser = new JsonFactory().createParser(text)) {
            parser.nextToken();
            JsonTree tree = new JsonTree(read(parser));
            if (parser.nextToken() != null) {
                throw new IllegalArgumentException("more than one document");
            }
            return tree;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static @Nullable Object read(JsonParser parser) throws IOException {
        switch (parser.currentToken()) {
            case START_OBJECT -> {
                Map<String, @Nullable Object> members = new LinkedHashMap<>();
                while (parser.nextToken() != JsonToken.END_OBJECT) {
                    String key = parser.currentName();
                    parser.nextToken();
                    members.put(key, read(parser));
                }
                return members;
            }
            case START_ARRAY -> {
                List<@Nullable Object> items = new ArrayList<>();
                while (parser.nextToken() != JsonToken.END_ARRAY) {
                    items.add(read(parser));
                }
                return items;
            }
            case VALUE_STRING -> {
                return parser.getText();
            }
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> {
                return parser.getDoubleValue();
            }
            case VALUE_TRUE, VALUE_FALSE -> {
                return parser.getBooleanValue();
            }
            default -> {
                return null;
            }
        }
    }

    JsonTree get(String key) {
        if (!(value instanceof Map<?, ?> members) || !members.containsKey(key)) {
            throw new IllegalArgumentException("no key " + key + " in " + value);
        }
        return new JsonTree(members.get(key));
    }

    List<JsonTree> items() {
        List<JsonTree> items = new ArrayList<>();
        for (Object item : (List<?>) Objects.requireNonNull(value)) {
            items.add(new JsonTree(item));
        }
        return items;
    }

    Set<String> keys() {
        Set<String> keys = new java.util.LinkedHashSet<>();
        for (Object key : ((Map<?, ?>) Objects.requireNonNull(value)).keySet()) {
            keys.add(String.valueOf(key));
        }
        return keys;
    }

    double number() {
        return (Double) Objects.requireNonNull(value);
    }

    String text() {
        return (String) Objects.requireNonNull(value);
    }

    boolean isNull() {
        return value == null;
    }

    boolean truth() {
        return (Boolean) Objects.requireNonNull(value);
    }
}
