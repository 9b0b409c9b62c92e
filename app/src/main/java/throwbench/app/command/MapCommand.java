package throwbench.app.command;

import java.util.List;
import java.util.Optional;
import throwbench.solver.document.result.DutyMapCsv;
import throwbench.solver.map.Axis;
import throwbench.solver.map.DutyMap;
import throwbench.solver.map.MapRun;
import throwbench.solver.map.Result;
import throwbench.solver.map.Subject;
import throwbench.solver.map.Workers;

/** {@code map}: one result over two numbers of the machine file, as a table. */
final class MapCommand implements Command {

    @Override
    public String name() {
        return "map";
    }

    @Override
    public String synopsis() {
        return "map MACHINE.json --across KEY=FROM..TO:N --up KEY=FROM..TO:N --of RESULT"
                + " [--duty NAME] [--throw NAME] [--out FILE]";
    }

    @Override
    public String help() {
        return """
                Computes one result over two numbers of the machine file.

                  --across KEY=FROM..TO:N  the number along rows, as "drive.speed=600 rpm..1000 rpm:20": its key
                                           path in the machine file, two values with units, and how many
                                           values, both ends counted
                  --up KEY=FROM..TO:N      the other number, from row to row
                  --of RESULT              ID or ID.margin of a finding, as reversal-duration.margin; or
                                           COLUMN.max or COLUMN.min of a column of solve, as rod_load_N.max
                  --duty NAME              the duty point; the first one if left out
                  --throw NAME             the throw, where the result is one throw's; the first one if left out
                  --out FILE               where to write; standard output if left out

                Writes CSV with a row a point: across, up, value, reason. Angles are in degrees, everything else is
                in SI units, pressures absolute. A point that cannot be had has no value, and the reason says why.
                """;
    }

    @Override
    public List<Option> options() {
        return List.of(Option.ACROSS, Option.UP, Option.OF, Option.DUTY, Option.THROW, Option.OUT);
    }

    @Override
    public ExitCode run(Arguments arguments, Terminal terminal) {
        Optional<String> across = arguments.needed(Option.ACROSS);
        Optional<String> up = arguments.needed(Option.UP);
        Optional<String> of = arguments.needed(Option.OF);
        if (across.isEmpty() || up.isEmpty() || of.isEmpty()) {
            return ExitCode.REFUSED;
        }
        Optional<MachineSource> source = MachineSource.read(arguments.machineFile(), terminal);
        Optional<Subject> subject = source.flatMap(s -> s.subject(arguments));
        if (source.isEmpty() || subject.isEmpty()) {
            return ExitCode.REFUSED;
        }
        Optional<Stretch> columns = Stretch.read(Option.ACROSS, across.get(), subject.get(), source.get(), terminal);
        Optional<Stretch> rows = Stretch.read(Option.UP, up.get(), subject.get(), source.get(), terminal);
        Optional<Result> result =
                ResultWords.result(Option.OF, of.get(), source.get().machine(), terminal);
        if (rows.isEmpty() || columns.isEmpty() || result.isEmpty()) {
            return ExitCode.REFUSED;
        }
        if (rows.get().variable().equals(columns.get().variable())) {
            terminal.complain("throwbench", Option.UP.word(), "the same number as --across, another one is wanted");
            return ExitCode.REFUSED;
        }
        DutyMap map = new MapRun(subject.get(), axis(columns.get()), axis(rows.get()), result.get())
                .fill(Workers.cores(), new ProgressBar(terminal));
        return OutputFile.deliver(new DutyMapCsv(map), arguments, terminal) ? ExitCode.DONE : ExitCode.REFUSED;
    }

    private static Axis axis(Stretch stretch) {
        return new Axis(stretch.variable(), stretch.from().value(), stretch.to().value(), stretch.points());
    }
}
