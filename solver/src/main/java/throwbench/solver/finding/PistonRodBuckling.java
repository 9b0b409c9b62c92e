package throwbench.solver.finding;

import java.util.Locale;
import java.util.Optional;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.machine.PistonRodPart;
import throwbench.solver.revolution.Extreme;

/**
 * Safety of the piston rod against buckling, 1: the critical load of a round rod of the free length with pinned ends over the
 * greatest compression at its crosshead end. Euler's load, below the transition slenderness Johnson's. No default limit.
 */
public final class PistonRodBuckling implements ThrowCriterion {

    private static final Statement STATEMENT = Statement.atLeast(
                    LimitKey.PISTON_ROD_BUCKLING, "1", "piston rod buckling")
            .is("critical load (Euler; Johnson below the transition slenderness; pinned ends) / greatest compression")
            .from(
                    "column formulas: T. H. Wentzell, Machine Design (2007), ex. 3.5 and 3.6, p. 53 and 55; the safety wanted is"
                            + " the manufacturer's");

    @Override
    public Statement statement() {
        return STATEMENT;
    }

    @Override
    public Found find(JudgedDuty duty, int throwIndex) {
        PistonRodPart part = PistonRod.part(duty.described(throwIndex));
        Optional<String> missing = PistonRod.needs()
                .value("diameter", part.diameter())
                .value("freeLength", part.freeLength())
                .value("elasticModulus", part.elasticModulus())
                .value("yieldStrength", part.yieldStrength())
                .missing();
        if (missing.isPresent()) {
            return Found.none(missing.get());
        }
        Extreme least = PistonRod.load(duty, throwIndex).least();
        if (!(least.value() < 0)) {
            return Found.none("the piston rod is never in compression");
        }
        Strut strut = roundRod(
                part.diameter().orElseThrow(),
                part.freeLength().orElseThrow(),
                part.elasticModulus().orElseThrow(),
                part.yieldStrength().orElseThrow());
        return Found.at(least, strut.criticalLoad() / -least.value()).noting(strut.note());
    }

    /** A round bar of diameter and length in m with pinned ends; its radius of gyration is a quarter of the diameter. */
    static Strut roundRod(double diameter, double length, double elasticModulus, double yieldStrength) {
        return new Strut(PistonRod.area(diameter), length / (diameter / 4), elasticModulus, yieldStrength);
    }

    /**
     * A straight bar under compression.
     *
     * @param area m²
     * @param slenderness effective length over radius of gyration, 1
     * @param elasticModulus Pa
     * @param yieldStrength Pa
     */
    record Strut(double area, double slenderness, double elasticModulus, double yieldStrength) {

        /** √(2π²E/σ_y), where Euler's curve and Johnson's parabola meet at half the yield strength. */
        double transition() {
            return Math.sqrt(2 * Math.PI * Math.PI * elasticModulus / yieldStrength);
        }

        /** The load at which it buckles, N. */
        double criticalLoad() {
            return slenderness < transition() ? johnson() : euler();
        }

        /** π² E A/λ², N. */
        double euler() {
            return Math.PI * Math.PI * elasticModulus * area / (slenderness * slenderness);
        }

        private double johnson() {
            double ratio = slenderness / transition();
            return area * yieldStrength * (1 - ratio * ratio / 2);
        }

        private String note() {
            return String.format(
                    Locale.ROOT,
                    "critical load %.4g kN by %s: slenderness %.4g, transition at %.4g",
                    criticalLoad() / 1e3,
                    slenderness < transition() ? "Johnson" : "Euler",
                    slenderness,
                    transition());
        }
    }
}
