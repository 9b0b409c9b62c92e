package throwbench.solver.finding;

import java.util.Locale;
import java.util.OptionalDouble;
import throwbench.solver.machine.LimitKey;

/**
 * What a criterion says of itself, its limit apart.
 *
 * @param id as written
 * @param title in words
 * @param formula in one line
 * @param source of the default limit, or else of the definition
 * @param greatest whether the limit is the greatest value allowed
 * @param unit as written
 * @param usual the limit where the machine file sets none
 */
record Statement(
        LimitKey key,
        String id,
        String title,
        String formula,
        String source,
        boolean greatest,
        String unit,
        OptionalDouble usual) {

    /** Of a value that must not be more than its limit. */
    static Statement atMost(LimitKey key, String unit, String title) {
        return new Statement(key, id(key), title, "", "", true, unit, OptionalDouble.empty());
    }

    /** Of a value that must not be less than its limit. */
    static Statement atLeast(LimitKey key, String unit, String title) {
        return new Statement(key, id(key), title, "", "", false, unit, OptionalDouble.empty());
    }

    Statement is(String how) {
        return new Statement(key, id, title, how, source, greatest, unit, usual);
    }

    Statement from(String work) {
        return new Statement(key, id, title, formula, work, greatest, unit, usual);
    }

    Statement usually(double limit) {
        return new Statement(key, id, title, formula, source, greatest, unit, OptionalDouble.of(limit));
    }

    /** The finding's id is its limit's key with its words apart. */
    private static String id(LimitKey key) {
        return key.text().replaceAll("([A-Z])", "-$1").toLowerCase(Locale.ROOT);
    }
}
