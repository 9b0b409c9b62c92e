package throwbench.solver.document.schema;

/**
 * The values a quantity may take, SI.
 *
 * @param leastIn whether the least value itself is allowed
 * @param greatestIn likewise
 */
public record Range(double least, boolean leastIn, double greatest, boolean greatestIn) {

    /** Every finite value. */
    public static final Range ANY = new Range(Double.NEGATIVE_INFINITY, false, Double.POSITIVE_INFINITY, false);

    /** Greater than a value. */
    public static Range above(double least) {
        return new Range(least, false, Double.POSITIVE_INFINITY, false);
    }

    /** A value or more. */
    public static Range from(double least) {
        return new Range(least, true, Double.POSITIVE_INFINITY, false);
    }

    /** The same with an upper end that is not allowed itself. */
    public Range below(double end) {
        return new Range(least, leastIn, end, false);
    }

    /** The same with an upper end that is allowed. */
    public Range upTo(double end) {
        return new Range(least, leastIn, end, true);
    }

    /** Whether a value lies within. */
    public boolean contains(double value) {
        boolean highEnough = leastIn ? value >= least : value > least;
        return highEnough && (greatestIn ? value <= greatest : value < greatest);
    }

    /** For sentences: "above 0 and below 1"; empty where every value is allowed. */
    public String said() {
        String low =
                least == Double.NEGATIVE_INFINITY ? "" : leastIn ? plain(least) + " or more" : "above " + plain(least);
        String high =
                greatest == Double.POSITIVE_INFINITY ? "" : (greatestIn ? "at most " : "below ") + plain(greatest);
        return low.isEmpty() || high.isEmpty() ? low + high : low + " and " + high;
    }

    // the ends of this file's ranges are whole numbers
    private static String plain(double end) {
        return Long.toString(Math.round(end));
    }
}
