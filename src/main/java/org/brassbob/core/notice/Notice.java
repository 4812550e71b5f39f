// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.notice;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;

/**
 * Something to tell. The words are put together only when asked for.
 *
 * @param code what it is about
 * @param about the tank's id, {@code ship}, or a curve's name
 * @param values what goes into the sentence, in its order: numbers and words
 */
public record Notice(NoticeCode code, String about, List<Object> values) {
    public Notice {
        values = List.copyOf(values);
    }

    /** A notice with its values. */
    public static Notice of(NoticeCode code, String about, Object... values) {
        return new Notice(code, about, List.of(values));
    }

    public Severity severity() {
        return code.severity();
    }

    /** The sentence in English, numbers with a decimal point. */
    public String text() {
        String text = code.sentence();
        for (int i = 0; i < values.size(); i++) {
            text = text.replace("{" + i + "}", shown(values.get(i)));
        }
        return text;
    }

    private static String shown(Object value) {
        if (value instanceof Double number && Double.isFinite(number)) {
            return new BigDecimal(number)
                    .setScale(3, RoundingMode.HALF_EVEN)
                    .stripTrailingZeros()
                    .toPlainString();
        }
        return String.valueOf(value);
    }
}
