package throwbench.solver.finding;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import throwbench.solver.machine.Machine;

/** Telling names of the corners of ranges: "740 rpm · suction 3.5 bar g · discharge 12 bar g". */
final class CornerNames {

    private static final MathContext SIX_DIGITS = new MathContext(6);
    private static final double BAR = 1e5;
    private static final double CELSIUS_ZERO = 273.15;

    private final double ambient;
    private final boolean oneStage;

    CornerNames(Machine machine) {
        this.ambient = machine.site().ambientPressure();
        this.oneStage = machine.stages().size() == 1;
    }

    /** @param speed rad/s */
    static String speed(double speed) {
        return number(speed * 30 / Math.PI) + " rpm";
    }

    /** @param pressure Pa absolute */
    String pressure(double pressure) {
        return number((pressure - ambient) / BAR) + " bar g";
    }

    /** What of a stage is in its ranges; the stage is named where there are several. */
    String stage(
            String stage,
            OptionalDouble suction,
            OptionalDouble temperature,
            OptionalDouble discharge,
            boolean atRelief) {
        String before = oneStage ? "" : stage + " ";
        List<String> parts = new ArrayList<>();
        if (suction.isPresent()) {
            parts.add(before + "suction " + pressure(suction.getAsDouble()));
        }
        if (temperature.isPresent()) {
            parts.add(before + "suction " + number(temperature.getAsDouble() - CELSIUS_ZERO) + " degC");
        }
        if (discharge.isPresent()) {
            String relief = atRelief ? "discharge at relief " : "discharge ";
            parts.add(before + relief + pressure(discharge.getAsDouble()));
        }
        return String.join(Corners.APART, parts);
    }

    private static String number(double value) {
        BigDecimal rounded = BigDecimal.valueOf(value).round(SIX_DIGITS).stripTrailingZeros();
        return rounded.signum() == 0 ? "0" : rounded.toPlainString();
    }
}
