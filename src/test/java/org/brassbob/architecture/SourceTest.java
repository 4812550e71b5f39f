// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.architecture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.sun.source.tree.Tree;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Rules that are read off the sources: sizes and package descriptions. */
class SourceTest {
    private static final int LONGEST_FILE = 350;
    private static final int LONGEST_METHOD = 60;
    private static final int MOST_PARAMETERS = 6;

    @Test
    void filesAreShort() {
        List<String> tooLong = new ArrayList<>();
        for (Path file : Sources.files(Sources.MAIN)) {
            long lines = Sources.read(file).lines().count();
            if (lines > LONGEST_FILE) {
                tooLong.add(file + " has " + lines + " lines");
            }
        }
        assertEquals(List.of(), tooLong, "because a file holds one idea");
    }

    @Test
    void methodsAreShort() {
        List<Sources.Method> methods = Sources.methods(Sources.MAIN);
        assertTrue(methods.size() > 500, "only " + methods.size() + " methods were seen");
        List<String> tooLong = methods.stream()
                .filter(m -> m.lines() > LONGEST_METHOD)
                .map(m -> m.file() + ": " + m.name() + " has " + m.lines() + " lines")
                .toList();
        assertEquals(List.of(), tooLong, "because a method fits on a screen");
    }

    /** Records name every figure that travels together; a private constructor serves only its own factory. */
    @Test
    void constructorsTakeFewParameters() {
        List<Sources.Method> constructors = Sources.methods(Sources.MAIN).stream()
                .filter(m -> m.name().equals("<init>") && m.owner() == Tree.Kind.CLASS)
                .toList();
        assertTrue(constructors.size() > 50, "only " + constructors.size() + " constructors were seen");
        List<String> tooMany = constructors.stream()
                .filter(m -> !m.hidden() && m.parameters() > MOST_PARAMETERS)
                .map(m -> m.file() + " takes " + m.parameters() + " parameters")
                .toList();
        assertEquals(List.of(), tooMany, "because a class that needs more is two classes");
    }

    @Test
    void everyPackageIsDescribedAndNullMarked() {
        List<Path> bare = Stream.of(Sources.MAIN, Sources.TEST)
                .flatMap(root -> Sources.files(root).stream())
                .filter(f -> !f.endsWith("module-info.java"))
                .map(f -> f.resolveSibling("package-info.java"))
                .distinct()
                .map(SourceTest::whereDescribed)
                .filter(f -> !Files.exists(f) || !describes(Sources.read(f)))
                .toList();
        assertEquals(List.of(), bare, "because null is checked only where a package says so");
    }

    private static boolean describes(String packageInfo) {
        return packageInfo.contains("/**") && packageInfo.contains("\n@NullMarked\n");
    }

    /** A test package beside a package of the product is described there. */
    private static Path whereDescribed(Path packageInfo) {
        if (!packageInfo.startsWith(Sources.TEST)) {
            return packageInfo;
        }
        Path twin = Sources.MAIN.resolve(Sources.TEST.relativize(packageInfo));
        return Files.exists(twin) ? twin : packageInfo;
    }
}
