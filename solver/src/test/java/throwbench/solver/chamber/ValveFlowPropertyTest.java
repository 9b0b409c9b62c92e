package throwbench.solver.chamber;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalDouble;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import throwbench.solver.chamber.flow.LeakyTotals;
import throwbench.solver.fluid.PerfectGas;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;

/** Any chamber: valves over four decades, ratios 1.05 to 8, 50 to 2000 rev/min, clearances 2 to 100 %, offset or in line. */
class ValveFlowPropertyTest {

    private static final double TEMPERATURE = 300;

    /** A chamber and its valves. */
    record Any(FlowValves valves, ChamberDuty duty) {
        double gasConstant() {
            return ((PerfectGas) duty.fluid()).gasConstant();
        }

        double k() {
            return ((PerfectGas) duty.fluid()).isentropicExponent();
        }
    }

    @Provide
    Arbitrary<Any> working() {
        return any(Arbitraries.just(ChamberState.WORKING));
    }

    @Provide
    Arbitrary<Any> leaking() {
        return any(Arbitraries.of(ChamberState.HELD_OPEN, ChamberState.FAILED_SUCTION, ChamberState.FAILED_DISCHARGE));
    }

    private static Arbitrary<Any> any(Arbitrary<ChamberState> states) {
        Arbitrary<double[]> numbers = between(0, 1).array(double[].class).ofSize(13);
        return Combinators.combine(numbers, states, Arbitraries.of(Side.class), Arbitraries.of(Rotation.class))
                .as(ValveFlowPropertyTest::build);
    }

    private static Any build(double[] x, ChamberState state, Side side, Rotation rotation) {
        double radius = 0.02 + 0.38 * x[0];
        double ratio = 1.7 + 6.3 * x[1];
        double offset = x[2] < 0.5 ? 0 : (x[2] - 0.75) * 3.6 * (ratio - 1) * radius;
        Linkage linkage = new Linkage(radius, ratio * radius, offset);
        double area = decades(1e-3, 0.3, x[3]);
        double low = decades(1e5, 5e6, x[4]);
        double high = low * (1.05 + 6.95 * x[5]);
        FlowValves valves = new FlowValves(area * decades(1e-4, 1, x[6]), area * decades(1e-4, 1, x[7]));
        ChamberDuty duty = new ChamberDuty(
                linkage,
                rotation,
                new ChamberVolume(side, area, linkage.stroke(), decades(0.02, 1, x[8]) * area * linkage.stroke()),
                new PerfectGas(decades(0.002, 0.06, x[9]), 1.05 + 0.6 * x[10]),
                new LineConditions(low, high, OptionalDouble.of(TEMPERATURE)),
                new ChamberCondition(state, area * decades(1e-4, 1, x[11]), Clearance.NONE),
                decades(50, 2000, x[12]) * Math.PI / 30,
                0);
        return new Any(valves, duty);
    }

    private static double decades(double from, double to, double share) {
        return from * Math.pow(to / from, share);
    }

    private static Arbitrary<Double> between(double least, double greatest) {
        return Arbitraries.doubles().between(least, greatest).ofScale(9).withoutEdgeCases();
    }

    @Property
    void workingValvesAlwaysSettleAndPassTheSameMass(@ForAll("working") Any any) {
        WorkingFlow flow = new WorkingFlow(any.valves(), any.duty(), any.gasConstant(), any.k(), TEMPERATURE);
        if (flow.reaches()) {
            assertTrue(flow.search(1e-8, 40), "turns " + flow.passes());
            PressureCurve curve = flow.curve(List.of());
            // sums of the flows against the energy balance; the allowance is for valves a thousand times too small
            double allowed = 1e-4 * flow.drawn() + 1e-5 * any.duty().volume().swept();
            assertEquals(flow.drawn(), flow.flowedIn(), allowed);
            double hot = curve.dischargeTemperature().orElseThrow() / TEMPERATURE;
            assertEquals(flow.drawn() * hot, flow.flowedOut(), allowed * hot);
            assertEquals(4, curve.events().size());
            sound(any, curve);
        } else {
            sound(any, FlowSample.solved(any.valves(), any.duty()));
        }
    }

    @Property(tries = 200)
    void leakingChambersAlwaysSettle(@ForAll("leaking") Any any) {
        LeakyFlow flow = new LeakyFlow(any.valves(), any.duty(), any.gasConstant(), any.k(), TEMPERATURE);
        assertTrue(flow.search(1e-8, 400), "turns " + flow.turns());
        PressureCurve curve = flow.curve(List.of());
        sound(any, curve);
        double drawn = curve.massPerTurn().orElseThrow() * any.gasConstant();
        LeakyTotals totals = flow.turn().totals();
        double scale = flow.turn().content() + totals.delivered();
        assertEquals(totals.delivered() - totals.returned(), drawn, 3e-8 * scale);
    }

    @Property(tries = 200)
    void aMapFindsNearlyTheSame(@ForAll("working") Any any) {
        ChamberDuty duty = any.duty();
        double[] exact = FlowSample.pressures(FlowSample.solved(any.valves(), duty), duty, 360);
        ChamberDuty map = duty.followed(CycleAccuracy.MAP);
        double[] found = FlowSample.pressures(FlowSample.solved(any.valves(), map), map, 360);
        double peak = FlowSample.greatest(exact);
        assertEquals(peak, FlowSample.greatest(found), 2e-3 * peak);
    }

    private static void sound(Any any, PressureCurve curve) {
        ChamberDuty duty = any.duty();
        LineConditions lines = duty.lines();
        double whole = Math.pow(duty.volume().greatest() / duty.volume().least(), any.k());
        for (double pressure : FlowSample.pressures(curve, duty, 360)) {
            assertTrue(
                    pressure > lines.suctionPressure() / whole / 1.01
                            && pressure < lines.dischargePressure() * whole * 1.01,
                    "pressure " + pressure);
        }
        ValveLossWork loss = curve.valveLossWork().orElseThrow();
        assertTrue(loss.suction() >= 0 && loss.discharge() >= 0, loss.toString());
    }
}
