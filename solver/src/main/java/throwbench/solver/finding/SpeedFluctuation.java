package throwbench.solver.finding;

import throwbench.solver.drive.SpeedCurve;
import throwbench.solver.machine.LimitKey;

/** Fluctuation coefficient of the shaft's speed over a turn, (ω_max − ω_min)/ω_mean, 1, with the true extremes. No default limit. */
public final class SpeedFluctuation implements MachineCriterion {

    private static final Statement STATEMENT = Statement.atMost(LimitKey.SPEED_FLUCTUATION, "1", "speed fluctuation")
            .is("(greatest speed − least speed) / mean speed over the revolution")
            .from("what the driver or the driven machine allows; definition: Khurmi and Gupta, Theory of Machines, 14th"
                    + " edition (2009), ch. 16");

    @Override
    public Statement statement() {
        return STATEMENT;
    }

    @Override
    public Found find(JudgedDuty duty) {
        SpeedCurve speed = duty.running().speedCurve();
        return Found.of(speed.fluctuation()).noting(speed.constant() ? "the driver holds the speed constant" : "");
    }
}
