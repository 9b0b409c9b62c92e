package throwbench.solver.map;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import throwbench.solver.map.Crossing.Kind;

class LimitSearchTest {

    private static List<Crossing> crossings(double from, double to, LimitSearch.Margin margin) {
        return LimitSearch.of(() -> margin, from, to, 2, Watch.NONE)
                .orElseThrow()
                .crossings();
    }

    private static List<Crossing> zeros(double from, double to, DoubleUnaryOperator margin) {
        return crossings(from, to, x -> Outcome.of(margin.applyAsDouble(x)));
    }

    private static List<Crossing> limits(Subject subject, String path, double from, double to, String id) {
        return LimitSearch.of(subject, Boosters.variable(subject, path), from, to, Boosters.margin(id), 2, Watch.NONE)
                .orElseThrow()
                .crossings();
    }

    // closed forms

    @Test
    void everySmoothZeroIsFound() {
        List<Crossing> found = zeros(0.2, 20, Math::sin);

        assertEquals(6, found.size());
        for (int i = 0; i < found.size(); i++) {
            assertEquals(Kind.ZERO, found.get(i).kind());
            assertEquals((i + 1) * Math.PI, found.get(i).at(), 1e-11);
        }
        assertTrue(found.get(0).below().value().getAsDouble() > 0);
        assertTrue(found.get(0).above().value().getAsDouble() < 0);
    }

    @Test
    void twoZerosCloserThanTheScanAreFound() {
        // a parabola that dips below zero between 0.5021 and 0.5023, inside one interval of 0.005
        List<Crossing> found = zeros(0, 1, x -> (x - 0.5021) * (x - 0.5023));

        assertEquals(2, found.size());
        assertEquals(0.5021, found.get(0).at(), 1e-11);
        assertEquals(0.5023, found.get(1).at(), 1e-11);
    }

    @Test
    void twoZerosBesideAKinkAreFound() {
        List<Crossing> found = zeros(0, 1, x -> Math.abs(x - 0.7512) - 1e-4);

        assertEquals(2, found.size());
        assertEquals(0.7511, found.get(0).at(), 1e-11);
        assertEquals(0.7513, found.get(1).at(), 1e-11);
    }

    @Test
    void aZeroOnTheScanIsFoundOnce() {
        List<Crossing> found = zeros(0, 1, x -> 0.5 - x);

        assertEquals(1, found.size());
        assertEquals(0.5, found.get(0).at(), 1e-12);
        assertEquals(Kind.ZERO, found.get(0).kind());
        assertTrue(found.get(0).above().value().getAsDouble() < 0);
    }

    @Test
    void aStepOverZeroIsNoZero() {
        List<Crossing> found = zeros(0, 3, x -> x < Math.E ? 0.4 + x : -1);

        assertEquals(1, found.size());
        Crossing step = found.get(0);
        assertEquals(Kind.STEP, step.kind());
        assertEquals(Math.E, step.at(), 1e-11);
        assertEquals(0.4 + Math.E, step.below().value().getAsDouble(), 1e-9);
        assertEquals(-1, step.above().value().getAsDouble());
    }

    @Test
    void aStepOnOneSideOfZeroIsNone() {
        assertEquals(List.of(), zeros(0, 1, x -> x < 0.3 ? 2 : 1));
    }

    @Test
    void whereTheMarginCannotBeHadIsAnEdge() {
        Outcome none = Outcome.impossible("too far");
        List<Crossing> found = crossings(0, 2, x -> x > Math.sqrt(2) ? none : Outcome.of(x - 1));

        assertEquals(2, found.size());
        assertEquals(1, found.get(0).at(), 1e-12);
        assertEquals(Kind.EDGE, found.get(1).kind());
        assertEquals(Math.sqrt(2), found.get(1).at(), 1e-12);
        assertEquals(none, found.get(1).above());
    }

    @Test
    void aGapInsideABracketIsFoundAsAnEdge() {
        // positive up to 0.4013, nothing to 0.4022, negative beyond: all inside one interval of 0.005
        List<Crossing> found = crossings(
                0, 1, x -> x > 0.4013 && x < 0.4022 ? Outcome.impossible("gap") : Outcome.of(x <= 0.4013 ? 1 : -1));

        assertEquals(Kind.EDGE, found.get(0).kind());
        assertEquals(0.4013, found.get(0).at(), 1e-12);
    }

    @Test
    void nothingIsFoundWhereThereIsNothing() {
        assertEquals(List.of(), zeros(0, 1, x -> 1 + x * x));
        assertEquals(List.of(), crossings(0, 1, x -> Outcome.impossible("never")));
    }

    @Test
    void aRangeHasTwoEnds() {
        assertThrows(IllegalArgumentException.class, () -> zeros(1, 1, x -> x));
        assertThrows(IllegalArgumentException.class, () -> zeros(2, 1, x -> x));
    }

    @Test
    void aSearchThatIsNotWantedEnds() {
        AtomicInteger asked = new AtomicInteger();
        Watch watch = new Watch() {
            @Override
            public boolean cancelled() {
                return asked.get() >= 5;
            }
        };
        LimitSearch.Margin counting = x -> Outcome.of(asked.incrementAndGet());

        assertEquals(Optional.empty(), LimitSearch.of(() -> counting, 0, 1, 1, watch));
        assertEquals(5, asked.get());
    }

    // machines

    /** Closed form: mean piston speed 2 · stroke · n, in line stroke 2 r. */
    @Test
    void meanPistonSpeedLimitsTheSpeedInClosedForm() {
        List<Crossing> found = limits(
                Boosters.subject(), Boosters.SPEED, 300 * Boosters.RPM, 1500 * Boosters.RPM, "mean-piston-speed");

        assertEquals(1, found.size());
        // 4.5 m/s = 2 · 0.15 m · n: n = 15 1/s = 900 rpm
        assertEquals(900 * Boosters.RPM, found.get(0).at(), 1e-9);
    }

    /**
     * Clearance at which delivery stalls: p_s (V_max/V_min)^1.3 = p_d, c = 1/(15^(1/1.3) − 1) = 0.14226. P. K. Nag, Basic and
     * Applied Thermodynamics, 2006, ex. 19.4, p. 819, as the closed form.
     */
    @Test
    void deliveryStallsAtTheClearanceOfTheClosedForm() {
        String text = """
                { "throwbench": 1, "name": "stall", "drive": { "speed": "300 rpm" },
                  "fluids": { "air": { "kind": "gas", "molarMass": "28.96 g/mol", "isentropicExponent": 1.4 } },
                  "stages": { "first": { "fluid": "air" } },
                  "throws": [ { "name": "A", "crankRadius": "100 mm", "rodLength": "450 mm",
                    "masses": { "piston": "10 kg" }, "connectingRod": { "mass": "10 kg" },
                    "chambers": [ { "name": "one", "side": "head", "stage": "first", "bore": "200 mm",
                      "clearance": "5 %", "cycle": { "kind": "ideal-valves", "compressionExponent": 1.3,
                      "expansionExponent": 1.3 } } ] } ],
                  "dutyPoints": [ { "name": "greatest pressure", "stages": { "first": { "suctionPressure": "1 bar a",
                    "suctionTemperature": "300 K", "dischargePressure": "15 bar a" } } } ],
                  "limits": { "capacity": "0 kg/s" } }
                """;
        List<Crossing> found =
                limits(Boosters.subject(text, 0, 0), "throws[0].chambers[0].clearance", 0.05, 0.25, "capacity");

        assertEquals(1, found.size());
        assertEquals(1 / (Math.pow(15, 1 / 1.3) - 1), found.get(0).at(), 1e-9);
        // the printed 0.14226
        assertEquals(0.14226, found.get(0).at(), 5e-6);
        assertEquals(Kind.ZERO, found.get(0).kind());
    }

    /** Second method: the limit between two neighbours of a fine map, where the margin is nearly straight. */
    @Test
    void limitLiesWhereAMapInterpolatesIt() {
        Subject subject = Boosters.subject();
        Variable mass = Boosters.variable(subject, "throws[0].masses.piston");
        FindingResult tension = Boosters.margin("rod-load-tension");
        double from = 20;
        double to = 400;
        List<Crossing> found = limits(subject, "throws[0].masses.piston", from, to, "rod-load-tension");
        DutyMap map = new MapRun(
                        subject,
                        new Axis(mass, from, to, 39),
                        new Axis(Boosters.variable(subject, Boosters.SPEED), 740 * Boosters.RPM, 750 * Boosters.RPM, 2),
                        tension)
                .fill(2, Watch.NONE);

        assertEquals(1, found.size());
        int place = 0;
        while (map.at(place + 1, 0).orElseThrow().value().getAsDouble() > 0) {
            place++;
        }
        double before = map.at(place, 0).orElseThrow().value().getAsDouble();
        double behind = map.at(place + 1, 0).orElseThrow().value().getAsDouble();
        double straight = map.across().at(place) + 10 * before / (before - behind);
        assertEquals(straight, found.get(0).at(), 0.02);
        Outcome there = Boosters.alone(
                subject.document().withNumber(mass.path(), found.get(0).at()), tension);
        assertEquals(0, there.value().getAsDouble(), 1e-9);
    }

    /** Identity: at each limit of the speed the margin of the file with that speed is zero. */
    @Test
    void marginIsZeroAtEveryLimit() {
        Subject subject = Boosters.subject(Boosters.with("\"60 kN\"", "\"45 kN\""), 0, 0);
        List<Crossing> found =
                limits(subject, Boosters.SPEED, 100 * Boosters.RPM, 1500 * Boosters.RPM, "rod-load-tension");

        // inertia takes from the gas load first and outgrows it later
        assertEquals(2, found.size());
        for (Crossing crossing : found) {
            Outcome there = Boosters.alone(
                    subject.document().withNumber(subject.document().path(Boosters.SPEED), crossing.at()),
                    Boosters.margin("rod-load-tension"));
            assertEquals(0, there.value().getAsDouble(), 1e-9);
        }
    }
}
