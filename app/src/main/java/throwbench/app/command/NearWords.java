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

    /** Letters to insert, drop, change or swap with their neighbour to come from one word to the other, whatever their case. */
    static int distance(String one, String other) {
        String a = one.toLowerCase(Locale.ROOT);
        String b = other.toLowerCase(Locale.ROOT);
        int[][] steps = new int[a.length() + 1][b.length() + 1];
        for (int i = 0; i <= a.length(); i++) {
            for (int j = 0; j <= b.length(); j++) {
                steps[i][j] = i == 0 || j == 0 ? i + j : steps(a, b, i, j, steps);
            }
        }
        return steps[a.length()][b.length()];
    }

    private static int steps(String a, String b, int i, int j, int[][] before) {
        boolean same = a.charAt(i - 1) == b.charAt(j - 1);
        int least = Math.min(before[i - 1][j - 1] + (same ? 0 : 1), 1 + Math.min(before[i - 1][j], before[i][j - 1]));
        boolean swapped = i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
        return swapped ? Math.min(least, before[i - 2][j - 2] + 1) : least;
    }
}
