package throwbench.app.command;

import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import throwbench.solver.map.Subject;
import throwbench.solver.map.ToleranceStudy;
import throwbench.solver.map.Workers;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.Settling;

/** {@code tolerance}: how often machines within the file's tolerances meet its findings. */
final class ToleranceCommand implements Command {

    private static final long DEFAULT_SAMPLES = 10_000;
    private static final long MOST_SAMPLES = 1_000_000;
    private static final long DEFAULT_SEED = 1;

    @Override
    public String name() {
        return "tolerance";
    }

    @Override
    public String synopsis() {
        return "tolerance MACHINE.json [--samples 10000] [--seed 1] [--duty NAME]";
    }

    @Override
    public String help() {
        return """
                Judges many machines drawn within the tolerances of the file, as "75 mm ± 0.1 mm".

                  --samples N  number of machines, from 1 to 1000000; 10000 if left out
                  --seed N     where the draws begin: the same seed draws the same machines; 1 if left out
                  --duty NAME  the duty point; the first one if left out

                Every quantity with a tolerance is drawn uniformly within it, each by itself. For each judged
                finding: the share of machines that meet it, and the margin that 5 % and 95 % of them stay below.
                """;
    }

    @Override
    public List<Option> options() {
        return List.of(Option.SAMPLES, Option.SEED, Option.DUTY);
    }

    @Override
    public ExitCode run(Arguments arguments, Terminal terminal) {
        OptionalLong samples = arguments.whole(Option.SAMPLES, DEFAULT_SAMPLES, 1, MOST_SAMPLES);
        OptionalLong seed = arguments.whole(Option.SEED, DEFAULT_SEED, 0, Long.MAX_VALUE);
        if (samples.isEmpty() || seed.isEmpty()) {
            return ExitCode.REFUSED;
        }
        Optional<MachineSource> source = MachineSource.read(arguments.machineFile(), terminal);
        Optional<Subject> subject = source.flatMap(s -> s.subject(arguments));
        if (source.isEmpty() || subject.isEmpty()) {
            return ExitCode.REFUSED;
        }
        Settling nominal =
                RunningMachine.settle(subject.get().machine(), subject.get().dutyPoint());
        if (nominal.running().isEmpty()) {
            return source.get().refuse(nominal.refusals());
        }
        if (ToleranceStudy.toleranced(subject.get()).isEmpty()) {
            source.get().complain("", "no quantity of this duty point carries a tolerance, as \"75 mm ± 0.1 mm\"");
            return ExitCode.REFUSED;
        }
        ToleranceStudy study = ToleranceStudy.of(
                        subject.get(),
                        nominal.get(),
                        (int) samples.getAsLong(),
                        seed.getAsLong(),
                        Workers.cores(),
                        new ProgressBar(terminal))
                .orElseThrow();
        return terminal.print(new ToleranceText(subject.get(), study, seed.getAsLong()))
                ? ExitCode.DONE
                : ExitCode.REFUSED;
    }
}
