// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import java.nio.file.Path;

/** A process that accepts readings one after another and prints the id and number of each once it is accepted, until it is killed. */
final class AcceptingChild {
    private AcceptingChild() {}

    @SuppressWarnings("SystemOut")
    public static void main(String[] args) {
        Store store = Store.open(Path.of(args[0])).opened().orElseThrow();
        long round = store.rounds().inProgress("barge").map(StoredRound::id).orElseGet(() -> store.rounds()
                .start(Entries.ROUND));
        for (int n = Integer.parseInt(args[1]); ; n++) {
            long id = store.readings().accept(round, Entries.numbered(n));
            System.out.println(id + " " + n + " ok");
        }
    }
}
