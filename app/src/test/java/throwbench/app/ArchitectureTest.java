package throwbench.app;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** The arrows of the house, checked on the class files. */
@AnalyzeClasses(packages = "throwbench", importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {

    @ArchTest
    static final ArchRule SOLVER_KNOWS_NO_WINDOW = noClasses()
            .that()
            .resideInAPackage("throwbench.solver..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("javafx..", "throwbench.app..")
            .because("the command line and other programs use the solver without a display");

    @ArchTest
    static final ArchRule COMMAND_LINE_LOADS_NO_JAVAFX = noClasses()
            .that()
            .resideInAnyPackage("throwbench.app.command..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage(
                    "javafx..",
                    "org.controlsfx..",
                    "atlantafx..",
                    "throwbench.app.bench..",
                    "throwbench.app.drawing..",
                    "throwbench.app.window..")
            .because("it starts in a fraction of the window's time, and where there is no display");

    @ArchTest
    static final ArchRule BENCH_HOLDS_NO_CONTROL = noClasses()
            .that()
            .resideInAPackage("throwbench.app.bench..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("javafx.scene..", "javafx.stage..", "throwbench.app.drawing..")
            .because("what is open and what the user did is tested without a window");

    @ArchTest
    static final ArchRule VIEWS_MEET_IN_BENCH_ONLY = slices().matching(
                    "throwbench.app.(linkage|strip|gauge|findings|buildsheet)..")
            .should()
            .notDependOnEachOther()
            .because("a view can then be read, changed and tested alone");

    @ArchTest
    static final ArchRule WINDOW_IS_ON_TOP = noClasses()
            .that()
            .resideInAnyPackage(
                    "throwbench.app.bench..",
                    "throwbench.app.drawing..",
                    "throwbench.app.linkage..",
                    "throwbench.app.strip..",
                    "throwbench.app.gauge..",
                    "throwbench.app.findings..",
                    "throwbench.app.buildsheet..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("throwbench.app.window..")
            .because("the window puts the parts together; the parts do not know it");

    @ArchTest
    static final ArchRule SCREEN_HAS_NO_AWT = noClasses()
            .that()
            .resideInAPackage("throwbench.app..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("java.awt..", "javax.swing..")
            .because("AWT beside JavaFX costs a second toolkit's start");

    @ArchTest
    static final ArchRule NO_CYCLES =
            slices().matching("throwbench.app.(*)..").should().beFreeOfCycles();
}
