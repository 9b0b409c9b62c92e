package throwbench.app.command;

import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import throwbench.solver.document.result.RevolutionCsv;
import throwbench.solver.document.result.RevolutionJson;
import throwbench.solver.document.result.Written;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.revolution.Revolution;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.Settling;
import throwbench.solver.revolution.Summary;

/** {@code solve}: one throw over the revolution at one duty point, as a table or as JSON. */
final class SolveCommand implements Command {

    private static final int DEFAULT_STATIONS = 720;
    private static final int FEWEST_STATIONS = 8;
    private static final int MOST_STATIONS = 36000;

    @Override
    public String name() {
        return "solve";
    }

    @Override
    public String synopsis() {
        return "solve MACHINE.json [--duty NAME] [--throw NAME] [--stations 720] [--format csv|json] [--out FILE]";
    }

    @Override
    public String help() {
        return """
                Solves one throw of a machine over the revolution at a duty point.

                  --duty NAME        the duty point; the first one if left out
                  --throw NAME       the throw; the first one if left out
                  --stations N       crank angles to solve, from 8 to 36000; 720 if left out
                  --format csv|json  a row for every crank angle, or columns with a summary; csv if left out
                  --out FILE         where to write; standard output if left out

                Angles are in degrees from the throw's head-end dead centre, everything else is in SI units.
                Loads along the rod are positive in tension.
                """;
    }

    @Override
    public List<Option> options() {
        return List.of(Option.DUTY, Option.THROW, Option.STATIONS, Option.FORMAT, Option.OUT);
    }

    @Override
    public ExitCode run(Arguments arguments, Terminal terminal) {
        Optional<String> format = arguments.choice(Option.FORMAT, List.of("csv", "json"));
        OptionalLong stations = arguments.whole(Option.STATIONS, DEFAULT_STATIONS, FEWEST_STATIONS, MOST_STATIONS);
        if (format.isEmpty() || stations.isEmpty()) {
            return ExitCode.REFUSED;
        }
        Optional<MachineSource> source = MachineSource.read(arguments.machineFile(), terminal);
        if (source.isEmpty()) {
            return ExitCode.REFUSED;
        }
        Optional<DutyPoint> duty = source.get().duty(arguments.value(Option.DUTY));
        Optional<Integer> shown = source.get().throwIndex(arguments.value(Option.THROW));
        if (duty.isEmpty() || shown.isEmpty()) {
            return ExitCode.REFUSED;
        }
        Settling settling = RunningMachine.settle(source.get().machine(), duty.get());
        if (settling.running().isEmpty()) {
            return source.get().refuse(settling.refusals());
        }
        Revolution revolution = Revolution.solve(settling.running().get(), shown.get(), (int) stations.getAsLong());
        Written result = format.get().equals("csv")
                ? new RevolutionCsv(revolution)
                : new RevolutionJson(revolution, Summary.of(revolution.running(), shown.get(), Optional.empty()));
        return OutputFile.deliver(result, arguments, terminal) ? ExitCode.DONE : ExitCode.REFUSED;
    }
}
