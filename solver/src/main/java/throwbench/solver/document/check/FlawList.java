package throwbench.solver.document.check;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import throwbench.solver.document.json.Flaw;
import throwbench.solver.document.json.Node;

/** Flaws of one file as they are found; handed on in the order of the file. */
final class FlawList {

    static final String MISSING = "missing";

    private final List<Flaw> flaws = new ArrayList<>();

    void add(Flaw flaw) {
        flaws.add(flaw);
    }

    /** At a value. */
    void add(Node node, String found, String wanted) {
        add(new Flaw(node.memberStart(), node.path(), found, wanted));
    }

    /** At a key that an object has or should have. */
    void add(Node object, String key, String found, String wanted) {
        Node member = object.member(key);
        int offset = member == null ? object.start() : member.memberStart();
        add(new Flaw(offset, object.path(key), found, wanted));
    }

    List<Flaw> inOrder() {
        flaws.sort(Comparator.comparingInt(Flaw::offset));
        return List.copyOf(flaws);
    }
}
