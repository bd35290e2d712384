package binspan;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.library.Architectures.LayeredArchitecture;
import java.time.Clock;
import java.time.Instant;
import java.util.List;

/** Holds the order of the packages and keeps the model free of files, screens, printing and clocks. */
@AnalyzeClasses(packages = "binspan", importOptions = ImportOption.DoNotIncludeTests.class)
final class ArchitectureTest {

    /** In the order of the data flow: each package may use those named before it, never those after. */
    private static final List<String> PACKAGES =
            List.of("units", "scenario", "optics", "counting", "merit", "prediction", "worksheet", "study");

    @ArchTest
    static final ArchRule PACKAGES_FOLLOW_THE_DATA_FLOW = dataFlow();

    @ArchTest
    static final ArchRule NO_FILES_OR_SCREENS = noClasses()
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage(
                    "java.io..",
                    "java.nio.file..",
                    "java.awt..",
                    "javax.swing..",
                    "javafx..",
                    "tools.jackson..",
                    "picocli..")
            .because("files, screens and the command line belong to the planner")
            .allowEmptyShould(true);

    @ArchTest
    static final ArchRule NO_PRINTING = noClasses()
            .should()
            .accessField(System.class, "out")
            .orShould()
            .accessField(System.class, "err")
            .because("the model returns results and throws errors; it prints nothing")
            .allowEmptyShould(true);

    @ArchTest
    static final ArchRule NO_CLOCK = noClasses()
            .should()
            .dependOnClassesThat()
            .belongToAnyOf(Instant.class, Clock.class)
            .orShould()
            .callMethod(System.class, "currentTimeMillis")
            .orShould()
            .callMethod(System.class, "nanoTime")
            .because("the same scenario gives the same prediction at any time")
            .allowEmptyShould(true);

    @ArchTest
    static final ArchRule NO_UNSEEDED_RANDOMNESS = noClasses()
            .should()
            .callMethod(Math.class, "random")
            .orShould()
            .dependOnClassesThat()
            .haveFullyQualifiedName("java.util.concurrent.ThreadLocalRandom")
            .because("randomness comes in as a seed")
            .allowEmptyShould(true);

    private static ArchRule dataFlow() {
        LayeredArchitecture flow =
                layeredArchitecture().consideringOnlyDependenciesInLayers().withOptionalLayers(true);
        for (String name : PACKAGES) {
            flow = flow.layer(name).definedBy("binspan." + name + "..");
        }
        for (int i = 0; i < PACKAGES.size(); i++) {
            List<String> later = PACKAGES.subList(i + 1, PACKAGES.size());
            flow = later.isEmpty()
                    ? flow.whereLayer(PACKAGES.get(i)).mayNotBeAccessedByAnyLayer()
                    : flow.whereLayer(PACKAGES.get(i)).mayOnlyBeAccessedByLayers(later.toArray(String[]::new));
        }
        return flow.allowEmptyShould(true);
    }
}
