package throwbench.solver.chamber;

import java.util.Locale;
import java.util.Optional;

/**
 * The pressures at which the valves of a liquid chamber stand open. A loss that grows with the speed holds at the mean piston
 * speed 2 · stroke · n and is taken times (v / mean piston speed)² = (π x′ / stroke)², whatever the speed of the shaft.
 *
 * @param lines of which the line pressures are taken
 * @param stroke m, above 0
 */
record OpenPressures(LiquidValves valves, LineConditions lines, double stroke) {

    /** What the losses are multiplied by where the piston has this x′ (m). */
    double lossFactor(double reach1) {
        if (!valves.lossGrowsWithSpeed()) {
            return 1;
        }
        double ratio = Math.PI * reach1 / stroke;
        return ratio * ratio;
    }

    /** p_suction − loss, Pa. */
    double suction(double lossFactor) {
        return lines.suctionPressure() - valves.suctionLoss() * lossFactor;
    }

    /** p_suction + loss, Pa: what drives liquid out through a suction valve that is held open. */
    double pushedBack(double lossFactor) {
        return lines.suctionPressure() + valves.suctionLoss() * lossFactor;
    }

    /** p_discharge + loss, Pa. */
    double discharge(double lossFactor) {
        return lines.dischargePressure() + valves.dischargeLoss() * lossFactor;
    }

    /** Why the valves could not be told apart: somewhere the discharge valve would open before the suction valve shuts. */
    Optional<String> clash() {
        double least = valves.lossGrowsWithSpeed() ? 0 : 1;
        if (discharge(least) > suction(least)) {
            return Optional.empty();
        }
        return Optional.of(String.format(
                Locale.ROOT,
                "the discharge valve would stand open at %.0f Pa, which is not above the %.0f Pa of the open suction valve",
                discharge(least),
                suction(least)));
    }
}
