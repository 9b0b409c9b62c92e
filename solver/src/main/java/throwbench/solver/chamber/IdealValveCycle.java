package throwbench.solver.chamber;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.chamber.ValveEvent.Valve;
import throwbench.solver.fluid.Answer;
import throwbench.solver.mechanism.Strokes;

/**
 * The four legs behind ideal valves: compression p V^n_c from the greatest volume up to the discharge pressure, expansion
 * p V^n_e from the least volume down to the suction pressure. Three ways to run: working, breathing (no valve opens) and
 * held open.
 */
final class IdealValveCycle implements PressureCurve {

    private enum Way {
        WORKING,
        BREATHING,
        HELD_OPEN
    }

    private static final String NO_TEMPERATURE =
            "capacity by mass and discharge temperature need a suctionTemperature at the duty point";

    private final Way way;
    private final double low;
    private final double high;
    private final double compressionExponent;
    private final double expansionExponent;
    private final Optional<Openings> openings;
    private final Passed passed;
    private final List<String> notes;

    /** What a turn passes; the mass and the temperature where they are known. */
    private record Passed(double inletVolume, OptionalDouble mass, OptionalDouble dischargeTemperature) {
        static final Passed NOTHING = new Passed(0, OptionalDouble.of(0), OptionalDouble.empty());
    }

    /** The volumes (m³) at which the valves open; their angles are made when asked for, which a map point does not. */
    private record Openings(ChamberDuty duty, double suction, double discharge) {

        List<ValveEvent> events() {
            ValveEvent suctionOpens = new ValveEvent(Valve.SUCTION, true, duty.crankAngleAt(suction, true));
            ValveEvent suctionShuts = new ValveEvent(Valve.SUCTION, false, duty.greatestVolumeAngle());
            ValveEvent dischargeOpens = new ValveEvent(Valve.DISCHARGE, true, duty.crankAngleAt(discharge, false));
            ValveEvent dischargeShuts = new ValveEvent(Valve.DISCHARGE, false, duty.leastVolumeAngle());
            // in the order of the crank angle: each side's volume is least at its own dead centre
            return duty.volume().side() == Side.HEAD
                    ? List.of(dischargeShuts, suctionOpens, suctionShuts, dischargeOpens)
                    : List.of(suctionShuts, dischargeOpens, dischargeShuts, suctionOpens);
        }
    }

    private IdealValveCycle(
            Way way,
            double low,
            double high,
            double compressionExponent,
            double expansionExponent,
            Optional<Openings> openings,
            Passed passed,
            String note) {
        this.way = way;
        this.low = low;
        this.high = high;
        this.compressionExponent = compressionExponent;
        this.expansionExponent = expansionExponent;
        this.openings = openings;
        this.passed = passed;
        this.notes = note.isEmpty() ? List.of() : List.of(note);
    }

    static CycleOutcome solve(IdealValves valves, ChamberDuty duty) {
        LineConditions lines = duty.lines();
        double low = lines.suctionPressure() * (1 - valves.suctionLoss());
        double high = lines.dischargePressure() * (1 + valves.dischargeLoss());
        return switch (duty.condition().state()) {
            case HELD_OPEN -> CycleOutcome.solved(heldOpen(valves, lines));
            case WORKING -> {
                Answer<LegGas> gas = LegGas.of(duty.fluid(), lines, low, high);
                yield gas.value().isPresent()
                        ? CycleOutcome.solved(legs(valves, duty, gas.value().get(), low, high))
                        : CycleOutcome.refused(gas.reason());
            }
            case FAILED_SUCTION, FAILED_DISCHARGE -> CycleOutcome.refused("a failed valve needs the cycle valve-flow");
        };
    }

    private static IdealValveCycle legs(IdealValves valves, ChamberDuty duty, LegGas gas, double low, double high) {
        double nc = valves.compressionExponent().orElse(gas.volumeExponent());
        double ne = valves.expansionExponent().orElse(gas.volumeExponent());
        double n = Math.min(nc, ne);
        double reached = low * Math.pow(duty.volume().greatest() / duty.volume().least(), n);
        return reached < high
                ? breathing(low, reached, n)
                : working(
                        duty,
                        gas,
                        low,
                        high,
                        nc,
                        ne,
                        valves.compressionExponent().orElse(gas.temperatureExponent()));
    }

    private static IdealValveCycle heldOpen(IdealValves valves, LineConditions lines) {
        double falling = lines.suctionPressure() * (1 - valves.suctionLoss());
        double rising = lines.suctionPressure() * (1 + valves.suctionLoss());
        return new IdealValveCycle(Way.HELD_OPEN, falling, rising, 1, 1, Optional.empty(), Passed.NOTHING, "");
    }

    private static IdealValveCycle breathing(double low, double reached, double n) {
        return new IdealValveCycle(
                Way.BREATHING,
                low,
                reached,
                n,
                n,
                Optional.empty(),
                Passed.NOTHING,
                "no valve opens: the gas trapped in the clearance is compressed and expands again, nothing is delivered");
    }

    private static IdealValveCycle working(
            ChamberDuty duty, LegGas gas, double low, double high, double nc, double ne, double nt) {
        ChamberVolume volume = duty.volume();
        double suctionOpens = volume.least() * Math.pow(high / low, 1 / ne);
        double dischargeOpens = volume.greatest() * Math.pow(low / high, 1 / nc);
        double drawn = Math.max(0, volume.greatest() - suctionOpens) * (1 - duty.flowAllowance());
        // low pressure and line temperature: what the chamber holds when the suction valve shuts
        double inletVolume = drawn * low / duty.lines().suctionPressure();
        OptionalDouble temperature = duty.lines().suctionTemperature();
        OptionalDouble mass = temperature.isPresent()
                ? OptionalDouble.of(
                        low * drawn / (gas.compressibility() * gas.gasConstant() * temperature.getAsDouble()))
                : OptionalDouble.empty();
        OptionalDouble discharged = temperature.isPresent()
                ? OptionalDouble.of(temperature.getAsDouble() * Math.pow(high / low, (nt - 1) / nt))
                : OptionalDouble.empty();
        return new IdealValveCycle(
                Way.WORKING,
                low,
                high,
                nc,
                ne,
                Optional.of(new Openings(duty, suctionOpens, dischargeOpens)),
                new Passed(inletVolume, mass, discharged),
                temperature.isPresent() ? "" : NO_TEMPERATURE);
    }

    @Override
    public void fill(ChamberSweep sweep, double[] pressure) {
        Strokes strokes = sweep.sweep().strokes();
        double[] legs = way == Way.HELD_OPEN ? pressure : sweep.legs(compressionExponent, expansionExponent);
        for (int k = 0; k < strokes.count(); k++) {
            boolean grows = sweep.chamber().growsOn(strokes.inward(k));
            if (way == Way.HELD_OPEN) {
                Arrays.fill(pressure, strokes.from(k), strokes.to(k), grows ? low : high);
            } else if (grows) {
                expand(legs, pressure, strokes.from(k), strokes.to(k));
            } else {
                compress(legs, pressure, strokes.from(k), strokes.to(k));
            }
        }
    }

    private void expand(double[] legs, double[] pressure, int from, int to) {
        for (int i = from; i < to; i++) {
            pressure[i] = Math.max(low, high * legs[i]);
        }
    }

    private void compress(double[] legs, double[] pressure, int from, int to) {
        for (int i = from; i < to; i++) {
            pressure[i] = Math.min(high, low * legs[i]);
        }
    }

    @Override
    public List<ValveEvent> events() {
        return openings.map(Openings::events).orElse(List.of());
    }

    @Override
    public OptionalDouble massPerTurn() {
        return passed.mass();
    }

    @Override
    public double inletVolumePerTurn() {
        return passed.inletVolume();
    }

    @Override
    public OptionalDouble dischargeTemperature() {
        return passed.dischargeTemperature();
    }

    @Override
    public List<String> notes() {
        return notes;
    }
}
