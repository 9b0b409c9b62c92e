package throwbench.app.buildsheet;

/** How far one notch of the wheel or one press of an arrow key moves a value. */
final class Steps {

    /** Digits that a stepped value is written with: enough for any step, few enough to hide the binary remainder. */
    static final int DIGITS = 10;

    private Steps() {}

    /** The place of the last digit written, in the unit written: 1 for 75 mm, 0.1 for 4.1 bar g, 0.01 for 1.35. */
    static double lastPlace(String text) {
        int decimals = 0;
        boolean behindPoint = false;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (c == '.') {
                behindPoint = true;
            } else if (Character.isDigit(c)) {
                decimals += behindPoint ? 1 : 0;
            } else if (c != '-' && c != '\u2212') {
                break;
            }
        }
        return Math.pow(10, -decimals);
    }
}
