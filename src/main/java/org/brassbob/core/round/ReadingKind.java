// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.round;

/** What a reading states, as in the {@code kind} column of a round. */
public enum ReadingKind {
    /** Depth of liquid along the pipe (m). */
    SOUNDING("sounding", true),
    /** From the rim of the pipe down to the liquid (m). */
    ULLAGE("ullage", true),
    /** m3. */
    VOLUME("volume", true),
    /** Per cent of capacity. */
    PERCENT("percent", true),
    /** t. */
    MASS("mass", true),
    EMPTY("empty", false),
    FULL("full", false),
    /** No reading could be had; the note says why. */
    NOT_TAKEN("not-taken", false);

    private final String code;
    private final boolean hasValue;

    ReadingKind(String code, boolean hasValue) {
        this.code = code;
        this.hasValue = hasValue;
    }

    /** The word used in files. */
    public String code() {
        return code;
    }

    /** Whether a number belongs to it. */
    public boolean hasValue() {
        return hasValue;
    }
}
