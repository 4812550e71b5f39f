// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob;

/** Where the program starts. */
public final class Main {
    private Main() {}

    public static void main(String[] args) {
        System.out.println("Brassbob");
    }
}
