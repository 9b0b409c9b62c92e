package throwbench.app.drawing;

import java.util.List;

/** Names without what they all begin with: "north cylinder, head end" beside "north cylinder, crank end" is "head end". */
public final class ShortNames {

    private ShortNames() {}

    /** One short name for each name; a name alone, or one that is a beginning of the others, stays as it is. */
    public static List<String> of(List<String> names) {
        int shared = names.size() < 2 ? 0 : names.get(0).length();
        for (String name : names) {
            int same = 0;
            while (same < Math.min(shared, name.length())
                    && name.charAt(same) == names.get(0).charAt(same)) {
                same++;
            }
            shared = same;
        }
        // only whole words are taken off, and something is left of every name
        int cut = shared;
        while (cut > 0 && !Character.isWhitespace(names.get(0).charAt(cut - 1))) {
            cut--;
        }
        int from = cut;
        return names.stream()
                .map(name -> name.substring(from).isBlank() ? name : name.substring(from))
                .toList();
    }
}
