// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** A JSON document as a tree in which every value knows its line. */
sealed interface Json {
    int line();

    /** An object; a key given twice is a fault. */
    record Members(int line, Map<String, Json> values) implements Json {}

    /** An array. */
    record Items(int line, List<Json> values) implements Json {}

    /** A string. */
    record Words(int line, String value) implements Json {}

    /** A number as written. */
    record Figure(int line, String value) implements Json {}

    /** true, false or null. */
    record Other(int line, String value) implements Json {}

    /** The document; empty, with a fault, where it is no JSON object. */
    static Optional<Members> read(String file, byte[] bytes, Problems problems) {
        return Text.decode(file, bytes, problems).flatMap(text -> parse(file, text, problems));
    }

    private static Optional<Members> parse(String file, String text, Problems problems) {
        try (JsonParser parser = new JsonFactory().createParser(text)) {
            parser.nextToken();
            if (parser.currentToken() != JsonToken.START_OBJECT) {
                problems.add(file, 1, "not a JSON object; expected {…}");
                return Optional.empty();
            }
            Members root = members(parser, file, problems);
            if (parser.nextToken() != null) {
                problems.add(
                        file,
                        parser.currentTokenLocation().getLineNr(),
                        "more after the JSON object; expected its end");
                return Optional.empty();
            }
            return Optional.of(root);
        } catch (JsonProcessingException e) {
            int line = e.getLocation() == null ? 1 : Math.max(1, e.getLocation().getLineNr());
            problems.add(file, line, "not JSON: " + firstLine(e.getOriginalMessage()));
            return Optional.empty();
        } catch (IOException e) {
            problems.add(file, 1, "can't be read; expected a JSON object");
            return Optional.empty();
        }
    }

    private static String firstLine(String message) {
        String line = message.lines().findFirst().orElse("");
        return line.length() > 160 ? line.substring(0, 160) + "…" : line;
    }

    private static Json value(JsonParser parser, String file, Problems problems) throws IOException {
        int line = parser.currentTokenLocation().getLineNr();
        return switch (parser.currentToken()) {
            case START_OBJECT -> members(parser, file, problems);
            case START_ARRAY -> items(parser, file, problems);
            case VALUE_STRING -> new Words(line, parser.getText());
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> new Figure(line, parser.getText());
            default -> new Other(line, parser.getText());
        };
    }

    private static Members members(JsonParser parser, String file, Problems problems) throws IOException {
        int line = parser.currentTokenLocation().getLineNr();
        Map<String, Json> values = new LinkedHashMap<>();
        while (parser.nextToken() == JsonToken.FIELD_NAME) {
            String key = parser.currentName();
            int keyLine = parser.currentTokenLocation().getLineNr();
            parser.nextToken();
            if (values.put(key, value(parser, file, problems)) != null) {
                problems.add(file, keyLine, "key " + Numbers.shown(key) + " given twice; expected it once");
            }
        }
        return new Members(line, values);
    }

    private static Items items(JsonParser parser, String file, Problems problems) throws IOException {
        int line = parser.currentTokenLocation().getLineNr();
        List<Json> values = new ArrayList<>();
        while (parser.nextToken() != JsonToken.END_ARRAY) {
            values.add(value(parser, file, problems));
        }
        return new Items(line, values);
    }
}
