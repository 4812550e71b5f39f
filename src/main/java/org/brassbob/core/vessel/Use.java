// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.vessel;

/** Whether a tank's level stays on passage (ballast, cargo) or runs down (2008 IS Code part B 3.1.3). */
public enum Use {
    FIXED("fixed"),
    CONSUMABLE("consumable");

    private final String code;

    Use(String code) {
        this.code = code;
    }

    /** The word used in files. */
    public String code() {
        return code;
    }
}
