// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.architecture;

import static com.tngtech.archunit.base.DescribedPredicate.describe;
import static com.tngtech.archunit.base.DescribedPredicate.not;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.assignableTo;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noFields;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.AccessTarget;
import com.tngtech.archunit.core.domain.JavaAccess;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaModifier;
import java.lang.invoke.MethodHandles;
import java.util.Date;
import java.util.Locale;
import java.util.Random;
import java.util.Set;
import java.util.concurrent.ConcurrentMap;
import java.util.concurrent.ThreadLocalRandom;
import org.junit.jupiter.api.Test;

/** What the product keeps its hands off. Calls and method references count alike. */
class PurityTest {
    private static final Set<String> CLOCK = Set.of(
            "now",
            "currentTimeMillis",
            "nanoTime",
            "systemUTC",
            "systemDefaultZone",
            "system",
            "tickMillis",
            "tickSeconds",
            "tickMinutes");
    private static final Set<String> MACHINE = Set.of("getProperty", "getenv", "systemDefault", "random", "randomUUID");
    private static final Set<String> BY_NAME = Set.of("forName", "loadClass", "newInstance", "lookup");

    private static final DescribedPredicate<JavaAccess<?>> CLOCK_OR_MACHINE =
            describe("asks the clock, the machine or chance", access -> {
                JavaClass owner = access.getTargetOwner();
                boolean madeNow = access.getName().equals("<init>")
                        && (owner.isEquivalentTo(Date.class) || owner.isEquivalentTo(Random.class))
                        && parameters(access) == 0;
                boolean asked = CLOCK.contains(access.getName()) || MACHINE.contains(access.getName());
                return ofJava(owner) && (asked || madeNow || owner.isEquivalentTo(ThreadLocalRandom.class));
            });

    /** Takes the machine's own locale because none is named; the compiler's check sees more callees, but no references. */
    private static final DescribedPredicate<JavaAccess<?>> LEANS_ON_THE_LOCALE =
            describe("leans on the default locale", access -> {
                JavaClass owner = access.getTargetOwner();
                boolean formats = owner.isEquivalentTo(String.class)
                        && Set.of("format", "formatted", "toLowerCase", "toUpperCase")
                                .contains(access.getName());
                return (formats && !namesLocale(access))
                        || (owner.isEquivalentTo(Locale.class)
                                && access.getName().equals("getDefault"));
            });

    private static final DescribedPredicate<JavaAccess<?>> REACHES_BY_NAME =
            describe("reaches a class by name", access -> {
                JavaClass owner = access.getTargetOwner();
                boolean finder = owner.isEquivalentTo(Class.class)
                        || owner.isAssignableTo(ClassLoader.class)
                        || owner.isEquivalentTo(MethodHandles.class);
                boolean members = owner.isEquivalentTo(Class.class)
                        && access.getName().matches("get(Declared)?(Field|Method|Constructor)s?");
                return (finder && BY_NAME.contains(access.getName())) || members;
            });

    private static boolean ofJava(JavaClass owner) {
        return owner.getPackageName().startsWith("java.");
    }

    private static int parameters(JavaAccess<?> access) {
        return access.getTarget() instanceof AccessTarget.CodeUnitAccessTarget target
                ? target.getRawParameterTypes().size()
                : 0;
    }

    private static boolean namesLocale(JavaAccess<?> access) {
        return access.getTarget() instanceof AccessTarget.CodeUnitAccessTarget target
                && target.getRawParameterTypes().stream().anyMatch(t -> t.isEquivalentTo(Locale.class));
    }

    @Test
    void coreAsksOnlyItsArguments() {
        noClasses()
                .that()
                .resideInAPackage("org.brassbob.core..")
                .should()
                .accessTargetWhere(CLOCK_OR_MACHINE)
                .because("the same round must give the same figures tomorrow and on any machine")
                .check(Classes.MAIN);
    }

    @Test
    void coreStartsNoThreads() {
        noClasses()
                .that()
                .resideInAPackage("org.brassbob.core..")
                .should()
                .dependOnClassesThat()
                .areAssignableTo(Thread.class)
                .orShould()
                .dependOnClassesThat(resideInAPackage("java.util.concurrent..")
                        .and(not(assignableTo(ConcurrentMap.class)))
                        .as("are of java.util.concurrent, but for maps"))
                .orShould()
                .accessTargetWhere(describe(
                        "runs a stream in parallel",
                        a -> ofJava(a.getTargetOwner()) && a.getName().matches("parallel(Stream)?")))
                .because("who calls knows how many cores are free, and whose thread may wait")
                .check(Classes.MAIN);
    }

    @Test
    void nothingLeansOnTheDefaultLocale() {
        noClasses()
                .should()
                .accessTargetWhere(LEANS_ON_THE_LOCALE)
                .because("a decimal comma in a file, or a dotless i in a word, would be misread")
                .check(Classes.MAIN);
    }

    @Test
    void nothingUsesDesktopApi() {
        noClasses()
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("java.awt..", "javax.swing..", "java.beans..", "javax.imageio..")
                .because("tablets have none of it")
                .check(Classes.MAIN);
    }

    @Test
    void nothingUsesReflection() {
        noClasses()
                .should()
                .dependOnClassesThat()
                .resideInAPackage("java.lang.reflect..")
                .orShould()
                .accessTargetWhere(REACHES_BY_NAME)
                .because("a native image must be told of every class that is reached by name")
                .check(Classes.MAIN);
    }

    @Test
    void onlyMainTouchesTheStandardStreams() {
        noClasses()
                .that()
                .doNotHaveFullyQualifiedName("org.brassbob.Main")
                .should()
                .accessField(System.class, "out")
                .orShould()
                .accessField(System.class, "err")
                .orShould()
                .callMethod(Throwable.class, "printStackTrace")
                .because("what is printed is decided in one place, and is never a stack trace")
                .check(Classes.MAIN);
    }

    @Test
    void staticFieldsAreFinal() {
        fields().that()
                .areStatic()
                .should()
                .beFinal()
                .because("state that everybody shares belongs to nobody")
                .check(Classes.MAIN);
    }

    @Test
    void sharedArraysAreHidden() {
        noFields()
                .that()
                .areStatic()
                .and()
                .areNotPrivate()
                .and()
                .doNotHaveModifier(JavaModifier.SYNTHETIC)
                .should()
                .haveRawType(describe("array", JavaClass::isArray))
                .because("final does not keep an array's elements from being changed")
                .check(Classes.MAIN);
    }
}
