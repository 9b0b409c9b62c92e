package throwbench.solver.revolution;

import java.util.ArrayList;
import java.util.List;
import throwbench.solver.balance.Counterweights;
import throwbench.solver.balance.OrderVector;
import throwbench.solver.machine.ShaftPlace;
import throwbench.solver.machine.Throw;

/**
 * Counterweights that a throw might carry, as static moments opposite the pin, kg m.
 *
 * @param present W as described
 * @param usual all that turns and half of what reciprocates, this throw by itself
 * @param leastPrimaryForce with those of the other throws, the machine's primary shaking force is smallest; the one nearest to
 *     the present
 */
public record CounterweightAdvice(double present, double usual, double leastPrimaryForce) {

    /** One for each throw, for harmonics of the same machine. */
    public static List<CounterweightAdvice> of(RunningMachine running, MachineHarmonics harmonics) {
        OrderVector primary = harmonics.force(1);
        double[] pinAngles = new double[running.throwsInOrder().size()];
        for (int i = 0; i < pinAngles.length; i++) {
            pinAngles[i] = pinAngle(running, i);
        }
        double[] changes =
                Counterweights.leastPrimaryForce(primary, running.meanSpeed(), running.rotation(), pinAngles);
        List<CounterweightAdvice> advice = new ArrayList<>();
        for (int i = 0; i < pinAngles.length; i++) {
            Throw t = running.throwsInOrder().get(i).described();
            double present = t.crank().counterweight();
            advice.add(new CounterweightAdvice(
                    present, Counterweights.usual(t, Counterweights.CUSTOMARY_SHARE), present + changes[i]));
        }
        return List.copyOf(advice);
    }

    /** Angle of a pin from machine X when the first throw stands at head-end dead centre: ψ + δ = θ + γ. */
    private static double pinAngle(RunningMachine running, int throwIndex) {
        RunningThrow t = running.throwsInOrder().get(throwIndex);
        ShaftPlace place = t.described().place();
        return t.body().linkage().headEndAngle() + running.rotation().sign() * t.phase() + place.axisDirection();
    }
}
