package throwbench.solver.published;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import throwbench.solver.chamber.IdealValves;
import throwbench.solver.chamber.PressureCurve;
import throwbench.solver.chamber.Side;
import throwbench.solver.fluid.PerfectGas;
import throwbench.solver.load.Friction;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Ranges;
import throwbench.solver.machine.Site;
import throwbench.solver.machine.StageConditions;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.PistonSpeed;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Instant;
import throwbench.solver.revolution.Reversal;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.Sampled;
import throwbench.solver.revolution.Summary;
import throwbench.solver.trial.AnyThrow;
import throwbench.solver.trial.Machines;

/** Examples of the ideal compressor cycle, gas loads and reversal as the solver computes them. */
final class CompressorExamples {

    static final Map<String, ToDoubleFunction<PublishedRow>> BY_QUANTITY = Map.ofEntries(
            Map.entry("pressure ratio from temperatures", CompressorExamples::ratioFromTemperatures),
            Map.entry("mass flow", row -> of(row).massFlow()),
            Map.entry("indicated power", CompressorExamples::indicatedPower),
            Map.entry("volumetric efficiency", row -> of(row).inletShare()),
            Map.entry("isothermal efficiency", row -> of(row).isothermalEfficiency()),
            Map.entry("mean effective pressure", row -> of(row).work() / of(row).swept()),
            Map.entry("discharge temperature", row -> of(row).dischargeTemperature()),
            Map.entry("delivery temperature", row -> of(row).dischargeTemperature()),
            Map.entry("volumetric efficiency, clearance found from the stall pressure", CompressorExamples::stalled),
            Map.entry(
                    "free air delivered",
                    row -> of(row).inletShare() * of(row).swept() * of(row).cyclesPerSecond() * toFreeAir(row)),
            Map.entry("volumetric efficiency referred to free air", row -> of(row).inletShare() * toFreeAir(row)),
            Map.entry("same referred to free air", row -> of(row).inletShare() * toFreeAir(row)),
            Map.entry("bore (rod area neglected)", CompressorExamples::bore),
            Map.entry("stroke", row -> bore(row) * row.si("stroke/bore")),
            Map.entry("swept volume per end", CompressorExamples::sweptPerEnd),
            Map.entry("volume delivered at discharge pressure", row -> of(row).deliveredVolumeFlow()),
            Map.entry("work per mass", row -> of(row).work() / of(row).mass()),
            Map.entry(
                    "gas load at HDC, compression: pd Ah - ps Ac (handbook formula, no ambient term)",
                    row -> -gasLoad(row, 0, 0)),
            Map.entry("gas load at CDC: ps Ah - pd Ac (negative = tension)", row -> -gasLoad(row, Math.PI, 0)),
            Map.entry("with ambient pressure on the rod area, compression", row -> -gasLoad(row, 0, row.si("ambient"))),
            Map.entry("with ambient pressure, tension", row -> gasLoad(row, Math.PI, row.si("ambient"))),
            Map.entry(
                    "load F1 cos(phi) + F0: reversed peak / opposite peak when the reversed span is 15 deg",
                    CompressorExamples::ratioAtSpan),
            Map.entry("reversed span when the ratio is just 3 %", CompressorExamples::spanAtRatio),
            Map.entry(
                    "average piston speed = stroke x rpm / 6 (ft/min, in)",
                    row -> PistonSpeed.mean(new Linkage(row.si("stroke") / 2, row.si("stroke"), 0), row.si("speed"))));

    private static final String[] SUCTION = {"suction", "air", "free air"};

    private CompressorExamples() {}

    /** One single-acting end; where the example names no size or speed, any will do. */
    private record Case(
            double suction,
            double temperature,
            double discharge,
            double n,
            double clearance,
            double swept,
            double cyclesPerSecond,
            double gasConstant) {

        private static final double STROKE = 0.15;

        private RunningMachine running() {
            double bore = Math.sqrt(4 * swept / (Math.PI * STROKE));
            IdealValves valves = new IdealValves(0, 0, OptionalDouble.of(n), OptionalDouble.of(n));
            Chamber chamber = Machines.chamber("end", Side.HEAD, bore, 0, clearance, valves);
            DutyPoint duty = new DutyPoint(
                    "printed",
                    2 * Math.PI * cyclesPerSecond,
                    Map.of(
                            AnyThrow.STAGE,
                            new StageConditions(
                                    OptionalDouble.of(suction),
                                    OptionalDouble.of(temperature),
                                    OptionalDouble.of(discharge))),
                    Map.of());
            Machine m = Machines.of(
                    List.of(Machines.changed(
                            Machines.boosterThrow(0),
                            "A",
                            Machines.boosterThrow(0).place(),
                            new Linkage(STROKE / 2, 2.2 * STROKE, 0),
                            Friction.NONE,
                            List.of(chamber))),
                    Rotation.COUNTER_CLOCKWISE,
                    new Site(101_325, 101_325, false),
                    duty,
                    Limits.NONE);
            PerfectGas gas = new PerfectGas(PerfectGas.MOLAR_GAS_CONSTANT / gasConstant, 1.4);
            return Machines.running(new Machine(
                    m.name(),
                    "",
                    m.site(),
                    m.drive(),
                    Map.of("gas", gas),
                    m.stages(),
                    m.throwsInOrder(),
                    m.dutyPoints(),
                    m.limits(),
                    List.of(),
                    Ranges.NONE,
                    List.of()));
        }

        private PressureCurve curve() {
            return running().throwsInOrder().get(0).curves().get(0);
        }

        double mass() {
            return curve().massPerTurn().orElseThrow();
        }

        double massFlow() {
            return mass() * cyclesPerSecond;
        }

        double inletShare() {
            return curve().inletVolumePerTurn() / swept;
        }

        double dischargeTemperature() {
            return curve().dischargeTemperature().orElseThrow();
        }

        double power() {
            return Summary.of(running(), 0, Optional.empty()).throwFlow().totalPower();
        }

        double work() {
            return power() / cyclesPerSecond;
        }

        double isothermalEfficiency() {
            return mass() * gasConstant * temperature * Math.log(discharge / suction) / work();
        }

        double deliveredVolumeFlow() {
            return massFlow() * gasConstant * dischargeTemperature() / discharge;
        }
    }

    private static Case of(PublishedRow row) {
        return of(row, clearance(row), discharge(row));
    }

    private static Case of(PublishedRow row, double clearance, double discharge) {
        String suction = first(row, SUCTION);
        boolean flowFirst = suction.equals("air") || (suction.equals("free air") && row.si(suction) < 1);
        int at = flowFirst ? 1 : 0;
        boolean warm = PrintedQuantity.allIn(row.inputs().get(suction)).size() > at + 1;
        return new Case(
                row.si(suction, at),
                warm ? row.si(suction, at + 1) : 300,
                discharge,
                exponent(row),
                clearance,
                swept(row),
                cyclesPerSecond(row),
                gasConstant(row));
    }

    private static double gasConstant(PublishedRow row) {
        if (row.has("R")) {
            return row.si("R");
        }
        if (!row.has("gas")) {
            return 287; // any: the example asks for no mass
        }
        double molar = row.has("molar gas constant") ? row.si("molar gas constant") : PerfectGas.MOLAR_GAS_CONSTANT;
        double gramsPerMol = row.si("gas", 1);
        return molar / (gramsPerMol / 1000);
    }

    private static String first(PublishedRow row, String... names) {
        for (String name : names) {
            if (row.has(name)) {
                return name;
            }
        }
        throw new IllegalArgumentException(row + " names none of " + String.join(", ", names));
    }

    private static double discharge(PublishedRow row) {
        if (row.has("discharge temperature")) {
            return row.si("suction") * ratioFromTemperatures(row);
        }
        return row.has("delivery") ? row.si("delivery") : row.si("suction") * row.si("pressure ratio");
    }

    private static double exponent(PublishedRow row) {
        return row.si(first(row, "exponent", "exponent (both)"));
    }

    private static double clearance(PublishedRow row) {
        if (!row.has("clearance")) {
            return 0.1;
        }
        double printed = row.si("clearance");
        boolean volume = row.inputs().get("clearance").contains("cm3");
        double share = volume ? printed / row.si("swept") : printed;
        // none at all would leave no gas: far below what the tolerance sees
        return share == 0 ? 1e-9 : share;
    }

    private static double swept(PublishedRow row) {
        if (row.has("swept")) {
            return row.si("swept");
        }
        if (row.has("bore")) {
            double bore = row.si("bore");
            return Math.PI / 4 * bore * bore * row.si("stroke");
        }
        return 2e-3;
    }

    private static double cyclesPerSecond(PublishedRow row) {
        if (row.has("cycles")) {
            return row.si("cycles") / 60;
        }
        return row.has("speed") ? row.si("speed") / (2 * Math.PI) : 10;
    }

    /** Volume at the printed free-air conditions over that at suction. */
    private static double toFreeAir(PublishedRow row) {
        List<PrintedQuantity> free = PrintedQuantity.allIn(row.inputs().get("free air"));
        double pressure = 0;
        double temperature = 0;
        for (PrintedQuantity q : free) {
            if (q.unit().equals("K")) {
                temperature = q.si();
            } else if (q.unit().equals("bar") || q.unit().equals("kPa")) {
                pressure = q.si();
            }
        }
        return row.si("suction", 0) / pressure * temperature / row.si("suction", 1);
    }

    private static double ratioFromTemperatures(PublishedRow row) {
        double wanted = row.si("discharge temperature");
        double suction = row.si("suction");
        return new BrentSolver(1e-14, 1e-13)
                .solve(200, ratio -> of(row, 0.01, suction * ratio).dischargeTemperature() - wanted, 2, 20);
    }

    /** The clearance at which nothing is delivered at the stall pressure; then what is drawn in at the delivery. */
    private static double stalled(PublishedRow row) {
        double stall = row.si("greatest pressure (zero delivery)");
        double least = 0.01;
        double greatest = 1;
        for (int i = 0; i < 60; i++) {
            double middle = (least + greatest) / 2;
            boolean delivers = !of(row, middle, stall).curve().events().isEmpty();
            least = delivers ? middle : least;
            greatest = delivers ? greatest : middle;
        }
        return of(row, least, row.si("delivery")).inletShare() * toFreeAir(row);
    }

    /** Of one of two equal ends that together draw in the printed flow of free air. */
    private static double bore(PublishedRow row) {
        double turns = row.si("double-acting, speed") / (2 * Math.PI);
        double perEnd = row.si("free air") / (2 * turns);
        double swept = perEnd / (of(row).inletShare() * toFreeAir(row));
        return Math.cbrt(4 * swept / (Math.PI * row.si("stroke/bore")));
    }

    private static double sweptPerEnd(PublishedRow row) {
        double turns = row.si("double-acting, speed") / (2 * Math.PI);
        return row.si("air") / (2 * turns * of(row).inletShare());
    }

    /** Of the whole machine where the example names a flow instead of a size. */
    private static double indicatedPower(PublishedRow row) {
        Case one = of(row);
        if (!row.has("air")) {
            return one.power();
        }
        return one.power() * row.si("air") / (one.inletShare() * one.swept() * one.cyclesPerSecond());
    }

    private static double gasLoad(PublishedRow row, double angle, double framePressure) {
        double bore = row.si("bore");
        IdealValves valves = new IdealValves(0, 0, OptionalDouble.empty(), OptionalDouble.empty());
        DutyPoint duty = new DutyPoint(
                "printed",
                60,
                Map.of(AnyThrow.STAGE, Machines.lines(row.si("suction"), row.si("discharge"))),
                Map.of());
        Machine machine = Machines.of(
                List.of(Machines.changed(
                        Machines.boosterThrow(0),
                        "A",
                        Machines.boosterThrow(0).place(),
                        new Linkage(0.1, 0.5, 0),
                        Friction.NONE,
                        List.of(
                                Machines.chamber("head", Side.HEAD, bore, 0, 0.1, valves),
                                Machines.chamber("crank", Side.CRANK, bore, row.si("rod diameter"), 0.1, valves)))),
                Rotation.COUNTER_CLOCKWISE,
                new Site(101_325, framePressure, false),
                duty,
                Limits.NONE);
        return new Instant(Machines.running(machine), 0).turnTo(angle).at(Column.GAS_LOAD);
    }

    private static Reversal reversal(double shift) {
        return Reversal.of(Sampled.smooth(angle -> Math.cos(angle) + shift));
    }

    private static double ratioAtSpan(PublishedRow row) {
        double wanted = row.si("reversed span");
        double shift = new BrentSolver(1e-15, 1e-15).solve(200, s -> reversal(s).duration() - wanted, 0.5, 0.999);
        return reversal(shift).ratio();
    }

    private static double spanAtRatio(PublishedRow row) {
        double wanted = row.si("ratio");
        double shift = new BrentSolver(1e-15, 1e-15).solve(200, s -> reversal(s).ratio() - wanted, 0.5, 0.999);
        return reversal(shift).duration();
    }
}
