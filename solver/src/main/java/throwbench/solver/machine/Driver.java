package throwbench.solver.machine;

/** How the driver holds the speed over the revolution. */
public sealed interface Driver {

    /** The word of the machine file. */
    String kind();

    /** The shaft turns at one speed whatever the torque. */
    record ConstantSpeed() implements Driver {
        @Override
        public String kind() {
            return "constant-speed";
        }
    }

    /** The driver delivers the mean torque; the rotating inertia takes up the rest. */
    record ConstantTorque() implements Driver {
        @Override
        public String kind() {
            return "constant-torque";
        }
    }

    /**
     * Torque falls in proportion to speed.
     *
     * @param ratedTorque N·m, above 0
     * @param ratedSlip share of the synchronous speed, in (0, 1)
     */
    record Slip(double ratedTorque, double ratedSlip) implements Driver {
        @Override
        public String kind() {
            return "slip";
        }
    }
}
