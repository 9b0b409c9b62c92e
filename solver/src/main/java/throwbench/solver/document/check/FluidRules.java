package throwbench.solver.document.check;

import throwbench.solver.document.json.Node;
import throwbench.solver.document.quantity.NumberText;
import throwbench.solver.document.quantity.Quantity;
import throwbench.solver.fluid.GasMixture;

/** A gas is given by its constants or by its parts, and the parts make a whole. */
final class FluidRules {

    private FluidRules() {}

    static void judge(Fields fluid) {
        if (!fluid.kind().equals("gas")) {
            return;
        }
        if (fluid.has("mixture")) {
            mixture(fluid);
            return;
        }
        missing(fluid, "molarMass", "\"27.2 g/mol\"");
        missing(fluid, "isentropicExponent", "1.29");
        if (fluid.text("model").equals("real")) {
            fluid.fault("model", "\"real\" for a gas given by its constants", "\"perfect\", or a mixture");
        }
    }

    private static void missing(Fields fluid, String name, String example) {
        if (!fluid.has(name)) {
            fluid.fault(name, FlawList.MISSING, example + " or the like, or a mixture");
        }
    }

    private static void mixture(Fields fluid) {
        if (fluid.has("molarMass") || fluid.has("isentropicExponent")) {
            String beside = fluid.has("molarMass") ? "molarMass" : "isentropicExponent";
            fluid.fault("mixture", "a mixture beside " + beside, "one or the other");
        }
        double sum = 0;
        for (Node part : fluid.values("mixture")) {
            Quantity fraction = fluid.checked().quantity(part).orElse(null);
            if (fraction == null) {
                return;
            }
            if (fraction.value() < 0) {
                fluid.fault("mixture", fraction.text() + " of " + part.name(), "fractions of 0 or more");
                return;
            }
            sum += fraction.value();
        }
        boolean whole = Math.abs(sum - 1) <= GasMixture.SUM_TOLERANCE;
        if (!whole) {
            fluid.fault("mixture", "fractions that sum to " + NumberText.write(sum, 9), "fractions that sum to 1");
        }
    }
}
