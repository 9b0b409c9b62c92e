package throwbench.solver.finding;

import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import throwbench.solver.balance.OrderVector;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.revolution.RunningMachine;

/**
 * Shaking force (N) or couple (N·m) of the moving parts on the frame, of first or second order: the greatest size of the vector of
 * that order, the semi-major axis of the ellipse that it draws. Couples are taken about the middle between the outermost throws. No
 * default limit; reported without one.
 */
public final class Shaking implements MachineCriterion {

    public static final Shaking FORCE_PRIMARY = new Shaking(LimitKey.SHAKING_FORCE_PRIMARY, false, 1);
    public static final Shaking FORCE_SECONDARY = new Shaking(LimitKey.SHAKING_FORCE_SECONDARY, false, 2);
    public static final Shaking COUPLE_PRIMARY = new Shaking(LimitKey.SHAKING_COUPLE_PRIMARY, true, 1);
    public static final Shaking COUPLE_SECONDARY = new Shaking(LimitKey.SHAKING_COUPLE_SECONDARY, true, 2);

    /** What cancels leaves this share of a throw's own force as rounding. */
    private static final double ROUNDING = 1e-11;

    private final Statement statement;
    private final boolean couple;
    private final int order;

    private Shaking(LimitKey key, boolean couple, int order) {
        String what = couple ? "shaking couple" : "shaking force";
        String rank = order == 1 ? "primary" : "secondary";
        this.statement = Statement.atMost(key, couple ? "N m" : "N", what + ", " + rank)
                .is("greatest size of order " + order + " of the inertia " + (couple ? "couple" : "force")
                        + " of the moving parts on the frame")
                .from(
                        "what the foundation allows; table of forces and couples: Bloch and Hoefner, Reciprocating Compressors"
                                + " (1996), p. 91");
        this.couple = couple;
        this.order = order;
    }

    @Override
    public Statement statement() {
        return statement;
    }

    @Override
    public Found find(JudgedDuty duty) {
        OrderVector vector =
                couple ? duty.harmonics().couple(order) : duty.harmonics().force(order);
        double size = vector.size();
        return size <= ROUNDING * scale(duty.running())
                ? Found.of(0).noting("cancels within the machine")
                : Found.of(size).noting(direction(vector, duty.running().rotation()));
    }

    private String direction(OrderVector vector, Rotation rotation) {
        OptionalDouble direction = vector.direction();
        if (direction.isPresent()) {
            // tenths of a degree, and 180 is 0
            double tenths = Math.rint(Math.toDegrees(direction.getAsDouble()) * 10) % 1800;
            String along = String.format(Locale.ROOT, "greatest along %.1f deg from X, ", tenths / 10);
            return vector.leastSize() <= ROUNDING * vector.size()
                    ? along + "none across it"
                    : along + String.format(Locale.ROOT, "%.4g k%s across it", vector.leastSize() / 1e3, unit());
        }
        boolean with = vector.length(rotation) >= vector.size() / 2;
        return "equally great all round, turning " + (with ? "with" : "against") + " the shaft";
    }

    /** The size that it had if nothing cancelled, N or N·m. */
    private double scale(RunningMachine running) {
        List<Throw> all = running.machine().throwsInOrder();
        double sum = 0;
        for (Throw t : all) {
            double moving = t.masses().total() + t.connectingRod().mass();
            double moment = moving * t.linkage().crankRadius()
                    + t.crank().unbalance()
                    + t.crank().counterweight();
            double arm = couple ? reach(all) : 1;
            sum += moment * arm;
        }
        return sum * running.meanSpeed() * running.meanSpeed();
    }

    /** The farthest that a throw stands from the shaft's zero, m: what an arm is rounded against. */
    private static double reach(List<Throw> all) {
        double reach = 0;
        for (Throw t : all) {
            reach = Math.max(reach, Math.abs(t.place().shaftPosition()));
        }
        return reach;
    }
}
