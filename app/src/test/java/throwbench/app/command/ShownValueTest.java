package throwbench.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class ShownValueTest {

    @Test
    void largeValuesTakeALargerUnit() {
        assertEquals(new ShownValue("123.5", "kN"), ShownValue.of(123456, "N", 123456));
        assertEquals(new ShownValue("0.05", "kN"), ShownValue.of(50, "N", 120e3));
        assertEquals(new ShownValue("999.9", "N"), ShownValue.of(999.9, "N", 999.9));
        assertEquals(new ShownValue("2.08", "kN m"), ShownValue.of(2080, "N m", 2080));
        assertEquals(new ShownValue("81", "kW"), ShownValue.of(81e3, "W", 81e3));
        assertEquals(new ShownValue("8.5", "MPa"), ShownValue.of(8.5e6, "Pa", 8.5e6));
        assertEquals(new ShownValue("850", "kPa"), ShownValue.of(8.5e5, "Pa", 8.5e5));
    }

    @Test
    void temperaturesAreCelsiusAndSharesHaveNoUnit() {
        assertEquals(new ShownValue("150", "degC"), ShownValue.of(423.15, "K", 423.15));
        assertEquals(new ShownValue("-3.15", "degC"), ShownValue.of(270, "K", 270));
        assertEquals(new ShownValue("0.6812", ""), ShownValue.of(0.68123, "1", 0.7));
        assertEquals(new ShownValue("15", "deg"), ShownValue.of(15, "deg", 15));
    }

    @Test
    void nothingIsZeroAndExtremesArePowersOfTen() {
        assertEquals(new ShownValue("0", "N"), ShownValue.of(0, "N", 0));
        assertEquals(new ShownValue("0", "N"), ShownValue.of(-0.0, "N", 0));
        assertEquals(new ShownValue("1.234E+9", "kg/s"), ShownValue.of(1.2341e9, "kg/s", 1));
        assertEquals(new ShownValue("1.234E-8", "m"), ShownValue.of(1.2341e-8, "m", 1));
    }

    @Test
    void anglesAreDegreesToATenth() {
        assertEquals("360.0 deg", ShownValue.degrees(2 * Math.PI));
        assertEquals("57.3 deg", ShownValue.degrees(1));
    }

    @Test
    void percentagesCarryTheirSign() {
        assertEquals("+12.3 %", ShownValue.percent(0.1234));
        assertEquals("-100.0 %", ShownValue.percent(-1));
        assertEquals("0.0 %", ShownValue.percent(0));
        assertEquals("-0.004 %", ShownValue.percent(-4.1e-5));
        assertEquals("> +9999 %", ShownValue.percent(1e6));
        assertEquals("< -9999 %", ShownValue.percent(-1e6));
    }
}
