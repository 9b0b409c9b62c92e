package throwbench.app.drawing;

/** Texts that must fit a width. */
public final class TextFit {

    private TextFit() {}

    /** The name where it fits, else the short one, else as much of the short one as fits. */
    public static String name(Pen pen, String name, String shortName, double width) {
        return pen.width(name) <= width ? name : elide(pen, shortName, width);
    }

    /**
     * The text, or as much of it as fits with an ellipsis in its middle: the ends of names tell them apart ("Booster A
     * head", "Booster A crank").
     *
     * @param pen with the font in use
     * @return empty where not even a letter and the ellipsis fit
     */
    public static String elide(Pen pen, String text, double width) {
        if (pen.width(text) <= width) {
            return text;
        }
        for (int kept = text.length() - 1; kept > 0; kept--) {
            int front = (kept + 1) / 2;
            String shorter = text.substring(0, front).strip()
                    + '…'
                    + text.substring(text.length() - (kept - front)).strip();
            if (pen.width(shorter) <= width) {
                return shorter;
            }
        }
        return "";
    }
}
