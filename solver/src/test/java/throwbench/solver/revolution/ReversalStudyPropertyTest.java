package throwbench.solver.revolution;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Map;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Machine;
import throwbench.solver.trial.AnyMachine;
import throwbench.solver.trial.AnyThrow;
import throwbench.solver.trial.Machines;

/** A map's quick way to the reversal against the full one. */
class ReversalStudyPropertyTest {

    /** One study through several machines and several duty points of one machine, each as if it were alone. */
    @Property(tries = 300)
    void studyFindsWhatTheFullTraceFinds(
            @ForAll(supplier = AnyMachine.class) Machine machine, @ForAll(supplier = AnyMachine.class) Machine other) {
        ReversalStudy study = new ReversalStudy(0);
        assertSame(study, Machines.running(machine));
        DutyPoint duty = machine.dutyPoints().get(0);
        DutyPoint elsewhere = other.dutyPoints().get(0);
        for (double share : new double[] {0.25, 0.5, 0.75, 1}) {
            DutyPoint between = new DutyPoint(
                    "between",
                    duty.speed() + share * (elsewhere.speed() - duty.speed()),
                    Map.of(AnyThrow.STAGE, elsewhere.stages().getOrDefault(AnyThrow.STAGE, Machines.lines(1e5, 2e5))),
                    duty.chambers());
            assertSame(study, RunningMachine.settle(machine, between).get());
        }
        assertSame(study, Machines.running(other));
    }

    private static void assertSame(ReversalStudy study, RunningMachine running) {
        Reversal full = Reversal.of(Traces.rodLoad(Revolution.solve(running, 0, Trace.STATIONS)));
        List<SignChange> quick = study.signChanges(running);
        assertEquals(full.signChanges().size(), quick.size(), () -> full.signChanges() + " against " + quick);
        for (int i = 0; i < quick.size(); i++) {
            assertEquals(full.signChanges().get(i).crankAngle(), quick.get(i).crankAngle(), 1e-9);
            assertEquals(full.signChanges().get(i).toTension(), quick.get(i).toTension());
        }
        assertEquals(full.duration(), study.duration(running), 1e-9);
        double shorter = Math.min(full.longestSpan(true), full.longestSpan(false));
        assertEquals(shorter, full.duration(), 1e-12);
    }
}
