// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

/** What can be set; the values are text, and what they mean is their reader's business. */
public enum Setting {
    /** Id of the ship shown. */
    VESSEL("vessel"),
    /** Name of the limit curve in force. */
    CURVE("curve"),
    /** Density of the sea as observed (t/m3). */
    SEA_DENSITY("sea-density"),
    /** Per cent. */
    TEXT_SCALE("text-scale"),
    /** Day, sun or night. */
    DRESS("dress"),
    LANGUAGE("language"),
    /** Larger targets for gloved hands. */
    GLOVES("gloves"),
    OFFICER("officer"),
    /** Whether the first cards were seen. */
    FIRST_CARDS("first-cards");

    private final String key;

    Setting(String key) {
        this.key = key;
    }

    String key() {
        return key;
    }
}
