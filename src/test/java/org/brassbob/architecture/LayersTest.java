// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.architecture;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class LayersTest {
    @Test
    void rulesHaveSomethingToJudge() {
        assertTrue(Classes.MAIN.size() > 80, "only " + Classes.MAIN.size() + " classes were found");
    }

    @Test
    void packagesHaveNoCycles() {
        slices().matching("org.brassbob.(**)")
                .should()
                .beFreeOfCycles()
                .because("a package that can be understood alone can be changed alone")
                .check(Classes.MAIN);
    }

    @Test
    void coreKnowsOnlyJavaAndItself() {
        classes()
                .that()
                .resideInAPackage("org.brassbob.core..")
                .should()
                .onlyDependOnClassesThat()
                .resideInAnyPackage(
                        "org.brassbob.core..",
                        "java.lang",
                        "java.lang.invoke",
                        "java.lang.runtime",
                        "java.math",
                        "java.time",
                        "java.time.chrono",
                        "java.util",
                        "java.util.concurrent",
                        "java.util.function",
                        "java.util.stream",
                        "org.jspecify.annotations")
                .because("the core knows no screens, database, files, network or logging, and ships everywhere")
                .check(Classes.MAIN);
    }

    @Test
    void dataDoesNotKnowTheCommandLine() {
        noClasses()
                .that()
                .resideInAPackage("org.brassbob.data..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("org.brassbob.cli..", "org.brassbob", "picocli..")
                .because("files are read the same for every way in")
                .check(Classes.MAIN);
    }

    @Test
    void onlyMainKnowsTheCommandLine() {
        noClasses()
                .that()
                .resideOutsideOfPackages("org.brassbob.cli..", "org.brassbob")
                .should()
                .dependOnClassesThat()
                .resideInAPackage("org.brassbob.cli..")
                .because("the command line is a way in, not a library")
                .check(Classes.MAIN);
    }

    @Test
    void contentsComesBeforeCondition() {
        noClasses()
                .that()
                .resideInAnyPackage(
                        "org.brassbob.core.geometry..",
                        "org.brassbob.core.table..",
                        "org.brassbob.core.vessel..",
                        "org.brassbob.core.round..",
                        "org.brassbob.core.contents..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage(
                        "org.brassbob.core.condition..", "org.brassbob.core.audit..", "org.brassbob.core.tabulate..")
                .because("what a tank holds is worked out before what the ship does with it")
                .check(Classes.MAIN);
    }
}
