// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.store;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.File;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.locks.LockSupport;
import org.brassbob.core.round.ReadingKind;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Kills (SIGKILL) a process that accepts readings, again and again: {@code -Dbrassbob.kills=N} for another number than 300. */
class KillTest {
    private static final int KILLS = Integer.getInteger("brassbob.kills", 300);

    @TempDir
    Path folder;

    /** One folder that is killed over and over, and what its children said was accepted. */
    private static final class Victim {
        private final Path folder;
        private final Random random;
        private final Map<Long, Integer> promised = new HashMap<>();
        private int next = 1;

        Victim(Path folder, long seed) {
            this.folder = folder;
            this.random = new Random(seed);
        }

        void killOnce() throws IOException, InterruptedException {
            Process child = start(folder, next);
            try (BufferedReader out = child.inputReader(StandardCharsets.UTF_8)) {
                int lines = random.nextInt(25);
                for (int i = 0; i < lines; i++) {
                    promise(out.readLine());
                }
                LockSupport.parkNanos(random.nextInt(8_000_000));
                // Not Process.destroyForcibly, which drops what was printed and not yet read.
                child.toHandle().destroyForcibly();
                child.waitFor();
                out.lines().filter(line -> line.matches("\\d+ \\d+ ok")).forEach(this::promise);
            } finally {
                child.destroyForcibly();
            }
            assertEquals(128 + 9, child.exitValue(), "the child ended by itself");
            check();
        }

        private void promise(String line) {
            assertTrue(line != null, "the child ended by itself");
            String[] parts = line.split(" ", 3);
            promised.put(Long.parseLong(parts[0]), Integer.parseInt(parts[1]));
            next = Math.max(next, Integer.parseInt(parts[1]) + 1);
        }

        private void check() {
            Opened opened = Store.open(folder);
            assertEquals("", opened.message());
            try (Store store = opened.opened().orElseThrow()) {
                List<StoredRound> rounds = store.rounds().page("barge", 0, 10);
                if (rounds.isEmpty()) {
                    assertTrue(promised.isEmpty(), "readings accepted, but no round");
                    return;
                }
                assertEquals(1, rounds.size());
                assertEquals(rounds.get(0), store.rounds().inProgress("barge").orElseThrow());
                List<StoredReading> stored =
                        store.readings().ofRound(rounds.get(0).id());
                Map<Long, Integer> found = new HashMap<>();
                for (StoredReading one : stored) {
                    assertEquals(ReadingKind.SOUNDING, one.draft().reading().kind());
                    int number = (int) Math.round(one.draft().reading().value() * 1000);
                    assertTrue(Entries.same(Entries.numbered(number), one.draft()), "a half record: " + one);
                    found.put(one.id(), number);
                    next = Math.max(next, number + 1);
                }
                promised.forEach((id, number) -> assertEquals(number, found.get(id), "reading " + id));
                promised.putAll(found);
            }
        }
    }

    private static Process start(Path folder, int next) throws IOException {
        return new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-Xshare:auto",
                        "-XX:TieredStopAtLevel=1",
                        "-XX:+UseSerialGC",
                        "-Xmx64m",
                        "-cp",
                        classPath(),
                        AcceptingChild.class.getName(),
                        folder.toString(),
                        Integer.toString(next))
                .redirectError(ProcessBuilder.Redirect.INHERIT)
                .start();
    }

    @Test
    void secondProcessIsTurnedAwayUntilTheFirstEnds() throws Exception {
        Process first = start(folder, 1);
        try (BufferedReader out = first.inputReader(StandardCharsets.UTF_8)) {
            out.readLine();
            Opened second = Store.open(folder);
            assertEquals(Optional.empty(), second.opened());
            assertTrue(second.message().contains("another Brassbob"), second.message());
            assertTrue(out.readLine().endsWith(" ok"), "the first goes on");
        } finally {
            first.destroyForcibly().waitFor();
        }
        Opened after = Store.open(folder);
        assertEquals("", after.message());
        after.opened().orElseThrow().close();
    }

    private static String classPath() {
        return List.of(System.getProperty("java.class.path").split(File.pathSeparator)).stream()
                .filter(p -> p.contains("classes") || p.contains("sqlite"))
                .reduce((a, b) -> a + File.pathSeparator + b)
                .orElseThrow();
    }

    @Test
    void noAcceptedReadingIsLostWhenTheProcessIsKilled() throws Exception {
        ExecutorService pool = Executors.newFixedThreadPool(2);
        try {
            List<Future<Victim>> victims =
                    pool.invokeAll(List.of(killed("a", KILLS - KILLS / 2, 1), killed("b", KILLS / 2, 2)));
            int readings = 0;
            for (Future<Victim> victim : victims) {
                readings += victim.get().promised.size();
            }
            assertTrue(readings > KILLS, "only " + readings + " readings were accepted in " + KILLS + " kills");
        } finally {
            pool.shutdownNow();
        }
    }

    private Callable<Victim> killed(String name, int times, long seed) {
        return () -> {
            Victim victim = new Victim(folder.resolve(name), seed);
            for (int i = 0; i < times; i++) {
                victim.killOnce();
            }
            return victim;
        };
    }
}
