package throwbench.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class ReadableTest {

    @Test
    void largeValuesTakeALargerUnit() {
        assertEquals(new Readable("123.5", "kN"), Readable.of(123456, "N", 123456));
        assertEquals(new Readable("0.05", "kN"), Readable.of(50, "N", 120e3));
        assertEquals(new Readable("999.9", "N"), Readable.of(999.9, "N", 999.9));
        assertEquals(new Readable("2.08", "kN m"), Readable.of(2080, "N m", 2080));
        assertEquals(new Readable("81", "kW"), Readable.of(81e3, "W", 81e3));
        assertEquals(new Readable("8.5", "MPa"), Readable.of(8.5e6, "Pa", 8.5e6));
        assertEquals(new Readable("850", "kPa"), Readable.of(8.5e5, "Pa", 8.5e5));
    }

    @Test
    void temperaturesAreCelsiusAndSharesHaveNoUnit() {
        assertEquals(new Readable("150", "degC"), Readable.of(423.15, "K", 423.15));
        assertEquals(new Readable("-3.15", "degC"), Readable.of(270, "K", 270));
        assertEquals(new Readable("0.6812", ""), Readable.of(0.68123, "1", 0.7));
        assertEquals(new Readable("15", "deg"), Readable.of(15, "deg", 15));
    }

    @Test
    void nothingIsZeroAndExtremesArePowersOfTen() {
        assertEquals(new Readable("0", "N"), Readable.of(0, "N", 0));
        assertEquals(new Readable("0", "N"), Readable.of(-0.0, "N", 0));
        assertEquals(new Readable("1.234E+9", "kg/s"), Readable.of(1.2341e9, "kg/s", 1));
        assertEquals(new Readable("1.234E-8", "m"), Readable.of(1.2341e-8, "m", 1));
    }

    @Test
    void anglesAreDegreesToATenth() {
        assertEquals("360.0 deg", Readable.degrees(2 * Math.PI));
        assertEquals("57.3 deg", Readable.degrees(1));
    }

    @Test
    void percentagesCarryTheirSign() {
        assertEquals("+12.3 %", Readable.percent(0.1234));
        assertEquals("-100.0 %", Readable.percent(-1));
        assertEquals("0.0 %", Readable.percent(0));
        assertEquals("-0.004 %", Readable.percent(-4.1e-5));
        assertEquals("> +9999 %", Readable.percent(1e6));
        assertEquals("< -9999 %", Readable.percent(-1e6));
    }
}
