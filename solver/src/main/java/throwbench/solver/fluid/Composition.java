package throwbench.solver.fluid;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * The gases of a mixture that are really there, with fractions that sum to 1 exactly.
 *
 * @param gases of the table, none twice in a mixture that names each once
 * @param fractions mole fraction of each, above 0
 */
record Composition(List<Gas> gases, List<Double> fractions) {

    Composition {
        gases = List.copyOf(gases);
        fractions = List.copyOf(fractions);
    }

    static Composition of(GasMixture mixture) {
        double sum = mixture.moleFractions().values().stream()
                .mapToDouble(Double::doubleValue)
                .sum();
        List<Gas> gases = new ArrayList<>();
        List<Double> fractions = new ArrayList<>();
        mixture.moleFractions().forEach((name, fraction) -> {
            if (fraction > 0) {
                gases.add(GasTable.find(name).orElseThrow());
                fractions.add(fraction / sum);
            }
        });
        return new Composition(gases, fractions);
    }

    double molarMass() {
        double mass = 0;
        for (int i = 0; i < gases.size(); i++) {
            mass += fractions.get(i) * gases.get(i).molarMass();
        }
        return mass;
    }

    /** c_p/R of the mixture as an ideal gas. */
    double heatCapacity(double temperature) {
        double sum = 0;
        for (int i = 0; i < gases.size(); i++) {
            sum += fractions.get(i) * gases.get(i).heatCapacity().at(temperature);
        }
        return sum;
    }

    /** ∫ c_p/(R T) dT of the mixture as an ideal gas. */
    double entropyRise(double start, double end) {
        double sum = 0;
        for (int i = 0; i < gases.size(); i++) {
            sum += fractions.get(i) * gases.get(i).heatCapacity().entropyRise(start, end);
        }
        return sum;
    }

    boolean isKnownAt(double temperature) {
        return gases.stream().allMatch(gas -> gas.heatCapacity().isKnownAt(temperature));
    }

    /** The highest temperature at which the heat capacity of every part is known, K. */
    double hottest() {
        return gases.stream().mapToDouble(gas -> gas.heatCapacity().to()).min().orElseThrow();
    }

    /** Says of the first part whose polynomial ends before this temperature where it ends. */
    String outOfRange(double temperature) {
        Gas first = gases.stream()
                .filter(gas -> !gas.heatCapacity().isKnownAt(temperature))
                .findFirst()
                .orElseThrow();
        return String.format(
                Locale.ROOT,
                "the heat capacity of %s is known from %.0f K to %.0f K, not at %.1f K",
                first.name(),
                first.heatCapacity().from(),
                first.heatCapacity().to(),
                temperature);
    }
}
