package throwbench.solver.chamber;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static throwbench.solver.chamber.LiquidChambers.WATER;
import static throwbench.solver.chamber.LiquidChambers.angleOf;
import static throwbench.solver.chamber.LiquidChambers.at;
import static throwbench.solver.chamber.LiquidChambers.duty;
import static throwbench.solver.chamber.LiquidChambers.passed;
import static throwbench.solver.chamber.LiquidChambers.solved;
import static throwbench.solver.chamber.LiquidChambers.work;

import java.util.List;
import org.junit.jupiter.api.Nested;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import throwbench.solver.chamber.ValveEvent.Valve;
import throwbench.solver.fluid.Liquid;
import throwbench.solver.fluid.PerfectGas;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;

/** The liquid cycle against closed forms (identities) and quadrature (a second method). */
class LiquidCycleTest {

    private static final LiquidValves IDEAL = new LiquidValves(0, 0, false, 0);
    private static final LiquidValves LOSSY = new LiquidValves(0.2e5, 0.4e5, false, Math.toRadians(7));
    private static final LiquidValves BRAKED = new LiquidValves(0.2e5, 0.4e5, true, Math.toRadians(7));

    /** Liquid soft enough that its clearance matters much. */
    private static final Liquid SOFT = new Liquid(800, 3e7, 2300);

    /** Pressures are read with a volume whose last digit K makes 1e-6 Pa of. */
    private static final double PRESSURE = 1e-4;

    @Nested
    class ClosedForms {

        @ParameterizedTest
        @CsvSource({"HEAD,0", "CRANK,0", "HEAD,0.05", "CRANK,-0.07"})
        void rigidLiquidIsDeliveredFromDeadCentreToDeadCentre(Side side, double offset) {
            ChamberDuty duty = duty(side, offset, new Liquid(1000, 1e30, 2300));
            PressureCurve curve = solved(IDEAL, duty);
            assertEquals(duty.volume().swept(), curve.inletVolumePerTurn(), 1e-15);
            assertEquals(1000 * duty.volume().swept(), curve.massPerTurn().orElseThrow(), 1e-12);
            assertEquals(duty.greatestVolumeAngle(), angleOf(curve, Valve.SUCTION, false), 1e-12);
            assertEquals(duty.leastVolumeAngle(), angleOf(curve, Valve.DISCHARGE, false), 1e-12);
            // an angle near a dead centre is known to the root of a double's last digit
            assertEquals(0, distance(duty.greatestVolumeAngle(), angleOf(curve, Valve.DISCHARGE, true)), 1e-7);
            assertEquals(0, distance(duty.leastVolumeAngle(), angleOf(curve, Valve.SUCTION, true)), 1e-7);
            // ∮ p dV = −(p_d − p_s) swept
            assertEquals(-39.5e5 * duty.volume().swept(), work(curve, duty), 1e-6);
        }

        @Test
        void clearanceTakesTheVolumeThatItsLiquidExpandsBy() {
            ChamberDuty duty = duty(Side.HEAD, 0, SOFT);
            double c = duty.volume().least();
            double expected = duty.volume().greatest() - c * Math.exp(39.5e5 / 3e7);
            assertEquals(expected, solved(IDEAL, duty).inletVolumePerTurn(), 1e-14);
        }

        @Test
        void flowAllowanceIsTakenOffTheWhole() {
            ChamberDuty full = duty(Side.HEAD, 0, SOFT);
            ChamberDuty slipping = new ChamberDuty(
                    full.linkage(),
                    full.rotation(),
                    full.volume(),
                    full.fluid(),
                    full.lines(),
                    full.condition(),
                    full.meanSpeed(),
                    0.06);
            PressureCurve curve = solved(LOSSY, slipping);
            double expected = 0.94 * solved(LOSSY, full).inletVolumePerTurn();
            assertEquals(expected, curve.inletVolumePerTurn(), 1e-16);
            assertEquals(800 * expected, curve.massPerTurn().orElseThrow(), 1e-13);
        }

        @ParameterizedTest
        @CsvSource({"HEAD,0,3e7", "CRANK,0,2.2e9", "HEAD,0.05,2.2e9", "CRANK,-0.07,3e7"})
        void valvesOpenWhereTheShutInLiquidReachesTheirPressure(Side side, double offset, double bulkModulus) {
            ChamberDuty duty = duty(side, offset, new Liquid(900, bulkModulus, 2300));
            PressureCurve curve = solved(LOSSY, duty);
            double suctionShuts = volume(curve, duty, duty.greatestVolumeAngle() + LOSSY.closingLag());
            double dischargeShuts = volume(curve, duty, duty.leastVolumeAngle() + LOSSY.closingLag());
            double rise = 41.4e5 - 1.3e5;
            assertEquals(
                    suctionShuts * Math.exp(-rise / bulkModulus),
                    volume(curve, duty, angleOf(curve, Valve.DISCHARGE, true)),
                    1e-15);
            assertEquals(
                    dischargeShuts * Math.exp(rise / bulkModulus),
                    volume(curve, duty, angleOf(curve, Valve.SUCTION, true)),
                    1e-15);
        }

        @ParameterizedTest
        @CsvSource({"HEAD,0,3e7", "CRANK,0,2.2e9", "HEAD,0.05,2.2e9", "CRANK,-0.07,3e7"})
        void workIsThatOfTwoLegsAndTwoLevels(Side side, double offset, double bulkModulus) {
            ChamberDuty duty = duty(side, offset, new Liquid(900, bulkModulus, 2300));
            PressureCurve curve = solved(LOSSY, duty);
            double v1 = volume(curve, duty, duty.greatestVolumeAngle() + LOSSY.closingLag());
            double v2 = volume(curve, duty, angleOf(curve, Valve.DISCHARGE, true));
            double v3 = volume(curve, duty, duty.leastVolumeAngle() + LOSSY.closingLag());
            double v4 = volume(curve, duty, angleOf(curve, Valve.SUCTION, true));
            double expected = leg(1.3e5, v1, v2, bulkModulus)
                    + 41.4e5 * (v3 - v2)
                    + leg(41.4e5, v3, v4, bulkModulus)
                    + 1.3e5 * (v1 - v4);
            assertEquals(expected, work(curve, duty), 1e-9 * Math.abs(expected));
        }

        /** ∫ (p₀ + K ln(V₀/V)) dV from V₀ to V. */
        private static double leg(double p0, double v0, double v, double bulkModulus) {
            return p0 * (v - v0) + bulkModulus * (v * Math.log(v0 / v) + v - v0);
        }
    }

    @Nested
    class Balances {

        /** Mass in the chamber changes only through the valves: both pass the same, at densities a factor exp(Δp/K) apart. */
        @ParameterizedTest
        @CsvSource({"HEAD,0,3e7", "CRANK,0,2.2e9", "HEAD,0.05,2.2e9", "CRANK,-0.07,3e7"})
        void bothValvesPassTheSameMass(Side side, double offset, double bulkModulus) {
            ChamberDuty duty = duty(side, offset, new Liquid(900, bulkModulus, 2300));
            PressureCurve curve = solved(LOSSY, duty);
            double drawn = passed(curve, duty, Valve.SUCTION);
            double delivered = passed(curve, duty, Valve.DISCHARGE) * Math.exp((41.4e5 - 1.3e5) / bulkModulus);
            assertEquals(drawn, delivered, 1e-12 * duty.volume().swept());
            assertEquals(
                    drawn, curve.inletVolumePerTurn(), 1e-12 * duty.volume().swept());
        }

        @Test
        void lossThatGrowsWithTheSpeedCostsWhatItsSquareComesTo() {
            ChamberDuty duty = duty(Side.HEAD, 0, new Liquid(1000, 1e30, 2300));
            LiquidValves valves = new LiquidValves(0.2e5, 0.4e5, true, 0);
            PressureCurve curve = solved(valves, duty);
            // ∫ (π s′/S)² A s′ dφ over a stroke, twice; s′ by a central difference of the travel
            double extra = 0;
            int n = 40_000;
            for (int i = 0; i < n; i++) {
                double angle = Math.PI * (i + 0.5) / n;
                double rate = (duty.linkage().travel(angle + 1e-5, duty.rotation())
                                - duty.linkage().travel(angle - 1e-5, duty.rotation()))
                        / 2e-5;
                extra += 0.6e5 * Math.pow(Math.PI * rate / 0.12, 2) * 0.004 * rate * Math.PI / n;
            }
            assertEquals(-39.5e5 * duty.volume().swept() - extra, work(curve, duty), 1e-6 * extra);
        }

        @Test
        void lossHoldsAtTheMeanPistonSpeed() {
            ChamberDuty duty = duty(Side.HEAD, 0, WATER);
            PressureCurve curve = solved(BRAKED, duty);
            double angle = bisect(duty, 2 * duty.linkage().stroke() / Angles.TURN);
            assertEquals(1.3e5, at(curve, duty, angle).pressure(), PRESSURE);
            assertEquals(41.4e5, at(curve, duty, Angles.TURN - angle).pressure(), PRESSURE);
        }

        /** Where the piston has a travel per radian (m) after its greatest speed on the inward stroke. */
        private static double bisect(ChamberDuty duty, double rate) {
            double low = Math.toRadians(90);
            double high = Math.PI;
            PressureCurve any = solved(IDEAL, duty);
            for (int i = 0; i < 60; i++) {
                double middle = (low + high) / 2;
                boolean faster = at(any, duty, middle).growth() / duty.volume().area() > rate;
                low = faster ? middle : low;
                high = faster ? high : middle;
            }
            return low;
        }

        @Test
        void movingAndStandingOpenPressuresAgreeWithoutLoss() {
            for (double bulkModulus : new double[] {3e7, 2.2e9, 1e15}) {
                ChamberDuty duty = duty(Side.CRANK, 0.05, new Liquid(900, bulkModulus, 2300));
                PressureCurve standing = solved(new LiquidValves(0, 0, false, 0.1), duty);
                PressureCurve moving = solved(new LiquidValves(0, 0, true, 0.1), duty);
                for (int i = 0; i < 4; i++) {
                    double expected = standing.events().get(i).crankAngle();
                    assertEquals(expected, moving.events().get(i).crankAngle(), 1e-11);
                }
                assertEquals(standing.inletVolumePerTurn(), moving.inletVolumePerTurn(), 1e-16);
            }
        }

        @Test
        void valvesOpenOnAPressureThatMovesWithTheSpeed() {
            ChamberDuty duty = duty(Side.HEAD, 0.03, SOFT);
            PressureCurve curve = solved(new LiquidValves(0.2e5, 9e5, true, 0.1), duty);
            double opens = angleOf(curve, Valve.DISCHARGE, true);
            LiquidChambers.Place place = at(curve, duty, opens);
            double rate = place.growth() / duty.volume().area();
            double open = 41e5 + 9e5 * Math.pow(Math.PI * rate / duty.linkage().stroke(), 2);
            double shuts = duty.greatestVolumeAngle() + 0.1;
            LiquidChambers.Place shut = at(curve, duty, shuts);
            double leg = shut.pressure() + 3e7 * Math.log(shut.volume() / place.volume());
            assertEquals(open, leg, 1e-3);
            assertEquals(open, place.pressure(), 1e-3);
        }
    }

    @Nested
    class WaysToPassNothing {

        @Test
        void noValveOpensInAClearanceThatTakesUpTheWholeStroke() {
            ChamberDuty duty = large(12);
            PressureCurve curve = solved(new LiquidValves(0.2e5, 0.4e5, false, 0.1), duty);
            assertPassesNothing(curve);
            assertEquals(List.of(), curve.events());
            assertEquals(1.3e5, at(curve, duty, duty.greatestVolumeAngle()).pressure(), PRESSURE);
            double v = duty.volume().greatest();
            for (double angle : new double[] {0, 1, 2, 4, 6}) {
                LiquidChambers.Place place = at(curve, duty, angle);
                assertEquals(1.3e5 + 3e7 * Math.log(v / place.volume()), place.pressure(), PRESSURE);
            }
            assertEquals(0, work(curve, duty), 1e-9);
            assertTrue(curve.notes().get(0).startsWith("no valve opens"), curve.notes()::toString);
        }

        @Test
        void suctionValveThatShutsTooLateGivesBackWhatItDrew() {
            ChamberDuty duty = large(6.5);
            PressureCurve curve = solved(new LiquidValves(0.2e5, 0.4e5, false, Math.toRadians(60)), duty);
            assertPassesNothing(curve);
            assertEquals(2, curve.events().size());
            assertEquals(0, passed(curve, duty, Valve.SUCTION), 1e-15);
            assertEquals(0, work(curve, duty), 1e-9);
            assertTrue(curve.notes().get(0).startsWith("the discharge valve does not open"), curve.notes()::toString);
        }

        @Test
        void dischargeValveThatShutsTooLateDeliversWhatFlowedBack() {
            // a rod so short and offset that the volume grows faster after its least than it falls after its greatest
            ChamberDuty duty = duty(
                    new Linkage(0.06, 0.11, 0), Rotation.COUNTER_CLOCKWISE, Side.HEAD, 6.2, SOFT, ChamberState.WORKING);
            PressureCurve curve = solved(new LiquidValves(0.2e5, 0.4e5, false, Math.toRadians(40)), duty);
            assertPassesNothing(curve);
            assertEquals(2, curve.events().size());
            assertEquals(0, passed(curve, duty, Valve.DISCHARGE), 1e-15);
            assertEquals(0, work(curve, duty), 1e-9);
            assertTrue(curve.notes().get(0).startsWith("the suction valve does not open"), curve.notes()::toString);
        }

        @Test
        void heldOpenChamberBreathesWithTheSuctionLine() {
            ChamberDuty duty = duty(
                    new Linkage(0.06, 0.3, 0.02), Rotation.CLOCKWISE, Side.CRANK, 0.4, WATER, ChamberState.HELD_OPEN);
            PressureCurve curve = solved(LOSSY, duty);
            assertPassesNothing(curve);
            double deadCentre = duty.linkage().crankEndDeadCentre(duty.rotation());
            // the crank end's volume falls on the inward stroke
            assertEquals(1.7e5, at(curve, duty, 0.5).pressure(), 0);
            assertEquals(1.3e5, at(curve, duty, deadCentre + 0.5).pressure(), 0);
            assertEquals(
                    1.7e5, at(curve, duty, deadCentre, Approach.JUST_BEFORE).pressure(), 0);
            assertEquals(1.3e5, at(curve, duty, deadCentre).pressure(), 0);
            assertEquals(-0.4e5 * duty.volume().swept(), work(curve, duty), 1e-10);
        }

        @Test
        void heldOpenLossThatGrowsWithTheSpeedVanishesAtTheDeadCentres() {
            ChamberDuty duty = duty(
                    new Linkage(0.06, 0.3, 0),
                    Rotation.COUNTER_CLOCKWISE,
                    Side.HEAD,
                    0.4,
                    WATER,
                    ChamberState.HELD_OPEN);
            PressureCurve curve = solved(BRAKED, duty);
            assertEquals(1.5e5, at(curve, duty, 0).pressure(), 1e-9);
            LiquidChambers.Place place = at(curve, duty, 1);
            double share = Math.pow(Math.PI * place.growth() / duty.volume().swept(), 2);
            assertEquals(1.5e5 - 0.2e5 * share, place.pressure(), 1e-9);
            assertEquals(1.5e5 + 0.2e5 * share, at(curve, duty, Angles.TURN - 1).pressure(), 1e-6);
        }

        private static ChamberDuty large(double clearance) {
            return duty(
                    new Linkage(0.06, 0.3, 0),
                    Rotation.COUNTER_CLOCKWISE,
                    Side.HEAD,
                    clearance,
                    SOFT,
                    ChamberState.WORKING);
        }

        private static void assertPassesNothing(PressureCurve curve) {
            assertEquals(0, curve.inletVolumePerTurn(), 0);
            assertEquals(0, curve.massPerTurn().orElseThrow(), 0);
            assertTrue(curve.dischargeTemperature().isEmpty());
        }
    }

    @Nested
    class Warnings {

        @Test
        void lateValvesCanPassMoreBackThanForth() {
            ChamberDuty duty = duty(Side.HEAD, 0, WATER);
            PressureCurve curve = solved(new LiquidValves(0, 0, false, Math.toRadians(95)), duty);
            double drawn = passed(curve, duty, Valve.SUCTION);
            assertEquals(drawn, curve.inletVolumePerTurn(), 1e-15);
            assertTrue(drawn < -0.05 * duty.volume().swept(), () -> "drawn " + drawn);
            assertTrue(curve.notes().get(0).endsWith("capacity is negative"), curve.notes()::toString);
        }

        @Test
        void pressureBelowTheVapourPressureIsTold() {
            ChamberDuty duty = duty(Side.HEAD, 0, WATER);
            // at the greatest speed the loss is near 2.56 times that at the mean speed
            assertEquals(
                    List.of(),
                    solved(new LiquidValves(0.57e5, 0, true, 0), duty).notes());
            assertEquals(
                    List.of(
                            "the pressure falls below the liquid's vapour pressure: it would boil, which this cycle does"
                                    + " not follow"),
                    solved(new LiquidValves(0.59e5, 0, true, 0), duty).notes());
        }
    }

    @Nested
    class Refusals {

        @Test
        void gasIsRefused() {
            assertEquals(
                    "a liquid cycle needs a liquid",
                    IDEAL.solve(duty(Side.HEAD, 0, new PerfectGas(0.029, 1.4))).refusal());
        }

        @Test
        void lagOfAWholeStrokeIsRefused() {
            LiquidValves late = new LiquidValves(0, 0, false, Math.PI);
            assertEquals(
                    "closingLag 180.00 deg, want less than the shorter stroke of 180.00 deg",
                    late.solve(duty(Side.HEAD, 0, WATER)).refusal());
        }

        @Test
        void dischargeThatDoesNotExceedSuctionIsRefused() {
            ChamberDuty duty = duty(Side.HEAD, 0, WATER);
            ChamberDuty falling = new ChamberDuty(
                    duty.linkage(),
                    duty.rotation(),
                    duty.volume(),
                    duty.fluid(),
                    new LineConditions(2e5, 1.9e5, duty.lines().suctionTemperature()),
                    duty.condition(),
                    duty.meanSpeed(),
                    0);
            // enough at the mean speed, but not at the dead centres, where a loss that grows with the speed is nought
            assertEquals(
                    List.of(),
                    solved(new LiquidValves(0.2e5, 0, false, 0), falling).notes());
            assertEquals(
                    "the discharge valve would stand open at 190000 Pa, which is not above the 200000 Pa of the open"
                            + " suction valve",
                    new LiquidValves(0.2e5, 0, true, 0).solve(falling).refusal());
        }

        @Test
        void failedValveIsRefused() {
            ChamberDuty duty = duty(
                    new Linkage(0.06, 0.3, 0),
                    Rotation.COUNTER_CLOCKWISE,
                    Side.HEAD,
                    0.4,
                    WATER,
                    ChamberState.FAILED_SUCTION);
            assertEquals(
                    "a failed valve needs the cycle valve-flow",
                    IDEAL.solve(duty).refusal());
        }
    }

    private static double volume(PressureCurve curve, ChamberDuty duty, double angle) {
        return at(curve, duty, angle).volume();
    }

    private static double distance(double a, double b) {
        return Math.IEEEremainder(a - b, Angles.TURN);
    }
}
