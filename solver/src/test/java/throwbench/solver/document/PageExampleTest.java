package throwbench.solver.document;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import throwbench.solver.chamber.ChamberState;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.FlowValves;
import throwbench.solver.chamber.IdealValves;
import throwbench.solver.chamber.Side;
import throwbench.solver.fluid.PerfectGas;
import throwbench.solver.load.ConnectingRod;
import throwbench.solver.load.Crank;
import throwbench.solver.load.Friction;
import throwbench.solver.load.ReciprocatingMasses;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.Driver;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Parts;
import throwbench.solver.machine.Ranges;
import throwbench.solver.machine.Stage;
import throwbench.solver.machine.StageConditions;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;

/** The example of the machine file's page, value by value. */
class PageExampleTest {

    private static Machine machine() {
        return Samples.machine(Samples.pageExample());
    }

    @Test
    void machineAsAWhole() {
        Machine machine = machine();
        assertEquals("Saltmarsh biogas booster", machine.name());
        assertEquals("The first throw of an opposed pair.", machine.notes());
        assertEquals(101_325, machine.site().ambientPressure());
        assertEquals(101_325, machine.site().framePressure(), "the ambient pressure where none is given");
        assertEquals(0, machine.site().gravityAcceleration());
        assertEquals(740 * 2 * Math.PI / 60, machine.drive().speed(), 1e-12);
        assertEquals(Rotation.COUNTER_CLOCKWISE, machine.drive().rotation());
        assertEquals(OptionalDouble.of(38), machine.drive().rotatingInertia());
        assertEquals(new Driver.ConstantSpeed(), machine.drive().driver());
        assertEquals(1, machine.drive().mechanicalEfficiency());
        assertEquals(Map.of("biogas", new PerfectGas(0.0272, 1.29)), machine.fluids());
        Stage first = machine.stages().get(0);
        assertEquals("first biogas", first.name() + ' ' + first.fluid());
        assertEquals(Optional.empty(), first.follows());
        assertEquals(List.of(), machine.loadSteps());
        assertEquals(Ranges.NONE, machine.ranges());
        assertEquals(List.of(), machine.bookmarks());
    }

    @Test
    void throwAndItsChambers() {
        Throw one = machine().throwsInOrder().get(0);
        assertEquals("A", one.name());
        assertEquals(new Linkage(0.075, 0.4, 0), one.linkage());
        assertEquals(new ReciprocatingMasses(38, 24, 42), one.masses());
        assertEquals(new ConnectingRod(55, OptionalDouble.of(0.13), OptionalDouble.of(1.35)), one.connectingRod());
        assertEquals(new Crank(2.1, 0), one.crank());
        assertEquals(Friction.NONE, one.friction());
        assertEquals(Parts.NONE, one.parts());
        Chamber head = one.chambers().get(0);
        assertEquals("A head", head.name());
        assertEquals(Side.HEAD, head.side());
        assertEquals(Optional.of("first"), head.stage());
        assertEquals(0.32, head.bore());
        assertEquals(0, head.innerDiameter());
        assertEquals(new Clearance(0.14, true), head.clearance());
        assertEquals(0, head.flowAllowance());
        assertEquals(new IdealValves(0.03, 0.04, OptionalDouble.empty(), OptionalDouble.empty()), head.cycle());
        Chamber crank = one.chambers().get(1);
        assertEquals(Side.CRANK, crank.side());
        assertEquals(0.064, crank.innerDiameter());
        assertEquals(new Clearance(0.16, true), crank.clearance());
        assertEquals(new FlowValves(0.0026, 0.0022), crank.cycle());
    }

    @Test
    void dutyPointsAndLimits() {
        Machine machine = machine();
        DutyPoint normal = machine.dutyPoints().get(0);
        assertEquals(machine.drive().speed(), normal.speed(), "the drive's where none is given");
        StageConditions lines = Samples.at(normal.stages(), "first");
        assertEquals(4.1e5 + 101_325, lines.suctionPressure().orElseThrow(), 1e-9);
        assertEquals(305.15, lines.suctionTemperature().orElseThrow(), 1e-12);
        assertEquals(11.5e5 + 101_325, lines.dischargePressure().orElseThrow(), 1e-9);
        DutyPoint unloaded = machine.dutyPoints().get(1);
        assertEquals(20 * Math.PI, unloaded.speed(), 1e-12);
        assertEquals(ChamberState.HELD_OPEN, unloaded.condition("A crank").state());
        assertEquals(ChamberState.WORKING, unloaded.condition("A head").state());
        assertEquals(new Clearance(0.2, true), unloaded.condition("A head").addedClearance());
        assertEquals(OptionalDouble.of(120e3), machine.limits().get(LimitKey.ROD_TENSION));
        assertEquals(
                Math.PI / 12, machine.limits().get(LimitKey.REVERSAL_DURATION).orElseThrow(), 1e-15);
        assertEquals(OptionalDouble.of(0.03), machine.limits().get(LimitKey.REVERSAL_RATIO));
        assertEquals(
                423.15, machine.limits().get(LimitKey.DISCHARGE_TEMPERATURE).orElseThrow(), 1e-12);
        assertEquals(OptionalDouble.empty(), machine.limits().get(LimitKey.GAS_TENSION));
    }
}
