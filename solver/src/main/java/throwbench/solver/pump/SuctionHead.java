package throwbench.solver.pump;

import java.util.Locale;
import java.util.OptionalDouble;
import throwbench.solver.fluid.Answer;
import throwbench.solver.fluid.Fluid;
import throwbench.solver.fluid.Liquid;
import throwbench.solver.machine.Site;
import throwbench.solver.machine.Stage;
import throwbench.solver.machine.StageConditions;
import throwbench.solver.machine.SuctionLine;
import throwbench.solver.revolution.RunningMachine;

/**
 * The suction head that a pump's stage has to spare above the vapour pressure: (p_source − p_vapour)/(ρ g) + staticHead −
 * frictionLoss − h_a, with standard gravity wherever the machine stands.
 *
 * @param available m of liquid, any sign
 * @param handbook h_a by the handbook's formula, m; empty where its C or K_h is not known
 * @param solved h_a from the solved suction flow, m, without the surge at its steps
 * @param note both heads and which of them is in the available one, in a sentence
 */
public record SuctionHead(double available, OptionalDouble handbook, double solved, String note) {

    /** Of a stage of liquid; the reason where something is missing. */
    public static Answer<SuctionHead> of(RunningMachine running, String stageName) {
        Stage stage = running.machine().stage(stageName);
        Fluid fluid = running.machine().fluidOf(stageName);
        if (!(fluid instanceof Liquid liquid)) {
            return Answer.none("stage " + stageName + " holds a gas");
        }
        if (stage.suctionLine().isEmpty()) {
            return Answer.none("stage " + stageName + " has no suctionLine");
        }
        SuctionLine line = stage.suctionLine().get();
        if (line.length().isEmpty() || line.bore().isEmpty()) {
            String missing = line.length().isEmpty() ? "length" : "bore";
            return Answer.none("the suctionLine of stage " + stageName + " has no " + missing);
        }
        OptionalDouble source = source(running, stageName, line);
        if (source.isEmpty()) {
            return Answer.none("stage " + stageName + " has no suctionPressure at the duty point");
        }
        double standing = (source.getAsDouble() - liquid.vapourPressure()) / (liquid.density() * Site.STANDARD_GRAVITY)
                + line.staticHead()
                - line.frictionLoss();
        return ManifoldFlow.suction(running, stageName).map(flow -> of(running, stageName, line, standing, flow));
    }

    private static OptionalDouble source(RunningMachine running, String stage, SuctionLine line) {
        StageConditions conditions = running.dutyPoint().stages().get(stage);
        return line.sourcePressure().isPresent() || conditions == null
                ? line.sourcePressure()
                : conditions.suctionPressure();
    }

    private static SuctionHead of(
            RunningMachine running, String stage, SuctionLine line, double standing, ManifoldFlow flow) {
        // known wherever the suction flow is
        StageTurn turn = StageTurn.of(running, stage).orElseThrow();
        double length = line.length().orElseThrow();
        double bore = line.bore().orElseThrow();
        double area = Math.PI / 4 * bore * bore;
        double solved =
                AccelerationHead.ofFlow(length, area, flow.greatestRise().value());
        OptionalDouble constant = PumpArrangement.constantOf(running, stage);
        boolean known = constant.isPresent() && line.liquidFactor().isPresent() && turn.passed() > 0;
        OptionalDouble handbook = known
                ? OptionalDouble.of(AccelerationHead.byHandbook(
                        length,
                        turn.passed() * running.turnsPerSecond() / area,
                        running.meanSpeed(),
                        constant.getAsDouble(),
                        line.liquidFactor().getAsDouble()))
                : OptionalDouble.empty();
        return new SuctionHead(
                standing - handbook.orElse(solved), handbook, solved, note(handbook, solved, constant, line));
    }

    private static String note(OptionalDouble handbook, double solved, OptionalDouble constant, SuctionLine line) {
        String bySolution = String.format(Locale.ROOT, "%.4g m from the solved flow without its steps", solved);
        if (handbook.isPresent()) {
            return String.format(
                    Locale.ROOT,
                    "acceleration head %.4g m by the handbook formula (C %.3g, K %.3g), which is judged; %s",
                    handbook.getAsDouble(),
                    constant.orElseThrow(),
                    line.liquidFactor().orElseThrow(),
                    bySolution);
        }
        String lacking = constant.isEmpty()
                ? "the handbooks give no C for this arrangement"
                : line.liquidFactor().isEmpty()
                        ? "the handbook formula needs the suction line's liquidFactor"
                        : "the handbook formula needs a flow above 0";
        return "acceleration head " + bySolution + ", which is judged; " + lacking;
    }
}
