package throwbench.solver.fluid;

import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * Liquids that plunger pumps handle, each at one temperature and about atmospheric pressure. The bulk modulus is the
 * isothermal one of the air-free liquid; it grows with pressure, for water by 8 % up to 300 bar.
 */
public final class LiquidTable {

    private static final String IAPWS = "IAPWS-95 (Wagner and Pruss 2002) by the library CoolProp 8.0.0";

    private static final List<Entry> ENTRIES = List.of(
            entry("water", 20, 998.2, 2.18e9, 2339, IAPWS + "; handbooks print 2.18 GPa"),
            entry("water 40 degC", 40, 992.2, 2.26e9, 7385, IAPWS),
            entry("water 60 degC", 60, 983.2, 2.247e9, 19947, IAPWS),
            entry(
                    "sea water",
                    20,
                    1024.8,
                    2.346e9,
                    2285,
                    "35 g/kg: UNESCO equation of state of sea water 1980, from memory, for density and modulus;"
                            + " vapour pressure by the library CoolProp 8.0.0 (MITSW)"),
            entry(
                    "light oil",
                    20,
                    865,
                    1.8e9,
                    1,
                    "mineral oil ISO VG 32: modulus from engineeringtoolbox.com/bulk-modulus-elasticity-d_585.html;"
                            + " density and a bound of the vapour pressure from memory"),
            entry(
                    "kerosene",
                    20,
                    800,
                    1.43e9,
                    300,
                    "modulus: K. Subramanya, 1000 Solved Problems in Fluid Mechanics, ch. 1; density and vapour pressure from"
                            + " memory"),
            entry("ethylene glycol", 20, 1113, 3.0e9, 8, "from memory; the modulus to about 5 %"),
            entry(
                    "ethylene glycol 50 %",
                    20,
                    1065,
                    2.8e9,
                    1813,
                    "half by mass in water: density by Melinder (2010) in the library CoolProp 8.0.0; vapour pressure of the"
                            + " water by Raoult's law; modulus from memory, to about 10 %"));

    private LiquidTable() {}

    /**
     * One liquid.
     *
     * @param name as the user chooses it
     * @param temperature of the figures, K
     * @param source where each figure comes from
     */
    public record Entry(String name, double temperature, Liquid liquid, String source) {}

    private static Entry entry(
            String name, double celsius, double density, double bulkModulus, double vapourPressure, String source) {
        return new Entry(name, celsius + 273.15, new Liquid(density, bulkModulus, vapourPressure), source);
    }

    /** The liquid of that name, without regard to case. */
    public static Optional<Entry> find(String name) {
        String wanted = name.strip().toLowerCase(Locale.ROOT);
        return ENTRIES.stream()
                .filter(entry -> entry.name().toLowerCase(Locale.ROOT).equals(wanted))
                .findFirst();
    }

    public static List<String> names() {
        return ENTRIES.stream().map(Entry::name).toList();
    }
}
