package throwbench.solver.document.check;

import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.document.json.Node;

/** What duty points, load steps and ranges say of stages and chambers fits what these are. */
final class DutyRules {

    private final Roster roster;

    DutyRules(Roster roster) {
        this.roster = roster;
    }

    void judgePoint(Fields point) {
        if (point.has("stages")) {
            roster.stages().keySet().forEach(stage -> judgeStage(point, stage));
        }
        judgeChambers(point);
    }

    private void judgeStage(Fields point, String stage) {
        boolean used = !roster.chambersOf(stage).isEmpty();
        Fields conditions = point.member("stages", stage);
        Node stages = point.node().member("stages");
        if (used && stages != null && stages.type() == Node.Type.OBJECT && stages.member(stage) == null) {
            String user = roster.chambersOf(stage).get(0).text("name");
            point.checked()
                    .flaws()
                    .add(stages, stage, FlawList.MISSING, "the pressures of the stage that " + user + " uses");
        }
        if (!conditions.isThere()) {
            return;
        }
        SeriesRules.judgeConditions(conditions, point, roster);
        if (used && !conditions.has("suctionTemperature")) {
            temperature(conditions, stage);
        }
        pressures(conditions, stage, conditions.number("suctionPressure"), conditions.number("dischargePressure"));
    }

    private void temperature(Fields conditions, String stage) {
        Optional<Fields> fluid =
                roster.fluidOf(stage).filter(held -> held.kind().equals("gas"));
        boolean flow = roster.chambersOf(stage).stream()
                .anyMatch(chamber -> Roster.cycleOf(chamber).equals("valve-flow"));
        boolean mixture = fluid.isPresent() && fluid.get().has("mixture");
        if (mixture || (flow && fluid.isPresent())) {
            String wanted = "a temperature, as \"32 degC\", for a " + (mixture ? "mixture" : "flow through valves");
            conditions.fault("suctionTemperature", FlawList.MISSING, wanted);
        }
    }

    void judgeRange(Fields range) {
        OptionalDouble suction = end(range, "suctionPressure", 1);
        pressures(range, range.name(), suction, end(range, "dischargePressure", 0));
        OptionalDouble relief = range.number("reliefPressure");
        if (suction.isPresent() && relief.isPresent() && !(relief.getAsDouble() > suction.getAsDouble())) {
            range.fault("reliefPressure", range.said("reliefPressure"), "more than the greatest suction pressure");
        }
    }

    private static OptionalDouble end(Fields range, String name, int index) {
        if (range.values(name).size() != 2) {
            return OptionalDouble.empty();
        }
        return range.checked()
                .quantity(range.values(name).get(index))
                .map(q -> OptionalDouble.of(q.value()))
                .orElse(OptionalDouble.empty());
    }

    /** Discharge above suction inside every chamber, losses taken in. */
    private void pressures(Fields conditions, String stage, OptionalDouble suction, OptionalDouble discharge) {
        if (suction.isEmpty() || discharge.isEmpty()) {
            return;
        }
        for (Fields chamber : roster.chambersOf(stage)) {
            if (!rises(chamber, suction.getAsDouble(), discharge.getAsDouble())) {
                String found = pressureSaid(conditions, "dischargePressure") + " with "
                        + pressureSaid(conditions, "suctionPressure") + " and the losses of " + chamber.text("name");
                conditions.fault("dischargePressure", found, "a discharge pressure above the suction pressure");
                return;
            }
        }
    }

    private static String pressureSaid(Fields conditions, String name) {
        return conditions.values(name).isEmpty() ? conditions.said(name) : "these values of " + name;
    }

    private static boolean rises(Fields chamber, double suction, double discharge) {
        Fields cycle = chamber.object("cycle");
        return switch (Roster.cycleOf(chamber)) {
            case "ideal-valves" ->
                discharge * (1 + loss(cycle, "dischargeLoss")) > suction * (1 - loss(cycle, "suctionLoss"));
            case "liquid" -> discharge + loss(cycle, "dischargeLoss") > suction - loss(cycle, "suctionLoss");
            default -> true;
        };
    }

    private static double loss(Fields cycle, String name) {
        return cycle.number(name).orElse(0);
    }

    /** Of a duty point or a load step. */
    void judgeChambers(Fields point) {
        for (Fields condition : point.items("chambers")) {
            roster.chamber(condition.name()).ifPresent(chamber -> state(condition, Roster.cycleOf(chamber)));
        }
    }

    private static void state(Fields condition, String cycle) {
        String state = condition.text("state");
        boolean failed = state.equals("failed-suction") || state.equals("failed-discharge");
        if (cycle.equals("recorded")) {
            recorded(condition, state);
        } else if (failed && !cycle.isEmpty() && !cycle.equals("valve-flow")) {
            String found = '"' + state + "\" for a chamber with the cycle " + cycle;
            condition.fault("state", found, "a failed valve only with the cycle valve-flow");
        }
        if (failed && !condition.has("leakArea")) {
            condition.fault("leakArea", FlawList.MISSING, "the effective area of the leak, as \"2.5 cm2\"");
        }
    }

    private static void recorded(Fields condition, String state) {
        if (!state.equals("working")) {
            condition.fault(
                    "state", '"' + state + "\" for a recorded pressure", "\"working\": the record is what it is");
        }
        if (condition.has("addedClearance")) {
            condition.fault("addedClearance", condition.said("addedClearance"), "no pocket on a recorded pressure");
        }
    }
}
