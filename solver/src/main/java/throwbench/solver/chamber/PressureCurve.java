package throwbench.solver.chamber;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** A solved cycle: the chamber's pressure at any crank angle, and what it passes in a turn. Immutable. */
public interface PressureCurve {

    /** Fills the pressure at every station of a sweep, Pa absolute. */
    void fill(ChamberSweep sweep, double[] pressure);

    /** When valves open and shut, by crank angle. */
    List<ValveEvent> events();

    /**
     * The crank angles (rad, in [0, 2π)) at which its pieces join in value and slope. They are no breaks: a peak or a change
     * of sign is found across them; but an integral is exact only when it is split there.
     */
    default double[] joints() {
        return new double[0];
    }

    /** Whether it is known when the valves stand open and what they pass; of a measured pressure it is not. */
    default boolean flowKnown() {
        return true;
    }

    /**
     * Mass passed in a turn, kg; empty where it is not known, which a note then explains. The flow allowance is taken off,
     * except from valve flow, where it is the net suction flow itself.
     */
    OptionalDouble massPerTurn();

    /** The same at suction line conditions, m³; 0 when no valve opens, and without meaning where the flow is not known. */
    double inletVolumePerTurn();

    /** Temperature of what is discharged, K, its mean by mass; empty where nothing is, or where it is not known. */
    OptionalDouble dischargeTemperature();

    /** Work that the valves cost in a turn; empty where a cycle does not follow their flow. */
    default Optional<ValveLossWork> valveLossWork() {
        return Optional.empty();
    }

    /** What a user must be told of this cycle, in sentences without the chamber's name. */
    List<String> notes();
}
