package throwbench.solver.finding;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import throwbench.solver.machine.Machine;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extremes;
import throwbench.solver.revolution.Revolution;
import throwbench.solver.trial.JudgedMachine;
import throwbench.solver.trial.Machines;

/** What is judged of a throw, by a second method (many stations, no refining) and by hand. */
class ThrowCriteriaTest {

    /** So close that the stations miss a peak by less than what is asked. */
    private static final int STATIONS = 36_000;

    private static final double MISSED = 1e-6;

    private final JudgedMachine file = JudgedMachine.twoStages();
    private final Machine machine = file.machine();
    private final Revolution stations = Revolution.solve(Machines.running(machine), 0, STATIONS);

    /** Greatest size over the stations, and where. */
    private double[] greatestSize(Column x, Column y) {
        double size = 0;
        int at = 0;
        for (int i = 0; i < STATIONS; i++) {
            double here = Math.hypot(stations.at(x, i), stations.at(y, i));
            if (here > size) {
                size = here;
                at = i;
            }
        }
        return new double[] {size, 2 * Math.PI * at / STATIONS};
    }

    private Extremes pistonRod() {
        return new JudgedDuty(Machines.running(machine)).extremes(0, Column.PISTON_ROD_LOAD);
    }

    @ParameterizedTest
    @CsvSource({
        "crosshead-pin-pressure, CROSSHEAD_PIN_X, CROSSHEAD_PIN_Y, 0.095, 0.110",
        "crank-pin-pressure, CRANK_PIN_X, CRANK_PIN_Y, 0.150, 0.090",
        "main-bearing-pressure, MAIN_BEARING_X, MAIN_BEARING_Y, 0.160, 0.100"
    })
    void bearingPressureIsTheVectorsGreatestSizeOverTheProjectedArea(
            String id, Column x, Column y, double diameter, double length) {
        double[] peak = greatestSize(x, y);
        Finding finding = file.finding(id, "A");
        double expected = peak[0] / (diameter * length);
        assertEquals(expected, finding.value().orElseThrow(), MISSED * expected);
        assertTrue(finding.value().orElseThrow() >= expected * (1 - 1e-12), "no less than at any station");
        assertEquals(peak[1], finding.angle().orElseThrow(), Math.toRadians(0.02));
    }

    @Test
    void guidePressureIsThatOfTheHarderPressedSide() {
        double size = 0;
        for (int i = 0; i < STATIONS; i++) {
            size = Math.max(size, Math.abs(stations.at(Column.GUIDE_FORCE, i)));
        }
        double value = file.value("guide-pressure", "A");
        // the force has its peak in a kink, where a valve opens, and stations miss it by more than a smooth top
        assertEquals(size / 0.042, value, 5e-5 * size / 0.042);
        assertTrue(value >= size / 0.042 * (1 - 1e-12), "no less than at any station");
    }

    @Test
    void meanPistonSpeedIsTwoTrueStrokesATurn() {
        // stroke by the dead centres: √((l+r)² − e²) − √((l−r)² − e²); 600 rpm are 10 turns a second
        double stroke = Math.sqrt(0.44 * 0.44 - 0.005 * 0.005) - Math.sqrt(0.28 * 0.28 - 0.005 * 0.005);
        assertEquals(2 * stroke * 10, file.value("mean-piston-speed", "A"), 1e-12);
    }

    @Test
    void rodToCrankRatioIsThatOfTheLengths() {
        assertEquals(360.0 / 80, file.value("rod-to-crank-ratio", "A"), 1e-12);
    }

    @Test
    void pistonRodStressTakesTensionAtTheThreadRootAndCompressionInTheRod() {
        double root = Math.PI / 4 * 0.047 * 0.047;
        double rod = Math.PI / 4 * 0.060 * 0.060;
        double tension = pistonRod().greatest().value() / root;
        double compression = -pistonRod().least().value() / rod;
        Finding pulled = file.finding("piston-rod-stress", "A");
        assertEquals(Math.max(tension, compression), pulled.value().orElseThrow(), 1e-9 * tension);
        assertEquals("tension at the thread root governs", pulled.note());
        // a root as wide as the rod: the greater load governs
        Finding pushed = file.with("\"47 mm\"", "\"60 mm\"").finding("piston-rod-stress", "A");
        assertEquals(compression, pushed.value().orElseThrow(), 1e-9 * compression);
        assertEquals("compression of the rod governs", pushed.note());
        assertEquals(pistonRod().least().crankAngle(), pushed.angle().orElseThrow(), 1e-9);
    }

    @Test
    void pistonRodStressIsLimitedByTheYieldStrengthUnlessALimitIsSet() {
        assertEquals(520e6, file.finding("piston-rod-stress", "A").limit().orElseThrow());
        Finding set =
                file.and("\"limits\": { \"pistonRodStress\": \"90 MPa\" }").finding("piston-rod-stress", "A");
        assertEquals(90e6, set.limit().orElseThrow());
        Finding open = file.with("\"yieldStrength\": \"520 MPa\", ", "").finding("piston-rod-stress", "A");
        assertEquals(OptionalDouble.empty(), open.limit());
        assertEquals(Verdict.NOT_JUDGED, open.verdict());
        assertEquals(
                "tension at the thread root governs; pistonRodPart.yieldStrength is missing; no limit given",
                open.note());
    }

    @Test
    void pistonRodFatigueIsTheModifiedGoodmanLineWithoutCreditForACompressiveMean() {
        double root = Math.PI / 4 * 0.047 * 0.047;
        double most = pistonRod().greatest().value() / root;
        double least = pistonRod().least().value() / root;
        assertTrue(most + least < 0, "the mean of this rod is in compression");
        double expected = 2.8 * (most - least) / 2 / 260e6;
        Finding finding = file.finding("piston-rod-fatigue", "A");
        assertEquals(expected, finding.value().orElseThrow(), 1e-9 * expected);
        assertEquals(1, finding.limit().orElseThrow());
        assertTrue(finding.note().contains("mean 0.000 MPa"), finding.note());
        assertTrue(finding.note().contains("pistonRodPart.preload being missing"), finding.note());
    }

    @Test
    void aMeanInTensionCountsInFull() {
        // the crank end at four times the pressure by a wider bore there: the rod is pulled on the mean
        JudgedMachine pulled = file.with(
                "\"A crank\", \"side\": \"crank\", \"stage\": \"first\", \"bore\": \"300 mm\"",
                "\"A crank\", \"side\": \"crank\", \"stage\": \"first\", \"bore\": \"420 mm\"");
        JudgedDuty duty = new JudgedDuty(Machines.running(pulled.machine()));
        Extremes load = duty.extremes(0, Column.PISTON_ROD_LOAD);
        double root = Math.PI / 4 * 0.047 * 0.047;
        double mean = (load.greatest().value() + load.least().value()) / 2 / root;
        double amplitude = (load.greatest().value() - load.least().value()) / 2 / root;
        assertTrue(mean > 0, "mean " + mean);
        double expected = 2.8 * amplitude / 260e6 + mean / 740e6;
        assertEquals(expected, pulled.value("piston-rod-fatigue", "A"), 1e-9 * expected);
    }

    @Test
    void aPreloadHelpsOnlyWhileNoTensionOvercomesIt() {
        String key = "\"stressConcentration\": 2.8";
        double tension = pistonRod().greatest().value();
        double root = Math.PI / 4 * 0.047 * 0.047;
        String enough = Math.ceil(tension / 1e3) + " kN";
        Finding clamped =
                file.with(key, key + ", \"preload\": \"" + enough + "\"").finding("piston-rod-fatigue", "A");
        double expected = 1e3 * Math.ceil(tension / 1e3) / root / 740e6;
        assertEquals(expected, clamped.value().orElseThrow(), 1e-9 * expected);
        assertTrue(clamped.note().contains("the joint is taken as rigid"), clamped.note());
        String little = Math.floor(tension / 1e3) + " kN";
        Finding parted =
                file.with(key, key + ", \"preload\": \"" + little + "\"").finding("piston-rod-fatigue", "A");
        double without = file.value("piston-rod-fatigue", "A");
        assertEquals(without, parted.value().orElseThrow(), 1e-12);
        assertTrue(parted.note().contains("overcomes the preload"), parted.note());
    }

    @Test
    void pistonRodBucklingIsTheCriticalLoadOverTheGreatestCompression() {
        double slenderness = 1.1 / (0.060 / 4);
        double transition = Math.sqrt(2 * Math.PI * Math.PI * 205e9 / 520e6);
        assertTrue(slenderness < transition, "Johnson's parabola");
        double area = Math.PI / 4 * 0.060 * 0.060;
        double critical = area * 520e6 * (1 - 520e6 * slenderness * slenderness / (4 * Math.PI * Math.PI * 205e9));
        double push = -pistonRod().least().value();
        assertEquals(critical / push, file.value("piston-rod-buckling", "A"), 1e-9 * critical / push);
        double euler = Math.PI * Math.PI * 205e9 * Math.PI / 64 * Math.pow(0.060, 4) / (2.2 * 2.2);
        assertEquals(
                euler / push,
                file.with("\"1.1 m\"", "\"2.2 m\"").value("piston-rod-buckling", "A"),
                1e-9 * euler / push);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "crosshead-pin-pressure | crossheadPart.pinDiameter and crossheadPart.pinLength are missing",
                "crank-pin-pressure     | crankPinPart.diameter and crankPinPart.length are missing",
                "main-bearing-pressure  | mainBearingPart.diameter and mainBearingPart.length are missing",
                "guide-pressure         | crossheadPart.shoeArea is missing",
                "piston-rod-stress      | pistonRodPart.diameter and pistonRodPart.threadRootDiameter are missing",
                "piston-rod-fatigue     | pistonRodPart.threadRootDiameter, pistonRodPart.ultimateStrength,"
                        + " pistonRodPart.enduranceLimit and pistonRodPart.stressConcentration are missing",
                "piston-rod-buckling    | pistonRodPart.diameter, pistonRodPart.freeLength, pistonRodPart.elasticModulus"
                        + " and pistonRodPart.yieldStrength are missing"
            })
    void whatIsMissingIsNamed(String id, String note) {
        assertUnknown(file.finding(id, "B"), note);
    }

    @Test
    void oneMissingKeyIsNamedAlone() {
        JudgedMachine lacking = file.with("\"freeLength\": \"1.1 m\", ", "");
        assertUnknown(lacking.finding("piston-rod-buckling", "A"), "pistonRodPart.freeLength is missing");
    }

    @Test
    void aRodThatIsNeverPushedCannotBuckle() {
        JudgedMachine pulled = file.with("\"600 rpm\"", "\"6 rpm\"")
                .with("\"A head\", \"side\": \"head\"", "\"A head\", \"side\": \"crank\"")
                .with("\"400 N\"", "\"0 N\"")
                .with("\"guideCoefficient\": 0.03", "\"guideCoefficient\": 0");
        assertUnknown(pulled.finding("piston-rod-buckling", "A"), "the piston rod is never in compression");
    }

    private static void assertUnknown(Finding finding, String note) {
        assertEquals(OptionalDouble.empty(), finding.value());
        assertEquals(OptionalDouble.empty(), finding.margin());
        assertEquals(Verdict.NOT_JUDGED, finding.verdict());
        assertEquals(note, finding.note());
    }
}
