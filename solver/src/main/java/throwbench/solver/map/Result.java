package throwbench.solver.map;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import throwbench.solver.finding.Criterion;
import throwbench.solver.finding.Judgement;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.Machine;
import throwbench.solver.revolution.Column;

/** A result that a study asks for: a finding's value or margin, or an extreme of a solved column. */
public interface Result {

    /** As commands spell it: {@code reversal-duration.margin}, {@code rod_load_N.max}. */
    String text();

    /** Unit of its values as tables have it: N, deg, 1, …; empty where the text already ends in it. */
    String unit();

    /**
     * What takes this result, for one thread.
     *
     * @param throwIndex the throw, where the result is a throw's
     */
    Probe probe(int throwIndex);

    /** The result that a text names: {@code ID}, {@code ID.margin}, {@code COLUMN.max} or {@code COLUMN.min}. */
    static Choice<Result> find(Machine machine, String text) {
        int dot = text.lastIndexOf('.');
        String stem = dot < 0 ? text : text.substring(0, dot);
        String ending = dot < 0 ? "" : text.substring(dot + 1);
        Optional<Result> result =
                switch (ending) {
                    case "" -> criterion(text).map(criterion -> new FindingResult(criterion, false));
                    case "margin" -> criterion(stem).map(criterion -> new FindingResult(criterion, true));
                    case "max" -> column(machine, stem, true);
                    case "min" -> column(machine, stem, false);
                    default -> Optional.empty();
                };
        return result.map(Choice::of).orElseGet(() -> Choice.none("no such result"));
    }

    /** The margin of the finding of an id, with or without {@code .margin} behind it. */
    static Choice<FindingResult> findMargin(String text) {
        String id = text.endsWith(".margin") ? text.substring(0, text.length() - ".margin".length()) : text;
        return criterion(id)
                .map(criterion -> Choice.of(new FindingResult(criterion, true)))
                .orElseGet(() -> Choice.none("no such finding"));
    }

    private static Optional<Criterion> criterion(String id) {
        return Judgement.CRITERIA.stream().filter(c -> c.id().equals(id)).findFirst();
    }

    private static Optional<Result> column(Machine machine, String name, boolean greatest) {
        for (Column column : Column.values()) {
            if (column.fileName().equals(name) && column != Column.CRANK_ANGLE) {
                return Optional.of(new ColumnResult(column, greatest));
            }
        }
        for (int t = 0; t < machine.throwsInOrder().size(); t++) {
            List<Chamber> chambers = machine.throwsInOrder().get(t).chambers();
            for (int c = 0; c < chambers.size(); c++) {
                if (Column.pressureName(chambers.get(c).name()).equals(name)) {
                    return Optional.of(new PressureResult(chambers.get(c).name(), t, c, greatest));
                }
            }
        }
        return Optional.empty();
    }

    /** Ids of every finding. */
    static List<String> findings() {
        return Judgement.CRITERIA.stream().map(Criterion::id).toList();
    }

    /** Names of every column that has extremes, those of the pressures of all chambers too. */
    static List<String> columns(Machine machine) {
        List<String> names = new ArrayList<>();
        for (Column column : Column.values()) {
            if (column == Column.GAS_LOAD) {
                machine.throwsInOrder().stream()
                        .flatMap(t -> t.chambers().stream())
                        .map(chamber -> Column.pressureName(chamber.name()))
                        .forEach(names::add);
            }
            if (column != Column.CRANK_ANGLE) {
                names.add(column.fileName());
            }
        }
        return List.copyOf(names);
    }
}
