// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.architecture;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

/** Which package may know which. Layers that have no classes yet are named, so that their first class finds its place. */
class LayersTest {
    @Test
    void rulesHaveSomethingToJudge() {
        long core = Classes.MAIN.stream()
                .filter(c -> c.getPackageName().startsWith("org.brassbob.core."))
                .count();
        assertTrue(core > 60, "only " + core + " classes of the core were found");
        assertTrue(Classes.MAIN.size() > core, "only classes of the core were found");
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
    void layersKnowOnlyWhatLiesBelow() {
        layeredArchitecture()
                .consideringOnlyDependenciesInLayers()
                .withOptionalLayers(true)
                .layer("main")
                .definedBy("org.brassbob")
                .layer("app")
                .definedBy("org.brassbob.app..")
                .layer("ui")
                .definedBy("org.brassbob.ui..")
                .layer("cli")
                .definedBy("org.brassbob.cli..")
                .layer("store")
                .definedBy("org.brassbob.store..")
                .layer("report")
                .definedBy("org.brassbob.report..")
                .layer("data")
                .definedBy("org.brassbob.data..")
                .layer("platform")
                .definedBy("org.brassbob.platform..")
                .layer("core")
                .definedBy("org.brassbob.core..")
                .whereLayer("main")
                .mayNotBeAccessedByAnyLayer()
                .whereLayer("app")
                .mayOnlyBeAccessedByLayers("main")
                .whereLayer("ui")
                .mayOnlyBeAccessedByLayers("app")
                .whereLayer("cli")
                .mayOnlyBeAccessedByLayers("main")
                .whereLayer("store")
                .mayOnlyBeAccessedByLayers("app", "ui")
                .whereLayer("report")
                .mayOnlyBeAccessedByLayers("app", "ui", "cli")
                .whereLayer("data")
                .mayOnlyBeAccessedByLayers("app", "ui", "cli")
                .whereLayer("platform")
                .mayOnlyBeAccessedByLayers("app", "ui")
                .whereLayer("core")
                .mayOnlyBeAccessedByLayers("app", "ui", "cli", "store", "report", "data")
                .ensureAllClassesAreContainedInArchitecture()
                .because("ways in and out come and go; what they have in common stays")
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
    void coreGoesFromTablesToTheShip() {
        layeredArchitecture()
                .consideringOnlyDependenciesInLayers()
                .layer("figures")
                .definedBy("org.brassbob.core.table..", "org.brassbob.core.notice..", "org.brassbob.core.working..")
                .layer("ship")
                .definedBy("org.brassbob.core.geometry..", "org.brassbob.core.vessel..", "org.brassbob.core.round..")
                .layer("contents")
                .definedBy("org.brassbob.core.contents..")
                .layer("condition")
                .definedBy("org.brassbob.core.condition..")
                .layer("audit")
                .definedBy("org.brassbob.core.audit..")
                .layer("tabulate")
                .definedBy("org.brassbob.core.tabulate..")
                .whereLayer("figures")
                .mayNotAccessAnyLayer()
                .whereLayer("ship")
                .mayOnlyAccessLayers("figures")
                .whereLayer("contents")
                .mayOnlyAccessLayers("figures", "ship")
                .whereLayer("condition")
                .mayOnlyAccessLayers("figures", "ship", "contents", "tabulate")
                .whereLayer("tabulate")
                .mayOnlyAccessLayers("figures", "ship", "contents")
                .whereLayer("audit")
                .mayOnlyAccessLayers("figures", "ship", "contents", "tabulate")
                .because(
                        "what a tank holds is worked out before what the ship does with it, and is checked apart from it")
                .check(Classes.MAIN);
    }

    @Test
    void librariesStayInTheirPlace() {
        keep("picocli..", "org.brassbob.cli..");
        keep("de.siegmar..", "org.brassbob.data..");
        keep("com.fasterxml..", "org.brassbob.data..", "org.brassbob.cli..");
        keep("javafx..", "org.brassbob.ui..", "org.brassbob.app..");
        keep("java.sql..", "org.brassbob.store..");
        keep("javax.sql..", "org.brassbob.store..");
        keep("org.sqlite..", "org.brassbob.store..");
    }

    @Test
    void storeKnowsNoScreensNoCommandsNoFiles() {
        noClasses()
                .that()
                .resideInAPackage("org.brassbob.store..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage(
                        "javafx..",
                        "org.brassbob.ui..",
                        "org.brassbob.app..",
                        "org.brassbob.cli..",
                        "org.brassbob.data..")
                .because("records outlive every screen and every file format")
                .check(Classes.MAIN);
    }

    private static void keep(String library, String... places) {
        noClasses()
                .that()
                .resideOutsideOfPackages(places)
                .should()
                .dependOnClassesThat()
                .resideInAPackage(library)
                .because("a library that one package knows can be changed for another")
                .check(Classes.MAIN);
    }
}
