package throwbench.solver.chamber;

import throwbench.solver.chamber.flow.PistonPath;
import throwbench.solver.fluid.Fluid;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;

/**
 * All that a cycle needs to be solved.
 *
 * @param volume with a clearance above 0
 * @param meanSpeed of the shaft, rad/s: cycles run at the constant mean speed
 * @param flowAllowance share of the capacity lost to heating, leakage and slip
 * @param accuracy how closely an integrated cycle is followed
 */
public record ChamberDuty(
        Linkage linkage,
        Rotation rotation,
        ChamberVolume volume,
        Fluid fluid,
        LineConditions lines,
        ChamberCondition condition,
        double meanSpeed,
        double flowAllowance,
        CycleAccuracy accuracy) {

    public ChamberDuty {
        if (!(volume.clearance() > 0)) {
            throw new IllegalArgumentException("a cycle needs a clearance above 0, not " + volume.clearance() + " m3");
        }
    }

    /** To be solved with full accuracy. */
    public ChamberDuty(
            Linkage linkage,
            Rotation rotation,
            ChamberVolume volume,
            Fluid fluid,
            LineConditions lines,
            ChamberCondition condition,
            double meanSpeed,
            double flowAllowance) {
        this(linkage, rotation, volume, fluid, lines, condition, meanSpeed, flowAllowance, CycleAccuracy.SOLVE);
    }

    /** The same duty, followed as closely as asked. */
    public ChamberDuty followed(CycleAccuracy closely) {
        return new ChamberDuty(linkage, rotation, volume, fluid, lines, condition, meanSpeed, flowAllowance, closely);
    }

    /** The crank angle (rad) at which the chamber has a volume (m³), on the stroke on which it grows or falls. */
    double crankAngleAt(double chamberVolume, boolean growing) {
        Linkage.TravelAngles angles = linkage.anglesAtTravel(volume.travelAt(chamberVolume), rotation);
        return volume.growsOn(true) == growing ? angles.inward() : angles.outward();
    }

    /** The way of its volume, to be followed in small steps. */
    PistonPath pistonPath() {
        double growth = volume.side() == Side.HEAD ? volume.area() : -volume.area();
        return new PistonPath(linkage, rotation, volume.at(0), growth);
    }

    /** The crank angle (rad, in [0, 2π)) of the chamber's least volume. */
    double leastVolumeAngle() {
        return volume.side() == Side.HEAD ? 0 : linkage.crankEndDeadCentre(rotation);
    }

    /** The crank angle (rad, in [0, 2π)) of its greatest volume. */
    double greatestVolumeAngle() {
        return volume.side() == Side.HEAD ? linkage.crankEndDeadCentre(rotation) : 0;
    }
}
