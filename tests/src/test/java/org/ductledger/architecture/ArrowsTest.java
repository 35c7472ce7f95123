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
import java.util.Map;

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

    /** A class and all that is nested in it is one file; the files of one family of flow stand together. */
    private static final class FilePerSlice implements SliceAssignment {
        /** How the files of a family that takes more than one begin. */
        private static final Map<String, String> FAMILIES = Map.ofEntries(
                Map.entry("Isentropic", "isentropic"),
                Map.entry("FlowRate", "dimensional"),
                Map.entry("Fan", "fan"),
                Map.entry("NormalShock", "shock"),
                Map.entry("ShockEntropy", "shock"),
                Map.entry("Pitot", "shock"),
                Map.entry("Nozzle", "nozzle"),
                Map.entry("Thrust", "nozzle"),
                Map.entry("JetTurn", "nozzle"),
                Map.entry("Fanno", "fanno"),
                Map.entry("FrictionFactor", "fanno"),
                Map.entry("Rayleigh", "rayleigh"),
                Map.entry("Oblique", "oblique"),
                Map.entry("Vessel", "vessel"));

        @Override
        public SliceIdentifier getIdentifierOf(JavaClass javaClass) {
            JavaClass outer = outermost(javaClass);
            if (!outer.getPackageName().startsWith("org.ductledger")) {
                return SliceIdentifier.ignore();
            }
            String file = outer.getSimpleName();
            return FAMILIES.entrySet().stream()
                    .filter(family -> outer.getPackageName().endsWith(".flow") && startsWith(file, family.getKey()))
                    .findFirst()
                    .map(family -> SliceIdentifier.of("family", family.getValue()))
                    .orElseGet(() -> SliceIdentifier.of("file", outer.getName()));
        }

        private static JavaClass outermost(JavaClass javaClass) {
            return javaClass.getEnclosingClass().map(FilePerSlice::outermost).orElse(javaClass);
        }

        /** As a word: Fan begins FanCells, but not Fanno. */
        private static boolean startsWith(String file, String word) {
            return file.startsWith(word)
                    && (file.length() == word.length()
                            || !Character.isLowerCase(file.charAt(word.length()))
                            || word.equals("FlowRate"));
        }

        @Override
        public String getDescription() {
            return "files";
        }
    }
}
