package throwbench.solver.chamber;

import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Sweep;

/** A liquid chamber at one crank angle: its volume and the pressures of its open valves. Turned by its one owner. */
final class LiquidPlace {

    private final Sweep sweep;
    private final ChamberVolume chamber;
    private final OpenPressures open;

    LiquidPlace(ChamberDuty duty, OpenPressures open) {
        this.sweep = Sweep.single(duty.linkage(), duty.rotation());
        this.chamber = duty.volume();
        this.open = open;
    }

    /** Turns to a crank angle, rad, any number of turns. */
    LiquidPlace turnTo(double crankAngle) {
        sweep.turnTo(crankAngle, Approach.JUST_AFTER);
        return this;
    }

    /** V, m³. */
    double volume() {
        return chamber.at(sweep.travel()[0]);
    }

    /** Pressure with the suction valve open, Pa. */
    double suction() {
        return open.suction(open.lossFactor(sweep.reach1()[0]));
    }

    /** Pressure with the discharge valve open, Pa. */
    double discharge() {
        return open.discharge(open.lossFactor(sweep.reach1()[0]));
    }
}
