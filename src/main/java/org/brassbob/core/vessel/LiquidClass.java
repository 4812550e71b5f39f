// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.vessel;

/** The classes of liquid that a tank may hold, as in the {@code class} column of liquids.csv. */
public enum LiquidClass {
    SEA_WATER("sea-water"),
    FRESH_WATER("fresh-water"),
    FUEL_OIL("fuel-oil"),
    GAS_OIL("gas-oil"),
    LUBE_OIL("lube-oil"),
    HYDRAULIC_OIL("hydraulic-oil"),
    GREY_WATER("grey-water"),
    BLACK_WATER("black-water"),
    OILY_WATER("oily-water"),
    UREA("urea"),
    CARGO("cargo"),
    /** A space that should be dry. */
    NONE("none");

    private final String code;

    LiquidClass(String code) {
        this.code = code;
    }

    /** The word used in files. */
    public String code() {
        return code;
    }
}
