package binspan.planner;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** Holds the window apart from its logic, and both apart from the command line. */
@AnalyzeClasses(packages = "binspan.planner", importOptions = ImportOption.DoNotIncludeTests.class)
final class PlannerArchitectureTest {
    private static final String VIEW = "binspan.planner.view..";
    private static final String VIEW_MODEL = "binspan.planner.viewmodel..";
    private static final String CLI = "binspan.planner.cli..";

    @ArchTest
    static final ArchRule VIEW_MODELS_DRAW_NOTHING = noClasses()
            .that()
            .resideInAPackage(VIEW_MODEL)
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("javafx.scene..", "javafx.stage..", "javafx.application..", "java.awt..")
            .because("view models know properties and lists, no controls and no threads of a window");

    @ArchTest
    static final ArchRule ONLY_THE_WINDOW_KNOWS_THE_TOOLKIT = noClasses()
            .that()
            .resideOutsideOfPackages(VIEW, VIEW_MODEL)
            .should()
            .dependOnClassesThat()
            .resideInAPackage("javafx..")
            .because("the command line starts without it");

    @ArchTest
    static final ArchRule THE_COMMAND_LINE_IS_NOT_USED_BY_OTHERS = noClasses()
            .that()
            .resideOutsideOfPackages(CLI, "binspan.planner")
            .should()
            .dependOnClassesThat()
            .resideInAPackage(CLI)
            .because("what a command and the window share stands before both");

    @ArchTest
    static final ArchRule VIEW_MODELS_DO_NOT_KNOW_THE_WINDOW = noClasses()
            .that()
            .resideInAPackage(VIEW_MODEL)
            .should()
            .dependOnClassesThat()
            .resideInAPackage(VIEW)
            .because("views follow view models, never the reverse");
}
