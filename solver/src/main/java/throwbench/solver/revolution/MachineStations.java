package throwbench.solver.revolution;

import java.util.Arrays;
import java.util.List;
import throwbench.solver.load.ThrowForces;
import throwbench.solver.machine.ShaftPlace;
import throwbench.solver.mechanism.Approach;

/**
 * All throws at the same instants, and what they add up to: shaft torque, shaking forces and couples in machine axes. Whole
 * revolutions and single angles are both one of these.
 */
final class MachineStations {

    private final RunningMachine running;
    private final ThrowStations[] throwStations;
    private final double[][] block;
    private final double[] speed;
    private final double[] alpha;
    private final double[] shaftTorque;
    private final double[] shakingForceX;
    private final double[] shakingForceY;
    private final double[] shakingCoupleX;
    private final double[] shakingCoupleY;

    MachineStations(RunningMachine running, List<ThrowStations> throwStations) {
        this(running, throwStations, new double[7][throwStations.get(0).sweep().count()]);
    }

    private MachineStations(RunningMachine running, List<ThrowStations> throwStations, double[][] block) {
        this.running = running;
        this.throwStations = throwStations.toArray(new ThrowStations[0]);
        this.block = block;
        speed = block[0];
        alpha = block[1];
        shaftTorque = block[2];
        shakingForceX = block[3];
        shakingForceY = block[4];
        shakingCoupleX = block[5];
        shakingCoupleY = block[6];
    }

    /** Another solution in these arrays, whose values are given up. */
    MachineStations over(RunningMachine next, List<ThrowStations> nextStations) {
        boolean fits = nextStations.get(0).sweep().count() == count();
        return fits ? new MachineStations(next, nextStations, block) : new MachineStations(next, nextStations);
    }

    /**
     * Fills every column of every throw and of the machine.
     *
     * @param approach the side that the sweeps were turned to
     */
    void solve(Approach approach) {
        if (running.speedCurve().constant()) {
            Arrays.fill(speed, running.meanSpeed());
            Arrays.fill(alpha, 0);
        } else {
            running.fillSpeed(0, throwStations[0].sweep().crankAngle(), approach, speed, alpha);
        }
        for (ThrowStations t : throwStations) {
            t.solve(speed, alpha);
        }
        shaft();
        shaking();
    }

    private void shaft() {
        Arrays.fill(shaftTorque, 0);
        for (ThrowStations t : throwStations) {
            addScaled(t.forces().torque(), 1, shaftTorque);
        }
    }

    private void shaking() {
        Arrays.fill(shakingForceX, 0);
        Arrays.fill(shakingForceY, 0);
        Arrays.fill(shakingCoupleX, 0);
        Arrays.fill(shakingCoupleY, 0);
        double centre = running.coupleCentre();
        for (ThrowStations t : throwStations) {
            ShaftPlace place = t.running().described().place();
            double cos = Math.cos(place.axisDirection());
            double sin = Math.sin(place.axisDirection());
            double arm = place.shaftPosition() - centre;
            ThrowForces f = t.forces();
            addScaled(f.frameForceX(), cos, shakingForceX);
            addScaled(f.frameForceY(), -sin, shakingForceX);
            addScaled(f.frameForceX(), sin, shakingForceY);
            addScaled(f.frameForceY(), cos, shakingForceY);
            if (arm != 0) {
                addScaled(f.frameForceX(), arm * cos, shakingCoupleX);
                addScaled(f.frameForceY(), -arm * sin, shakingCoupleX);
                addScaled(f.frameForceX(), arm * sin, shakingCoupleY);
                addScaled(f.frameForceY(), arm * cos, shakingCoupleY);
            }
        }
    }

    private static void addScaled(double[] from, double factor, double[] to) {
        for (int i = 0; i < to.length; i++) {
            to[i] = Math.fma(factor, from[i], to[i]);
        }
    }

    RunningMachine running() {
        return running;
    }

    ThrowStations of(int throwIndex) {
        return throwStations[throwIndex];
    }

    int count() {
        return speed.length;
    }

    double[] speed() {
        return speed;
    }

    double[] alpha() {
        return alpha;
    }

    /** The array behind a column, for one throw or (whichever throw is named) for the machine. */
    double[] column(int throwIndex, Column column) {
        return switch (column) {
            case SHAFT_TORQUE -> shaftTorque;
            case SHAFT_SPEED -> speed;
            case SHAKING_FORCE_X -> shakingForceX;
            case SHAKING_FORCE_Y -> shakingForceY;
            case SHAKING_COUPLE_X -> shakingCoupleX;
            case SHAKING_COUPLE_Y -> shakingCoupleY;
            default -> throwStations[throwIndex].column(column);
        };
    }
}
