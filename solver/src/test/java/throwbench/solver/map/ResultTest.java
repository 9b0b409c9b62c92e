package throwbench.solver.map;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import throwbench.solver.finding.Finding;
import throwbench.solver.finding.Judgement;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extremes;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.Summary;

class ResultTest {

    private final Subject subject = Boosters.subject();
    private final RunningMachine running = Boosters.running(subject.document());

    private Outcome ask(String text, int throwIndex) {
        return Boosters.result(subject, text).probe(throwIndex).at(running);
    }

    /** Identity: extremes against those of solve. */
    @Test
    void everyColumnHasTheExtremesOfSolve() {
        for (int t = 0; t < 2; t++) {
            Summary summary = Summary.of(running, t, Optional.empty());
            for (String name : Result.columns(subject.machine())) {
                if (!name.startsWith("pressure_Pa[")) {
                    Column column = List.of(Column.values()).stream()
                            .filter(c -> c.fileName().equals(name))
                            .findFirst()
                            .orElseThrow();
                    Extremes extremes = summary.extremes(column);
                    double most = column.inFile(extremes.greatest().value());
                    double least = column.inFile(extremes.least().value());
                    assertEquals(most, ask(name + ".max", t).value().getAsDouble(), name);
                    assertEquals(least, ask(name + ".min", t).value().getAsDouble(), name);
                }
            }
        }
    }

    @Test
    void aPressureIsThatOfItsChamberWhateverThrowIsShown() {
        double expected = Summary.of(running, 1, Optional.empty())
                .pressures()
                .get(0)
                .least()
                .value();

        assertEquals(expected, ask("pressure_Pa[B head].min", 0).value().getAsDouble());
        assertEquals(expected, ask("pressure_Pa[B head].min", 1).value().getAsDouble());
    }

    /** Completeness: every finding of the judgement, for both throws. */
    @Test
    void everyFindingIsTheWorstOfItsPlaces() {
        List<Finding> findings = Judgement.of(
                        subject.machine(), subject.machine().dutyPoints().subList(0, 1))
                .findings();
        for (int t = 0; t < 2; t++) {
            String name = t == 0 ? "A" : "B";
            for (String id : Result.findings()) {
                List<Finding> own = findings.stream()
                        .filter(f -> f.criterion().id().equals(id))
                        .filter(f -> f.where().throwName().map(name::equals).orElse(true))
                        .toList();
                Outcome margin = ask(id + ".margin", t);
                Outcome value = ask(id, t);
                if (own.isEmpty()) {
                    assertEquals("nothing here that " + id + " could be found of", margin.reason());
                    assertEquals(margin, value);
                } else {
                    // findings stand worst first
                    Finding worst = own.get(0);
                    assertEquals(worst.margin().isPresent(), margin.isPossible(), id);
                    worst.margin().ifPresent(m -> assertEquals(m, margin.value().getAsDouble(), 1e-9, id));
                    assertEquals(worst.value().isPresent(), value.isPossible(), id);
                }
            }
        }
        assertEquals("no limit given", ask("capacity.margin", 0).reason());
    }

    @Test
    void namesReadBackAndWhatIsNoneIsSaid() {
        for (String text : List.of(
                "rod-load-tension",
                "reversal-duration.margin",
                "rod_load_N.max",
                "pressure_Pa[A crank].min",
                "shaking_couple_y_N_m.min")) {
            assertEquals(text, Boosters.result(subject, text).text());
        }
        for (String text : List.of(
                "",
                ".",
                "rod-load-tension.max",
                "rod_load_N",
                "rod_load_N.margin",
                "crank_angle_deg.max",
                "pressure_Pa[C].max",
                "reversal-duration.margin.max")) {
            assertEquals("no such result", Result.find(subject.machine(), text).fault(), text);
        }
        assertEquals("no such finding", Result.findMargin("rod_load_N.max").fault());
        assertEquals("reversal-ratio.margin", Boosters.margin("reversal-ratio").text());
        assertEquals(
                "reversal-ratio.margin",
                Boosters.margin("reversal-ratio.margin").text());
    }

    @Test
    void unitsAreThoseOfTables() {
        assertEquals("N", Boosters.result(subject, "rod-load-tension").unit());
        assertEquals("deg", Boosters.result(subject, "reversal-duration").unit());
        assertEquals("1", Boosters.result(subject, "reversal-duration.margin").unit());
    }

    @Test
    void whatIsNoNumberIsNoValue() {
        assertEquals("comes out as NaN", Outcome.of(Double.NaN).reason());
        assertEquals(
                "comes out as Infinity", Outcome.of(Double.POSITIVE_INFINITY).reason());
        assertEquals(0, Double.compare(0.0, Outcome.of(-0.0).value().getAsDouble()));
        assertTrue(Outcome.of(1).reason().isEmpty());
    }
}
