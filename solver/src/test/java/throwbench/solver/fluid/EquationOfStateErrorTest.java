package throwbench.solver.fluid;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.List;
import java.util.Locale;
import java.util.function.Predicate;
import org.junit.jupiter.api.Test;

/**
 * The errors that the validation table states for the real gas, against reference equations of state. A failure prints the
 * whole table, so that it can be stated anew.
 */
class EquationOfStateErrorTest {

    /** A line of the table: which rows, and the greatest error that is stated for them. */
    private record Line(String what, Predicate<CheckRow> rows, double stated) {}

    private static final List<Line> LINES = List.of(
            new Line("Z, single gases to 300 bar", row -> isReference(row, "compressibility", "G5"), 0.0085),
            new Line(
                    "Z, mixtures to 200 bar",
                    row -> isReference(row, "compressibility", "M-") && !isRichInCo2(row),
                    0.02),
            new Line(
                    "Z, mixtures rich in CO2",
                    row -> isReference(row, "compressibility", "M-") && isRichInCo2(row) && !isNearCritical(row),
                    0.025),
            new Line("Z, CO2 with N2 near its critical point", EquationOfStateErrorTest::isNearCritical, 0.105),
            new Line(
                    "real c_p/c_v at 15 degC, 1 atm",
                    row -> isReference(row, "real-gas c_p/c_v", "GAS")
                            && row.id().endsWith("k15"),
                    0.002),
            new Line(
                    "T_d, K, ammonia apart",
                    row -> row.quantity().equals("isentropic discharge temperature") && !isAmmonia(row),
                    0.8),
            new Line(
                    "T_d, K, ammonia",
                    row -> row.quantity().equals("isentropic discharge temperature") && isAmmonia(row),
                    3),
            new Line(
                    "temperature exponent, ammonia apart",
                    row -> row.quantity().equals("temperature exponent") && !isAmmonia(row),
                    0.003),
            new Line(
                    "temperature exponent, ammonia",
                    row -> row.quantity().equals("temperature exponent") && isAmmonia(row),
                    0.008),
            new Line("volume exponent", row -> row.quantity().equals("volume exponent"), 0.009),
            new Line(
                    "dew pressure, single gases",
                    row -> row.quantity().equals("dew pressure")
                            && row.text("mixture").endsWith(" 1"),
                    0.03),
            new Line(
                    "dew pressure, hydrocarbon mixtures",
                    row -> row.quantity().equals("dew pressure")
                            && !row.text("mixture").endsWith(" 1")
                            && !row.text("mixture").contains("water"),
                    0.07),
            new Line(
                    "dew pressure, wet methane",
                    row -> row.quantity().equals("dew pressure")
                            && row.text("mixture").contains("methane 0.98, water"),
                    0.12));

    private static boolean isReference(CheckRow row, String quantity, String id) {
        return row.quantity().equals(quantity)
                && row.id().startsWith(id)
                && !row.id().endsWith("-LK");
    }

    private static boolean isRichInCo2(CheckRow row) {
        return row.text("mixture").startsWith("carbon dioxide");
    }

    private static boolean isNearCritical(CheckRow row) {
        return row.id().equals("M-carbon-dioxide-with-nitrogen-300-100");
    }

    private static boolean isAmmonia(CheckRow row) {
        return row.text("mixture").equals("ammonia 1");
    }

    @Test
    void noErrorIsGreaterThanStated() throws IOException {
        List<CheckRow> rows = CheckRow.all();
        StringBuilder table = new StringBuilder("\nwhat | rows | mean | greatest | stated | worst row\n");
        boolean met = true;
        for (Line line : LINES) {
            double sum = 0;
            double greatest = 0;
            int count = 0;
            String worst = "";
            for (CheckRow row : rows.stream().filter(line.rows()).toList()) {
                double error = Math.abs(row.error(FluidCheckValuesTest.computed(row)));
                worst = error > greatest ? row.id() : worst;
                greatest = Math.max(greatest, error);
                sum += error;
                count++;
            }
            met &= count > 0 && greatest <= line.stated();
            table.append(String.format(
                    Locale.ROOT,
                    "%s | %d | %.4f | %.4f | %.4f | %s%n",
                    line.what(),
                    count,
                    sum / count,
                    greatest,
                    line.stated(),
                    worst));
        }
        assertTrue(met, table::toString);
    }
}
