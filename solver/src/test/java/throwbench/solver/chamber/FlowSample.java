package throwbench.solver.chamber;

import java.util.Arrays;
import java.util.OptionalDouble;
import throwbench.solver.fluid.PerfectGas;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.mechanism.Sweep;

/** The chambers that valve flow is tried on: a double-acting throw at four speeds and sizes of valves. */
enum FlowSample {
    /** 740 rev/min, 26 and 22 cm². */
    A(740, 1, 4.1e5, 11.5e5, 0.14, 0.16),
    /** Four times the areas. */
    B(740, 4, 4.1e5, 11.5e5, 0.14, 0.16),
    /** The same, slow. */
    C(200, 4, 4.1e5, 11.5e5, 0.14, 0.16),
    /** Fast, narrow, a high ratio. */
    D(1200, 0.7, 1e5, 6e5, 0.10, 0.12);

    static final double ATMOSPHERE = 101325;

    private final double revolutionsPerMinute;
    private final double areas;
    private final double suctionGauge;
    private final double dischargeGauge;
    private final double headClearance;
    private final double crankClearance;

    FlowSample(
            double revolutionsPerMinute,
            double areas,
            double suctionGauge,
            double dischargeGauge,
            double headClearance,
            double crankClearance) {
        this.revolutionsPerMinute = revolutionsPerMinute;
        this.areas = areas;
        this.suctionGauge = suctionGauge;
        this.dischargeGauge = dischargeGauge;
        this.headClearance = headClearance;
        this.crankClearance = crankClearance;
    }

    FlowValves valves() {
        return new FlowValves(26e-4 * areas, 22e-4 * areas);
    }

    private LineConditions lines() {
        return new LineConditions(suctionGauge + ATMOSPHERE, dischargeGauge + ATMOSPHERE, OptionalDouble.of(305.15));
    }

    ChamberDuty duty(Side side) {
        return duty(side, ChamberCondition.WORKING);
    }

    ChamberDuty duty(Side side, ChamberState state, double leakArea) {
        return duty(side, new ChamberCondition(state, leakArea, Clearance.NONE));
    }

    private ChamberDuty duty(Side side, ChamberCondition condition) {
        Linkage linkage = new Linkage(0.075, 0.4, 0);
        double inner = side == Side.HEAD ? 0 : 0.064;
        double area = Math.PI / 4 * (0.32 * 0.32 - inner * inner);
        double swept = area * linkage.stroke();
        double clearance = side == Side.HEAD ? headClearance : crankClearance;
        return new ChamberDuty(
                linkage,
                Rotation.COUNTER_CLOCKWISE,
                new ChamberVolume(side, area, linkage.stroke(), clearance * swept),
                new PerfectGas(0.0272, 1.29),
                lines(),
                condition,
                revolutionsPerMinute * Math.PI / 30,
                0);
    }

    /** The curve of a cycle that must be solved. */
    static PressureCurve solved(Cycle cycle, ChamberDuty duty) {
        CycleOutcome outcome = cycle.solve(duty);
        return outcome.curve().orElseThrow(() -> new AssertionError(outcome.refusal()));
    }

    /** Pressures at equally spaced crank angles from 0, Pa. */
    static double[] pressures(PressureCurve curve, ChamberDuty duty, int stations) {
        Sweep sweep = Sweep.wholeTurn(duty.linkage(), duty.rotation(), 0, stations);
        double[] pressure = new double[stations];
        curve.fill(new ChamberSweep(sweep, duty.volume()), pressure);
        return pressure;
    }

    /** −∮ p dV of pressures at equally spaced crank angles, by the trapezoidal rule, J. */
    static double work(double[] pressures, ChamberDuty duty) {
        double work = 0;
        double step = 2 * Math.PI / pressures.length;
        for (int i = 0; i < pressures.length; i++) {
            work -= pressures[i] * volumeSlope(duty, i * step) * step;
        }
        return work;
    }

    /** dV/dφ by a difference quotient, m³/rad. */
    static double volumeSlope(ChamberDuty duty, double angle) {
        double d = 1e-6;
        ChamberVolume volume = duty.volume();
        double after = volume.at(duty.linkage().travel(angle + d, duty.rotation()));
        double before = volume.at(duty.linkage().travel(angle - d, duty.rotation()));
        return (after - before) / (2 * d);
    }

    static double greatest(double[] values) {
        return Arrays.stream(values).max().orElseThrow();
    }
}
