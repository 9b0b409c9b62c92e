package throwbench.app.strip;

import java.util.OptionalDouble;
import javafx.scene.input.KeyCode;
import throwbench.solver.mechanism.Angles;

/** What the keys of the strip do to the crank angle. */
final class ScrubKeys {

    private static final double COARSE = 10;
    private static final double PLAIN = 1;
    private static final double FINE = 0.1;

    private ScrubKeys() {}

    /**
     * The crank angle after a key; empty for a key that turns nothing.
     *
     * @param coarse Shift is down
     * @param fine Ctrl (Command) is down
     * @param angle where the crank stands, rad
     * @param crankEnd φ of crank-end dead centre, rad
     */
    static OptionalDouble after(
            KeyCode key, boolean coarse, boolean fine, double angle, double crankEnd, StripEvents events) {
        double step = coarse ? COARSE : fine ? FINE : PLAIN;
        return switch (key) {
            case RIGHT, KP_RIGHT -> OptionalDouble.of(turned(angle, step));
            case LEFT, KP_LEFT -> OptionalDouble.of(turned(angle, -step));
            case HOME -> OptionalDouble.of(0);
            case END -> OptionalDouble.of(crankEnd);
            case N -> events.next(angle);
            case B -> events.previous(angle);
            default -> OptionalDouble.empty();
        };
    }

    private static double turned(double angle, double stepDeg) {
        // steps of a tenth of a degree add up without a tail of digits
        double degrees = Math.rint((Math.toDegrees(angle) + stepDeg) * 1e9) / 1e9;
        return Angles.wrap(Math.toRadians(degrees));
    }
}
