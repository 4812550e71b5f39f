// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

/** Numbers as they stand in files: a decimal point, no thousands mark, nothing else. */
final class Numbers {
    private Numbers() {}

    /** The number that a text states, or NaN where it states none. */
    static double parse(String text) {
        if (text.isEmpty() || text.length() > 40 || !hasOnlyNumberSigns(text)) {
            return Double.NaN;
        }
        try {
            double value = Double.parseDouble(text);
            return Double.isInfinite(value) ? Double.NaN : value;
        } catch (NumberFormatException e) {
            return Double.NaN;
        }
    }

    /** Why a text is no number, as a hint after the fault; empty where there is nothing to add. */
    static String hint(String text) {
        if (text.indexOf(',') >= 0) {
            return " (decimal point, no comma)";
        }
        return text.isBlank() || text.strip().equals(text) ? "" : " (no spaces)";
    }

    /** Java would also read hexadecimal, "NaN" and a trailing "d". */
    private static boolean hasOnlyNumberSigns(String text) {
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            boolean sign = (c >= '0' && c <= '9') || c == '.' || c == '-' || c == '+' || c == 'e' || c == 'E';
            if (!sign) {
                return false;
            }
        }
        return true;
    }

    /** A text as shown in a message: quoted, and cut where it is long. */
    static String shown(String text) {
        String oneLine = text.replaceAll("\\p{Cntrl}", "?");
        return "'" + (oneLine.length() > 40 ? oneLine.substring(0, 40) + "…" : oneLine) + "'";
    }
}
