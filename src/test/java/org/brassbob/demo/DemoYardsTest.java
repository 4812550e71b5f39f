// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.demo;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * What stands in vessel-data is what the yards write, to the byte: a cell changed by hand, or a tabulation that gives other figures than
 * those that were checked, shows here. The rounds are written by hand and are left out.
 */
class DemoYardsTest {
    private static final Path DELIVERED = Path.of("vessel-data");

    @Test
    void heronIsWhatHerYardWrites(@TempDir Path built) throws IOException {
        String[] folder = {built.toString()};
        HeronYard.main(folder);
        HeronTables.main(folder);
        assertSameFiles(DELIVERED.resolve("heron"), built);
    }

    @Test
    void dabchickIsWhatHerYardWrites(@TempDir Path built) throws IOException {
        TenderYard.main(new String[] {built.toString()});
        assertSameFiles(DELIVERED.resolve("dabchick"), built);
    }

    private static void assertSameFiles(Path delivered, Path built) throws IOException {
        Map<String, String> expected = contents(delivered);
        Map<String, String> found = contents(built);
        assertTrue(expected.size() > 20, "only " + expected.keySet());
        assertEquals(expected.keySet(), found.keySet());
        expected.forEach((file, text) -> assertEquals(text, found.get(file), file));
    }

    private static Map<String, String> contents(Path folder) throws IOException {
        Map<String, String> contents = new TreeMap<>();
        try (Stream<Path> paths = Files.walk(folder)) {
            for (Path path : paths.filter(Files::isRegularFile).toList()) {
                String file = folder.relativize(path).toString().replace('\\', '/');
                if (!file.startsWith("rounds/")) {
                    contents.put(file, Files.readString(path));
                }
            }
        }
        return contents;
    }
}
