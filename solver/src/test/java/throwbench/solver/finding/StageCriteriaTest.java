package throwbench.solver.finding;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import throwbench.solver.fluid.PerfectGas;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.SuctionLine;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.trial.JudgedMachine;
import throwbench.solver.trial.Pumps;

/** What is judged of chambers and stages, against closed forms. */
class StageCriteriaTest {

    private static final double GAS_CONSTANT = PerfectGas.MOLAR_GAS_CONSTANT / 0.024;

    private final JudgedMachine file = JudgedMachine.twoStages();

    private static Finding pump(SuctionLine line, String id) {
        Machine machine = Pumps.machine(
                Pumps.plungers(5, Pumps.IDEAL, Pumps.equallySpaced(3)),
                Rotation.COUNTER_CLOCKWISE,
                Pumps.duty(Pumps.RIGID).with(line));
        List<Finding> found = Judgement.of(machine, machine.dutyPoints()).findings().stream()
                .filter(f -> f.criterion().id().equals(id))
                .toList();
        assertEquals(1, found.size(), id);
        return found.get(0);
    }

    /** p_s (V_max − V_4)/(R T), V_4 = V_min (p_d/p_s)^(1/n_e). */
    private static double mass(double swept, double clearance, double p1, double p2, double temperature) {
        double inlet = swept * (1 + clearance - clearance * Math.pow(p2 / p1, 1 / 1.2));
        return p1 * inlet / (GAS_CONSTANT * temperature);
    }

    private static double first() {
        double stroke = Math.sqrt(0.44 * 0.44 - 0.005 * 0.005) - Math.sqrt(0.28 * 0.28 - 0.005 * 0.005);
        return 10
                * (mass(Math.PI / 4 * 0.3 * 0.3 * stroke, 0.12, 1.2e5, 4e5, 293.15)
                        + mass(Math.PI / 4 * (0.3 * 0.3 - 0.06 * 0.06) * stroke, 0.15, 1.2e5, 4e5, 293.15));
    }

    private static double second() {
        return 10 * mass(Math.PI / 4 * 0.21 * 0.21 * 0.16, 0.10, 4e5, 9e5, 308.15);
    }

    @Test
    void capacityIsTheMassThatTheChambersOfAStageTakeIn() {
        assertEquals(first(), file.value("capacity", "first"), 1e-9 * first());
        assertEquals(second(), file.value("capacity", "second"), 1e-9 * second());
        double volume = first() * GAS_CONSTANT * 293.15 / 1.2e5;
        assertEquals(
                String.format(Locale.ROOT, "%.4g m3/s at inlet conditions; no limit given", volume),
                file.finding("capacity", "first").note());
        Finding wanted = file.with(
                        "\"first\": { \"fluid\": \"gas\" }",
                        "\"first\": { \"fluid\": \"gas\", \"limits\": {" + " \"capacity\": \"0.1 kg/s\" } }")
                .finding("capacity", "first");
        assertEquals((first() - 0.1) / 0.1, wanted.margin().orElseThrow(), 1e-9);
        assertEquals(Verdict.MET, wanted.verdict());
    }

    @Test
    void capacityWithoutASuctionTemperatureIsAVolumeAlone() {
        Finding finding = file.with("\"suctionTemperature\": \"20 degC\", ", "").finding("capacity", "first");
        assertEquals(OptionalDouble.empty(), finding.value());
        assertEquals(Verdict.NOT_JUDGED, finding.verdict());
        assertTrue(
                finding.note().startsWith("stages.first.suctionTemperature is missing at the duty point; "),
                finding.note());
        assertTrue(finding.note().endsWith(" m3/s at inlet conditions"), finding.note());
    }

    @Test
    void stageFlowMismatchIsTheShareByWhichTheNextStageTakesInMoreOrLess() {
        double expected = Math.abs(second() - first()) / first();
        Finding finding = file.finding("stage-flow-mismatch", "second");
        assertEquals(expected, finding.value().orElseThrow(), 1e-9);
        assertTrue(finding.note().startsWith("stage first passes 0."), finding.note());
        JudgedMachine balanced = file.with("\"dischargePressure\": \"4 bar a\"", "\"dischargePressure\": \"balanced\"")
                .with("\"suctionPressure\": \"4 bar a\"", "\"suctionPressure\": \"balanced\"");
        assertEquals(0, balanced.value("stage-flow-mismatch", "second"), 1e-9);
    }

    @Test
    void dischargeTemperatureIsThatOfTheCompressionLeg() {
        double expected = 293.15 * Math.pow(4 / 1.2, 0.25 / 1.25);
        Finding finding = file.finding("discharge-temperature", "A head");
        assertEquals(expected, finding.value().orElseThrow(), 1e-9 * expected);
        assertEquals(423.15, finding.limit().orElseThrow());
        assertEquals("first", finding.where().stage().orElseThrow());
        assertEquals("A", finding.where().throwName().orElseThrow());
    }

    @Test
    void lightGasIsHeldToALowerTemperature() {
        assertEquals(408.15, limitAt("12 g/mol"));
        assertEquals(423.15, limitAt("12.1 g/mol"));
        JudgedMachine mixed = file.with(
                "\"molarMass\": \"24 g/mol\", \"isentropicExponent\": 1.3",
                "\"mixture\": { \"hydrogen\": 0.8, \"methane\": 0.2 }");
        assertEquals(
                408.15, mixed.finding("discharge-temperature", "B head").limit().orElseThrow());
    }

    private double limitAt(String molarMass) {
        return file.with("\"24 g/mol\"", '"' + molarMass + '"')
                .finding("discharge-temperature", "A head")
                .limit()
                .orElseThrow();
    }

    @Test
    void narrowerLimitGoesBeforeWider() {
        JudgedMachine wide = file.and("\"limits\": { \"dischargeTemperature\": \"140 degC\" }");
        assertLimits(wide, 140, 140, 140);
        JudgedMachine ofStage = wide.with(
                "\"first\": { \"fluid\": \"gas\"",
                "\"first\": { \"limits\": {" + " \"dischargeTemperature\": \"130 degC\" }, \"fluid\": \"gas\"");
        assertLimits(ofStage, 130, 130, 140);
        JudgedMachine ofThrow = ofStage.with(
                "{ \"name\": \"A\",", "{ \"name\": \"A\", \"limits\": { \"dischargeTemperature\": \"120 degC\" },");
        assertLimits(ofThrow, 120, 120, 140);
        JudgedMachine ofChamber = ofThrow.with(
                "{ \"name\": \"A head\",",
                "{ \"name\": \"A head\", \"limits\": { \"dischargeTemperature\": \"110 degC\" },");
        assertLimits(ofChamber, 110, 120, 140);
    }

    /** Limits in °C. */
    private static void assertLimits(JudgedMachine file, double aHead, double aCrank, double bHead) {
        assertEquals(aHead + 273.15, limit(file, "A head"), 1e-9);
        assertEquals(aCrank + 273.15, limit(file, "A crank"), 1e-9);
        assertEquals(bHead + 273.15, limit(file, "B head"), 1e-9);
    }

    private static double limit(JudgedMachine file, String chamber) {
        return file.finding("discharge-temperature", chamber).limit().orElseThrow();
    }

    @Test
    void aChamberThatDischargesNothingHasNoDischargeTemperature() {
        JudgedMachine open = file.with(
                "{ \"name\": \"normal\"",
                "{ \"name\": \"normal\", \"chambers\": { \"A head\": { \"state\": \"held-open\" } }");
        Finding finding = open.finding("discharge-temperature", "A head");
        assertEquals("nothing is discharged", finding.note());
        assertEquals(OptionalDouble.empty(), finding.value());
        Finding cold =
                file.with("\"suctionTemperature\": \"20 degC\", ", "").finding("discharge-temperature", "A head");
        assertEquals("stages.first.suctionTemperature is missing at the duty point", cold.note());
    }

    @Test
    void suctionHeadIsWhatThePressureLeavesAfterAcceleration() {
        double length = 6;
        double bore = 0.1;
        SuctionLine line = new SuctionLine(
                OptionalDouble.of(length),
                OptionalDouble.of(bore),
                2,
                0.5,
                OptionalDouble.empty(),
                OptionalDouble.of(1.5));
        // h_a = L v n C/(K g), C = 0.066 for a triplex, n in rev/min; water of 1000 kg/m³ at 1.5 bar, 31 rad/s
        double flow = 3 * Math.PI / 4 * 0.07 * 0.07 * 0.12 * 31 / (2 * Math.PI);
        double velocity = flow / (Math.PI / 4 * bore * bore);
        double acceleration = length * velocity * (31 * 30 / Math.PI) * 0.066 / (1.5 * 9.80665);
        double expected = (1.5e5 - 2300) / (1000 * 9.80665) + 2 - 0.5 - acceleration;
        Finding finding = pump(line, "suction-head");
        assertEquals(expected, finding.value().orElseThrow(), 1e-9 * expected);
        assertEquals(0, finding.limit().orElseThrow());
        assertEquals(expected, finding.margin().orElseThrow(), 1e-9 * expected);
        assertTrue(finding.note().endsWith("; margin is the difference, the limit being 0"), finding.note());
    }

    @Test
    void suctionHeadWithoutALineSaysSo() {
        assertEquals(
                "stage lift has no suctionLine",
                pump(Pumps.NO_LINE, "suction-head").note());
    }

    @Test
    void flowVariationOfATriplexIsTheTabulatedOne() {
        // Pump Handbook, section on power pumps, at l/r = 5: 25.315 % in all (evaluated apart from this program)
        Finding finding = pump(Pumps.NO_LINE, "flow-variation");
        assertEquals(0.25315, finding.value().orElseThrow(), 5e-6);
        assertEquals("6.797 % above the mean, 18.52 % below it; no limit given", finding.note());
    }

    @Test
    void gasIsNotAskedForSuctionHeadNorLiquidForDischargeTemperature() {
        List<String> ofGas =
                file.findings().stream().map(f -> f.criterion().id()).distinct().toList();
        assertTrue(!ofGas.contains("suction-head") && !ofGas.contains("flow-variation"), ofGas.toString());
        Machine machine =
                Pumps.machine(Pumps.plungers(5, Pumps.IDEAL, 0), Rotation.COUNTER_CLOCKWISE, Pumps.duty(Pumps.RIGID));
        assertTrue(Judgement.of(machine, machine.dutyPoints()).findings().stream()
                .noneMatch(f -> f.criterion().id().equals("discharge-temperature")));
    }
}
