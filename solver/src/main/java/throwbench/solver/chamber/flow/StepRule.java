package throwbench.solver.chamber.flow;

/**
 * How finely the opening of a valve is followed. Angles in rad.
 *
 * @param longest step, at most {@link PistonPath#LONGEST}
 * @param shortest first step, however quickly the flow answers
 * @param change share by which the piston alone would change the pressure in a step, at most
 * @param growth of each step over the one before, above 1
 * @param near the last step of Newton's method in a stage, as a share; the error left is less than its square
 */
public record StepRule(double longest, double shortest, double change, double growth, double near) {

    public StepRule {
        if (!(longest > 0 && longest <= PistonPath.LONGEST && shortest > 0 && change > 0 && growth > 1 && near > 0)) {
            throw new IllegalArgumentException("steps of " + shortest + " to " + longest + " rad, change " + change
                    + ", growth " + growth + ", near " + near);
        }
    }
}
