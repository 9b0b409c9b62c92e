package throwbench.solver.mechanism;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.apache.commons.math3.analysis.differentiation.DerivativeStructure;
import org.apache.commons.math3.analysis.differentiation.FiniteDifferencesDifferentiator;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import throwbench.solver.trial.AnyLinkage;

/** Geometry of any linkage that turns: inverse functions, dead centres, and derivatives by differences. */
class LinkagePropertyTest {

    @Property
    void travelAtCrankEndDeadCentreIsTheStroke(
            @ForAll(supplier = AnyLinkage.class) Linkage linkage, @ForAll Rotation rotation) {
        double stroke = linkage.stroke();
        assertEquals(0, linkage.travel(0, rotation), 1e-14 * linkage.rodLength());
        assertEquals(
                stroke, linkage.travel(linkage.crankEndDeadCentre(rotation), rotation), 1e-13 * linkage.rodLength());
        double l = linkage.rodLength();
        double r = linkage.crankRadius();
        double e = linkage.guideOffset();
        double legs = Math.sqrt((l + r) * (l + r) - e * e) - Math.sqrt((l - r) * (l - r) - e * e);
        assertEquals(legs, stroke, 1e-12 * l, "the two legs of the dead-centre triangles");
    }

    /** Second method: the outermost places of the piston, searched for by Commons Math. */
    @Property(tries = 100)
    void deadCentresAreTheOutermostPlaces(
            @ForAll(supplier = AnyLinkage.class) Linkage linkage, @ForAll Rotation rotation) {
        double guess = linkage.crankEndDeadCentre(rotation);
        double found = new BrentOptimizer(1e-10, 1e-12)
                .optimize(
                        new MaxEval(500),
                        new UnivariateObjectiveFunction(angle -> linkage.travel(angle, rotation)),
                        GoalType.MAXIMIZE,
                        new SearchInterval(guess - 1, guess + 1))
                .getValue();
        assertEquals(linkage.stroke(), found, 1e-12 * linkage.rodLength());
    }

    @Property
    void bothRotationsRunThroughTheSameGeometry(
            @ForAll(supplier = AnyLinkage.class) Linkage linkage, @ForAll @IntRange(max = 9999) int some) {
        double angle = some * Angles.TURN / 10_000;
        double forwards = linkage.travel(angle, Rotation.COUNTER_CLOCKWISE);
        double backwards = linkage.travel(Angles.TURN - angle, Rotation.CLOCKWISE);
        assertEquals(forwards, backwards, 1e-13 * linkage.rodLength());
        assertEquals(
                Angles.TURN,
                linkage.crankEndDeadCentre(Rotation.CLOCKWISE) + linkage.crankEndDeadCentre(Rotation.COUNTER_CLOCKWISE),
                1e-13);
        assertEquals(1, linkage.timeRatio(Rotation.CLOCKWISE) * linkage.timeRatio(Rotation.COUNTER_CLOCKWISE), 1e-12);
    }

    /** Inverse kinematics: the angles found for a travel have that travel, each on its stroke. */
    @Property
    void anglesAtATravelHaveThatTravel(
            @ForAll(supplier = AnyLinkage.class) Linkage linkage,
            @ForAll Rotation rotation,
            @ForAll @IntRange(max = 1000) int share) {
        // rounding must not take it out of the stroke
        double travel = Math.min(linkage.stroke(), linkage.stroke() * share / 1000);
        Linkage.TravelAngles angles = linkage.anglesAtTravel(travel, rotation);
        double crankEnd = linkage.crankEndDeadCentre(rotation);
        double rounding = 1e-13 * linkage.rodLength() / linkage.crankRadius() * linkage.rodLength();
        assertEquals(travel, linkage.travel(angles.inward(), rotation), rounding);
        assertEquals(travel, linkage.travel(angles.outward(), rotation), rounding);
        assertTrue(angles.inward() >= 0 && angles.inward() <= crankEnd + 1e-7, () -> angles + " about " + crankEnd);
        assertTrue(
                angles.outward() >= crankEnd - 1e-7 && angles.outward() <= Angles.TURN,
                () -> angles + " about " + crankEnd);
    }

    /** And the travel at an angle leads back to it. */
    @Property
    void travelLeadsBackToTheAngle(
            @ForAll(supplier = AnyLinkage.class) Linkage linkage,
            @ForAll Rotation rotation,
            @ForAll @IntRange(min = 10, max = 9990) int some) {
        double angle = some * Angles.TURN / 10_000;
        double crankEnd = linkage.crankEndDeadCentre(rotation);
        double travel = Math.max(0, Math.min(linkage.stroke(), linkage.travel(angle, rotation)));
        Linkage.TravelAngles angles = linkage.anglesAtTravel(travel, rotation);
        double back = angle < crankEnd ? angles.inward() : angles.outward();
        // near a dead centre the travel says little about the angle
        double near = Math.min(Math.abs(angle - crankEnd), Math.min(angle, Angles.TURN - angle));
        double flat = Math.max(near, 1e-7) * (1 - linkage.greatestSinRodAngle());
        assertEquals(angle, back, 1e-12 / flat + (near < 1e-6 ? 1e-6 : 0));
    }

    /** Second method: derivatives of the travel and the rod angle by nine-point differences. */
    @Property
    void derivativesAreThoseOfDifferences(
            @ForAll(supplier = AnyLinkage.class) Linkage linkage,
            @ForAll Rotation rotation,
            @ForAll @IntRange(max = 9999) int some) {
        double angle = some * Angles.TURN / 10_000;
        Sweep sweep = Sweep.single(linkage, rotation);
        sweep.turnTo(angle, Approach.JUST_AFTER);
        double sin = linkage.greatestSinRodAngle();
        double sharp = 1 - sin; // the curve bends in about this angle
        FiniteDifferencesDifferentiator differences = new FiniteDifferencesDifferentiator(9, 0.02 * sharp);
        double theta = linkage.headEndAngle() + rotation.sign() * angle;
        DerivativeStructure at = new DerivativeStructure(1, 2, 0, theta);
        DerivativeStructure reach = differences.differentiate(linkage::reach).value(at);
        DerivativeStructure rod = differences
                .differentiate((double t) -> Math.asin(linkage.sinRodAngle(t)))
                .value(at);
        double l = linkage.rodLength();
        assertEquals(reach.getPartialDerivative(1), sweep.reach1()[0], 1e-9 / sharp * l);
        assertEquals(reach.getPartialDerivative(2), sweep.reach2()[0], 1e-7 / (sharp * sharp) * l);
        assertEquals(rod.getPartialDerivative(1), sweep.rodAngle1()[0], 1e-9 / sharp);
        assertEquals(rod.getPartialDerivative(2), sweep.rodAngle2()[0], 1e-7 / (sharp * sharp));
        assertEquals(rod.getValue(), sweep.rodAngle()[0], 1e-13);
        assertEquals(linkage.greatestReach() - reach.getValue(), sweep.travel()[0], 1e-14 * l);
    }

    @Property
    void stretchesCutATurnIntoItsStrokes(
            @ForAll(supplier = AnyLinkage.class) Linkage linkage,
            @ForAll Rotation rotation,
            @ForAll @IntRange(min = 8, max = 2000) int count,
            @ForAll @IntRange(max = 9999) int some) {
        Sweep sweep = Sweep.wholeTurn(linkage, rotation, some * Angles.TURN / 10_000, count);
        Strokes strokes = sweep.strokes();
        int next = 0;
        for (int k = 0; k < strokes.count(); k++) {
            assertEquals(next, strokes.from(k), "no station is left out");
            for (int i = strokes.from(k); i < strokes.to(k); i++) {
                double angle = sweep.crankAngle()[i];
                double wrapped = Angles.TURN - angle < 1e-9 ? 0 : angle;
                boolean inward = wrapped < linkage.crankEndDeadCentre(rotation) - 1e-9;
                assertEquals(inward, strokes.inward(k), "station " + i + " at " + angle);
            }
            next = strokes.to(k);
        }
        assertEquals(count, next);
    }
}
