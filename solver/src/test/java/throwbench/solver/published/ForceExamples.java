package throwbench.solver.published;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import throwbench.solver.chamber.ChamberCondition;
import throwbench.solver.chamber.ChamberState;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.IdealValves;
import throwbench.solver.chamber.Side;
import throwbench.solver.load.ConnectingRod;
import throwbench.solver.load.Crank;
import throwbench.solver.load.Friction;
import throwbench.solver.load.ReciprocatingMasses;
import throwbench.solver.load.ThrowBody;
import throwbench.solver.load.ThrowForces;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Site;
import throwbench.solver.machine.StageConditions;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Instant;
import throwbench.solver.trial.AnyThrow;
import throwbench.solver.trial.Machines;
import throwbench.solver.trial.MovingThrow;

/** Examples of forces as the solver computes them, all counter-clockwise; vertical engines stand with the cylinder above. */
final class ForceExamples {

    static final Map<String, ToDoubleFunction<PublishedRow>> BY_QUANTITY = Map.ofEntries(
            Map.entry(
                    "inertia load of reciprocating parts",
                    row -> solve(row).forces().inertiaLoad()[0]),
            Map.entry("connecting-rod thrust", ForceExamples::crossheadPin),
            Map.entry("crosshead-pin force, rigid rod", ForceExamples::crossheadPin),
            // a gas that drives: the pin holds it up
            Map.entry("load on gudgeon pin", ForceExamples::effort),
            Map.entry("piston effort (net force on crosshead pin along the stroke)", ForceExamples::effort),
            Map.entry("side thrust", ForceExamples::guide),
            Map.entry("guide reaction", ForceExamples::guide),
            Map.entry("guide force, rigid rod", ForceExamples::guide),
            Map.entry("tangential force at crank pin", row -> turningMoment(row) / radius(row)),
            Map.entry("tangential force at crank pin (= torque / crank)", row -> turningMoment(row) / radius(row)),
            Map.entry("turning moment", ForceExamples::turningMoment),
            Map.entry("torque from gas load alone", ForceExamples::turningMoment),
            Map.entry("torque from pressures alone", ForceExamples::turningMoment),
            Map.entry("radial force at crank pin", ForceExamples::radial),
            Map.entry("radial force at crank pin (bearing thrust)", ForceExamples::radial),
            Map.entry("crank-pin force, rigid rod", ForceExamples::crankPin),
            Map.entry("speed above which the gudgeon-pin load reverses", ForceExamples::reversingSpeed),
            Map.entry(
                    "flywheel acceleration (20 kW load, 60 kg at 0.6 m radius of gyration)",
                    row -> (turningMoment(row) - 20e3 / row.si("speed")) / (60 * 0.6 * 0.6)),
            Map.entry("correction couple of the two-mass rod put at the pin centres", ForceExamples::correctionCouple),
            Map.entry("piston acceleration", row -> solve(row).motion().acceleration()[0]),
            Map.entry("inertia force of the rod, m a_G", ForceExamples::rodInertia),
            Map.entry(
                    "rod angular acceleration (magnitude)",
                    row -> Math.abs(solve(row).motion().rodAcceleration()[0])),
            Map.entry("torque on the shaft from this rod alone (no gravity)", row -> torque(row, 0)),
            Map.entry("torque on shaft from inertia and rod weight (gravity 9.81)", row -> torque(row, gravity(row))),
            Map.entry("inertia torque of the rod, weight included", row -> torque(row, gravity(row))),
            Map.entry("torque from inertia and rod weight", row -> torque(row, gravity(row))),
            Map.entry("same without gravity", row -> torque(row, 0)),
            Map.entry("same without weight", row -> torque(row, 0)),
            Map.entry(
                    "part from the reciprocating mass plus the rod share at the crosshead pin (580 + 500 x 19/60 lb)",
                    ForceExamples::lumpedTorque));

    /** The textbooks' g where they do not print it; it stands behind the exact values too. */
    private static final double TEXTBOOK_GRAVITY = 9.81;

    private ForceExamples() {}

    private static double effort(PublishedRow row) {
        return solve(row).forces().crossheadPinX()[0];
    }

    private static double guide(PublishedRow row) {
        return Math.abs(solve(row).forces().guideForce()[0]);
    }

    private static double crossheadPin(PublishedRow row) {
        ThrowForces f = solve(row).forces();
        return Math.hypot(f.crossheadPinX()[0], f.crossheadPinY()[0]);
    }

    private static double crankPin(PublishedRow row) {
        ThrowForces f = solve(row).forces();
        return Math.hypot(f.crankPinX()[0], f.crankPinY()[0]);
    }

    /** Towards the crank's centre, on the crank. */
    private static double radial(PublishedRow row) {
        MovingThrow.Solved s = solve(row);
        return s.forces().crankPinX()[0] * s.sweep().cosPin()[0]
                + s.forces().crankPinY()[0] * s.sweep().sinPin()[0];
    }

    /** What the engine delivers is minus what a driver must. */
    private static double turningMoment(PublishedRow row) {
        return -solve(row).forces().torque()[0];
    }

    private static double torque(PublishedRow row, double gravity) {
        return at(row, gravity, speed(row)).solve().forces().torque()[0];
    }

    private static double rodInertia(PublishedRow row) {
        ThrowForces f = solve(row).forces();
        return row.si("rod mass") * Math.hypot(f.rodCentreAccelerationX()[0], f.rodCentreAccelerationY()[0]);
    }

    /** Two lumps at the pins have more inertia than the rod: the couple is the difference's. */
    private static double correctionCouple(PublishedRow row) {
        double mass = row.si("mass");
        double l = row.si("centres");
        double b = l - row.si("small end to mass centre");
        ConnectingRod lumps = new ConnectingRod(mass, OptionalDouble.of(b), OptionalDouble.empty());
        double k = row.si("radius of gyration");
        return (lumps.inertiaAboutMassCentre(l) - mass * k * k) * row.si("rod acceleration");
    }

    private static double reversingSpeed(PublishedRow row) {
        return new BrentSolver(1e-14, 1e-12)
                .solve(
                        200,
                        omega -> at(row, gravity(row), omega).solve().forces().crossheadPinX()[0],
                        100,
                        500);
    }

    private static double lumpedTorque(PublishedRow row) {
        MovingThrow whole = at(row, 0, speed(row));
        ThrowBody b = whole.body();
        double share = b.rodMass() * b.rodMassCentre() / b.linkage().rodLength();
        ThrowBody lumped = ThrowBody.of(
                b.linkage(),
                new ReciprocatingMasses(b.masses().total() + share, 0, 0),
                new ConnectingRod(0, OptionalDouble.empty(), OptionalDouble.empty()),
                new Crank(0, 0),
                Friction.NONE,
                0,
                0);
        return new MovingThrow(lumped, whole.rotation(), whole.crankAngle(), whole.speed(), 0, 0)
                .solve()
                .forces()
                .torque()[0];
    }

    private static MovingThrow.Solved solve(PublishedRow row) {
        return at(row, gravity(row), speed(row)).solve();
    }

    private static MovingThrow at(PublishedRow row, double gravity, double speed) {
        Linkage linkage = KinematicExamples.linkage(row);
        double friction = row.has("friction") ? row.si("friction") : 0;
        ThrowBody body = ThrowBody.of(
                linkage,
                new ReciprocatingMasses(reciprocating(row), 0, 0),
                rod(row, linkage),
                new Crank(0, 0),
                new Friction(friction, 0),
                vertical(row) ? Math.PI / 2 : 0,
                gravity);
        double angle = row.has("travel")
                ? linkage.anglesAtTravel(row.si("travel"), Rotation.COUNTER_CLOCKWISE)
                        .inward()
                : row.si("angle from HDC");
        return new MovingThrow(body, Rotation.COUNTER_CLOCKWISE, angle, speed, 0, gasLoad(row, linkage, angle));
    }

    private static double radius(PublishedRow row) {
        return row.si("crank");
    }

    private static boolean vertical(PublishedRow row) {
        return row.has("gravity") || row.inputs().getOrDefault("machine", "").startsWith("vertical");
    }

    private static double gravity(PublishedRow row) {
        if (row.has("g")) {
            return row.si("g");
        }
        boolean weighs = row.has("gravity") || row.has("machine");
        return weighs ? TEXTBOOK_GRAVITY : 0;
    }

    private static double speed(PublishedRow row) {
        if (row.has("piston acceleration (given)")) {
            // the shaft speed at which the piston has that acceleration
            MovingThrow unit = new MovingThrow(
                    ThrowBody.of(
                            KinematicExamples.linkage(row),
                            new ReciprocatingMasses(1, 0, 0),
                            new ConnectingRod(0, OptionalDouble.empty(), OptionalDouble.empty()),
                            new Crank(0, 0),
                            Friction.NONE,
                            0,
                            0),
                    Rotation.COUNTER_CLOCKWISE,
                    row.si("angle from HDC"),
                    1,
                    0,
                    0);
            return Math.sqrt(row.si("piston acceleration (given)")
                    / unit.solve().motion().acceleration()[0]);
        }
        // a static example weighs no inertia, whatever the speed
        return row.has("speed") ? row.si("speed") : 1;
    }

    private static double reciprocating(PublishedRow row) {
        if (row.has("reciprocating weight")) {
            return mass(row, "reciprocating weight");
        }
        if (row.has("reciprocating mass")) {
            return row.si("reciprocating mass");
        }
        return row.has("mass") ? row.si("mass") : 0;
    }

    /** A weight in pounds over the g of the example: its mass where the pound-force is a weight there. */
    private static double mass(PublishedRow row, String weight) {
        return row.si(weight) * 9.80665 / row.si("g");
    }

    private static ConnectingRod rod(PublishedRow row, Linkage linkage) {
        double mass = row.has("rod weight") ? mass(row, "rod weight") : row.has("rod mass") ? row.si("rod mass") : 0;
        if (mass == 0) {
            return new ConnectingRod(0, OptionalDouble.empty(), OptionalDouble.empty());
        }
        double b;
        if (row.has("mass centre from crank pin")) {
            b = row.si("mass centre from crank pin");
        } else {
            String from = row.has("mass centre from small end")
                    ? "mass centre from small end"
                    : "mass centre from crosshead pin";
            b = linkage.rodLength() - row.si(from);
        }
        double arm = linkage.rodLength() - b;
        double inertia;
        if (row.has("radius of gyration")) {
            inertia = mass * row.si("radius of gyration") * row.si("radius of gyration");
        } else {
            // hung from its small end: T = 2 pi sqrt(I / (m g arm))
            double swings = row.si("pendulum about small end", 0);
            double period = row.si("pendulum about small end", 1) / swings;
            double perRadian = period / (2 * Math.PI);
            inertia = mass * TEXTBOOK_GRAVITY * arm * perRadian * perRadian - mass * arm * arm;
        }
        return new ConnectingRod(mass, OptionalDouble.of(b), OptionalDouble.of(inertia));
    }

    /** From chambers held at the printed pressures; the frame holds none where the example counts none. */
    private static double gasLoad(PublishedRow row, Linkage linkage, double angle) {
        double head = pressure(
                row,
                "head-end pressure",
                "pressure above",
                "net pressure",
                "pressure",
                "net pressure pushing to crank");
        if (head == 0) {
            return 0;
        }
        double crank = pressure(row, "crank-end pressure", "pressure below");
        double load = chamberLoad(linkage, angle, head, Side.HEAD, row.si("bore"), 0);
        if (crank != 0) {
            load += chamberLoad(linkage, angle, crank, Side.CRANK, row.si("bore"), row.si("rod diameter"));
        }
        return load;
    }

    private static double chamberLoad(
            Linkage linkage, double angle, double pressure, Side side, double bore, double rod) {
        IdealValves still = new IdealValves(0, 0, OptionalDouble.empty(), OptionalDouble.empty());
        Chamber chamber = new Chamber(
                "held", side, Optional.of(AnyThrow.STAGE), bore, rod, new Clearance(0.1, true), still, 0, Limits.NONE);
        DutyPoint duty = new DutyPoint(
                "held",
                1,
                Map.of(
                        AnyThrow.STAGE,
                        new StageConditions(
                                OptionalDouble.of(pressure), OptionalDouble.empty(), OptionalDouble.of(2 * pressure))),
                Map.of("held", new ChamberCondition(ChamberState.HELD_OPEN, 0, Clearance.NONE)));
        Instant instant = new Instant(
                Machines.running(Machines.of(
                        List.of(Machines.changed(
                                Machines.boosterThrow(0),
                                "A",
                                Machines.boosterThrow(0).place(),
                                linkage,
                                Friction.NONE,
                                List.of(chamber))),
                        Rotation.COUNTER_CLOCKWISE,
                        new Site(1e5, 0, false),
                        duty,
                        Limits.NONE)),
                0);
        return instant.turnTo(angle).at(Column.GAS_LOAD);
    }

    private static double pressure(PublishedRow row, String... names) {
        for (String name : names) {
            if (row.has(name)) {
                return row.si(name);
            }
        }
        return 0;
    }
}
