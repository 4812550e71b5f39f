// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.architecture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Rules that are read off the sources: sizes, package descriptions, names that the test runner would miss. */
class SourceTest {
    private static final int LONGEST_FILE = 350;
    private static final int LONGEST_METHOD = 60;
    private static final int MOST_PARAMETERS = 6;
    private static final Path MAIN = Path.of("src/main/java");
    private static final Path TEST = Path.of("src/test/java");
    private static final Pattern METHOD = Pattern.compile("(?m)^ {4}(?:[\\w@<>?,.\\[\\] ]+)\\([^;{]*\\)[^;{]*\\{$");
    private static final Pattern PUBLIC_CONSTRUCTOR =
            Pattern.compile("(?m)^ {4}(?:public )?([A-Z]\\w*)\\(([^)]*)\\)[^;{]*\\{");

    private static List<Path> sources(Path root) {
        try (Stream<Path> files = Files.walk(root)) {
            return files.filter(f -> f.toString().endsWith(".java")).toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static String read(Path file) {
        try {
            return Files.readString(file);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    @Test
    void filesAreShort() {
        List<String> tooLong = new ArrayList<>();
        for (Path file : sources(MAIN)) {
            long lines = read(file).lines().count();
            if (lines > LONGEST_FILE) {
                tooLong.add(file + " has " + lines + " lines");
            }
        }
        assertEquals(List.of(), tooLong, "a file holds one idea");
    }

    @Test
    void methodsAreShort() {
        List<String> tooLong = new ArrayList<>();
        int methods = 0;
        for (Path file : sources(MAIN)) {
            String text = read(file);
            var matcher = METHOD.matcher(text);
            while (matcher.find()) {
                methods++;
                int end = text.indexOf("\n    }", matcher.end() - 1);
                long lines = text.substring(matcher.start(), Math.max(matcher.end(), end))
                        .lines()
                        .count();
                if (lines > LONGEST_METHOD) {
                    tooLong.add(file + ": "
                            + matcher.group().strip().lines().findFirst().orElse("") + " " + lines);
                }
            }
        }
        assertTrue(methods > 300, "only " + methods + " methods were seen");
        assertEquals(List.of(), tooLong, "a method fits on a screen");
    }

    @Test
    void constructorsTakeFewParameters() {
        List<String> tooMany = new ArrayList<>();
        int constructors = 0;
        for (Path file : sources(MAIN)) {
            var matcher = PUBLIC_CONSTRUCTOR.matcher(read(file));
            while (matcher.find()) {
                constructors++;
                String parameters = matcher.group(2).replaceAll("<[^>]*>", "");
                long count = parameters.isBlank()
                        ? 0
                        : parameters.chars().filter(c -> c == ',').count() + 1;
                if (count > MOST_PARAMETERS) {
                    tooMany.add(file + " " + matcher.group(1) + " " + count);
                }
            }
        }
        assertTrue(constructors > 10, "only " + constructors + " constructors were seen");
        assertEquals(List.of(), tooMany, "a class that needs more is two classes");
    }

    @Test
    void everyPackageIsDescribedAndNullMarked() {
        List<String> bare = new ArrayList<>();
        for (Path root : List.of(MAIN, TEST)) {
            sources(root).stream()
                    .filter(f -> !f.getFileName().toString().equals("module-info.java"))
                    .map(f -> f.resolveSibling("package-info.java"))
                    .distinct()
                    .filter(f -> !Files.exists(inMain(f)) || !read(inMain(f)).contains("@NullMarked"))
                    .forEach(f -> bare.add(f.toString()));
        }
        assertEquals(List.of(), bare, "null is checked only where a package says so");
    }

    /** A test package beside a package of the product is described there. */
    private static Path inMain(Path packageInfo) {
        if (packageInfo.startsWith(TEST)) {
            Path twin = MAIN.resolve(TEST.relativize(packageInfo));
            return Files.exists(twin) ? twin : packageInfo;
        }
        return packageInfo;
    }

    @Test
    void everyTestClassHasANameThatRuns() {
        List<String> missed = new ArrayList<>();
        for (Path file : sources(TEST)) {
            String name = file.getFileName().toString();
            boolean hasTests = Pattern.compile(
                            "(?m)^    @(Test|Property|ParameterizedTest|RepeatedTest|TestFactory)\\b")
                    .matcher(read(file))
                    .find();
            if (hasTests && !name.endsWith("Test.java") && !name.endsWith("Properties.java")) {
                missed.add(file.toString());
            }
        }
        assertEquals(
                List.of(), missed, "the runner takes *Test and *Properties and passes over the rest without a word");
    }
}
