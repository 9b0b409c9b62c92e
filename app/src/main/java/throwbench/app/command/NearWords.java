package throwbench.app.command;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;

/** Words that someone who wrote another one may have meant. */
final class NearWords {

    /** Beyond this, a list of names helps nobody. */
    private static final int LISTED = 12;

    private NearWords() {}

    /** Those of the known words that differ from the written one in little, nearest first. */
    static List<String> of(String written, List<String> known) {
        List<String> near = new ArrayList<>();
        for (String word : known) {
            if (distance(written, word) <= Math.max(1, word.length() / 3)) {
                near.add(word);
            }
        }
        near.sort(Comparator.comparingInt(word -> distance(written, word)));
        return near;
    }

    /** The existing names in quotes, nearest first, a dozen at most and then how many more. */
    static String existing(String written, List<String> known) {
        List<String> sorted = new ArrayList<>(known);
        List<String> near = of(written, known);
        sorted.removeAll(near);
        sorted.addAll(0, near);
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < sorted.size() && i < LISTED; i++) {
            text.append(i == 0 ? "\"" : ", \"").append(sorted.get(i)).append('"');
        }
        int more = sorted.size() - LISTED;
        return more > 0 ? text + " and " + more + " more" : text.toString();
    }

    /** Letters to insert, drop or change to come from one word to the other (Levenshtein), whatever their case. */
    static int distance(String one, String other) {
        String a = one.toLowerCase(Locale.ROOT);
        String b = other.toLowerCase(Locale.ROOT);
        int[] row = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            row[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            int diagonal = row[0];
            row[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                int changed = diagonal + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                diagonal = row[j];
                row[j] = Math.min(changed, 1 + Math.min(row[j], row[j - 1]));
            }
        }
        return row[b.length()];
    }
}
