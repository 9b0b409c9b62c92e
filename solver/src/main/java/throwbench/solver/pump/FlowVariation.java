package throwbench.solver.pump;

import throwbench.solver.fluid.Answer;
import throwbench.solver.revolution.Extreme;
import throwbench.solver.revolution.Extremes;
import throwbench.solver.revolution.RunningMachine;

/**
 * How far a stage's delivery swings about its mean.
 *
 * @param mean m³/s, above 0
 * @param least m³/s, at the crank angle of the machine's first throw
 * @param greatest likewise
 */
public record FlowVariation(double mean, Extreme least, Extreme greatest) {

    public FlowVariation {
        if (!(mean > 0)) {
            throw new IllegalArgumentException("a variation about a mean of " + mean + " m3/s");
        }
    }

    /** Of the delivery of a stage; the reason where it delivers nothing or its delivery cannot be told. */
    public static Answer<FlowVariation> ofDelivery(RunningMachine running, String stage) {
        Answer<ManifoldFlow> flow = ManifoldFlow.discharge(running, stage);
        if (flow.value().isPresent() && !(flow.value().get().mean() > 0)) {
            return Answer.none("stage " + stage + " delivers nothing");
        }
        return flow.map(FlowVariation::of);
    }

    private static FlowVariation of(ManifoldFlow flow) {
        Extremes extremes = flow.extremes();
        return new FlowVariation(flow.mean(), extremes.least(), extremes.greatest());
    }

    /** (max − mean)/mean. */
    public double above() {
        return (greatest.value() - mean) / mean;
    }

    /** (mean − min)/mean. */
    public double below() {
        return (mean - least.value()) / mean;
    }

    /** (max − min)/mean. */
    public double total() {
        return (greatest.value() - least.value()) / mean;
    }
}
