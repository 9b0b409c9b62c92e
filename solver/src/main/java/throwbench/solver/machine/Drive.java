package throwbench.solver.machine;

import java.util.OptionalDouble;
import throwbench.solver.mechanism.Rotation;

/**
 * What turns the shaft.
 *
 * @param speed mean speed, rad/s, above 0
 * @param rotatingInertia J of all that turns with the shaft, kg m²; connecting rods are not in it
 * @param mechanicalEfficiency indicated over shaft power, in (0, 1]
 */
public record Drive(
        double speed, Rotation rotation, OptionalDouble rotatingInertia, Driver driver, double mechanicalEfficiency) {}
