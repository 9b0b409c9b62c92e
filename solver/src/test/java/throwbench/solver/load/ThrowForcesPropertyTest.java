package throwbench.solver.load;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static throwbench.solver.load.DifferentiatedThrow.first;
import static throwbench.solver.load.DifferentiatedThrow.second;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;
import throwbench.solver.trial.AnyMovingThrow;
import throwbench.solver.trial.MovingThrow;

/** What must hold for any throw at any instant, whatever the speed does: identities and a second method. */
class ThrowForcesPropertyTest {

    /** Rounding of terms that cancel, as a share of the largest of them. */
    private static final double ROUNDING = 1e-11;

    @Property
    void motionIsThatOfDifferentiatedPositions(@ForAll(supplier = AnyMovingThrow.class) MovingThrow at) {
        DifferentiatedThrow d = new DifferentiatedThrow(at);
        ThrowMotion motion = at.solve().motion();
        double r = at.body().linkage().crankRadius();
        double w = at.speed();
        double a = w * w + Math.abs(at.alpha());
        assertEquals(-first(d.reach), motion.velocity()[0], ROUNDING * r * w);
        assertEquals(-second(d.reach), motion.acceleration()[0], steep(at) * r * a);
        assertEquals(first(d.rodAngle), motion.rodVelocity()[0], steep(at) * w);
        assertEquals(second(d.rodAngle), motion.rodAcceleration()[0], steep(at) * a);
    }

    /** A rod that stands almost across the line of stroke magnifies rounding. */
    private static double steep(MovingThrow at) {
        double sin = at.body().linkage().greatestSinRodAngle();
        double cos = Math.sqrt(1 - sin * sin);
        return ROUNDING / (cos * cos * cos);
    }

    @Property
    void powerOfTheShaftIsGasFrictionAndChangeOfEnergy(@ForAll(supplier = AnyMovingThrow.class) MovingThrow at) {
        MovingThrow.Solved solved = at.solve();
        DifferentiatedThrow d = new DifferentiatedThrow(at);
        double velocity = first(d.reach);
        double pushed = (at.gasLoad() + packing(at, velocity) + guideFriction(at, solved, velocity)) * velocity;
        double power = solved.forces().torque()[0] * at.speed();
        assertEquals(-pushed + d.energyRate(), power, 100 * steep(at) * scale(at) * at.speed());
    }

    @Property
    void forcesOnTheMovingPartsChangeTheirMomentum(@ForAll(supplier = AnyMovingThrow.class) MovingThrow at) {
        MovingThrow.Solved solved = at.solve();
        ThrowForces f = solved.forces();
        DifferentiatedThrow d = new DifferentiatedThrow(at);
        ThrowBody body = at.body();
        double velocity = first(d.reach);
        double along = at.gasLoad() + packing(at, velocity) + guideFriction(at, solved, velocity);
        double mass = body.masses().total() + body.rodMass();
        double gx = -body.gravity() * Math.sin(body.axisDirection());
        double gy = -body.gravity() * Math.cos(body.axisDirection());
        double rounding = 100 * steep(at) * scale(at) / body.linkage().crankRadius();
        assertEquals(d.momentumRateX(), f.mainBearingX()[0] + along + mass * gx, rounding);
        assertEquals(d.momentumRateY(), f.mainBearingY()[0] + f.guideForce()[0] + mass * gy, rounding);
        assertEquals(-d.momentumRateX(), f.frameForceX()[0], rounding);
        assertEquals(-d.momentumRateY(), f.frameForceY()[0], rounding);
    }

    @Property
    void pistonRodCarriesWhatThePistonNeeds(@ForAll(supplier = AnyMovingThrow.class) MovingThrow at) {
        DifferentiatedThrow d = new DifferentiatedThrow(at);
        ThrowForces f = at.solve().forces();
        ThrowBody body = at.body();
        double pistonAndRod = body.masses().pistonAndRod();
        double gx = -body.gravity() * Math.sin(body.axisDirection());
        // Newton for piston and rod alone: m x'' = gas + packing + weight - T
        double wanted = at.gasLoad() + packing(at, first(d.reach)) + pistonAndRod * gx - pistonAndRod * second(d.reach);
        double rounding = 100 * steep(at) * scale(at) / body.linkage().crankRadius();
        assertEquals(wanted, f.pistonRodLoad()[0], rounding);
        assertEquals(-body.masses().total() * second(d.reach), f.inertiaLoad()[0], rounding);
        assertEquals(at.gasLoad() - body.masses().total() * second(d.reach), f.rodLoad()[0], rounding);
    }

    @Property
    void frictionTakesPowerAndNeverGivesIt(@ForAll(supplier = AnyMovingThrow.class) MovingThrow at) {
        ThrowBody body = at.body();
        MovingThrow.Solved with = at.solve();
        MovingThrow without = with(at, new Friction(0, 0), at.rotation(), body.linkage(), body.axisDirection());
        double packingAlone = with(
                        at,
                        new Friction(body.friction().packing(), 0),
                        at.rotation(),
                        body.linkage(),
                        body.axisDirection())
                .solve()
                .forces()
                .torque()[0];
        double lost = packingAlone - without.solve().forces().torque()[0];
        double velocity = with.motion().velocity()[0];
        assertEquals(
                body.friction().packing() * Math.abs(velocity),
                lost * at.speed(),
                100 * steep(at) * scale(at) * at.speed());
    }

    /** A clockwise throw is the mirror image, by its line of stroke's direction, of a counter-clockwise one. */
    @Property
    void clockwiseIsTheMirrorImage(@ForAll(supplier = AnyMovingThrow.class) MovingThrow at) {
        Linkage own = at.body().linkage();
        Linkage mirrored = new Linkage(own.crankRadius(), own.rodLength(), -own.guideOffset());
        // the mirror lies along the line of stroke; the vertical is mirrored with the machine, so that the sine of the
        // axis direction (along the stroke) stays and its cosine (across) turns over
        Rotation other = at.rotation() == Rotation.CLOCKWISE ? Rotation.COUNTER_CLOCKWISE : Rotation.CLOCKWISE;
        MovingThrow image = with(
                at, at.body().friction(), other, mirrored, Math.PI - at.body().axisDirection());
        ThrowForces f = at.solve().forces();
        ThrowForces g = image.solve().forces();
        double rounding = 100 * steep(at) * scale(at) / own.crankRadius();
        assertEquals(f.rodLoad()[0], g.rodLoad()[0], rounding);
        assertEquals(f.pistonRodLoad()[0], g.pistonRodLoad()[0], rounding);
        assertEquals(f.guideForce()[0], -g.guideForce()[0], rounding);
        assertEquals(f.crossheadPinX()[0], g.crossheadPinX()[0], rounding);
        assertEquals(f.crossheadPinY()[0], -g.crossheadPinY()[0], rounding);
        assertEquals(f.crankPinX()[0], g.crankPinX()[0], rounding);
        assertEquals(f.crankPinY()[0], -g.crankPinY()[0], rounding);
        assertEquals(f.mainBearingX()[0], g.mainBearingX()[0], rounding);
        assertEquals(f.mainBearingY()[0], -g.mainBearingY()[0], rounding);
        assertEquals(f.torque()[0], g.torque()[0], rounding * own.crankRadius());
    }

    private static MovingThrow with(
            MovingThrow at, Friction friction, Rotation rotation, Linkage linkage, double axisDirection) {
        ThrowBody b = at.body();
        ThrowBody changed = new ThrowBody(
                linkage,
                b.masses(),
                b.rodMass(),
                b.rodMassCentre(),
                b.rodInertia(),
                b.crankNet(),
                friction,
                axisDirection,
                b.gravity());
        return new MovingThrow(changed, rotation, at.crankAngle(), at.speed(), at.alpha(), at.gasLoad());
    }

    private static double packing(MovingThrow at, double velocity) {
        return -Math.signum(velocity) * at.body().friction().packing();
    }

    private static double guideFriction(MovingThrow at, MovingThrow.Solved solved, double velocity) {
        return -Math.signum(velocity)
                * at.body().friction().guideCoefficient()
                * Math.abs(solved.forces().guideForce()[0]);
    }

    /** A torque as large as the largest part of the throw's. */
    private static double scale(MovingThrow at) {
        ThrowBody b = at.body();
        double r = b.linkage().crankRadius();
        double acceleration = r * (at.speed() * at.speed() + Math.abs(at.alpha())) + b.gravity();
        double inertia = (b.masses().total() + b.rodMass() + Math.abs(b.crankNet()) / r) * acceleration;
        double length = b.linkage().rodLength();
        double turning = b.rodInertia() / (length * length) * acceleration;
        return r * (Math.abs(at.gasLoad()) + b.friction().packing() + inertia + turning);
    }
}
