// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.architecture;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;

/** The classes that the rules judge. */
final class Classes {
    /** The product's own classes. */
    static final JavaClasses MAIN = imported(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS);

    /** The tests, their fixtures and benchmarks. */
    static final JavaClasses TESTS = imported(ImportOption.Predefined.ONLY_INCLUDE_TESTS);

    private Classes() {}

    private static JavaClasses imported(ImportOption which) {
        return new ClassFileImporter().withImportOption(which).importPackages("org.brassbob");
    }
}
