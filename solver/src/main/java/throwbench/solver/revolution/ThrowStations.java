package throwbench.solver.revolution;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import throwbench.solver.chamber.ChamberSweep;
import throwbench.solver.chamber.ChamberVolume;
import throwbench.solver.chamber.Side;
import throwbench.solver.load.ThrowForces;
import throwbench.solver.load.ThrowMotion;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Sweep;

/** One throw at the stations of its sweep: pressures, motion and forces, filled by the same loops for one station or many. */
final class ThrowStations {

    private final RunningThrow running;
    private final Sweep sweep;
    private final List<ChamberSweep> chambers;
    private final double[][] pressures;
    private final double[] gasLoad;
    private final ThrowMotion motion;
    private final ThrowForces forces;
    private final double framePressure;

    /** @param kept a chamber sweep of an earlier solution is used again where sweep and volume are the same */
    ThrowStations(RunningThrow running, Sweep sweep, double framePressure, List<ChamberSweep> kept) {
        this(
                running,
                sweep,
                framePressure,
                chambers(running, sweep, kept),
                new double[running.volumes().size()][sweep.count()],
                new double[sweep.count()],
                new ThrowMotion(sweep.count()),
                new ThrowForces(running.body(), sweep.count()));
    }

    private ThrowStations(
            RunningThrow running,
            Sweep sweep,
            double framePressure,
            List<ChamberSweep> chambers,
            double[][] pressures,
            double[] gasLoad,
            ThrowMotion motion,
            ThrowForces forces) {
        this.running = running;
        this.sweep = sweep;
        this.framePressure = framePressure;
        this.chambers = chambers;
        this.pressures = pressures;
        this.gasLoad = gasLoad;
        this.motion = motion;
        this.forces = forces;
    }

    /** Another solution in these arrays, whose values are given up; kept geometry as above. */
    ThrowStations over(RunningThrow next, Sweep nextSweep, double nextFramePressure) {
        boolean fits = nextSweep.count() == sweep.count() && next.volumes().size() == pressures.length;
        return fits
                ? new ThrowStations(
                        next,
                        nextSweep,
                        nextFramePressure,
                        chambers(next, nextSweep, chambers),
                        pressures,
                        gasLoad,
                        motion,
                        forces.over(next.body()))
                : new ThrowStations(next, nextSweep, nextFramePressure, chambers);
    }

    /** The same with the sweep kept where the geometry still holds; stations count from head-end dead centre. */
    ThrowStations over(RunningMachine next, int throwIndex) {
        RunningThrow t = next.throwsInOrder().get(throwIndex);
        Linkage linkage = t.body().linkage();
        Sweep nextSweep = sweep;
        if (!sweep.linkage().equals(linkage) || sweep.rotation() != next.rotation()) {
            nextSweep = sweep.count() == 1
                    ? Sweep.single(linkage, next.rotation())
                    : Sweep.wholeTurn(linkage, next.rotation(), 0, sweep.count());
        }
        return over(t, nextSweep, next.machine().site().framePressure());
    }

    private static List<ChamberSweep> chambers(RunningThrow running, Sweep sweep, List<ChamberSweep> kept) {
        List<ChamberSweep> chambers = new ArrayList<>();
        for (int i = 0; i < running.volumes().size(); i++) {
            ChamberVolume volume = running.volumes().get(i);
            boolean same = i < kept.size()
                    && kept.get(i).sweep() == sweep
                    && kept.get(i).chamber().equals(volume);
            chambers.add(same ? kept.get(i) : new ChamberSweep(sweep, volume));
        }
        return chambers;
    }

    /** Pressures, gas load, acceleration, inertia load and rod load: what a judgement of reversal needs. */
    void solveRodLoad(double[] speed, double[] alpha) {
        gasLoad();
        motion.solveAcceleration(sweep, speed, alpha);
        forces.solveRodLoad(motion, gasLoad);
    }

    /** Everything of this throw. */
    void solve(double[] speed, double[] alpha) {
        gasLoad();
        motion.solve(sweep, speed, alpha);
        forces.solve(sweep, motion, gasLoad, speed, alpha);
    }

    /** F_gas = Σ_c pA − Σ_h pA + p_frame (A_h − A_c). */
    private void gasLoad() {
        Arrays.fill(gasLoad, framePressure * running.uncoveredArea());
        for (int c = 0; c < pressures.length; c++) {
            running.curves().get(c).fill(chambers.get(c), pressures[c]);
            ChamberVolume volume = running.volumes().get(c);
            add(volume.side() == Side.HEAD ? -volume.area() : volume.area(), pressures[c]);
        }
    }

    private void add(double area, double[] pressure) {
        for (int i = 0; i < gasLoad.length; i++) {
            gasLoad[i] = Math.fma(area, pressure[i], gasLoad[i]);
        }
    }

    RunningThrow running() {
        return running;
    }

    Sweep sweep() {
        return sweep;
    }

    List<ChamberSweep> chambers() {
        return chambers;
    }

    double[] pressure(int chamber) {
        return pressures[chamber];
    }

    ThrowForces forces() {
        return forces;
    }

    ThrowMotion motion() {
        return motion;
    }

    /** The array behind a column of this throw. */
    double[] column(Column column) {
        return switch (column) {
            case CRANK_ANGLE -> sweep.crankAngle();
            case TRAVEL -> sweep.travel();
            case VELOCITY -> motion.velocity();
            case ACCELERATION -> motion.acceleration();
            case ROD_ANGLE -> sweep.rodAngle();
            case ROD_VELOCITY -> motion.rodVelocity();
            case ROD_ACCELERATION -> motion.rodAcceleration();
            case GAS_LOAD -> gasLoad;
            case INERTIA_LOAD -> forces.inertiaLoad();
            case ROD_LOAD -> forces.rodLoad();
            case PISTON_ROD_LOAD -> forces.pistonRodLoad();
            case GUIDE_FORCE -> forces.guideForce();
            case CROSSHEAD_PIN_X -> forces.crossheadPinX();
            case CROSSHEAD_PIN_Y -> forces.crossheadPinY();
            case CRANK_PIN_X -> forces.crankPinX();
            case CRANK_PIN_Y -> forces.crankPinY();
            case MAIN_BEARING_X -> forces.mainBearingX();
            case MAIN_BEARING_Y -> forces.mainBearingY();
            case THROW_TORQUE -> forces.torque();
            case SHAFT_TORQUE, SHAFT_SPEED, SHAKING_FORCE_X, SHAKING_FORCE_Y, SHAKING_COUPLE_X, SHAKING_COUPLE_Y ->
                throw new IllegalArgumentException(column + " is the machine's, not a throw's");
        };
    }
}
