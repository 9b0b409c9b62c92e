package throwbench.solver.trial;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.SplittableRandom;

/**
 * The machine file of a random machine: any number of throws, any cycle that fits its fluid, any driver and chamber state. The
 * same number gives the same file. Nearly all of them are valid; what is not must be said so.
 */
public final class MachineText {

    private static final List<String> GASES = List.of("methane", "carbon dioxide", "nitrogen", "hydrogen", "propane");

    private final SplittableRandom random;
    private final boolean liquid;
    private final List<String> states = new ArrayList<>();

    private MachineText(long number) {
        random = new SplittableRandom(number);
        liquid = chance(0.25);
    }

    /** The text of machine number so and so. */
    public static String of(long number) {
        return new MachineText(number).machine();
    }

    private boolean chance(double share) {
        return random.nextDouble() < share;
    }

    private double between(double least, double greatest) {
        return least + (greatest - least) * random.nextDouble();
    }

    /** Over several powers of ten, evenly by their logarithm. */
    private double scale(double least, double greatest) {
        return least * Math.pow(greatest / least, random.nextDouble());
    }

    private static String text(double value, String unit) {
        return "\"" + String.format(Locale.ROOT, "%.6g", value) + " " + unit + "\"";
    }

    private String machine() {
        List<String> throwTexts = new ArrayList<>();
        int count = chance(0.6) ? 1 : 1 + random.nextInt(6);
        double stroke = scale(20, 400);
        for (int i = 0; i < count; i++) {
            throwTexts.add(oneThrow(i, stroke));
        }
        double suction = scale(0.4, 120);
        double ratio = liquid ? scale(1.5, 200) : scale(1.08, 9);
        return "{ \"throwbench\": 1, \"name\": \"any\", \"site\": { \"gravity\": " + chance(0.5)
                + " },\n \"drive\": { \"speed\": "
                + text(scale(40, 1800), "rpm") + ", \"rotation\": \""
                + (chance(0.5) ? "clockwise" : "counter-clockwise") + "\"" + driver(stroke)
                + " },\n \"fluids\": { \"f\": " + fluid()
                + " }, \"stages\": { \"s\": { \"fluid\": \"f\" } },\n \"throws\": [ " + String.join(",\n  ", throwTexts)
                + " ],\n \"dutyPoints\": [ { \"name\": \"d\", \"stages\": { \"s\": { \"suctionPressure\": "
                + text(suction, "bar a") + ", \"suctionTemperature\": " + text(between(260, 330), "K")
                + ", \"dischargePressure\": " + text(suction * ratio, "bar a") + " } }, \"chambers\": { "
                + String.join(", ", states) + " } } ] }";
    }

    private String driver(double stroke) {
        double inertia = scale(0.05, 20) * Math.pow(stroke / 100, 5);
        String with = ", \"rotatingInertia\": " + text(inertia * 10, "kg m2") + ", \"driver\": { \"kind\": ";
        int kind = random.nextInt(10);
        if (kind < 6) {
            return "";
        }
        return kind < 8
                ? with + "\"constant-torque\" }"
                : with + "\"slip\", \"ratedTorque\": " + text(scale(0.1, 50), "kN m") + ", \"ratedSlip\": "
                        + text(between(0.3, 6), "%") + " }";
    }

    private String fluid() {
        if (liquid) {
            return "{ \"kind\": \"liquid\", \"density\": " + text(between(700, 1300), "kg/m3") + ", \"bulkModulus\": "
                    + text(between(0.8, 3), "GPa") + ", \"vapourPressure\": " + text(scale(0.5, 30), "kPa a") + " }";
        }
        if (chance(0.3)) {
            double first = Math.round(between(0.05, 0.95) * 1000) / 1000.0;
            int gas = random.nextInt(GASES.size());
            return "{ \"kind\": \"gas\", \"mixture\": { \"" + GASES.get(gas) + "\": " + first + ", \""
                    + GASES.get((gas + 1) % GASES.size()) + "\": " + Math.round((1 - first) * 1000) / 1000.0
                    + " }, \"model\": \"" + (chance(0.5) ? "real" : "perfect") + "\" }";
        }
        return "{ \"kind\": \"gas\", \"molarMass\": " + text(scale(2, 60), "g/mol") + ", \"isentropicExponent\": "
                + String.format(Locale.ROOT, "%.4f", between(1.05, 1.67)) + " }";
    }

    private String oneThrow(int index, double stroke) {
        double r = stroke / 2;
        double l = r * between(2.5, 8);
        double e = chance(0.6) ? 0 : (l - r) * between(-0.4, 0.4);
        boolean trunk = chance(0.3);
        double kilograms = scale(0.2, 8) * Math.pow(stroke / 100, 3);
        List<String> chambers = new ArrayList<>();
        int sides = trunk || chance(0.3) ? 1 : 2;
        double bore = stroke * between(0.3, 2);
        for (int c = 0; c < sides; c++) {
            chambers.add(
                    chamber(index + " " + c, c == 0 ? "head" : "crank", bore, c == 0 ? 0 : bore * between(0.15, 0.7)));
        }
        return "{ \"name\": \"" + index + "\", \"crankPhase\": " + text(between(0, 360), "deg")
                + ", \"axisDirection\": "
                + text(between(-180, 180), "deg") + ", \"shaftPosition\": " + text(index * stroke * 2, "mm")
                + ", \"crankRadius\": " + text(r, "mm") + ", \"rodLength\": " + text(l, "mm") + ", \"guideOffset\": "
                + text(e, "mm") + ", \"masses\": { \"piston\": " + text(kilograms, "kg")
                + (trunk
                        ? ""
                        : ", \"pistonRod\": " + text(kilograms / 2, "kg") + ", \"crosshead\": " + text(kilograms, "kg"))
                + " }, \"connectingRod\": { \"mass\": " + text(kilograms * between(0, 2), "kg")
                + (chance(0.5) ? ", \"massCentreFromCrankPin\": " + text(l * between(0, 1), "mm") : "")
                + " }, \"crank\": { \"unbalance\": " + text(kilograms * r / 1000, "kg m")
                + " }, \"friction\": { \"packing\": "
                + text(chance(0.5) ? 0 : scale(1, 500), "N") + ", \"guideCoefficient\": "
                + (chance(0.5) ? "0" : String.format(Locale.ROOT, "%.3f", between(0, 0.15))) + " }, \"chambers\": [ "
                + String.join(", ", chambers) + " ] }";
    }

    private String chamber(String name, String side, double bore, double inner) {
        boolean flow = !liquid && chance(0.35);
        condition(name, flow);
        return "{ \"name\": \"" + name + "\", \"side\": \"" + side + "\", \"stage\": \"s\", \"bore\": "
                + text(bore, "mm")
                + ", \"innerDiameter\": " + text(inner, "mm") + ", \"clearance\": " + text(scale(1, 120), "%")
                + ", \"cycle\": " + (liquid ? liquidCycle() : flow ? flowCycle(bore) : idealCycle()) + " }";
    }

    private void condition(String name, boolean flow) {
        int kind = random.nextInt(10);
        String pocket = chance(0.3) ? ", \"addedClearance\": " + text(scale(2, 150), "%") : "";
        if (kind == 0) {
            states.add("\"" + name + "\": { \"state\": \"held-open\"" + pocket + " }");
        } else if (kind == 1 && flow) {
            states.add("\"" + name + "\": { \"state\": \"" + (chance(0.5) ? "failed-suction" : "failed-discharge")
                    + "\", \"leakArea\": " + text(scale(0.001, 5), "cm2") + pocket + " }");
        } else if (kind == 2) {
            states.add("\"" + name + "\": { \"state\": \"working\"" + pocket + " }");
        }
    }

    private String idealCycle() {
        String exponents = chance(0.3)
                ? ", \"compressionExponent\": " + String.format(Locale.ROOT, "%.3f", between(1, 1.6))
                        + ", \"expansionExponent\": " + String.format(Locale.ROOT, "%.3f", between(1, 1.6))
                : "";
        return "{ \"kind\": \"ideal-valves\", \"suctionLoss\": " + text(between(0, 8), "%") + ", \"dischargeLoss\": "
                + text(between(0, 8), "%") + exponents + " }";
    }

    private String flowCycle(double bore) {
        double area = bore * bore / 100;
        return "{ \"kind\": \"valve-flow\", \"suctionFlowArea\": " + text(area * scale(0.002, 0.15), "cm2")
                + ", \"dischargeFlowArea\": " + text(area * scale(0.002, 0.15), "cm2") + " }";
    }

    private String liquidCycle() {
        return "{ \"kind\": \"liquid\", \"suctionLoss\": " + text(between(0, 0.1), "bar") + ", \"dischargeLoss\": "
                + text(between(0, 2), "bar") + ", \"lossLaw\": \"" + (chance(0.5) ? "constant" : "speed-squared")
                + "\", \"closingLag\": " + text(chance(0.5) ? 0 : between(0, 12), "deg") + " }";
    }
}
