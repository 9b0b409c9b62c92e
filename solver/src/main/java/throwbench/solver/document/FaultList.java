package throwbench.solver.document;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import throwbench.solver.document.json.Node;

/** Faults of one file as they are found; handed on in the order of the file. */
final class FaultList {

    static final String MISSING = "missing";

    private final List<Placed> faults = new ArrayList<>();

    private record Placed(int offset, Fault fault) {}

    void add(int offset, Fault fault) {
        faults.add(new Placed(offset, fault));
    }

    /** At a value. */
    void add(Node node, String found, String wanted) {
        add(node.memberStart(), new Fault(node.path(), found, wanted));
    }

    /** At a key that an object has or should have. */
    void add(Node object, String key, String found, String wanted) {
        Node member = object.member(key);
        int offset = member == null ? object.start() : member.memberStart();
        add(offset, new Fault(object.path(key), found, wanted));
    }

    List<Fault> inOrder() {
        if (faults.isEmpty()) {
            return List.of();
        }
        faults.sort(Comparator.comparingInt(Placed::offset));
        return faults.stream().map(Placed::fault).toList();
    }
}
