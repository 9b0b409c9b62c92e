package throwbench.solver.pump;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import throwbench.solver.chamber.ChamberCondition;
import throwbench.solver.chamber.ChamberState;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.machine.SuctionLine;
import throwbench.solver.machine.Throw;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.trial.Pumps;

/** Suction head by its parts, what is missing where it cannot be had, and arrangements that the handbooks know. */
class SuctionHeadTest {

    private static final OptionalDouble NONE = OptionalDouble.empty();

    private static SuctionLine line(OptionalDouble source, OptionalDouble factor) {
        return new SuctionLine(OptionalDouble.of(6), OptionalDouble.of(0.1), 2.5, 0.7, source, factor);
    }

    private static RunningMachine triplex(SuctionLine line) {
        return Pumps.running(
                Pumps.plungers(5, Pumps.IDEAL, 0, 120, 240),
                Pumps.duty(Pumps.WATER).with(line));
    }

    private static SuctionHead head(RunningMachine running) {
        return SuctionHead.of(running, Pumps.STAGE).value().orElseThrow();
    }

    @Test
    void handbookHeadIsJudgedWhereItIsKnown() {
        RunningMachine running = triplex(line(NONE, OptionalDouble.of(LiquidFactor.WATER.factor())));
        SuctionHead head = head(running);
        double efficiency = VolumetricEfficiency.ofStage(running, Pumps.STAGE).orElseThrow();
        double flow = efficiency * 3 * Math.PI / 4 * 0.07 * 0.07 * 0.12 * 31 / (2 * Math.PI);
        double velocity = flow / (Math.PI / 4 * 0.01);
        double handbook = 6 * velocity * (31 * 30 / Math.PI) * 0.066 / (1.5 * 9.80665);
        assertEquals(handbook, head.handbook().orElseThrow(), 1e-12);
        double standing = (1.5e5 - 2300) / (998 * 9.80665) + 2.5 - 0.7;
        assertEquals(standing - handbook, head.available(), 1e-12);
        assertEquals(
                String.format(
                        Locale.ROOT,
                        "acceleration head %.4g m by the handbook formula (C 0.0660, K 1.50), which is judged; %.4g m from"
                                + " the solved flow without its steps",
                        handbook,
                        head.solved()),
                head.note());
    }

    /** C is that of a rigid column at l/r = 5, rounded to 0.3 %; the factor K_h is all that divides the two heads. */
    @Test
    void rigidColumnNeedsTheHandbookHeadTimesItsLiquidFactor() {
        SuctionHead head = head(Pumps.running(
                Pumps.plungers(5, Pumps.IDEAL, 0, 120, 240),
                Pumps.duty(Pumps.RIGID).with(line(NONE, OptionalDouble.of(2.5)))));
        assertEquals(head.solved(), 2.5 * head.handbook().orElseThrow(), 0.0031 * head.solved());
    }

    @Test
    void sourcePressureGoesBeforeTheSuctionPressure() {
        double tank = head(triplex(line(OptionalDouble.of(1.1e5), NONE))).available();
        double pipe = head(triplex(line(NONE, NONE))).available();
        assertEquals(0.4e5 / (998 * 9.80665), pipe - tank, 1e-12);
    }

    @Test
    void solvedHeadIsJudgedWithoutALiquidFactor() {
        SuctionHead head = head(triplex(line(NONE, NONE)));
        assertEquals(NONE, head.handbook());
        assertEquals((1.5e5 - 2300) / (998 * 9.80665) + 2.5 - 0.7 - head.solved(), head.available(), 1e-12);
        assertEquals(
                String.format(
                        Locale.ROOT,
                        "acceleration head %.4g m from the solved flow without its steps, which is judged; the handbook"
                                + " formula needs the suction line's liquidFactor",
                        head.solved()),
                head.note());
    }

    @Test
    void solvedHeadIsJudgedWhereTheHandbooksHaveNoConstant() {
        Pumps.Duty duty = Pumps.duty(Pumps.WATER).with(line(NONE, OptionalDouble.of(1.5)));
        double[][] arrangements = {{0, 90, 180, 270}, {0, 110, 240}, {0, 90}};
        for (double[] phases : arrangements) {
            SuctionHead head = head(Pumps.running(Pumps.plungers(5, Pumps.IDEAL, phases), duty));
            assertEquals(NONE, head.handbook());
            assertEquals(
                    "the handbooks give no C for this arrangement",
                    head.note().substring(head.note().lastIndexOf(';') + 2));
        }
    }

    @Test
    void unlikeThrowsAndIdleChambersHaveNoConstant() {
        List<Throw> unlike = List.of(
                Pumps.plungers(5, Pumps.IDEAL, 0, 120, 240).get(0),
                Pumps.plungers(5.1, Pumps.IDEAL, 0, 120, 240).get(1),
                Pumps.plungers(5, Pumps.IDEAL, 0, 120, 240).get(2));
        assertEquals(NONE, PumpArrangement.constantOf(Pumps.running(unlike, Pumps.duty(Pumps.WATER)), Pumps.STAGE));
        Pumps.Duty unloaded = Pumps.duty(Pumps.WATER)
                .with(Map.of("P2 head", new ChamberCondition(ChamberState.HELD_OPEN, 0, Clearance.NONE)));
        RunningMachine idle = Pumps.running(Pumps.plungers(5, Pumps.IDEAL, 0, 120, 240), unloaded);
        assertEquals(NONE, PumpArrangement.constantOf(idle, Pumps.STAGE));
    }

    @Test
    void cranksMayFollowInEitherOrder() {
        for (double[] phases : new double[][] {{0, 270}, {0, 90}}) {
            RunningMachine duplex = Pumps.running(Pumps.pistons(5, Pumps.IDEAL, phases), Pumps.duty(Pumps.WATER));
            assertEquals(OptionalDouble.of(0.115), PumpArrangement.constantOf(duplex, Pumps.STAGE));
        }
        RunningMachine triplex = Pumps.running(Pumps.pistons(5, Pumps.IDEAL, 0, 240, 120), Pumps.duty(Pumps.WATER));
        assertEquals(OptionalDouble.of(0.066), PumpArrangement.constantOf(triplex, Pumps.STAGE));
    }

    @Test
    void missingPartsOfTheLineAreNamed() {
        assertEquals(
                "stage lift has no suctionLine",
                SuctionHead.of(triplex(Pumps.NO_LINE), Pumps.STAGE).reason());
        assertEquals(
                "the suctionLine of stage lift has no length",
                SuctionHead.of(triplex(new SuctionLine(NONE, NONE, 1, 0, NONE, NONE)), Pumps.STAGE)
                        .reason());
        assertEquals(
                "the suctionLine of stage lift has no bore",
                SuctionHead.of(triplex(new SuctionLine(OptionalDouble.of(6), NONE, 1, 0, NONE, NONE)), Pumps.STAGE)
                        .reason());
    }
}
