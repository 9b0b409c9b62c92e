package throwbench.solver.document.quantity;

import java.util.OptionalDouble;

/** The sums a user may type in a field: + - * / and parentheses, with a decimal point or comma. */
final class Arithmetic {

    // deeper than any hand types; keeps the recursion far from the stack's end
    private static final int DEEPEST = 20;

    private final String text;
    private int at;
    private int depth;
    private boolean wrong;

    private Arithmetic(String text) {
        this.text = text;
    }

    /** The value of an expression; empty where it is none, or is not finite. */
    static OptionalDouble value(String text) {
        Arithmetic reading = new Arithmetic(text);
        double value = reading.sum();
        reading.skipSpace();
        boolean whole = !reading.wrong && reading.at == text.length() && Math.abs(value) <= Double.MAX_VALUE;
        return whole ? OptionalDouble.of(value) : OptionalDouble.empty();
    }

    private double sum() {
        double value = product();
        while (!wrong) {
            if (takes('+')) {
                value += product();
            } else if (takes('-')) {
                value -= product();
            } else {
                break;
            }
        }
        return value;
    }

    private double product() {
        double value = factor();
        while (!wrong) {
            if (takes('*')) {
                value *= factor();
            } else if (takes('/')) {
                value /= factor();
            } else {
                break;
            }
        }
        return value;
    }

    private double factor() {
        if (++depth > DEEPEST) {
            wrong = true;
            return 0;
        }
        double value;
        if (takes('-')) {
            value = -factor();
        } else if (takes('(')) {
            value = sum();
            wrong |= !takes(')');
        } else {
            value = number();
        }
        depth--;
        return value;
    }

    private double number() {
        skipSpace();
        int end = NumberText.end(text, at);
        if (end == at || text.charAt(at) == '-') {
            wrong = true;
            return 0;
        }
        double value = Double.parseDouble(text.substring(at, end));
        at = end;
        return value;
    }

    private boolean takes(char sign) {
        skipSpace();
        boolean there = at < text.length() && text.charAt(at) == sign;
        at += there ? 1 : 0;
        return there;
    }

    private void skipSpace() {
        while (at < text.length() && text.charAt(at) == ' ') {
            at++;
        }
    }
}
