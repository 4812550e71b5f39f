// SPDX-License-Identifier: GPL-3.0-or-later

/** Brassbob. Without {@code java.desktop}: what ships to a tablet has no AWT and no Swing. */
module org.brassbob {
    requires static org.jspecify;
    requires com.fasterxml.jackson.core;
    requires de.siegmar.fastcsv;
    requires info.picocli;
    requires java.sql;
    requires org.xerial.sqlitejdbc;
}
