package throwbench.solver.document.check;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Who works with whom: chambers by name and by stage, the fluids of stages, the stages that follow others. */
final class Roster {

    private final Map<String, Fields> chambers = new LinkedHashMap<>();
    private final Map<String, List<Fields>> chambersOfStage = new LinkedHashMap<>();
    private final Map<String, Fields> stages = new LinkedHashMap<>();
    private final Map<String, Fields> fluids = new HashMap<>();
    private final Map<String, List<String>> followers = new HashMap<>();

    Roster(Fields machine) {
        machine.items("fluids").forEach(fluid -> fluids.put(fluid.name(), fluid));
        for (Fields stage : machine.items("stages")) {
            stages.put(stage.name(), stage);
            stage.given("follows").ifPresent(first -> followers
                    .computeIfAbsent(first, any -> new ArrayList<>())
                    .add(stage.name()));
        }
        for (Fields one : machine.items("throws")) {
            for (Fields chamber : one.items("chambers")) {
                chamber.given("name").ifPresent(name -> chambers.putIfAbsent(name, chamber));
                chamber.given("stage").ifPresent(stage -> chambersOfStage
                        .computeIfAbsent(stage, any -> new ArrayList<>())
                        .add(chamber));
            }
        }
    }

    Optional<Fields> chamber(String name) {
        return Optional.ofNullable(chambers.get(name));
    }

    Map<String, Fields> stages() {
        return stages;
    }

    /** The chambers that use a stage; none where none does. */
    List<Fields> chambersOf(String stage) {
        return chambersOfStage.getOrDefault(stage, List.of());
    }

    /** The fluid of a stage, where both are declared. */
    Optional<Fields> fluidOf(String stage) {
        Fields declared = stages.get(stage);
        return declared == null ? Optional.empty() : declared.given("fluid").map(fluids::get);
    }

    /** The stages fed by a stage. */
    List<String> followersOf(String stage) {
        return followers.getOrDefault(stage, List.of());
    }

    /** The kind of a chamber's cycle; empty where it has none. */
    static String cycleOf(Fields chamber) {
        return chamber.object("cycle").kind();
    }
}
