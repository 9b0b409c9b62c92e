package throwbench.solver;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.lang.syntax.elements.ClassesShouldConjunction;
import java.util.List;
import java.util.stream.Stream;

/** The arrows between the solver's packages, checked on its class files. */
@AnalyzeClasses(packages = "throwbench.solver", importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {

    @ArchTest
    static final ArchRule KNOWS_NO_WINDOW = noClasses()
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("javafx..", "java.awt..", "javax.swing..", "throwbench.app..")
            .because("the command line and other programs use the solver without a display");

    @ArchTest
    static final ArchRule KNOWS_NO_CLOCK = noClasses()
            .should()
            .callMethod(System.class, "currentTimeMillis")
            .orShould()
            .callMethod(System.class, "nanoTime")
            .orShould()
            .dependOnClassesThat()
            .resideInAPackage("java.time..")
            .because("the same machine gives the same answer whenever it is asked");

    @ArchTest
    static final ArchRule ONLY_DOCUMENT_READS_FILES = noClasses()
            .that()
            .resideOutsideOfPackage("throwbench.solver.document..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("java.nio.file..", "com.fasterxml..")
            .because(
                    "a machine is known before it is solved; only the machine file's package knows files and their text");

    @ArchTest
    static final ArchRule MECHANISM_IS_GEOMETRY = uses("mechanism").because("geometry serves every mass and pressure");

    @ArchTest
    static final ArchRule FLUID_STANDS_ALONE = uses("fluid").because("a gas does not know what it is compressed in");

    @ArchTest
    static final ArchRule CHAMBER_KNOWS_VOLUME_AND_FLUID = uses("chamber", "mechanism", "fluid")
            .because("a cycle depends on volume and fluid, never on the forces it makes");

    @ArchTest
    static final ArchRule LOAD_KNOWS_MOTION =
            uses("load", "mechanism").because("forces take a gas load as a number, wherever it comes from");

    @ArchTest
    static final ArchRule MACHINE_DESCRIBES = uses("machine", "mechanism", "fluid", "chamber", "load")
            .because("a description is complete without a solution or a verdict");

    @ArchTest
    static final ArchRule DRIVE_KNOWS_A_TORQUE = uses("drive", "mechanism", "machine")
            .because("the speed follows from a torque by the angle, wherever it comes from");

    @ArchTest
    static final ArchRule BALANCE_KNOWS_A_CURVE = uses("balance", "mechanism", "load", "machine")
            .because("harmonics are those of any quantity over the turn");

    @ArchTest
    static final ArchRule REVOLUTION_SOLVES = uses(
                    "revolution", "mechanism", "fluid", "chamber", "load", "machine", "balance", "drive")
            .because("results are the same whatever they are judged by");

    @ArchTest
    static final ArchRule RESULTS_KNOW_NO_FINDING = noClasses()
            .that()
            .resideOutsideOfPackages(
                    "throwbench.solver.finding..", "throwbench.solver.map..", "throwbench.solver.document..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("throwbench.solver.finding..", "throwbench.solver.map..")
            .because("findings are made from results; only maps and what is written of them ask for findings");

    @ArchTest
    static final ArchRule NOTHING_USES_DOCUMENT = noClasses()
            .that()
            .resideOutsideOfPackages("throwbench.solver.document..", "throwbench.solver.map..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("throwbench.solver.document..")
            .because(
                    "units and text stop at the edge: inside, everything is SI; only a map varies the file's own numbers");

    @ArchTest
    static final ArchRule NO_CYCLES = slices().matching("throwbench.solver.(**)")
            .should()
            .beFreeOfCycles()
            .because("a package that can be read without its users can be understood");

    /** A package may use itself, those named and nothing else of the solver. */
    private static ClassesShouldConjunction uses(String own, String... others) {
        String[] forbidden = Stream.of(
                        "mechanism",
                        "fluid",
                        "chamber",
                        "load",
                        "machine",
                        "revolution",
                        "balance",
                        "drive",
                        "finding",
                        "map",
                        "document")
                .filter(name -> !name.equals(own) && !List.of(others).contains(name))
                .map(name -> "throwbench.solver." + name + "..")
                .toArray(String[]::new);
        return noClasses()
                .that()
                .resideInAPackage("throwbench.solver." + own + "..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage(forbidden);
    }
}
