// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.core.notice;

/** How much a notice weighs, lightest first. */
public enum Severity {
    NOTE("note"),
    CAUTION("caution"),
    STOP("stop");

    private final String code;

    Severity(String code) {
        this.code = code;
    }

    /** The word used in output. */
    public String code() {
        return code;
    }
}
