package throwbench.solver.chamber;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.trial.Numbers;

/** Random periodic tables: uneven steps, level pieces, jumps. */
class MonotoneCurvePropertyTest {

    /** A table and its curve. */
    @SuppressWarnings("ArrayRecordComponent") // never compared
    record Table(double[] angles, double[] values, MonotoneCurve curve) {

        double angle(int k) {
            return angles[k % angles.length] + (k >= angles.length ? Angles.TURN : 0);
        }

        double value(int k) {
            return values[k % angles.length];
        }

        double at(double angle) {
            return curve.at(Angles.wrap(angle));
        }
    }

    @Provide
    Arbitrary<Table> tables() {
        Arbitrary<Double> pressures = Arbitraries.oneOf(Numbers.between(1e5, 2e6), Arbitraries.of(1e5, 5e5));
        return Combinators.combine(
                        Numbers.between(0.01, 1).list().ofMinSize(9).ofMaxSize(40),
                        pressures.list().ofSize(40),
                        Numbers.between(0, 1))
                .as(MonotoneCurvePropertyTest::table);
    }

    /** The first step as a share of the rest puts the first row anywhere in it. */
    private static Table table(List<Double> steps, List<Double> pressures, double offset) {
        double whole = steps.stream().mapToDouble(Double::doubleValue).sum();
        double[] angles = new double[steps.size()];
        double at = offset * steps.get(0);
        for (int k = 0; k < angles.length; k++) {
            angles[k] = at / whole * Angles.TURN;
            at += steps.get((k + 1) % angles.length);
        }
        double[] values = Arrays.copyOf(
                pressures.stream().mapToDouble(Double::doubleValue).toArray(), angles.length);
        return new Table(angles, values, new MonotoneCurve(angles, values));
    }

    @Property
    void rowsAreMetExactly(@ForAll("tables") Table table) {
        for (int k = 0; k < table.angles().length; k++) {
            assertEquals(table.values()[k], table.curve().at(table.angles()[k]), 0);
        }
    }

    @Property
    void betweenTwoRowsTheCurveOnlyRisesOrOnlyFalls(@ForAll("tables") Table table) {
        for (int k = 0; k < table.angles().length; k++) {
            double sense = Math.signum(table.value(k + 1) - table.value(k));
            double before = table.value(k);
            for (int i = 1; i <= 20; i++) {
                double next = table.at(table.angle(k) + i * (table.angle(k + 1) - table.angle(k)) / 20.0);
                double step = next - before;
                // 1e-9 Pa is the last digit of these pressures
                assertTrue(sense == 0 ? Math.abs(step) < 1e-8 : sense * step > -1e-8, () -> "step " + step);
                before = next;
            }
        }
    }

    @Property
    void slopesAgreeFromBothSidesOfARow(@ForAll("tables") Table table) {
        for (int k = 1; k <= table.angles().length; k++) {
            double h = 1e-4 * Math.min(table.angle(k) - table.angle(k - 1), angleAfter(table, k) - table.angle(k));
            double row = table.value(k);
            // one-sided differences of second order: exact for a parabola, off by h² times the cube's coefficient
            double left = (3 * row - 4 * table.at(table.angle(k) - h) + table.at(table.angle(k) - 2 * h)) / (2 * h);
            double right = (-3 * row + 4 * table.at(table.angle(k) + h) - table.at(table.angle(k) + 2 * h)) / (2 * h);
            double scale = 2e6 / h * 1e-4;
            assertEquals(left, right, 1e-6 * scale);
        }
    }

    private static double angleAfter(Table table, int k) {
        int n = table.angles().length;
        return k + 1 < n ? table.angles()[k + 1] : table.angles()[(k + 1) % n] + Angles.TURN;
    }

    /** The cubic of a piece in Bernstein's form, its slopes by the harmonic mean written as a quotient of products. */
    @Property
    void secondFormulationAgrees(@ForAll("tables") Table table) {
        int n = table.angles().length;
        for (int k = 0; k < n; k++) {
            double h = table.angle(k + 1) - table.angle(k);
            double m0 = slope(table, k);
            double m1 = slope(table, (k + 1) % n);
            double[] b = {
                table.value(k), table.value(k) + h * m0 / 3, table.value(k + 1) - h * m1 / 3, table.value(k + 1)
            };
            for (double u : new double[] {0.1, 0.37, 0.5, 0.93}) {
                double w = 1 - u;
                double expected = w * w * w * b[0] + 3 * w * w * u * b[1] + 3 * w * u * u * b[2] + u * u * u * b[3];
                // an angle taken into one turn loses 1e-15 rad, over which the steepest piece rises by 1e-6 Pa
                assertEquals(expected, table.at(table.angle(k) + u * h), 1e-5);
            }
        }
    }

    /** 3 (h₁ + h₂) d₁ d₂ / ((2h₂ + h₁) d₂ + (h₂ + 2h₁) d₁). */
    private static double slope(Table table, int k) {
        int n = table.angles().length;
        int before = (k + n - 1) % n;
        double h1 = table.angle(before + 1) - table.angle(before);
        double h2 = table.angle(k + 1) - table.angle(k);
        double d1 = (table.value(k) - table.value(before)) / h1;
        double d2 = (table.value(k + 1) - table.value(k)) / h2;
        return d1 * d2 > 0 ? 3 * (h1 + h2) * d1 * d2 / ((2 * h2 + h1) * d2 + (h2 + 2 * h1) * d1) : 0;
    }
}
