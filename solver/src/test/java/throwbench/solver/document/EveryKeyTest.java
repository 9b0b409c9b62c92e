package throwbench.solver.document;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import throwbench.solver.chamber.ChamberCondition;
import throwbench.solver.chamber.ChamberState;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.IdealValves;
import throwbench.solver.chamber.LiquidValves;
import throwbench.solver.chamber.RecordedPressure;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.schema.Schema;
import throwbench.solver.fluid.GasMixture;
import throwbench.solver.fluid.Liquid;
import throwbench.solver.load.Crank;
import throwbench.solver.load.Friction;
import throwbench.solver.machine.BearingPart;
import throwbench.solver.machine.Bookmark;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.CrossheadPart;
import throwbench.solver.machine.Driver;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.LoadStep;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.PistonRodPart;
import throwbench.solver.machine.Ranges;
import throwbench.solver.machine.ShaftPlace;
import throwbench.solver.machine.SuctionLine;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;

/** A file with every key: each value lands where it belongs. Values differ pairwise, so that a swap shows. */
class EveryKeyTest {

    private static Machine machine() {
        return Samples.machine(Samples.everyKey());
    }

    private static OptionalDouble some(double value) {
        return OptionalDouble.of(value);
    }

    @Test
    void fileHoldsEveryNumericKeyOfTheSchemaOnce() {
        Set<String> numeric = new TreeSet<>();
        for (Schema.Entry entry : Schema.entries()) {
            boolean number = entry.key().dimension().isPresent();
            boolean ofSomeLevel = entry.pattern().contains("limits.");
            if (number && !ofSomeLevel) {
                numeric.add(entry.pattern().replace(".*", ".").replace("[]", ""));
            }
        }
        Set<String> held = new TreeSet<>();
        MachineDocument document = Samples.document(Samples.everyKey());
        for (NumericKey key : document.numericKeys()) {
            String plain = key.path().toString().replaceAll("\\[\\d+]", "");
            for (String name : List.of(
                    "sour gas",
                    "dry air",
                    "brine 1.0",
                    "low",
                    "high",
                    "lift",
                    "A head",
                    "A crank",
                    "methane",
                    "carbon dioxide")) {
                plain = plain.replace('.' + name, ".");
            }
            held.add(plain);
        }
        numeric.removeAll(held);
        assertEquals(Set.of("loadSteps.chambers..leakArea"), numeric);
    }

    @Test
    void siteAndDrive() {
        Machine machine = machine();
        assertEquals(98_500, machine.site().ambientPressure());
        assertEquals(98_500 + 2_000, machine.site().framePressure(), "gauge from the site's own ambient pressure");
        assertEquals(9.80665, machine.site().gravityAcceleration());
        assertEquals(590 * Math.PI / 30, machine.drive().speed(), 1e-12);
        assertEquals(Rotation.CLOCKWISE, machine.drive().rotation());
        assertEquals(some(41), machine.drive().rotatingInertia());
        assertEquals(new Driver.Slip(2400, 0.012), machine.drive().driver());
        assertEquals(0.93, machine.drive().mechanicalEfficiency());
    }

    @Test
    void fluidsAndStages() {
        Machine machine = machine();
        assertEquals(
                new GasMixture(Map.of("methane", 0.62, "carbon dioxide", 0.38), true),
                Samples.at(machine.fluids(), "sour gas"));
        assertEquals(
                List.of("methane", "carbon dioxide"),
                List.copyOf(((GasMixture) Samples.at(machine.fluids(), "sour gas"))
                        .moleFractions()
                        .keySet()),
                "in the order of the file");
        assertEquals(new Liquid(1025, 2.2e9, 2300), Samples.at(machine.fluids(), "brine 1.0"));
        assertEquals(Optional.of("low"), machine.stage("high").follows());
        assertEquals(
                Optional.of(new SuctionLine(some(6.5), some(0.08), 1.8, 0.3, some(98_500 + 10_000), some(1.5))),
                machine.stage("lift").suctionLine());
        Limits limits = machine.stage("low").limits();
        assertEquals(some(140 + 273.15), limits.get(LimitKey.DISCHARGE_TEMPERATURE));
        assertEquals(some(0.25), limits.get(LimitKey.CAPACITY));
        assertEquals(some(0.9), limits.get(LimitKey.FLOW_VARIATION));
        assertEquals(some(0.02), limits.get(LimitKey.STAGE_FLOW_MISMATCH));
        assertEquals(some(-1), limits.get(LimitKey.SUCTION_HEAD));
    }

    @Test
    void throwWithItsParts() {
        Throw one = machine().throwsInOrder().get(0);
        assertEquals(new ShaftPlace(Math.PI / 18, Math.PI, 0.31), one.place());
        assertEquals(new Linkage(0.076, 0.402, -0.003), one.linkage());
        assertEquals(new Crank(2.1, 1.9), one.crank());
        assertEquals(new Friction(350, 0.03), one.friction());
        assertEquals(
                Optional.of(new PistonRodPart(
                        some(0.063),
                        some(0.052),
                        some(0.9),
                        some(206e9),
                        some(650e6),
                        some(850e6),
                        some(300e6),
                        some(2.6),
                        some(210e3))),
                one.parts().pistonRod());
        assertEquals(
                Optional.of(new CrossheadPart(some(0.085), some(0.14), some(0.029))),
                one.parts().crosshead());
        assertEquals(
                Optional.of(new BearingPart(some(0.132), some(0.088))),
                one.parts().crankPin());
        assertEquals(
                Optional.of(new BearingPart(some(0.141), some(0.092))),
                one.parts().mainBearing());
    }

    @Test
    void everyLimitInItsUnit() {
        Limits ofThrow = machine().throwsInOrder().get(0).limits();
        Map<LimitKey, Double> expected = Map.ofEntries(
                Map.entry(LimitKey.GAS_TENSION, 101e3),
                Map.entry(LimitKey.GAS_COMPRESSION, 102e3),
                Map.entry(LimitKey.ROD_TENSION, 103e3),
                Map.entry(LimitKey.ROD_COMPRESSION, 104e3),
                Map.entry(LimitKey.REVERSAL_DURATION, 16 * Math.PI / 180),
                Map.entry(LimitKey.REVERSAL_RATIO, 0.04),
                Map.entry(LimitKey.MEAN_PISTON_SPEED, 5.0),
                Map.entry(LimitKey.ROD_TO_CRANK_RATIO, 4.0),
                Map.entry(LimitKey.CROSSHEAD_PIN_PRESSURE, 14e6),
                Map.entry(LimitKey.CRANK_PIN_PRESSURE, 8e6),
                Map.entry(LimitKey.MAIN_BEARING_PRESSURE, 6e6),
                Map.entry(LimitKey.GUIDE_PRESSURE, 0.4e6),
                Map.entry(LimitKey.PISTON_ROD_STRESS, 400e6),
                Map.entry(LimitKey.PISTON_ROD_FATIGUE, 0.9),
                Map.entry(LimitKey.PISTON_ROD_BUCKLING, 5.0));
        assertEquals(new Limits(expected), ofThrow);
        Map<LimitKey, Double> ofMachine = Map.of(
                LimitKey.SPEED_FLUCTUATION, 0.015,
                LimitKey.PEAK_TO_MEAN_TORQUE, 3.0,
                LimitKey.INDICATED_POWER, 250e3,
                LimitKey.SHAFT_POWER, 270e3,
                LimitKey.SHAKING_FORCE_PRIMARY, 30e3,
                LimitKey.SHAKING_FORCE_SECONDARY, 12e3,
                LimitKey.SHAKING_COUPLE_PRIMARY, 9e3,
                LimitKey.SHAKING_COUPLE_SECONDARY, 4e3);
        assertEquals(new Limits(ofMachine), machine().limits());
    }

    @Test
    void chambersAndCycles() {
        List<Chamber> first = machine().throwsInOrder().get(0).chambers();
        assertEquals(
                new IdealValves(0.03, 0.05, some(1.36), some(1.31)),
                first.get(0).cycle());
        assertEquals(0.04, first.get(0).innerDiameter());
        assertEquals(0.04, first.get(0).flowAllowance());
        assertEquals(some(418.15), first.get(0).limits().get(LimitKey.DISCHARGE_TEMPERATURE));
        assertEquals(new Clearance(1.1e-3, false), first.get(1).clearance());
        List<Chamber> second = machine().throwsInOrder().get(1).chambers();
        assertEquals(
                new LiquidValves(20_000, 40_000, true, 4 * Math.PI / 180),
                second.get(0).cycle());
        RecordedPressure recorded = (RecordedPressure) second.get(1).cycle();
        assertEquals("tables/b-2.csv", recorded.file());
        assertEquals(8, recorded.pressures().size());
        assertEquals(Math.PI / 4, recorded.crankAngles().get(1), 1e-15);
        assertEquals(201_000, recorded.pressures().get(1));
        assertEquals(Optional.empty(), second.get(1).stage());
    }

    @Test
    void dutyPointsLoadStepsRangesAndBookmarks() {
        Machine machine = machine();
        DutyPoint point = machine.dutyPoints().get(0);
        assertEquals(OptionalDouble.empty(), Samples.at(point.stages(), "low").dischargePressure());
        assertEquals(OptionalDouble.empty(), Samples.at(point.stages(), "high").suctionPressure());
        assertEquals(
                11.5e5 + 98_500,
                Samples.at(point.stages(), "high").dischargePressure().orElseThrow(),
                1e-9);
        assertEquals(
                new ChamberCondition(ChamberState.FAILED_DISCHARGE, 1.5e-4, new Clearance(5e-4, false)),
                point.condition("A crank"));
        assertEquals(
                List.of(new LoadStep(
                        "crank end open",
                        Map.of("A crank", new ChamberCondition(ChamberState.HELD_OPEN, 0, Clearance.NONE)))),
                machine.loadSteps());
        Ranges.StageRange low = Samples.at(machine.ranges().stages(), "low");
        assertEquals(
                new Ranges.Range(500 * Math.PI / 30, 620 * Math.PI / 30),
                machine.ranges().speed().orElseThrow());
        assertEquals(new Ranges.Range(278.15, 308.15), low.suctionTemperature().orElseThrow());
        assertEquals(new Ranges.Range(300_000, 400_000), low.dischargePressure().orElseThrow());
        assertEquals(Optional.of(500_000.0), low.reliefPressure());
        assertEquals(List.of(new Bookmark("A", 37.5 * Math.PI / 180, "peak guide force")), machine.bookmarks());
    }

    @Test
    void numericKeysHaveTheirDimensionValueAndTolerance() {
        MachineDocument document = Samples.document(Samples.everyKey());
        Map<String, NumericKey> keys = document.numericKeys().stream()
                .collect(Collectors.toMap(key -> key.path().toString(), key -> key));
        NumericKey bore = Samples.at(keys, "throws[0].chambers[0].bore");
        assertEquals(Dimension.LENGTH, bore.dimension());
        assertEquals(0.32, bore.quantity().value());
        assertEquals(2e-4, bore.quantity().tolerance(), 1e-19);
        assertEquals(
                Dimension.VOLUME,
                Samples.at(keys, "throws[0].chambers[1].clearance").dimension());
        assertEquals(
                Dimension.SHARE,
                Samples.at(keys, "throws[0].chambers[0].clearance").dimension());
        assertEquals(
                Dimension.GAS_PRESSURE,
                Samples.at(keys, "dutyPoints[0].stages.lift.suctionPressure").dimension());
        assertEquals(
                Dimension.SHARE,
                Samples.at(keys, "fluids.sour gas.mixture.methane").dimension());
        assertEquals(false, keys.containsKey("dutyPoints[0].stages.high.suctionPressure"), "balanced is no number");
    }

    @Test
    void everyNumberCanBeSetByItsPathAndReadsBackAsTheVeryDouble() {
        MachineDocument document = Samples.document(Samples.everyKey());
        for (NumericKey key : document.numericKeys()) {
            double wanted = key.quantity().value() * 1.000123;
            MachineDocument changed =
                    document.withNumber(document.path(key.path().toString()), wanted);
            double read = changed.numericKeys().stream()
                    .filter(other -> other.path().equals(key.path()))
                    .findFirst()
                    .orElseThrow(() -> new AssertionError(key + " is gone"))
                    .quantity()
                    .value();
            assertEquals(wanted, read, key.path().toString());
        }
    }
}
