package throwbench.solver.fluid;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import org.junit.jupiter.api.Test;

class LiquidTableTest {

    /**
     * Equation of state of sea water 1980 at atmospheric pressure, N. P. Fofonoff and R. C. Millard, UNESCO technical papers
     * in marine science 44 (1983), from memory: g/kg, °C → kg/m³.
     */
    private static double seaWaterDensity(double s, double t) {
        double pure = 999.842594
                + t * (6.793952e-2 + t * (-9.095290e-3 + t * (1.001685e-4 + t * (-1.120083e-6 + t * 6.536332e-9))));
        double first = 8.24493e-1 + t * (-4.0899e-3 + t * (7.6438e-5 + t * (-8.2467e-7 + t * 5.3875e-9)));
        double second = -5.72466e-3 + t * (1.0227e-4 - t * 1.6546e-6);
        return pure + s * first + s * Math.sqrt(s) * second + 4.8314e-4 * s * s;
    }

    /** Secant bulk modulus of the same at atmospheric pressure, bar. */
    private static double seaWaterModulus(double s, double t) {
        double pure = 19652.21 + t * (148.4206 + t * (-2.327105 + t * (1.360477e-2 - t * 5.155288e-5)));
        double first = 54.6746 + t * (-0.603459 + t * (1.09987e-2 - t * 6.1670e-5));
        double second = 7.944e-2 + t * (1.6483e-2 - t * 5.3009e-4);
        return pure + s * first + s * Math.sqrt(s) * second;
    }

    /** The formulas recalled meet the check values printed with them. */
    @Test
    void seaWaterEquationMeetsItsPrintedCheckValues() {
        assertEquals(999.96675, seaWaterDensity(0, 5), 5e-6);
        assertEquals(1027.67547, seaWaterDensity(35, 5), 5e-6);
        assertEquals(1023.34306, seaWaterDensity(35, 25), 5e-6);
        assertEquals(20337.80375, seaWaterModulus(0, 5), 5e-6);
        assertEquals(22185.93358, seaWaterModulus(35, 5), 5e-6);
        assertEquals(23726.34949, seaWaterModulus(35, 25), 5e-6);
    }

    @Test
    void seaWaterFollowsItsEquationOfState() {
        Liquid liquid = LiquidTable.find("sea water").orElseThrow().liquid();
        assertEquals(seaWaterDensity(35, 20), liquid.density(), 0.05);
        assertEquals(seaWaterModulus(35, 20) * 1e5, liquid.bulkModulus(), 5e5);
    }

    /** Raoult's law over half glycol, half water by mass: 18.01528 and 62.068 g/mol. */
    @Test
    void vapourPressureOfHalfGlycolIsThatOfItsWater() {
        double water = 0.5 / 18.01528;
        double share = water / (water + 0.5 / 62.068);
        double pure = LiquidTable.find("water").orElseThrow().liquid().vapourPressure();
        assertEquals(
                share * pure,
                LiquidTable.find("ethylene glycol 50 %").orElseThrow().liquid().vapourPressure(),
                0.5);
    }

    /** A mixture without change of volume has a modulus between; glycol and water bind each other and are stiffer yet. */
    @Test
    void modulusOfHalfGlycolIsAboveThatOfAnIdealMixture() {
        Liquid water = LiquidTable.find("water").orElseThrow().liquid();
        Liquid glycol = LiquidTable.find("ethylene glycol").orElseThrow().liquid();
        double waterVolume = 0.5 / water.density();
        double glycolVolume = 0.5 / glycol.density();
        double ideal = (waterVolume + glycolVolume)
                / (waterVolume / water.bulkModulus() + glycolVolume / glycol.bulkModulus());
        double modulus =
                LiquidTable.find("ethylene glycol 50 %").orElseThrow().liquid().bulkModulus();
        assertTrue(modulus >= ideal && modulus <= 1.15 * ideal, () -> modulus + " Pa, ideal " + ideal + " Pa");
    }

    @Test
    void everyNameFindsAnEntryWithASourceAtATemperature() {
        for (String name : LiquidTable.names()) {
            LiquidTable.Entry entry = LiquidTable.find(name).orElseThrow();
            assertEquals(name, entry.name());
            assertTrue(entry.source().length() > 10 && entry.temperature() >= 293.15, name);
        }
        assertEquals(LiquidTable.find("water"), LiquidTable.find(" Water "));
        assertEquals(Optional.empty(), LiquidTable.find("quicksilver"));
    }
}
