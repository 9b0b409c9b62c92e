package throwbench.app.strip;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import throwbench.app.bench.Shown;
import throwbench.app.drawing.Readout;
import throwbench.solver.finding.Finding;
import throwbench.solver.finding.Verdict;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.revolution.Reversal;

/**
 * One filled piece of the reversal band: a span of the rod load in tension or compression, or one of the two pieces of a span
 * that is counted through 360°.
 *
 * @param from rad, in [0, 2π)
 * @param to rad, in (0, 2π]
 * @param governing whether this span counts for the criterion
 * @param words from the longest to the shortest; none on the smaller piece of a divided span
 * @param asked what is asked of the span that counts, "15° asked"; may be empty
 */
record BandSpan(double from, double to, boolean inTension, boolean governing, List<String> words, String asked) {

    /** The id of the criterion whose limit the governing span carries. */
    private static final String CRITERION = "reversal-duration";

    BandSpan {
        words = List.copyOf(words);
    }

    /** The pieces of a state's band from 0° to 360°. */
    static List<BandSpan> of(Shown shown) {
        Reversal reversal = shown.summary().reversal();
        String asked = finding(shown).map(BandSpan::asked).orElse("");
        Optional<Reversal.Span> governing = reversal.governing();
        List<BandSpan> pieces = new ArrayList<>();
        for (Reversal.Span span : reversal.spans()) {
            boolean counts = governing.filter(span::equals).isPresent();
            String sign = span.inTension() ? "tension" : "compression";
            String degrees = Readout.angle().text(span.length());
            List<String> words = reversal.reverses()
                    ? List.of(sign + ' ' + degrees, degrees)
                    : List.of(sign + " all round: the rod load never reverses", sign + ": no reversal", "no reversal");
            split(span, counts, words, counts || !reversal.reverses() ? asked : "", pieces);
        }
        pieces.sort((a, b) -> Double.compare(a.from, b.from));
        return List.copyOf(pieces);
    }

    private static void split(
            Reversal.Span span, boolean counts, List<String> words, String asked, List<BandSpan> into) {
        double end = span.from() + span.length();
        boolean whole = end <= Angles.TURN;
        double first = Math.min(end, Angles.TURN);
        boolean speaks = whole || Angles.TURN - span.from() >= end - Angles.TURN;
        BandSpan silent = new BandSpan(span.from(), first, span.inTension(), counts, List.of(), "");
        into.add(speaks ? silent.saying(words, asked) : silent);
        if (!whole) {
            BandSpan rest = new BandSpan(0, end - Angles.TURN, span.inTension(), counts, List.of(), "");
            into.add(speaks ? rest : rest.saying(words, asked));
        }
    }

    private BandSpan saying(List<String> said, String limit) {
        return new BandSpan(from, to, inTension, governing, said, limit);
    }

    private static Optional<Finding> finding(Shown shown) {
        String duty = shown.dutyName();
        String name = shown.shownThrow().name();
        return shown.findings().stream()
                .filter(f -> f.criterion().id().equals(CRITERION))
                .filter(f -> f.where().duty().equals(duty)
                        && f.where().throwName().filter(name::equals).isPresent())
                .findFirst();
    }

    private static String asked(Finding finding) {
        if (finding.limit().isEmpty()) {
            return "";
        }
        return degrees(finding.limit().getAsDouble()) + " asked"
                + (finding.verdict() == Verdict.NOT_MET ? ", not met" : "");
    }

    /** A limit as written: 15°, 7.5°. */
    private static String degrees(double limit) {
        String tenths = Readout.fixed(limit, 1);
        return (tenths.endsWith(".0") ? tenths.substring(0, tenths.length() - 2) : tenths) + "°";
    }
}
