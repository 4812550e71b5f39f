// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What can be wrong with a disk, a folder or a file: each told in a line, nothing lost that could be read. */
class TroubleTest {
    private static final int READINGS = 2000;

    @TempDir
    Path folder;

    private Path filled() {
        try (Store store = Store.open(folder).opened().orElseThrow()) {
            List<ReadingDraft> many = Stream.iterate(1, n -> n + 1)
                    .limit(READINGS)
                    .map(Entries::numbered)
                    .toList();
            store.rounds().add(Entries.ROUND, Entries.START.plusHours(1), many);
        }
        return folder.resolve(Opening.FILE);
    }

    private static void assertOneLine(String message) {
        assertTrue(message.length() > 20 && !message.contains("\n"), message);
    }

    /** Opens a damaged file; every reading that comes back must be one that went in, whole. */
    private int rescued() throws IOException {
        Opened opened = Store.open(folder);
        assertOneLine(opened.message());
        assertTrue(opened.message().contains("brassbob-damaged-"), opened.message());
        int found = 0;
        try (Store store = opened.opened().orElseThrow()) {
            for (StoredRound round : store.rounds().page("barge", 0, 100)) {
                found += round.readings();
            }
            long round = store.rounds().start(Entries.ROUND);
            store.readings().accept(round, Entries.numbered(5));
        }
        try (Stream<Path> files = Files.list(folder)) {
            assertEquals(
                    1,
                    files.filter(f -> f.getFileName().toString().matches("brassbob-damaged-[-0-9]+\\.db"))
                            .count());
        }
        assertEquals("", closedAgain());
        return found;
    }

    private String closedAgain() {
        Opened again = Store.open(folder);
        again.opened().orElseThrow().close();
        return again.message();
    }

    @Test
    void overwrittenPagesCostOnlyTheirRows() throws IOException {
        Path file = filled();
        Random random = new Random(7);
        try (RandomAccessFile raw = new RandomAccessFile(file.toFile(), "rw")) {
            long pages = raw.length() / 4096;
            byte[] noise = new byte[4096];
            for (int i = 0; i < 3; i++) {
                random.nextBytes(noise);
                raw.seek(4096 * (pages / 2 + random.nextInt((int) pages / 3)));
                raw.write(noise);
            }
        }
        int found = rescued();
        assertTrue(found > READINGS / 2, found + " of " + READINGS + " were rescued");
    }

    @Test
    void truncatedFileGivesWhatIsLeft() throws IOException {
        Path file = filled();
        try (RandomAccessFile raw = new RandomAccessFile(file.toFile(), "rw")) {
            raw.setLength(raw.length() * 3 / 4 / 4096 * 4096);
        }
        int found = rescued();
        assertTrue(found > READINGS / 4, found + " of " + READINGS + " were rescued");
    }

    @Test
    void destroyedHeaderLosesNoReading() throws IOException {
        Path file = filled();
        try (RandomAccessFile raw = new RandomAccessFile(file.toFile(), "rw")) {
            raw.write(new byte[100]);
        }
        assertEquals(READINGS, rescued());
    }

    @Test
    void fileOfNoiseIsKeptAndReplaced() throws IOException {
        byte[] noise = new byte[50_000];
        new Random(3).nextBytes(noise);
        Files.write(folder.resolve(Opening.FILE), noise);
        assertEquals(0, rescued());
    }

    @Test
    void secondCopyIsTurnedAway() {
        try (Store first = Store.open(folder).opened().orElseThrow()) {
            Opened second = Store.open(folder);
            assertNull(second.store());
            assertOneLine(second.message());
            assertTrue(second.message().contains("another Brassbob"), second.message());
            first.rounds().start(Entries.ROUND);
        }
        assertEquals("", closedAgain());
    }

    @Test
    void newerRecordsAreLeftAlone() throws IOException {
        try (Store store = Store.open(folder).opened().orElseThrow()) {
            store.database().inTransaction(c -> {
                Database.execute(c, "PRAGMA user_version = 99");
                return 0;
            });
        }
        byte[] before = Files.readAllBytes(folder.resolve(Opening.FILE));
        Opened opened = Store.open(folder);
        assertNull(opened.store());
        assertTrue(opened.message().contains("version 99"), opened.message());
        assertEquals(-1, Arrays.mismatch(before, Files.readAllBytes(folder.resolve(Opening.FILE))));
    }

    /** A file in the folder's place: whoever runs the test, root too, can't make files in it. */
    @Test
    void folderThatCannotBeWrittenIsTold() throws IOException {
        Path place = Files.writeString(folder.resolve("place"), "not a folder");
        Opened opened = Store.open(place);
        assertNull(opened.store());
        assertOneLine(opened.message());
        assertTrue(opened.message().contains("can't be written"), opened.message());
    }

    /** SQLite's own page limit gives the code that a full disk gives, at the same place (sqlite.org, PRAGMA max_page_count). */
    @Test
    void fullDiskKeepsWhatWasAccepted() {
        int accepted;
        try (Store store = Store.open(folder).opened().orElseThrow()) {
            long round = store.rounds().start(Entries.ROUND);
            int pages = store.database()
                    .list("PRAGMA page_count", row -> row.getInt(1))
                    .get(0);
            store.database().list("PRAGMA max_page_count = " + (pages + 3), row -> row.getInt(1));
            accepted = fillUp(store, round);
            store.database().list("PRAGMA max_page_count = 1000000", row -> row.getInt(1));
            store.readings().accept(round, Entries.numbered(accepted + 1));
        }
        try (Store store = Store.open(folder).opened().orElseThrow()) {
            List<StoredReading> all = store.readings()
                    .ofRound(store.rounds().inProgress("barge").orElseThrow().id());
            assertEquals(accepted + 1, all.size());
            for (int i = 0; i < all.size(); i++) {
                assertTrue(Entries.same(Entries.numbered(i + 1), all.get(i).draft()));
            }
        }
    }

    /** Accepts readings until the disk is full; how many were accepted. */
    private static int fillUp(Store store, long round) {
        for (int n = 1; n < 10_000; n++) {
            try {
                store.readings().accept(round, Entries.numbered(n));
            } catch (StoreException e) {
                assertEquals(StoreException.Reason.FULL, e.reason());
                assertOneLine(String.valueOf(e.getMessage()));
                return n - 1;
            }
        }
        throw new AssertionError("the disk was never full");
    }

    @Test
    void failedActionLeavesNothing() {
        try (Store store = Store.open(folder).opened().orElseThrow()) {
            assertThrows(StoreException.class, () -> store.readings().accept(77, Entries.numbered(1)));
            assertEquals(List.of(), store.readings().ofRound(77));
        }
    }
}
