package throwbench.app.command;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import throwbench.solver.document.quantity.Quantity;
import throwbench.solver.document.quantity.QuantityReading;
import throwbench.solver.document.quantity.QuantityText;
import throwbench.solver.document.quantity.Refusal;
import throwbench.solver.map.Choice;
import throwbench.solver.map.Subject;
import throwbench.solver.map.Variable;

/**
 * A number of the machine file from one value to another, as an option says it: {@code drive.speed=600 rpm..1000 rpm:20}.
 *
 * @param points number of values with both ends; 2 where none is asked for
 */
record Stretch(Variable variable, Quantity from, Quantity to, int points) {

    private static final int FEWEST_POINTS = 2;
    private static final int MOST_POINTS = 2000;
    private static final String DOTS = "..";

    /** Key paths shown for one that is none. */
    private static final int NEAR = 3;

    /** Reads an option's value; empty, and said, where something is wrong with it. */
    static Optional<Stretch> read(
            Option option, String written, Subject subject, MachineSource source, Terminal terminal) {
        return new Reader(option, written, subject, source, terminal).read();
    }

    /** What is read of one option. */
    private record Reader(Option option, String written, Subject subject, MachineSource source, Terminal terminal) {

        Optional<Stretch> read() {
            boolean counted = option.value().endsWith(":N");
            int equals = written.lastIndexOf('=');
            String range = written.substring(equals + 1);
            int dots = range.indexOf(DOTS);
            int colon = counted ? range.lastIndexOf(':') : range.length();
            if (equals <= 0 || dots <= 0 || colon < dots + DOTS.length()) {
                return refuse("\"" + written + "\", " + option.value() + " is wanted, as drive.speed=600 rpm..1000 rpm"
                        + (counted ? ":20" : ""));
            }
            Optional<Variable> variable = variable(written.substring(0, equals));
            int points = counted ? points(range.substring(colon + 1)) : FEWEST_POINTS;
            if (variable.isEmpty() || points == 0) {
                return Optional.empty();
            }
            Optional<Quantity> from = end(variable.get(), range.substring(0, dots));
            Optional<Quantity> to = end(variable.get(), range.substring(dots + DOTS.length(), colon));
            if (from.isEmpty() || to.isEmpty()) {
                return Optional.empty();
            }
            if (from.get().value() == to.get().value()) {
                return refuse(variable.get() + " from and to the same value, two different ones are wanted");
            }
            warn(variable.get());
            return Optional.of(new Stretch(variable.get(), from.get(), to.get(), points));
        }

        private Optional<Stretch> refuse(String what) {
            terminal.complain("throwbench", option.word(), what);
            return Optional.empty();
        }

        private Optional<Variable> variable(String key) {
            Choice<Variable> choice = Variable.find(subject.document(), subject.machine(), key);
            if (choice.chosen().isEmpty()) {
                List<String> near = new ArrayList<>(NearWords.of(key, Variable.paths(subject.document())));
                String perhaps = String.join(" or ", near.subList(0, Math.min(NEAR, near.size())));
                boolean helps = choice.fault().startsWith("no ") && !near.isEmpty();
                source.complain(key, choice.fault() + (helps ? "; perhaps " + perhaps : ""));
            }
            return choice.chosen();
        }

        /** 0, and said, where it is none. */
        private int points(String number) {
            OptionalLong points = Whole.read(number.strip(), FEWEST_POINTS, MOST_POINTS);
            if (points.isEmpty()) {
                refuse("\"" + number + "\" points, " + Whole.wanted(FEWEST_POINTS, MOST_POINTS));
            }
            return (int) points.orElse(0);
        }

        private Optional<Quantity> end(Variable variable, String text) {
            QuantityReading reading = QuantityText.read(
                    text.strip(), variable.dimension(), subject.document().ambientPressure());
            if (reading instanceof Quantity quantity) {
                return Optional.of(quantity);
            }
            Refusal refusal = (Refusal) reading;
            refuse(variable + ": " + refusal.found() + ", wanted " + refusal.wanted());
            return Optional.empty();
        }

        private void warn(Variable variable) {
            if (!subject.bears(variable)) {
                terminal.complain(
                        "throwbench",
                        option.word(),
                        variable + " has no bearing on the duty point \""
                                + subject.dutyPoint().name() + "\"; all of its values give the same");
            }
        }
    }

    /** A value of the variable in the unit in which the range begins. */
    String said(double si, double ambientPressure) {
        int digits = 6;
        return from.rewritten(si, ambientPressure, digits);
    }
}
