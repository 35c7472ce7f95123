package org.ductledger.architecture;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.library.dependencies.SliceAssignment;
import com.tngtech.archunit.library.dependencies.SliceIdentifier;

/** The arrows between the rooms: server over workbook templates over functions, and no circle anywhere. */
@AnalyzeClasses(packages = "org.ductledger", importOptions = ImportOption.DoNotIncludeTests.class)
final class ArrowsTest {
    private static final String[] FUNCTIONS = {"..catalogue..", "..flow..", "..ledger..", "..numeric.."};
    private static final String[] WORKBOOKS = {
        "..sheet..", "..template..", "..record..", "..fill..", "..audit..", "..rebuild.."
    };
    private static final String[] SERVER = {"..server..", "..command..", "..batch..", "..http.."};

    @ArchTest
    static final ArchRule MODULES_LEAN_ONE_WAY = layeredArchitecture()
            .consideringOnlyDependenciesInLayers()
            .layer("functions")
            .definedBy(FUNCTIONS)
            .layer("workbooks")
            .definedBy(WORKBOOKS)
            .layer("server")
            .definedBy(SERVER)
            .whereLayer("server")
            .mayNotBeAccessedByAnyLayer()
            .whereLayer("workbooks")
            .mayOnlyBeAccessedByLayers("server");

    @ArchTest
    static final ArchRule CATALOGUE_LEANS_ON_NOTHING_OF_OURS = classes()
            .that()
            .resideInAPackage("..catalogue..")
            .should()
            .onlyAccessClassesThat()
            .resideOutsideOfPackages("..flow..", "..ledger..", "..numeric..");

    @ArchTest
    static final ArchRule EVALUATOR_KNOWS_NO_FAMILY = noClasses()
            .that()
            .resideInAPackage("..ledger..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("..flow..", "..numeric..");

    @ArchTest
    static final ArchRule FUNCTIONS_KNOW_NO_FACE = noClasses()
            .that()
            .resideInAnyPackage(FUNCTIONS)
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("com.fasterxml..", "io.undertow..", "org.apache.poi..", "picocli..");

    @ArchTest
    static final ArchRule BATCH_KNOWS_NO_HTTP = noClasses()
            .that()
            .resideInAPackage("..batch..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("io.undertow..", "..http..", "..command..");

    @ArchTest
    static final ArchRule WORKBOOKS_KNOW_NO_HTTP_AND_NO_JSON = noClasses()
            .that()
            .resideInAnyPackage(WORKBOOKS)
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("io.undertow..", "com.fasterxml..");

    @ArchTest
    static final ArchRule NO_CIRCLE_OF_PACKAGES =
            slices().matching("org.ductledger.(*)..").should().beFreeOfCycles();

    @ArchTest
    static final ArchRule NO_CIRCLE_OF_FILES =
            slices().assignedFrom(new FilePerSlice()).should().beFreeOfCycles();

    /** Kernels give the same bits on every machine: Math's transcendental functions do not. */
    @ArchTest
    static final ArchRule KERNELS_ARE_STRICT = noClasses()
            .that()
            .resideInAnyPackage("..flow..", "..numeric..", "..catalogue..", "..ledger..")
            .should()
            .callMethodWhere(new NotTheSameBits());

    /** A class and all that is nested in it: one file. */
    private static final class FilePerSlice implements SliceAssignment {
        @Override
        public SliceIdentifier getIdentifierOf(JavaClass javaClass) {
            JavaClass outer = javaClass;
            while (outer.getEnclosingClass().isPresent()) {
                outer = outer.getEnclosingClass().get();
            }
            return outer.getPackageName().startsWith("org.ductledger")
                    ? SliceIdentifier.of(outer.getName())
                    : SliceIdentifier.ignore();
        }

        @Override
        public String getDescription() {
            return "files";
        }
    }
}
