package throwbench.app.command;

import java.util.List;
import java.util.Optional;
import throwbench.solver.finding.Finding;
import throwbench.solver.map.FindingResult;
import throwbench.solver.map.Outcome;
import throwbench.solver.map.Sensitivity;
import throwbench.solver.map.Subject;
import throwbench.solver.map.Workers;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.Settling;

/** {@code sensitivity}: which numbers of the machine file a finding's margin hangs on most. */
final class SensitivityCommand implements Command {

    @Override
    public String name() {
        return "sensitivity";
    }

    @Override
    public String synopsis() {
        return "sensitivity MACHINE.json --of ID [--duty NAME] [--throw NAME]";
    }

    @Override
    public String help() {
        return """
                Ranks the numbers of the machine file by how much a finding's margin changes with them.

                  --of ID       the finding, as rod-load-tension
                  --duty NAME   the duty point; the first one if left out
                  --throw NAME  the throw, where the finding is one throw's; the first one if left out

                Each number is changed by 1 % of its SI value, pressures and temperatures counted from absolute
                zero, and angles by 1 deg, up and down. Numbers that are zero are left out.
                """;
    }

    @Override
    public List<Option> options() {
        return List.of(Option.OF_FINDING, Option.DUTY, Option.THROW);
    }

    @Override
    public ExitCode run(Arguments arguments, Terminal terminal) {
        Optional<String> of = arguments.needed(Option.OF_FINDING);
        if (of.isEmpty()) {
            return ExitCode.REFUSED;
        }
        Optional<MachineSource> source = MachineSource.read(arguments.machineFile(), terminal);
        Optional<Subject> subject = source.flatMap(s -> s.subject(arguments));
        if (source.isEmpty() || subject.isEmpty()) {
            return ExitCode.REFUSED;
        }
        Optional<FindingResult> finding = ResultWords.margin(Option.OF_FINDING, of.get(), terminal);
        if (finding.isEmpty()) {
            return ExitCode.REFUSED;
        }
        Settling nominal =
                RunningMachine.settle(subject.get().machine(), subject.get().dutyPoint());
        return nominal.running().isPresent()
                ? study(subject.get(), finding.get(), nominal.get(), terminal)
                : source.get().refuse(nominal.refusals());
    }

    private static ExitCode study(Subject subject, FindingResult result, RunningMachine nominal, Terminal terminal) {
        Outcome margin = result.probe(subject.shownThrow()).at(nominal);
        Optional<Finding> finding = result.finding(nominal, subject.shownThrow());
        if (margin.value().isEmpty() || finding.isEmpty()) {
            terminal.complain(
                    "throwbench",
                    Option.OF_FINDING.word(),
                    result.criterion().id() + " has no margin: " + margin.reason());
            return ExitCode.REFUSED;
        }
        Sensitivity sensitivity = Sensitivity.of(
                        subject, result, margin.value().getAsDouble(), Workers.cores(), new ProgressBar(terminal))
                .orElseThrow();
        return terminal.print(new SensitivityText(subject, finding.get(), sensitivity))
                ? ExitCode.DONE
                : ExitCode.REFUSED;
    }
}
