package throwbench.app.window;

import throwbench.app.Release;

/** What the about box says. */
final class About {

    private About() {}

    static String text() {
        return "Throwbench " + Release.number()
                + "\n\nA bench for the running gear of reciprocating compressors and plunger pumps.\n\n"
                + StatusLine.CAUTION
                + " Limits and defaults must be checked against the documents that apply to your machine;"
                + " the judgement of reversal follows API 618, 5th edition, and later editions changed the clause."
                + "\n\nThe typeface Noto Sans is used under the SIL Open Font License 1.1.";
    }
}
