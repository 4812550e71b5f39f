// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

/** How quiet the ship lies while she is sounded. */
public enum Conditions {
    ALONGSIDE("alongside"),
    AT_SEA("at-sea"),
    ROUGH("rough");

    private final String code;

    Conditions(String code) {
        this.code = code;
    }

    /** The word stored. */
    public String code() {
        return code;
    }

    static Conditions of(String code) {
        for (Conditions one : values()) {
            if (one.code.equals(code)) {
                return one;
            }
        }
        throw new IllegalArgumentException("conditions " + code + "; expected alongside, at-sea or rough");
    }
}
