package throwbench.solver.document.check;

import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.document.attached.AttachedFiles;
import throwbench.solver.document.attached.AttachedFiles.Attached;
import throwbench.solver.document.quantity.Refusal;

/** A chamber's diameters, and what its cycle needs. */
final class ChamberRules {

    private ChamberRules() {}

    static void judge(Fields chamber, Roster roster, AttachedFiles files) {
        diameters(chamber);
        String kind = Roster.cycleOf(chamber);
        if (kind.equals("recorded")) {
            recording(chamber.object("cycle"), files);
            return;
        }
        // of an unknown cycle nothing more can be said than that
        if (!kind.isEmpty()) {
            missing(chamber, "stage", "the name of its stage");
            missing(chamber, "clearance", "a share of the swept volume, as \"14 %\", or a volume");
            fluid(chamber, kind, roster);
        }
    }

    private static void missing(Fields chamber, String name, String wanted) {
        if (!chamber.has(name)) {
            chamber.fault(name, FlawList.MISSING, wanted);
        }
    }

    private static void diameters(Fields chamber) {
        OptionalDouble bore = chamber.number("bore");
        OptionalDouble inner = chamber.number("innerDiameter");
        if (bore.isPresent() && inner.isPresent() && inner.getAsDouble() >= bore.getAsDouble()) {
            String found = chamber.said("innerDiameter") + " with " + chamber.said("bore");
            chamber.fault("innerDiameter", found, "less than the bore");
        }
    }

    private static void fluid(Fields chamber, String kind, Roster roster) {
        Optional<Fields> fluid = chamber.given("stage").flatMap(roster::fluidOf);
        if (fluid.isEmpty()) {
            return;
        }
        String held = fluid.get().kind();
        boolean clash = !held.isEmpty() && held.equals("gas") == kind.equals("liquid");
        if (clash) {
            String found =
                    '"' + kind + "\" for the " + held + " \"" + fluid.get().name() + '"';
            String wanted =
                    held.equals("gas") ? "one of ideal-valves, valve-flow, recorded" : "one of liquid, recorded";
            chamber.object("cycle").fault("kind", found, wanted);
        }
    }

    private static void recording(Fields cycle, AttachedFiles files) {
        Optional<String> file = cycle.given("file").filter(path -> !path.isBlank());
        if (file.isEmpty()) {
            return;
        }
        Attached attached = files.read(file.get());
        attached.recording().ifPresent(recording -> cycle.checked().record(cycle.node(), recording));
        Optional<Refusal> refusal = attached.refusal();
        refusal.ifPresent(wrong -> cycle.fault("file", wrong.found(), wrong.wanted()));
    }
}
