package throwbench.solver.document.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.io.IOException;
import java.io.InputStream;
import java.math.BigDecimal;
import java.math.MathContext;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** Units against their definitions, one way, in decimal arithmetic; the table names each definition's source. */
class UnitTest {

    private record Row(Dimension dimension, String symbol, BigDecimal offset, BigDecimal factor, BigDecimal divisor) {

        double exactSi(String value) {
            BigDecimal shifted = new BigDecimal(value).add(offset);
            return shifted.multiply(factor)
                    .divide(divisor, MathContext.DECIMAL128)
                    .doubleValue();
        }
    }

    private static List<Row> table() throws IOException {
        List<Row> rows = new ArrayList<>();
        try (InputStream in = UnitTest.class.getResourceAsStream("units.csv")) {
            String text = new String(Objects.requireNonNull(in).readAllBytes(), StandardCharsets.UTF_8);
            for (String line :
                    text.lines().filter(l -> !l.startsWith("#")).skip(1).toList()) {
                String[] cell = line.split(",", 6);
                assertFalse(cell[5].isBlank(), "no source: " + line);
                rows.add(new Row(
                        Dimension.valueOf(cell[0]),
                        cell[1],
                        new BigDecimal(cell[2]),
                        new BigDecimal(cell[3]),
                        new BigDecimal(cell[4])));
            }
        }
        return rows;
    }

    private static Unit unit(Row row) {
        return row.dimension().units().stream()
                .filter(unit -> unit.symbol().equals(row.symbol()))
                .findFirst()
                .orElseThrow(() -> new AssertionError("no unit " + row));
    }

    @Test
    void everyUnitStandsInTheTableOfDefinitions() throws IOException {
        Set<Unit> missing = EnumSet.allOf(Unit.class);
        table().forEach(row -> missing.remove(unit(row)));
        assertEquals(Set.of(), missing);
    }

    @Test
    void everyUnitGivesTheSiValueOfItsDefinition() throws IOException {
        for (Row row : table()) {
            for (String value : List.of("1", "0.1", "8.5", "75", "-40", "1234567")) {
                double exact = row.exactSi(value);
                // factor and sum are rounded once each: two units in the last place of the larger part
                double tolerance =
                        4e-16 * Math.max(Math.abs(exact), row.offset().doubleValue());
                assertEquals(exact, unit(row).toSi(Double.parseDouble(value)), tolerance, row + " at " + value);
            }
        }
    }

    @Test
    void differencesLeaveTheZeroPointOut() {
        assertEquals(9, Unit.DEGREE_FAHRENHEIT.differenceFromSi(5), 1e-15, "NIST SP 811, B.8: 1 degF is 5/9 K");
        assertEquals(5, Unit.DEGREE_FAHRENHEIT.differenceToSi(9), 1e-15);
        assertEquals(2, Unit.DEGREE_CELSIUS.differenceToSi(2));
        assertEquals(0.002, Unit.MILLIMETRE.differenceToSi(2));
    }

    // published, rounded: NIST SP 811, 2008, table B.8; tolerance half a unit of the last printed digit
    @Test
    void agreesWithThePrintedTable() {
        assertEquals(6.894757e3, Unit.POUND_PER_SQUARE_INCH.toSi(1), 0.5e-3);
        assertEquals(7.456999e2, Unit.HORSEPOWER.toSi(1), 0.5e-4);
        assertEquals(1.355818, Unit.POUND_FORCE_FOOT.toSi(1), 0.5e-6);
        assertEquals(4.214011e-2, Unit.POUND_SQUARE_FOOT.toSi(1), 0.5e-8);
        assertEquals(1.601846e1, Unit.POUND_PER_CUBIC_FOOT.toSi(1), 0.5e-5);
        assertEquals(4.719474e-4, Unit.CUBIC_FOOT_PER_MINUTE.toSi(1), 0.5e-10);
        assertEquals(6.309020e-5, Unit.GALLON_PER_MINUTE.toSi(1), 0.5e-11);
        assertEquals(5.08e-3, Unit.FOOT_PER_MINUTE.toSi(1), 1e-18);
    }

    @Test
    void everyDimensionHasACoherentUnitAndNoSymbolTwice() {
        for (Dimension dimension : Dimension.values()) {
            assertEquals(1, dimension.coherentUnit().toSi(1));
            long symbols =
                    dimension.units().stream().map(Unit::symbol).distinct().count();
            assertEquals(dimension.units().size(), symbols, dimension.toString());
        }
    }

    @Test
    void displaysAsTheSiWrites() {
        assertEquals("kN·m", Unit.KILONEWTON_METRE.display());
        assertEquals("kg·m²", Unit.KILOGRAM_SQUARE_METRE.display());
        assertEquals("°C", Unit.DEGREE_CELSIUS.display());
        assertEquals("°", Unit.DEGREE.display());
        assertEquals("in²", Unit.SQUARE_INCH.display());
        assertEquals("lb·ft²", Unit.POUND_SQUARE_FOOT.display());
        assertEquals("kg/m³", Unit.KILOGRAM_PER_CUBIC_METRE.display());
        assertEquals("µm", Unit.MICROMETRE.display());
    }
}
