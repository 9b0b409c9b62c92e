package throwbench.solver.document.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class UnitSystemTest {

    @Test
    void everyDimensionIsShownInAUnitOfItsOwn() {
        for (UnitSystem system : UnitSystem.values()) {
            for (Dimension dimension : Dimension.values()) {
                assertTrue(dimension.holds(system.unit(dimension)), system + " " + dimension);
            }
        }
    }

    @Test
    void showsInBothSystemsWithMark() {
        assertEquals("4.1 bar g", UnitSystem.SI.show(511_325, Dimension.GAS_PRESSURE, PressureMark.GAUGE, 101_325, 4));
        // 4.1e5 Pa / 6894.757 Pa = 59.4655
        assertEquals(
                "59.47 psi g", UnitSystem.US.show(511_325, Dimension.GAS_PRESSURE, PressureMark.GAUGE, 101_325, 4));
        assertEquals("32 °C", UnitSystem.SI.show(305.15, Dimension.TEMPERATURE, PressureMark.NONE, 0, 4));
        assertEquals("89.6 °F", UnitSystem.US.show(305.15, Dimension.TEMPERATURE, PressureMark.NONE, 0, 4));
        assertEquals("2.4 kN·m", UnitSystem.SI.show(2400, Dimension.TORQUE, PressureMark.NONE, 0, 4));
        assertEquals("4 in²", UnitSystem.US.show(0.00258064, Dimension.AREA, PressureMark.NONE, 0, 4));
        assertEquals("14 %", UnitSystem.US.show(0.14, Dimension.SHARE, PressureMark.NONE, 0, 4));
        assertEquals("1.29", UnitSystem.SI.show(1.29, Dimension.NUMBER, PressureMark.NONE, 0, 4));
        assertEquals("1.8 m", UnitSystem.SI.show(1.8, Dimension.HEAD, PressureMark.NONE, 0, 4));
    }

    @Test
    void eachIsTheOthersOther() {
        assertEquals(UnitSystem.US, UnitSystem.SI.other());
        assertEquals(UnitSystem.SI, UnitSystem.US.other());
    }
}
