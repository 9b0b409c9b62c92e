package throwbench.solver.machine;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import throwbench.solver.chamber.ChamberCondition;
import throwbench.solver.chamber.ChamberVolume;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.IdealValves;
import throwbench.solver.chamber.Side;
import throwbench.solver.load.ConnectingRod;
import throwbench.solver.load.Crank;
import throwbench.solver.load.ReciprocatingMasses;
import throwbench.solver.trial.AnyThrow;
import throwbench.solver.trial.Machines;

/** Records of a machine: derived values with pairwise different inputs, defaults, refusals. */
class MachineTest {

    private static final IdealValves VALVES = new IdealValves(0, 0, OptionalDouble.empty(), OptionalDouble.empty());

    @Test
    void areaIsTheRingBetweenBoreAndWhatPassesThrough() {
        Chamber chamber = Machines.chamber("c", Side.CRANK, 0.32, 0.064, 0.16, VALVES);
        assertEquals(Math.PI / 4 * (0.32 * 0.32 - 0.064 * 0.064), chamber.area(), 1e-16);
        IllegalArgumentException refused = assertThrows(
                IllegalArgumentException.class, () -> Machines.chamber("c", Side.CRANK, 0.05, 0.06, 0.16, VALVES));
        assertEquals("bore 0.05 m, inner diameter 0.06 m", refused.getMessage());
        assertThrows(
                IllegalArgumentException.class, () -> Machines.chamber("c", Side.CRANK, Double.NaN, 0, 0.16, VALVES));
    }

    @Test
    void massesAddUpFromThePistonOutwards() {
        ReciprocatingMasses masses = new ReciprocatingMasses(38, 24, 42);
        assertEquals(62, masses.pistonAndRod());
        assertEquals(104, masses.total());
        assertThrows(IllegalArgumentException.class, () -> new ReciprocatingMasses(1, -1, 0));
        assertEquals(1.6, new Crank(2.1, 0.5).net(), 1e-15);
    }

    @Test
    void missingRodValuesAreAThirdOfTheLengthAndTwoLumps() {
        ConnectingRod bare = new ConnectingRod(60, OptionalDouble.empty(), OptionalDouble.empty());
        assertEquals(0.4, bare.massCentre(1.2), 1e-15);
        assertEquals(60 * 0.4 * 0.8, bare.inertiaAboutMassCentre(1.2), 1e-12);
        ConnectingRod known = new ConnectingRod(60, OptionalDouble.of(0.5), OptionalDouble.of(9));
        assertEquals(0.5, known.massCentre(1.2));
        assertEquals(9, known.inertiaAboutMassCentre(1.2));
    }

    @Test
    void clearanceIsAShareOfTheSweptVolumeOrAVolume() {
        assertEquals(0.14 * 0.012, new Clearance(0.14, true).volume(0.012), 1e-18);
        assertEquals(0.14, new Clearance(0.14, false).volume(0.012));
        assertThrows(IllegalArgumentException.class, () -> new Clearance(-0.1, true));
        ChamberVolume head = new ChamberVolume(Side.HEAD, 0.08, 0.15, 0.002);
        assertEquals(0.002, head.least());
        assertEquals(0.014, head.greatest(), 1e-17);
        assertEquals(0.002 + 0.08 * 0.05, head.at(0.05), 1e-17);
        assertEquals(0.05, head.travelAt(head.at(0.05)), 1e-15);
        ChamberVolume crank = new ChamberVolume(Side.CRANK, 0.08, 0.15, 0.002);
        assertEquals(0.002 + 0.08 * 0.1, crank.at(0.05), 1e-17);
        assertEquals(0.05, crank.travelAt(crank.at(0.05)), 1e-15);
    }

    @Test
    void chamberNotNamedAtADutyPointWorks() {
        DutyPoint duty = Machines.boosterDuty(Map.of());
        assertEquals(ChamberCondition.WORKING, duty.condition("A head"));
    }

    @Test
    void machineFindsItsStagesAndFluids() {
        Machine machine = Machines.booster(0);
        assertEquals(AnyThrow.STAGE, machine.stage(AnyThrow.STAGE).name());
        assertEquals(true, machine.fluidOf(AnyThrow.STAGE).isGas());
        IllegalArgumentException refused = assertThrows(IllegalArgumentException.class, () -> machine.stage("second"));
        assertEquals("no stage \"second\"", refused.getMessage());
        assertThrows(
                IllegalArgumentException.class,
                () -> Machines.of(
                        List.of(),
                        machine.drive().rotation(),
                        machine.site(),
                        machine.dutyPoints().get(0),
                        Limits.NONE));
    }

    @Test
    void gravityIsStandardOrNone() {
        // CGPM 1901: 9.80665 m/s2 exactly
        assertEquals(9.80665, new Site(1e5, 1e5, true).gravityAcceleration());
        assertEquals(0, new Site(1e5, 1e5, false).gravityAcceleration());
    }
}
