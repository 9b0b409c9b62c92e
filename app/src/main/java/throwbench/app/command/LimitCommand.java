package throwbench.app.command;

import java.util.List;
import java.util.Optional;
import throwbench.solver.map.FindingResult;
import throwbench.solver.map.LimitSearch;
import throwbench.solver.map.Outcome;
import throwbench.solver.map.Subject;
import throwbench.solver.map.Workers;

/** {@code limit}: the values of a number of the machine file at which a finding is just met. */
final class LimitCommand implements Command {

    @Override
    public String name() {
        return "limit";
    }

    @Override
    public String synopsis() {
        return "limit MACHINE.json --vary KEY=FROM..TO --until ID [--duty NAME] [--throw NAME]";
    }

    @Override
    public String help() {
        return """
                Finds how far one number of the machine file may go until a finding is just met.

                  --vary KEY=FROM..TO  the number, as "drive.speed=600 rpm..1000 rpm": its key path in the machine
                                       file and two values with units
                  --until ID           the finding, as rod-load-tension
                  --duty NAME          the duty point; the first one if left out
                  --throw NAME         the throw, where the finding is one throw's; the first one if left out

                Every such value between the two is found. A margin that jumps over zero is said to step.
                """;
    }

    @Override
    public List<Option> options() {
        return List.of(Option.VARY, Option.UNTIL, Option.DUTY, Option.THROW);
    }

    @Override
    public ExitCode run(Arguments arguments, Terminal terminal) {
        Optional<String> vary = arguments.needed(Option.VARY);
        Optional<String> until = arguments.needed(Option.UNTIL);
        if (vary.isEmpty() || until.isEmpty()) {
            return ExitCode.REFUSED;
        }
        Optional<MachineSource> source = MachineSource.read(arguments.machineFile(), terminal);
        Optional<Subject> subject = source.flatMap(s -> s.subject(arguments));
        if (source.isEmpty() || subject.isEmpty()) {
            return ExitCode.REFUSED;
        }
        Optional<Stretch> stretch = Stretch.read(Option.VARY, vary.get(), subject.get(), source.get(), terminal);
        Optional<FindingResult> finding = ResultWords.margin(Option.UNTIL, until.get(), terminal);
        return stretch.isPresent() && finding.isPresent()
                ? search(subject.get(), stretch.get(), finding.get(), terminal)
                : ExitCode.REFUSED;
    }

    private static ExitCode search(Subject subject, Stretch stretch, FindingResult finding, Terminal terminal) {
        double from = Math.min(stretch.from().value(), stretch.to().value());
        double to = Math.max(stretch.from().value(), stretch.to().value());
        LimitSearch found = LimitSearch.of(
                        subject, stretch.variable(), from, to, finding, Workers.cores(), new ProgressBar(terminal))
                .orElseThrow();
        if (found.scan().stream().noneMatch(Outcome::isPossible)) {
            String reason = found.scan().get(0).reason();
            terminal.complain(
                    "throwbench",
                    Option.UNTIL.word(),
                    "the margin of " + finding.criterion().id() + " cannot be had anywhere in the range: " + reason);
            return ExitCode.REFUSED;
        }
        return terminal.print(new LimitText(subject, stretch, finding, found)) ? ExitCode.DONE : ExitCode.REFUSED;
    }
}
