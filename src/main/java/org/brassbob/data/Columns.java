// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.data;

import java.util.List;
import java.util.function.Predicate;

/**
 * The columns that a file may have.
 *
 * @param required those it must have
 * @param optional those it may have
 * @param alsoAllowed further names it may have
 */
record Columns(List<String> required, List<String> optional, Predicate<String> alsoAllowed) {
    static Columns of(List<String> required, String... optional) {
        return new Columns(required, List.of(optional), name -> false);
    }

    boolean allows(String name) {
        return required.contains(name) || optional.contains(name) || alsoAllowed.test(name);
    }
}
