// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.architecture;

import static com.tngtech.archunit.base.DescribedPredicate.describe;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaMethodCall;
import java.util.Locale;
import java.util.Set;
import org.junit.jupiter.api.Test;

class PurityTest {
    private static final Set<String> CLOCK =
            Set.of("now", "currentTimeMillis", "nanoTime", "systemUTC", "systemDefaultZone");

    private static final DescribedPredicate<JavaMethodCall> READS_THE_CLOCK = describe(
            "reads the clock",
            call -> CLOCK.contains(call.getName())
                    && call.getTargetOwner().getPackageName().startsWith("java."));

    /** A call that takes the machine's own locale because none is named. */
    private static final DescribedPredicate<JavaMethodCall> LEANS_ON_THE_LOCALE =
            describe("leans on the default locale", call -> {
                boolean text = call.getTargetOwner().isEquivalentTo(String.class);
                boolean named =
                        call.getTarget().getRawParameterTypes().stream().anyMatch(t -> t.isEquivalentTo(Locale.class));
                boolean formats = Set.of("format", "formatted", "toLowerCase", "toUpperCase")
                        .contains(call.getName());
                return (text && formats && !named)
                        || (call.getTargetOwner().isEquivalentTo(Locale.class)
                                && call.getName().equals("getDefault"));
            });

    @Test
    void coreReadsNoClock() {
        noClasses()
                .that()
                .resideInAPackage("org.brassbob.core..")
                .should()
                .callMethodWhere(READS_THE_CLOCK)
                .because("the same round must give the same figures tomorrow")
                .check(Classes.MAIN);
    }

    @Test
    void nothingLeansOnTheDefaultLocale() {
        noClasses()
                .should()
                .callMethodWhere(LEANS_ON_THE_LOCALE)
                .because("a decimal comma in a file, or a dotless i in a word, would be misread")
                .check(Classes.MAIN);
    }

    @Test
    void nothingUsesDesktopApi() {
        noClasses()
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("java.awt..", "javax.swing..")
                .because("tablets have neither")
                .check(Classes.MAIN);
    }

    @Test
    void nothingUsesReflection() {
        noClasses()
                .should()
                .dependOnClassesThat()
                .resideInAPackage("java.lang.reflect..")
                .orShould()
                .callMethod(Class.class, "forName", String.class)
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
                .because("what is printed is decided in one place")
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
}
