// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.contents;

/** How a tank counts for free surface. */
public enum TankState {
    /** At or under the residue that stripping leaves. */
    EMPTY("empty"),
    /** In between: it has a free surface. */
    SLACK("slack"),
    /** 98 % of capacity and over (2008 IS Code part B 3.1.2). */
    FULL("full"),
    /** Nobody knows: there is no reading. */
    UNKNOWN("unknown");

    /** The share of capacity from which a tank counts as full (2008 IS Code part B 3.1.2). */
    public static final double FULL_SHARE = 0.98;

    private final String code;

    TankState(String code) {
        this.code = code;
    }

    /** The word used in output. */
    public String code() {
        return code;
    }
}
