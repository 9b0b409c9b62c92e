package throwbench.solver.chamber.flow;

/** What a turn of a leaky chamber comes to: what passed its ports, and the p–V areas beyond the line pressures. */
public final class LeakyTotals {

    private final Port suction;
    private final Port discharge;
    private double drawn;
    private double delivered;
    private double returned;
    private double deliveredEnergy;
    private double suctionLoss;
    private double dischargeLoss;

    LeakyTotals(Port suction, Port discharge) {
        this.suction = suction;
        this.discharge = discharge;
    }

    void clear() {
        drawn = 0;
        delivered = 0;
        returned = 0;
        deliveredEnergy = 0;
        suctionLoss = 0;
        dischargeLoss = 0;
    }

    /** Adds a step, told by its start and what it holds at its end; it lies on one side of each line's pressure. */
    void add(
            LeakyStep step,
            double taken,
            double pressure,
            double slope,
            double volume,
            double volumeSlope,
            double reached) {
        drawn -= step.massPassed(suction);
        if (step.massPassed(discharge) > 0) {
            delivered += step.massPassed(discharge);
            deliveredEnergy += step.energyPassed(discharge);
        } else {
            returned -= step.massPassed(discharge);
        }
        double middle = (pressure + reached) / 2 + taken / 8 * (slope - step.pressureSlope());
        double middleSlope = 1.5 * (step.endVolume() - volume) / taken - (volumeSlope + step.endVolumeSlope()) / 4;
        double work = taken / 6 * (pressure * volumeSlope + 4 * middle * middleSlope + reached * step.endVolumeSlope());
        double swept = step.endVolume() - volume;
        if (pressure < suction.line() || reached < suction.line()) {
            suctionLoss += suction.line() * swept - work;
        }
        if (pressure > discharge.line() || reached > discharge.line()) {
            dischargeLoss += discharge.line() * swept - work;
        }
    }

    /** Net suction flow, as R m, Pa m³/K. */
    public double drawn() {
        return drawn;
    }

    /** What left through the discharge valve, likewise. */
    public double delivered() {
        return delivered;
    }

    /** What came back through it, likewise. */
    public double returned() {
        return returned;
    }

    /** R T m of what left, Pa m³. */
    public double deliveredEnergy() {
        return deliveredEnergy;
    }

    /** ∮ max(p_suction − p, 0) dV, J. */
    public double suctionLoss() {
        return suctionLoss;
    }

    /** ∮ max(p − p_discharge, 0) (−dV), J. */
    public double dischargeLoss() {
        return dischargeLoss;
    }
}
