package throwbench.solver.chamber;

import java.util.List;
import java.util.OptionalDouble;

/** A pressure as it was measured: no valve is known of it, and so nothing of what they pass. */
final class RecordedCurve implements PressureCurve {

    private static final String UNKNOWN =
            "the pressure is recorded: valve events, capacity, volume flow and discharge temperature are not known";

    private final MonotoneCurve curve;

    RecordedCurve(RecordedPressure recorded) {
        this.curve = new MonotoneCurve(numbers(recorded.crankAngles()), numbers(recorded.pressures()));
    }

    private static double[] numbers(List<Double> list) {
        return list.stream().mapToDouble(Double::doubleValue).toArray();
    }

    @Override
    public void fill(ChamberSweep sweep, double[] pressure) {
        double[] crankAngle = sweep.sweep().crankAngle();
        for (int i = 0; i < pressure.length; i++) {
            pressure[i] = curve.at(crankAngle[i]);
        }
    }

    @Override
    public List<ValveEvent> events() {
        return List.of();
    }

    @Override
    public double[] joints() {
        return curve.angles();
    }

    @Override
    public boolean flowKnown() {
        return false;
    }

    @Override
    public OptionalDouble massPerTurn() {
        return OptionalDouble.empty();
    }

    @Override
    public double inletVolumePerTurn() {
        return 0;
    }

    @Override
    public OptionalDouble dischargeTemperature() {
        return OptionalDouble.empty();
    }

    @Override
    public List<String> notes() {
        return List.of(UNKNOWN);
    }
}
