package throwbench.solver.revolution;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import throwbench.solver.load.ConnectingRod;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.StageConditions;

/** What a user must be told of a solution: assumptions made for missing values, chambers that deliver nothing. */
final class Notes {

    private static final MathContext SIX_DIGITS = new MathContext(6);

    private Notes() {}

    static List<String> of(RunningMachine running, int shown) {
        List<String> notes = new ArrayList<>();
        RunningThrow t = running.throwsInOrder().get(shown);
        String name = "throw " + t.described().name();
        ConnectingRod rod = t.described().connectingRod();
        if (rod.mass() > 0 && rod.massCentreFromCrankPin().isEmpty()) {
            notes.add(name + ": massCentreFromCrankPin is missing; a third of the rod length is assumed");
        }
        if (rod.mass() > 0 && rod.inertia().isEmpty()) {
            notes.add(name + ": the connecting rod's inertia is missing; that of two lumps at the pins is assumed");
        }
        for (int c = 0; c < t.chambers().size(); c++) {
            Chamber chamber = t.chambers().get(c);
            for (String note : t.curves().get(c).notes()) {
                notes.add(chamber.name() + ": " + note);
            }
        }
        running.machine().dutyPoints().stream()
                .filter(written -> written.name().equals(running.dutyPoint().name()))
                .findFirst()
                .ifPresent(written -> addBalanced(written, running.dutyPoint(), notes));
        return List.copyOf(notes);
    }

    private static void addBalanced(DutyPoint written, DutyPoint settled, List<String> notes) {
        settled.stages().forEach((stage, lines) -> {
            StageConditions asked = written.stages().get(stage);
            if (asked != null && asked.suctionPressure().isEmpty()) {
                lines.suctionPressure()
                        .ifPresent(pressure -> notes.add("stage " + stage + ": the balanced suction pressure is "
                                + new BigDecimal(pressure).round(SIX_DIGITS).toPlainString() + " Pa absolute"));
            }
        });
    }
}
