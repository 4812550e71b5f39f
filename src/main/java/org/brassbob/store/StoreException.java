// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.sql.SQLException;

/** An action that could not be stored; nothing of it was. The message is one line for the officer. */
public final class StoreException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /** Why; SQLite's result codes (sqlite.org, Result and Error Codes) in groups. */
    public enum Reason {
        FULL("the disk is full; expected some free space: make room and enter it again"),
        READ_ONLY("the records can't be written; expected a folder and files that may be changed"),
        DAMAGED("the records file is damaged; expected a whole one: start again, and what can be read is rescued"),
        BUSY("another program holds the records; expected one at a time"),
        REFUSED("the records would contradict each other; expected what the records allow"),
        OTHER("the records can't be read or written");

        private final String text;

        Reason(String text) {
            this.text = text;
        }
    }

    private final Reason reason;

    StoreException(Reason reason, SQLException cause) {
        super(
                reason == Reason.OTHER || reason == Reason.REFUSED
                        ? reason.text + " (" + oneLine(cause) + ")"
                        : reason.text,
                cause);
        this.reason = reason;
    }

    static StoreException of(SQLException e) {
        return new StoreException(reasonOf(e), e);
    }

    static Reason reasonOf(SQLException e) {
        return switch (e.getErrorCode() & 0xff) {
            case 13 -> Reason.FULL;
            case 8, 3, 23 -> Reason.READ_ONLY;
            case 11, 26 -> Reason.DAMAGED;
            case 5, 6 -> Reason.BUSY;
            case 19 -> Reason.REFUSED;
            default -> Reason.OTHER;
        };
    }

    private static String oneLine(SQLException e) {
        return String.valueOf(e.getMessage()).replaceAll("\\s+", " ");
    }

    /** What kind of failure it was. */
    public Reason reason() {
        return reason;
    }
}
