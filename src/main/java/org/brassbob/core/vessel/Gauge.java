// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.vessel;

/** How a tank is usually read. */
public enum Gauge {
    SOUNDING("sounding"),
    ULLAGE("ullage"),
    REMOTE("remote");

    private final String code;

    Gauge(String code) {
        this.code = code;
    }

    /** The word used in files. */
    public String code() {
        return code;
    }
}
