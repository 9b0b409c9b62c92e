package throwbench.solver.document.check;

import java.util.HashSet;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** Stages in series: no stage feeds itself, and a balanced pressure has a stage on its other end. */
final class SeriesRules {

    private static final String SUCTION = "suctionPressure";
    private static final String DISCHARGE = "dischargePressure";

    private SeriesRules() {}

    /** One fault for each loop, at its first stage in the file. */
    static void judgeStages(Roster roster) {
        Set<String> settled = new HashSet<>();
        for (Map.Entry<String, Fields> stage : roster.stages().entrySet()) {
            Set<String> chain = new HashSet<>();
            String at = stage.getKey();
            Fields link = stage.getValue();
            while (link != null && !settled.contains(at) && chain.add(at)) {
                at = link.given("follows").orElse("");
                link = roster.stages().get(at);
            }
            if (link != null && chain.contains(at)) {
                link.fault("follows", "stages that follow each other in a ring", "a first stage");
            }
            settled.addAll(chain);
        }
    }

    /** A stage's conditions at a duty point. */
    static void judgeConditions(Fields conditions, Fields point, Roster roster) {
        Fields stage = roster.stages().get(conditions.name());
        if (stage == null) {
            return;
        }
        if (conditions.hasWord(SUCTION)) {
            Optional<String> first = stage.given("follows");
            if (first.isEmpty()) {
                conditions.fault(
                        SUCTION, "\"balanced\" for a stage that follows none", "a pressure, or a stage to follow");
            } else {
                otherEnd(conditions, SUCTION, point.member("stages", first.get()), DISCHARGE);
            }
        }
        if (conditions.hasWord(DISCHARGE)) {
            if (roster.followersOf(conditions.name()).isEmpty()) {
                conditions.fault(
                        DISCHARGE, "\"balanced\" for a stage that none follows", "a pressure, or a stage that follows");
            }
            for (String follower : roster.followersOf(conditions.name())) {
                otherEnd(conditions, DISCHARGE, point.member("stages", follower), SUCTION);
            }
        }
    }

    private static void otherEnd(Fields conditions, String balanced, Fields other, String end) {
        if (other.isThere() && other.quantity(end).isPresent()) {
            String found = "\"balanced\" with " + other.name() + "'s " + other.said(end) + " on the other end";
            conditions.fault(balanced, found, "\"balanced\" on both ends, or a pressure on both");
        }
    }
}
