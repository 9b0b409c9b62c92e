package throwbench.solver.revolution;

import java.util.ArrayList;
import java.util.List;
import throwbench.solver.revolution.Summary.StageFlows;

/**
 * What a machine takes and passes on the mean of a revolution, all its throws together.
 *
 * @param shaftTorque mean of the shaft's torque, N·m, positive when the driver must deliver it
 * @param flow power and flow by stage
 */
public record MachineMeans(double shaftTorque, StageFlows flow) {

    /** Of a machine at its duty point. */
    public static MachineMeans of(RunningMachine running) {
        List<TurnMeans> means = new ArrayList<>();
        for (int i = 0; i < running.throwsInOrder().size(); i++) {
            means.add(new TurnMeans(running, i));
        }
        return of(running, means);
    }

    /** @param means one a throw */
    static MachineMeans of(RunningMachine running, List<TurnMeans> means) {
        StageFlows sum = ofThrow(running, 0, means.get(0));
        for (int i = 1; i < means.size(); i++) {
            sum = add(sum, ofThrow(running, i, means.get(i)));
        }
        return new MachineMeans(means.stream().mapToDouble(TurnMeans::torque).sum(), sum);
    }

    /** The share of one throw. */
    static StageFlows ofThrow(RunningMachine running, int index, TurnMeans means) {
        return new StageFlows(
                means.powerByStage(),
                TurnMeans.capacityByStage(running, index),
                TurnMeans.inletVolumeByStage(running, index),
                means.power());
    }

    private static StageFlows add(StageFlows a, StageFlows b) {
        b.indicatedPower().forEach((stage, power) -> a.indicatedPower().merge(stage, power, Double::sum));
        b.inletVolume().forEach((stage, volume) -> a.inletVolume().merge(stage, volume, TurnMeans::sum));
        b.capacity().forEach((stage, mass) -> a.capacity().merge(stage, mass, TurnMeans::sum));
        return new StageFlows(a.indicatedPower(), a.capacity(), a.inletVolume(), a.totalPower() + b.totalPower());
    }
}
