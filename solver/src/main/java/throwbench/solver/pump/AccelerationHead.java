package throwbench.solver.pump;

import throwbench.solver.machine.Site;

/** The head that it takes to accelerate the liquid in a suction line with every stroke, m of liquid. */
public final class AccelerationHead {

    private AccelerationHead() {}

    /**
     * The handbook formula h_a = L v n C/(K_h g), with n in revolutions a minute.
     *
     * <p>Source: Hydraulic Institute standards; GPSA Engineering Data Book, section on pumps; both from memory. Meant for
     * lines of some 15 m at most, without a dampener.
     *
     * @param length L of the line, m
     * @param meanVelocity v in the line, m/s
     * @param shaftSpeed rad/s
     * @param arrangementConstant C, see {@link PumpArrangement}
     * @param liquidFactor K_h, see {@link LiquidFactor}
     */
    public static double byHandbook(
            double length, double meanVelocity, double shaftSpeed, double arrangementConstant, double liquidFactor) {
        double revolutionsPerMinute = shaftSpeed * 30 / Math.PI;
        return length
                * meanVelocity
                * revolutionsPerMinute
                * arrangementConstant
                / (liquidFactor * Site.STANDARD_GRAVITY);
    }

    /**
     * From the solved flow: (L/(g A_line)) max dQ/dt, Newton's second law for a rigid column.
     *
     * @param length L of the line, m
     * @param lineArea A_line, m²
     * @param greatestRise max dQ/dt, m³/s²
     */
    public static double ofFlow(double length, double lineArea, double greatestRise) {
        return length * greatestRise / (Site.STANDARD_GRAVITY * lineArea);
    }
}
