// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.vessel;

/**
 * How a liquid's density changes with temperature, as in the {@code expansion} column of liquids.csv. The petroleum groups are those
 * of API MPMS chapter 11.1 (ASTM D1250-80, ISO 91-1); their density is stated at 15 °C.
 */
public enum Expansion {
    NONE("none"),
    /** The generalized product group that the density at 15 °C falls into (table 54B). */
    PETROLEUM("petroleum"),
    /** Lubricating and hydraulic oils (table 54D). */
    PETROLEUM_LUBRICANT("petroleum-lubricant");

    private final String code;

    Expansion(String code) {
        this.code = code;
    }

    /** The word used in files. */
    public String code() {
        return code;
    }
}
