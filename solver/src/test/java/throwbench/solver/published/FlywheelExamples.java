package throwbench.solver.published;

import java.util.List;
import java.util.Map;
import java.util.function.DoubleUnaryOperator;
import java.util.function.ToDoubleFunction;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import throwbench.solver.drive.ShaftLoad;
import throwbench.solver.drive.SpeedCurve;
import throwbench.solver.drive.SpeedSolver;
import throwbench.solver.drive.WantedInertia;
import throwbench.solver.machine.Driver;
import throwbench.solver.mechanism.Approach;

/**
 * Flywheels on printed torque diagrams. The books size them by the energy formula ΔE = C J ω²; the solved extremes give ΔE
 * exactly as ½ J (ω_max² − ω_min²), which is how both are compared.
 */
final class FlywheelExamples {

    static final Map<String, ToDoubleFunction<PublishedRow>> BY_QUANTITY = Map.ofEntries(
            Map.entry("coefficient of fluctuation of speed from energy fluctuation", FlywheelExamples::coefficient),
            Map.entry("coefficient of fluctuation of speed", FlywheelExamples::coefficient),
            Map.entry("coefficient of fluctuation, constant load", FlywheelExamples::coefficient),
            Map.entry(
                    "coefficient of fluctuation, speed integrated over the revolution, (max-min)/time-mean speed",
                    row -> curve(row, inertia(row)).fluctuation()),
            Map.entry(
                    "flywheel mass",
                    row -> wanted(row) / (row.si("radius of gyration") * row.si("radius of gyration"))),
            Map.entry("moment of inertia wanted", FlywheelExamples::wanted),
            Map.entry("energy fluctuation", FlywheelExamples::energy),
            Map.entry("energy fluctuation, load 5000 + 600 sin th", FlywheelExamples::energy),
            Map.entry("energy fluctuation from areas of a torque diagram", FlywheelExamples::energy),
            Map.entry(
                    "power",
                    row -> Math.abs(curve(row, 1e4).driving().orElseThrow().atMeanSpeed()) * speed(row) / turns(row)),
            Map.entry("angular acceleration at 45 deg", row -> curve(row, wanted(row))
                    .accelerationAt(Math.PI / 4, Approach.JUST_AFTER)),
            Map.entry(
                    "greatest angular acceleration between 0 and 90 deg",
                    row -> extreme(row, GoalType.MAXIMIZE, 0, Math.PI / 2)),
            Map.entry("greatest angular retardation", row -> -extreme(row, GoalType.MINIMIZE, Math.PI / 2, Math.PI)));

    private static final Pattern TERM = Pattern.compile("([+-]?) ?([0-9.]+)(?: (sin|cos) ([0-9]*)th)?");

    private FlywheelExamples() {}

    /** A torque by the angle with nothing else on the shaft. */
    private static final class Diagram implements ShaftLoad {

        private final DoubleUnaryOperator load;
        private double torque;

        Diagram(DoubleUnaryOperator load) {
            this.load = load;
        }

        @Override
        public void turnTo(double crankAngle, Approach approach, double speed, double acceleration) {
            double inside = approach == Approach.JUST_AFTER ? 1e-12 : -1e-12;
            torque = load.applyAsDouble(crankAngle + inside);
        }

        @Override
        public double torque() {
            return torque;
        }

        @Override
        public double inertia() {
            return 0;
        }

        @Override
        public double inertiaSlope() {
            return 0;
        }
    }

    private static SpeedSolver solver(PublishedRow row, double inertia) {
        Diagram diagram = new Diagram(load(row));
        return new SpeedSolver(diagram, inertia, new Driver.ConstantTorque(), speed(row) / turns(row));
    }

    private static SpeedCurve curve(PublishedRow row, double inertia) {
        double speed = speed(row) / turns(row);
        return solver(row, inertia)
                .solve(breaks(row), SpeedCurve.constant(speed))
                .curve()
                .orElseThrow();
    }

    private static double speed(PublishedRow row) {
        return row.has("mean speed") ? row.si("mean speed") : row.has("speed") ? row.si("speed") : 20;
    }

    /** Turns of the shaft that a diagram spans: they are taken as one turn of a shaft so much slower. */
    private static double turns(PublishedRow row) {
        return row.has("demand torque") ? 3 : 1;
    }

    private static double[] breaks(PublishedRow row) {
        double piece = Math.PI / 3;
        if (row.has("areas")) {
            return new double[] {0, piece, 2 * piece, 3 * piece, 4 * piece, 5 * piece};
        }
        return row.has("demand torque") ? new double[] {0, piece, 3 * piece, 4 * piece} : new double[] {0};
    }

    /** T_load: what the machine asks for, or less what the engine gives. */
    private static DoubleUnaryOperator load(PublishedRow row) {
        if (row.has("areas")) {
            return areas(row);
        }
        if (row.has("demand torque")) {
            return demand(row);
        }
        if (row.has("energy fluctuation")) {
            return swing(row.si("energy fluctuation"));
        }
        if (row.has("power")) {
            double work = row.si("power") * 2 * Math.PI / row.si("speed");
            return swing(row.si("energy fluctuation coefficient") * work);
        }
        DoubleUnaryOperator given = formula(row.inputs().get(row.has("torque") ? "torque" : "driver torque"));
        String load = row.has("load torque") ? "load torque" : "load";
        boolean constant = !row.has(load) || row.inputs().get(load).equals("constant");
        DoubleUnaryOperator taken = constant ? angle -> 0 : formula(row.inputs().get(load));
        return angle -> taken.applyAsDouble(angle) - given.applyAsDouble(angle);
    }

    /** Any torque whose energy swings by so much. */
    private static DoubleUnaryOperator swing(double energy) {
        return angle -> energy / 2 * Math.sin(angle);
    }

    /** Steps of equal length that have the printed areas. */
    private static DoubleUnaryOperator areas(PublishedRow row) {
        List<PrintedQuantity> areas =
                PrintedQuantity.allIn(row.inputs().get("areas").replace("+", ""));
        double perArea = row.si("scale") * Math.PI / 180;
        return angle -> {
            int step = (int) Math.floor(angle / (Math.PI / 3));
            return -areas.get(Math.floorMod(step, 6)).number() * perArea / (Math.PI / 3);
        };
    }

    /** Rising over half a turn, high for a turn, falling over half a turn, low for a turn; the three turns taken as one. */
    private static DoubleUnaryOperator demand(PublishedRow row) {
        List<PrintedQuantity> printed = PrintedQuantity.allIn(row.inputs().get("demand torque"));
        double low = printed.get(0).number();
        double high = printed.get(1).number();
        return angle -> {
            double third = angle / (Math.PI / 3);
            double share = third < 1 ? third : third < 3 ? 1 : third < 4 ? 4 - third : 0;
            return 3 * (low + (high - low) * share);
        };
    }

    private static DoubleUnaryOperator formula(String text) {
        DoubleUnaryOperator sum = angle -> 0;
        Matcher terms = TERM.matcher(text.replace(" N m", ""));
        while (terms.find()) {
            DoubleUnaryOperator before = sum;
            double factor = Double.parseDouble(terms.group(2)) * (terms.group(1).equals("-") ? -1 : 1);
            if (terms.group(3) == null) {
                sum = angle -> before.applyAsDouble(angle) + factor;
            } else {
                int order = terms.group(4).isEmpty() ? 1 : Integer.parseInt(terms.group(4));
                double shift = terms.group(3).equals("cos") ? Math.PI / 2 : 0;
                sum = angle -> before.applyAsDouble(angle) + factor * Math.sin(order * angle + shift);
            }
        }
        return sum;
    }

    private static double inertia(PublishedRow row) {
        if (row.has("inertia")) {
            return row.si("inertia") * turns(row) * turns(row);
        }
        if (!row.has("mass")) {
            return 1e3;
        }
        double gyration = row.si("radius of gyration") * turns(row);
        return row.si("mass") * gyration * gyration;
    }

    /** ΔE from the solved extremes, J. */
    private static double energy(PublishedRow row) {
        return energy(row, inertia(row));
    }

    private static double energy(PublishedRow row, double inertia) {
        SpeedCurve curve = curve(row, inertia);
        return inertia / 2 * (curve.greatest() - curve.least()) * (curve.greatest() + curve.least());
    }

    /** C by the energy formula. */
    private static double coefficient(PublishedRow row) {
        double mean = speed(row) / turns(row);
        return energy(row) / (inertia(row) * mean * mean);
    }

    /** J for a wanted coefficient as found by the solver, brought to the energy formula. */
    private static double wanted(PublishedRow row) {
        double fluctuation = row.si("speed fluctuation coefficient");
        double found = WantedInertia.find(
                        fluctuation, 1, j -> solver(row, j).solve(breaks(row), SpeedCurve.constant(speed(row))))
                .inertia()
                .orElseThrow();
        double byEnergy = energy(row, found) / (fluctuation * speed(row) * speed(row));
        if (!(Math.abs(found / byEnergy - 1) < fluctuation * fluctuation)) {
            throw new AssertionError(found + " and " + byEnergy + " kg m2 differ by more than the second order");
        }
        return byEnergy;
    }

    private static double extreme(PublishedRow row, GoalType goal, double from, double to) {
        SpeedCurve curve = curve(row, inertia(row));
        return new BrentOptimizer(1e-9, 1e-12)
                .optimize(
                        new MaxEval(200),
                        goal,
                        new SearchInterval(from, to),
                        new UnivariateObjectiveFunction(a -> curve.accelerationAt(a, Approach.JUST_AFTER)))
                .getValue();
    }
}
