package throwbench.app.command;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;

/** The words after a command: one machine file, and options with their values. */
final class Arguments {

    private final Command command;
    private final Terminal terminal;
    private final EnumMap<Option, String> values = new EnumMap<>(Option.class);
    private final List<String> operands = new ArrayList<>();
    private boolean good = true;

    private Arguments(Command command, Terminal terminal) {
        this.command = command;
        this.terminal = terminal;
    }

    /** Reads the words; empty when something is wrong with them, which then has been said, each fault on its line. */
    static Optional<Arguments> read(Command command, List<String> words, Terminal terminal) {
        Arguments read = new Arguments(command, terminal);
        read.read(words);
        return read.good ? Optional.of(read) : Optional.empty();
    }

    private void read(List<String> words) {
        int at = 0;
        while (at < words.size() && !words.get(at).equals("--")) {
            String word = words.get(at++);
            if (word.startsWith("-") && word.length() > 1) {
                at += option(word, at < words.size() ? Optional.of(words.get(at)) : Optional.empty());
            } else {
                operands.add(word);
            }
        }
        operands.addAll(words.subList(Math.min(words.size(), at + 1), words.size()));
        // after an unknown option nobody can tell its value from a file
        if (good) {
            checkOperands();
        }
    }

    /** Takes an option in and returns how many of the following words belong to it. */
    private int option(String word, Optional<String> next) {
        int equals = word.indexOf('=');
        String name = equals < 0 ? word : word.substring(0, equals);
        Optional<Option> option = find(name);
        if (option.isEmpty()) {
            refuse(name, unknown(name));
            return 0;
        }
        boolean missing = equals < 0 && (next.isEmpty() || find(next.get()).isPresent());
        if (missing) {
            refuse(name, "nothing stands after it, " + option.get().value() + " is wanted");
            return 0;
        }
        String value = equals < 0 ? next.get() : word.substring(equals + 1);
        if (values.put(option.get(), value) != null) {
            refuse(name, "given twice, once is wanted");
        }
        return equals < 0 ? 1 : 0;
    }

    private Optional<Option> find(String name) {
        for (Option option : command.options()) {
            if (option.word().equals(name)) {
                return Optional.of(option);
            }
        }
        return Optional.empty();
    }

    private String unknown(String name) {
        List<String> known = new ArrayList<>();
        for (Option option : command.options()) {
            known.add(option.word());
        }
        known.add("--help");
        List<String> near = NearWords.of(name, known);
        return "no such option of " + command.name()
                + (near.isEmpty() ? "; it takes " : "; perhaps ")
                + String.join(near.isEmpty() ? ", " : " or ", near.isEmpty() ? known : near);
    }

    private void checkOperands() {
        if (operands.isEmpty() || operands.get(0).isEmpty()) {
            refuse(
                    command.name(),
                    "no machine file given, one is wanted; throwbench " + command.name() + " --help tells more");
        }
        for (int i = 1; i < operands.size(); i++) {
            refuse(operands.get(i), "one word too many, " + command.name() + " takes one machine file");
        }
    }

    private void refuse(String where, String what) {
        terminal.complain("throwbench", where, what);
        good = false;
    }

    /** The machine file as written. */
    String machineFile() {
        return operands.get(0);
    }

    /** What was given for an option. */
    Optional<String> value(Option option) {
        return Optional.ofNullable(values.get(option));
    }

    /** What was given for an option that cannot be left out; empty, and said, where it is. */
    Optional<String> needed(Option option) {
        Optional<String> given = value(option);
        if (given.isEmpty()) {
            terminal.complain("throwbench", option.word(), "is missing, " + option.value() + " is wanted");
        }
        return given;
    }

    /** The whole number given for an option within bounds; empty, and said, where it is none. */
    OptionalLong whole(Option option, long otherwise, long least, long most) {
        String given = values.getOrDefault(option, Long.toString(otherwise));
        OptionalLong number = Whole.read(given, least, most);
        if (number.isEmpty()) {
            terminal.complain("throwbench", option.word(), "\"" + given + "\", " + Whole.wanted(least, most));
        }
        return number;
    }

    /** What was given for an option that has to be one of these words; the first of them where it was left out. */
    Optional<String> choice(Option option, List<String> words) {
        String given = values.getOrDefault(option, words.get(0));
        if (words.contains(given)) {
            return Optional.of(given);
        }
        terminal.complain(
                "throwbench", option.word(), "\"" + given + "\", " + String.join(" or ", words) + " is wanted");
        return Optional.empty();
    }
}
