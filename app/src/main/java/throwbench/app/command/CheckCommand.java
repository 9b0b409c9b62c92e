package throwbench.app.command;

import java.util.List;
import java.util.Optional;
import throwbench.solver.document.result.FindingsJson;
import throwbench.solver.document.result.Written;
import throwbench.solver.finding.JudgedPoints;
import throwbench.solver.finding.Judgement;
import throwbench.solver.machine.DutyPoint;

/** {@code check}: judges a machine against its limits at one duty point or at all of them, those of its ranges included. */
final class CheckCommand implements Command {

    @Override
    public String name() {
        return "check";
    }

    @Override
    public String synopsis() {
        return "check MACHINE.json [--duty NAME] [--format text|json]";
    }

    @Override
    public String help() {
        return """
                Judges a machine against its limits. The exit code is 0 when every judged finding is met, else 1.

                  --duty NAME         the duty point, or a load step at a corner of the ranges by its whole name;
                                      all of them if left out
                  --format text|json  for people or for programs; text if left out
                """;
    }

    @Override
    public List<Option> options() {
        return List.of(Option.DUTY, Option.FORMAT);
    }

    @Override
    public ExitCode run(Arguments arguments, Terminal terminal) {
        Optional<String> format = arguments.choice(Option.FORMAT, List.of("text", "json"));
        if (format.isEmpty()) {
            return ExitCode.REFUSED;
        }
        Optional<MachineSource> source = MachineSource.read(arguments.machineFile(), terminal);
        if (source.isEmpty()) {
            return ExitCode.REFUSED;
        }
        Optional<String> name = arguments.value(Option.DUTY);
        Optional<DutyPoint> duty = source.get().duty(name);
        if (duty.isEmpty()) {
            return ExitCode.REFUSED;
        }
        JudgedPoints points = source.get().points();
        if (name.isEmpty() && !points.refusals().isEmpty()) {
            return source.get().refuse(points.refusals());
        }
        List<DutyPoint> duties = name.isPresent() ? List.of(duty.get()) : points.points();
        return judge(source.get(), duties, format.get(), terminal);
    }

    /** Judges, and prints the findings in a format; a machine that cannot be solved is refused without any. */
    static ExitCode judge(MachineSource source, List<DutyPoint> duties, String format, Terminal terminal) {
        Judgement judgement = Judgement.of(source.machine(), duties);
        if (!judgement.refusals().isEmpty()) {
            return source.refuse(judgement.refusals());
        }
        String machine = source.machine().name();
        Written result = format.equals("json")
                ? new FindingsJson(machine, judgement.findings())
                : new FindingsText(machine, duties, judgement);
        if (!terminal.print(result)) {
            return ExitCode.REFUSED;
        }
        return judgement.allMet() ? ExitCode.DONE : ExitCode.NOT_MET;
    }
}
