package throwbench.solver.document.json;

import java.util.List;
import java.util.Optional;

/**
 * What became of a text.
 *
 * @param root the object that the text holds; empty where it is no JSON object
 * @param count number of values
 * @param flaws what is wrong; repeated keys and broken characters leave the root whole
 */
public record Parsed(Optional<Node> root, int count, List<Flaw> flaws) {

    public Parsed {
        flaws = List.copyOf(flaws);
    }
}
