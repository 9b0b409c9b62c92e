package throwbench.solver.finding;

import throwbench.solver.machine.LimitKey;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extreme;
import throwbench.solver.revolution.Extremes;

/** The greatest torque of the shaft in either sense over its mean, 1: what coupling and driver feel. No default limit. */
public final class PeakToMeanTorque implements MachineCriterion {

    /** A mean of this share of the peak is what rounding left of nothing. */
    private static final double NOTHING = 1e-9;

    private static final Statement STATEMENT = Statement.atMost(
                    LimitKey.PEAK_TO_MEAN_TORQUE, "1", "peak to mean torque")
            .is("greatest |shaft torque| / |mean shaft torque|")
            .from("definition; what the makers of coupling and driver allow");

    @Override
    public Statement statement() {
        return STATEMENT;
    }

    @Override
    public Found find(JudgedDuty duty) {
        Extremes torque = duty.extremes(0, Column.SHAFT_TORQUE);
        boolean driven = torque.greatest().value() >= -torque.least().value();
        Extreme peak = driven ? torque.greatest() : torque.least();
        double mean = Math.abs(duty.means().shaftTorque());
        double size = Math.abs(peak.value());
        return mean <= NOTHING * size ? Found.none("the mean torque is 0") : Found.at(peak, size / mean);
    }
}
