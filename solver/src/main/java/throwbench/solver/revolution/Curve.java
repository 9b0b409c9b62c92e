package throwbench.solver.revolution;

import throwbench.solver.mechanism.Approach;

/** One quantity as a continuous function of the crank angle, with its steps read from either side. */
@FunctionalInterface
public interface Curve {

    /** The value at a crank angle (rad, any number of turns). */
    double at(double crankAngle, Approach approach);
}
