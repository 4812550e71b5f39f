// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.architecture;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

/** Tests run, all of them, and don't wait. */
class TestHabitsTest {
    private static final Set<String> TESTS =
            Set.of("Test", "ParameterizedTest", "RepeatedTest", "TestFactory", "TestTemplate", "Property", "Example");

    private static boolean isPickedUp(Path file) {
        String name = file.getFileName().toString();
        return name.endsWith("Test.java") || name.endsWith("Properties.java");
    }

    private static Set<Path> filesWithTests() {
        return Sources.methods(Sources.TEST).stream()
                .filter(m -> m.annotations().stream().anyMatch(TESTS::contains))
                .map(Sources.Method::file)
                .collect(Collectors.toCollection(TreeSet::new));
    }

    @Test
    void everyTestHasANameThatRuns() {
        Set<Path> files = filesWithTests();
        assertTrue(files.size() > 20, "only " + files.size() + " files with tests were seen");
        List<Path> missed = files.stream().filter(f -> !isPickedUp(f)).toList();
        assertEquals(
                List.of(),
                missed,
                "because the runner takes *Test and *Properties and passes over the rest without a word");
    }

    @Test
    void everyNameThatRunsHasTests() {
        Set<Path> files = filesWithTests();
        List<Path> hollow = Sources.files(Sources.TEST).stream()
                .filter(f -> isPickedUp(f) && !files.contains(f))
                .toList();
        assertEquals(List.of(), hollow, "because a test class without tests looks as if it passed");
    }

    @Test
    void noTestIsSwitchedOff() {
        List<Path> off = Sources.files(Sources.TEST).stream()
                .filter(f -> Sources.read(f).contains("org.junit.jupiter.api.Disabled"))
                .filter(f -> !f.endsWith("TestHabitsTest.java"))
                .toList();
        assertEquals(List.of(), off, "because a test that doesn't run proves nothing");
    }

    @Test
    void noTestSleeps() {
        noClasses()
                .should()
                .callMethod(Thread.class, "sleep", long.class)
                .because("a test that waits is slow when it passes and red when the machine is busy")
                .check(Classes.TESTS);
    }
}
