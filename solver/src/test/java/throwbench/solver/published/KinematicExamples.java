package throwbench.solver.published;

import java.util.Map;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import throwbench.solver.load.ConnectingRod;
import throwbench.solver.load.Crank;
import throwbench.solver.load.Friction;
import throwbench.solver.load.ReciprocatingMasses;
import throwbench.solver.load.ThrowBody;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.PistonSpeed;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.mechanism.Sweep;
import throwbench.solver.mechanism.TwoTermSeries;
import throwbench.solver.mechanism.TwoTermSeries.Quantity;
import throwbench.solver.trial.MovingThrow;

/** Slider-crank examples as the solver computes them, all counter-clockwise. */
final class KinematicExamples {

    static final Map<String, ToDoubleFunction<PublishedRow>> BY_QUANTITY = Map.ofEntries(
            Map.entry("piston velocity", row -> solve(row).motion().velocity()[0]),
            Map.entry(
                    "offset: slider velocity (magnitude)",
                    row -> solve(row).motion().velocity()[0]),
            Map.entry("piston acceleration", row -> solve(row).motion().acceleration()[0]),
            Map.entry("rod angular velocity", KinematicExamples::rodSpeed),
            Map.entry("rod angular velocity (magnitude)", KinematicExamples::rodSpeed),
            Map.entry("offset: rod angular velocity (magnitude)", KinematicExamples::rodSpeed),
            Map.entry("rod angular acceleration", KinematicExamples::rodTurning),
            Map.entry("rod angular acceleration (magnitude)", KinematicExamples::rodTurning),
            Map.entry("velocity of a point on the rod", KinematicExamples::pointVelocity),
            Map.entry("velocity of rod point 1.5 m from crosshead pin", KinematicExamples::pointVelocity),
            Map.entry("acceleration of a point on the rod", KinematicExamples::pointAcceleration),
            Map.entry("acceleration of the rod point", KinematicExamples::pointAcceleration),
            // the rod turns against the crank while the pin is on the head-end side
            Map.entry(
                    "rubbing velocity at crank pin (60 mm dia): r_pin (crank speed + rod speed)",
                    row -> 0.030 * (omega(row) + rodSpeed(row))),
            Map.entry("rubbing velocity at crosshead pin (30 mm dia)", row -> 0.015 * rodSpeed(row)),
            Map.entry("rod inclination", KinematicExamples::rodAngle),
            Map.entry(
                    "offset: rod angle (project beta; Norton measures 180 deg minus it = 152.91)",
                    KinematicExamples::rodAngle),
            Map.entry("crank angle of greatest piston velocity", row -> fastest(row)
                    .crankAngle()),
            Map.entry(
                    "crank angle of greatest piston speed", row -> fastest(row).crankAngle()),
            Map.entry("crank angle of zero piston acceleration", row -> fastest(row)
                    .crankAngle()),
            Map.entry(
                    "greatest / mean piston speed",
                    row -> fastest(row).velocity() / PistonSpeed.mean(linkage(row), omega(row))),
            Map.entry("crank angle at 10 mm travel from HDC (inverse kinematics)", row -> linkage(row)
                    .anglesAtTravel(row.si("travel"), Rotation.COUNTER_CLOCKWISE)
                    .inward()),
            Map.entry(
                    "travel at 90 deg crank angle / stroke",
                    row -> linkage(row).travel(Math.PI / 2, Rotation.COUNTER_CLOCKWISE)
                            / linkage(row).stroke()),
            Map.entry("harmonic of order 2 of piston acceleration / (r w2)", row -> harmonic(row, 2)),
            Map.entry("harmonic of order 4 of piston acceleration / (r w2)", row -> harmonic(row, 4)),
            Map.entry("harmonic of order 6 of piston acceleration / (r w2)", row -> harmonic(row, 6)),
            Map.entry("largest error of the two-term acceleration / (r w2)", KinematicExamples::worstAcceleration),
            Map.entry("offset: HDC angle from the line of stroke", row -> linkage(row)
                    .headEndAngle()),
            Map.entry("offset: CDC angle", row -> linkage(row).crankEndAngle()),
            Map.entry("offset: crank angle of the stroke from HDC to CDC", row -> linkage(row)
                    .crankEndDeadCentre(Rotation.COUNTER_CLOCKWISE)),
            Map.entry("offset: time ratio of the strokes (longer/shorter)", row -> linkage(row)
                    .timeRatio(Rotation.COUNTER_CLOCKWISE)),
            Map.entry("offset: time ratio of the strokes", row -> linkage(row).timeRatio(Rotation.COUNTER_CLOCKWISE)),
            Map.entry("offset: stroke", row -> linkage(row).stroke()),
            Map.entry("offset: slider position x", row -> linkage(row).reach(pinAngle(row))));

    /** The same by the two-term series. */
    static final Map<String, ToDoubleFunction<PublishedRow>> TWO_TERM = Map.of(
            "piston velocity",
            row -> series(row, Quantity.VELOCITY) * omega(row),
            "piston acceleration",
            row -> series(row, Quantity.ACCELERATION) * omega(row) * omega(row));

    private KinematicExamples() {}

    private static double series(PublishedRow row, Quantity quantity) {
        Linkage linkage = linkage(row);
        return new TwoTermSeries(linkage, Rotation.COUNTER_CLOCKWISE)
                .at(quantity, pinAngle(row) - linkage.headEndAngle())
                .series();
    }

    static Linkage linkage(PublishedRow row) {
        double offset = row.has("offset") ? row.si("offset") : 0;
        double r = row.has("crank") ? row.si("crank") : 1;
        double l = row.has("l/r") ? row.si("l/r") * r : row.si("rod");
        return new Linkage(r, l, offset);
    }

    private static double omega(PublishedRow row) {
        if (row.has("crank speed")) {
            return row.si("crank speed");
        }
        return row.has("speed") ? row.si("speed") : 1;
    }

    private static double pinAngle(PublishedRow row) {
        if (row.has("angle from HDC")) {
            return linkage(row).headEndAngle() + row.si("angle from HDC");
        }
        return row.si(row.has("crank angle") ? "crank angle" : "crank angle from line of stroke");
    }

    /** A rod whose mass centre is the point asked for, so that the solver gives its acceleration. */
    private static MovingThrow.Solved solve(PublishedRow row) {
        Linkage linkage = linkage(row);
        ThrowBody body = ThrowBody.of(
                linkage,
                new ReciprocatingMasses(1, 0, 0),
                new ConnectingRod(1, OptionalDouble.of(point(row, linkage)), OptionalDouble.of(1)),
                new Crank(0, 0),
                Friction.NONE,
                0,
                0);
        double alpha = row.has("crank acceleration") ? row.si("crank acceleration") : 0;
        double angle = pinAngle(row) - linkage.headEndAngle();
        return new MovingThrow(body, Rotation.COUNTER_CLOCKWISE, angle, omega(row), alpha, 0).solve();
    }

    /** Distance of the rod point from the crank pin, m. */
    private static double point(PublishedRow row, Linkage linkage) {
        if (row.quantity().contains("1.5 m from crosshead pin")) {
            return linkage.rodLength() - 1.5;
        }
        if (!row.has("rod point")) {
            return 0;
        }
        return row.inputs().get("rod point").equals("mid-length") ? linkage.rodLength() / 2 : row.si("rod point");
    }

    private static double rodSpeed(PublishedRow row) {
        return Math.abs(solve(row).motion().rodVelocity()[0]);
    }

    private static double rodTurning(PublishedRow row) {
        return Math.abs(solve(row).motion().rodAcceleration()[0]);
    }

    private static double rodAngle(PublishedRow row) {
        return solve(row).sweep().rodAngle()[0];
    }

    /** The crosshead's velocity and the rod's turning about it. */
    private static double pointVelocity(PublishedRow row) {
        MovingThrow.Solved solved = solve(row);
        Linkage linkage = linkage(row);
        double turning =
                (linkage.rodLength() - point(row, linkage)) * solved.motion().rodVelocity()[0];
        double x = -solved.motion().velocity()[0] + turning * solved.sweep().sinRod()[0];
        double y = turning * solved.sweep().cosRod()[0];
        return Math.hypot(x, y);
    }

    private static double pointAcceleration(PublishedRow row) {
        MovingThrow.Solved solved = solve(row);
        return Math.hypot(
                solved.forces().rodCentreAccelerationX()[0], solved.forces().rodCentreAccelerationY()[0]);
    }

    private static PistonSpeed.Peak fastest(PublishedRow row) {
        return PistonSpeed.of(linkage(row), Rotation.COUNTER_CLOCKWISE, omega(row))
                .inward();
    }

    private static double worstAcceleration(PublishedRow row) {
        Linkage linkage = linkage(row);
        TwoTermSeries.Worst worst = new TwoTermSeries(linkage, Rotation.COUNTER_CLOCKWISE).worst(Quantity.ACCELERATION);
        return Math.abs(worst.value().error()) / linkage.crankRadius();
    }

    /** Cosine part, by sums over equally spaced stations, which are exact for so few orders. */
    private static double harmonic(PublishedRow row, int order) {
        Linkage linkage = linkage(row);
        int count = 360;
        double[] reach2 =
                Sweep.wholeTurn(linkage, Rotation.COUNTER_CLOCKWISE, 0, count).reach2();
        double sum = 0;
        for (int i = 0; i < count; i++) {
            sum -= reach2[i] * Math.cos(order * 2 * Math.PI * i / count);
        }
        return 2 * sum / count / linkage.crankRadius();
    }
}
