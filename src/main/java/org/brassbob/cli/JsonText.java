// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.cli;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.math.RoundingMode;
import org.jspecify.annotations.Nullable;

/** One JSON document. Numbers carry nine decimals at the most, what isn't known is null. */
final class JsonText {
    private static final int DECIMALS = 9;

    private final JsonGenerator json;

    private JsonText(JsonGenerator json) {
        this.json = json;
    }

    /** Writes the content of a document. */
    interface Content {
        void write(JsonText json) throws IOException;
    }

    static String document(Content content) {
        StringWriter text = new StringWriter();
        try (JsonGenerator generator = new JsonFactory().createGenerator(text)) {
            generator.setPrettyPrinter(new DefaultPrettyPrinter());
            generator.writeStartObject();
            content.write(new JsonText(generator));
            generator.writeEndObject();
        } catch (IOException e) {
            throw new UncheckedIOException("writing to memory", e);
        }
        return text + System.lineSeparator();
    }

    JsonText object(String name, Content content) throws IOException {
        json.writeObjectFieldStart(name);
        content.write(this);
        json.writeEndObject();
        return this;
    }

    /** Writes the items of a list, each an object. */
    <T> JsonText list(String name, Iterable<T> items, ItemContent<T> content) throws IOException {
        json.writeArrayFieldStart(name);
        for (T item : items) {
            json.writeStartObject();
            content.write(this, item);
            json.writeEndObject();
        }
        json.writeEndArray();
        return this;
    }

    /** Writes one item of a list. */
    interface ItemContent<T> {
        void write(JsonText json, T item) throws IOException;
    }

    JsonText words(String name, Iterable<String> words) throws IOException {
        json.writeArrayFieldStart(name);
        for (String word : words) {
            json.writeString(word);
        }
        json.writeEndArray();
        return this;
    }

    JsonText put(String name, @Nullable String value) throws IOException {
        json.writeStringField(name, value);
        return this;
    }

    JsonText put(String name, boolean value) throws IOException {
        json.writeBooleanField(name, value);
        return this;
    }

    JsonText put(String name, double value) throws IOException {
        json.writeFieldName(name);
        if (Double.isFinite(value)) {
            BigDecimal rounded = new BigDecimal(value).setScale(DECIMALS, RoundingMode.HALF_EVEN);
            json.writeNumber(
                    rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString());
        } else {
            json.writeNull();
        }
        return this;
    }

    JsonText nothing(String name) throws IOException {
        json.writeNullField(name);
        return this;
    }
}
