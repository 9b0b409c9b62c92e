package throwbench.app.command;

import java.util.OptionalLong;

/** Whole numbers of the command line. */
final class Whole {

    private Whole() {}

    /** The number of a text, where it is one within bounds. */
    static OptionalLong read(String text, long least, long most) {
        try {
            long number = Long.parseLong(text);
            return number >= least && number <= most ? OptionalLong.of(number) : OptionalLong.empty();
        } catch (NumberFormatException noWholeNumber) {
            return OptionalLong.empty();
        }
    }

    /** What should have been written. */
    static String wanted(long least, long most) {
        return "a whole number from " + least + " to " + most + " is wanted";
    }
}
