// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.vessel;

/** A tank, or a void (cofferdam, chain locker, bilge well) that should read dry. */
public enum SpaceKind {
    TANK("tank"),
    VOID("void");

    private final String code;

    SpaceKind(String code) {
        this.code = code;
    }

    /** The word used in files. */
    public String code() {
        return code;
    }
}
