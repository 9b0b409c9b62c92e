package throwbench.solver.fluid;

import java.util.List;

/**
 * One gas of the built-in table.
 *
 * @param name as a machine file writes it
 * @param otherNames formula and other spellings that are understood as well
 * @param molarMass M, kg/mol
 * @param source of molar mass and critical point
 */
public record Gas(
        String name,
        List<String> otherNames,
        double molarMass,
        CriticalPoint critical,
        IdealHeatCapacity heatCapacity,
        String source) {

    public Gas {
        otherNames = List.copyOf(otherNames);
        if (!(molarMass > 0)) {
            throw new IllegalArgumentException(name + ": molar mass " + molarMass + " kg/mol");
        }
    }
}
