package throwbench.solver.revolution;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import throwbench.solver.chamber.ChamberDuty;
import throwbench.solver.chamber.ChamberVolume;
import throwbench.solver.chamber.CycleOutcome;
import throwbench.solver.chamber.LineConditions;
import throwbench.solver.chamber.PressureCurve;
import throwbench.solver.chamber.Side;
import throwbench.solver.load.ThrowBody;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.StageConditions;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Linkage;

/** Settles one throw: resolves its defaults and solves its chambers' cycles. */
final class ThrowSettler {

    private final Machine machine;
    private final DutyPoint duty;
    private final int index;
    private final Throw described;
    private final List<Refusal> refusals;

    ThrowSettler(Machine machine, DutyPoint duty, int index, List<Refusal> refusals) {
        this.machine = machine;
        this.duty = duty;
        this.index = index;
        this.described = machine.throwsInOrder().get(index);
        this.refusals = refusals;
    }

    Optional<RunningThrow> settle() {
        List<ChamberVolume> volumes = new ArrayList<>();
        List<PressureCurve> curves = new ArrayList<>();
        double uncovered = 0;
        for (int i = 0; i < described.chambers().size(); i++) {
            Chamber chamber = described.chambers().get(i);
            ChamberVolume volume = volume(duty, described, chamber);
            volumes.add(volume);
            solve(i, chamber).ifPresent(curves::add);
            uncovered += chamber.side() == Side.HEAD ? chamber.area() : -chamber.area();
        }
        if (curves.size() < volumes.size()) {
            return Optional.empty();
        }
        ThrowBody body = ThrowBody.of(
                described.linkage(),
                described.masses(),
                described.connectingRod(),
                described.crank(),
                described.friction(),
                described.place().axisDirection(),
                machine.site().gravityAcceleration());
        return Optional.of(new RunningThrow(described, body, phase(), volumes, curves, uncovered));
    }

    private static ChamberVolume volume(DutyPoint duty, Throw t, Chamber chamber) {
        double stroke = t.linkage().stroke();
        double swept = chamber.area() * stroke;
        double clearance = chamber.clearance().volume(swept)
                + duty.condition(chamber.name()).addedClearance().volume(swept);
        return new ChamberVolume(chamber.side(), chamber.area(), stroke, clearance);
    }

    private Optional<PressureCurve> solve(int chamberIndex, Chamber chamber) {
        String path = "throws[" + index + "].chambers[" + chamberIndex + "].cycle";
        Optional<CycleOutcome> alone = chamber.cycle().solveAlone(duty.condition(chamber.name()));
        if (alone.isPresent()) {
            return taken(path, chamber, alone.get());
        }
        if (chamber.stage().isEmpty()) {
            return refuse(path, "a " + chamber.cycle().kind() + " cycle needs a stage");
        }
        String stage = chamber.stage().get();
        StageConditions lines = duty.stages().get(stage);
        if (lines == null
                || lines.suctionPressure().isEmpty()
                || lines.dischargePressure().isEmpty()) {
            return refuse("stages." + stage + ".follows", "its pressures are not known at this duty point");
        }
        LineConditions known = new LineConditions(
                lines.suctionPressure().getAsDouble(),
                lines.dischargePressure().getAsDouble(),
                lines.suctionTemperature());
        return taken(path, chamber, cycle(machine, duty, described, chamber, known));
    }

    private Optional<PressureCurve> taken(String path, Chamber chamber, CycleOutcome outcome) {
        if (outcome.failed()) {
            refusals.add(new Refusal(path, "chamber \"" + chamber.name() + "\": " + outcome.refusal(), true));
            return Optional.empty();
        }
        return outcome.curve().isPresent() ? outcome.curve() : refuse(path, outcome.refusal());
    }

    /** Solves the cycle of a chamber that has a stage, between its lines. */
    static CycleOutcome cycle(Machine machine, DutyPoint duty, Throw t, Chamber chamber, LineConditions lines) {
        return chamber.cycle()
                .solve(new ChamberDuty(
                        t.linkage(),
                        machine.drive().rotation(),
                        volume(duty, t, chamber),
                        machine.fluidOf(chamber.stage().orElseThrow()),
                        lines,
                        duty.condition(chamber.name()),
                        duty.speed(),
                        chamber.flowAllowance()));
    }

    private Optional<PressureCurve> refuse(String path, String sentence) {
        refusals.add(new Refusal(path, sentence));
        return Optional.empty();
    }

    /** φ of this throw when the first stands at its head-end dead centre. */
    private double phase() {
        Throw first = machine.throwsInOrder().get(0);
        double shaft = pinAngleFromShaft(first, first.linkage());
        double here = pinAngleFromShaft(described, described.linkage());
        return machine.drive().rotation().sign() * (shaft - here);
    }

    /** ψ at which a throw stands at head-end dead centre: θh + γ − δ. */
    private static double pinAngleFromShaft(Throw t, Linkage linkage) {
        return linkage.headEndAngle() + t.place().axisDirection() - t.place().crankPhase();
    }
}
