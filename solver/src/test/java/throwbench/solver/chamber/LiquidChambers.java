package throwbench.solver.chamber;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import throwbench.solver.fluid.Fluid;
import throwbench.solver.fluid.Liquid;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.mechanism.Sweep;

/** Liquid chambers for tests, and integrals over their turn by quadrature between the events. */
final class LiquidChambers {

    static final Liquid WATER = new Liquid(998, 2.2e9, 2300);

    private static final double AREA = 0.004;

    private LiquidChambers() {}

    /** A plunger of 120 mm stroke and 40 % clearance between 1.5 and 41 bar. */
    static ChamberDuty duty(Side side, double offset, Fluid fluid) {
        return duty(new Linkage(0.06, 0.3, offset), Rotation.COUNTER_CLOCKWISE, side, 0.4, fluid, ChamberState.WORKING);
    }

    static ChamberDuty duty(
            Linkage linkage, Rotation rotation, Side side, double clearance, Fluid fluid, ChamberState state) {
        double stroke = linkage.stroke();
        return new ChamberDuty(
                linkage,
                rotation,
                new ChamberVolume(side, AREA, stroke, clearance * AREA * stroke),
                fluid,
                new LineConditions(1.5e5, 41e5, OptionalDouble.empty()),
                new ChamberCondition(state, 0, Clearance.NONE),
                30,
                0);
    }

    static PressureCurve solved(Cycle cycle, ChamberDuty duty) {
        CycleOutcome outcome = cycle.solve(duty);
        return outcome.curve().orElseThrow(() -> new AssertionError(outcome.refusal()));
    }

    /** One chamber at one angle: what tests read. */
    record Place(double pressure, double volume, double growth) {}

    /** Reads a curve at an angle; growth is dV/dφ, m³. */
    static Place at(PressureCurve curve, ChamberDuty duty, double angle) {
        return at(curve, duty, angle, Approach.JUST_AFTER);
    }

    static Place at(PressureCurve curve, ChamberDuty duty, double angle, Approach approach) {
        Sweep sweep = Sweep.single(duty.linkage(), duty.rotation());
        sweep.turnTo(angle, approach);
        ChamberSweep chamber = new ChamberSweep(sweep, duty.volume());
        double[] pressure = new double[1];
        curve.fill(chamber, pressure);
        double travelRate = -duty.rotation().sign() * sweep.reach1()[0];
        double area = duty.volume().side() == Side.HEAD
                ? duty.volume().area()
                : -duty.volume().area();
        return new Place(pressure[0], chamber.volume()[0], area * travelRate);
    }

    static double angleOf(PressureCurve curve, ValveEvent.Valve valve, boolean opens) {
        return curve.events().stream()
                .filter(event -> event.valve() == valve && event.opens() == opens)
                .mapToDouble(ValveEvent::crankAngle)
                .findFirst()
                .orElseThrow(() -> new AssertionError("no " + valve + " opens " + opens));
    }

    /** ∮ p dV over the turn, J. */
    static double work(PressureCurve curve, ChamberDuty duty) {
        return integral(breaks(curve, duty), 0, Angles.TURN, angle -> {
            Place place = at(curve, duty, angle);
            return place.pressure() * place.growth();
        });
    }

    /** −∫ dV while the discharge valve is open, or +∫ dV while the suction valve is, m³. */
    static double passed(PressureCurve curve, ChamberDuty duty, ValveEvent.Valve valve) {
        double opens = angleOf(curve, valve, true);
        double shuts = opens + Angles.wrap(angleOf(curve, valve, false) - opens);
        double grown = integral(breaks(curve, duty), opens, shuts, angle -> at(curve, duty, angle)
                .growth());
        return valve == ValveEvent.Valve.SUCTION ? grown : -grown;
    }

    private static List<Double> breaks(PressureCurve curve, ChamberDuty duty) {
        List<Double> breaks = new ArrayList<>();
        for (int turn = 0; turn < 3; turn++) {
            double shift = turn * Angles.TURN;
            breaks.add(shift);
            breaks.add(duty.linkage().crankEndDeadCentre(duty.rotation()) + shift);
            curve.events().forEach(event -> breaks.add(event.crankAngle() + shift));
            for (double joint : curve.joints()) {
                breaks.add(joint + shift);
            }
        }
        breaks.sort(Double::compare);
        return breaks;
    }

    private static double integral(List<Double> breaks, double from, double to, DoubleUnaryOperator f) {
        double sum = 0;
        double left = from;
        for (double end : breaks) {
            double right = Math.min(to, end);
            // two events at one place differ by rounding
            if (right - left > 1e-12) {
                sum += piece(left, right, f);
                left = right;
            }
        }
        return sum;
    }

    private static double piece(double from, double to, DoubleUnaryOperator f) {
        int parts = 6;
        double sum = 0;
        for (int i = 0; i < parts; i++) {
            double step = (to - from) / parts;
            GaussIntegrator rule = new GaussIntegratorFactory().legendre(16, from + i * step, from + (i + 1) * step);
            sum += rule.integrate(f::applyAsDouble);
        }
        return sum;
    }
}
