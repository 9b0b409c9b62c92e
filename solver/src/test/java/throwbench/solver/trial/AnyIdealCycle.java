package throwbench.solver.trial;

import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ArbitrarySupplier;
import net.jqwik.api.Combinators;
import throwbench.solver.chamber.ChamberCondition;
import throwbench.solver.chamber.ChamberDuty;
import throwbench.solver.chamber.ChamberState;
import throwbench.solver.chamber.ChamberVolume;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.IdealValves;
import throwbench.solver.chamber.LineConditions;
import throwbench.solver.chamber.PressureCurve;
import throwbench.solver.chamber.Side;
import throwbench.solver.chamber.ValveEvent;
import throwbench.solver.fluid.PerfectGas;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;

/** Chambers on ideal valves, of any size, exponents and losses, at any pressures. */
public final class AnyIdealCycle implements ArbitrarySupplier<AnyIdealCycle.IdealCycle> {

    @Override
    public Arbitrary<IdealCycle> get() {
        return Combinators.combine(
                        new AnyLinkage().get(),
                        Arbitraries.of(Rotation.class),
                        Arbitraries.of(Side.class),
                        Numbers.between(0.003, 0.2).tuple2(),
                        valves(),
                        lines(),
                        Numbers.between(0, 0.2))
                .as((linkage, rotation, side, size, valves, lines, allowance) -> {
                    ChamberVolume volume = new ChamberVolume(
                            side, size.get1(), linkage.stroke(), size.get2() * 3 * size.get1() * linkage.stroke());
                    return new IdealCycle(linkage, rotation, volume, valves, lines, ChamberState.WORKING, allowance);
                });
    }

    private static Arbitrary<IdealValves> valves() {
        return Combinators.combine(
                        Numbers.between(0, 0.1),
                        Numbers.between(0, 0.1),
                        Numbers.between(1.01, 1.7),
                        Numbers.between(1.01, 1.7))
                .as((suction, discharge, nc, ne) ->
                        new IdealValves(suction, discharge, OptionalDouble.of(nc), OptionalDouble.of(ne)));
    }

    private static Arbitrary<LineConditions> lines() {
        return Combinators.combine(Numbers.between(0.3e5, 100e5), Numbers.between(1.05, 12), Numbers.between(250, 350))
                .as((suction, ratio, temperature) ->
                        new LineConditions(suction, suction * ratio, OptionalDouble.of(temperature)));
    }

    /** One of them, with what closed forms need of it. */
    public record IdealCycle(
            Linkage linkage,
            Rotation rotation,
            ChamberVolume volume,
            IdealValves valves,
            LineConditions lines,
            ChamberState state,
            double flowAllowance) {

        public PressureCurve solved() {
            ChamberDuty duty = new ChamberDuty(
                    linkage,
                    rotation,
                    volume,
                    gas(),
                    lines,
                    new ChamberCondition(state, 0, Clearance.NONE),
                    60,
                    flowAllowance);
            return valves.solve(duty).curve().orElseThrow();
        }

        public PerfectGas gas() {
            return new PerfectGas(0.0272, 1.29);
        }

        public double compressionExponent() {
            return valves.compressionExponent().getAsDouble();
        }

        public double expansionExponent() {
            return valves.expansionExponent().getAsDouble();
        }

        public double smallerExponent() {
            return Math.min(compressionExponent(), expansionExponent());
        }

        public double suctionPressure() {
            return lines.suctionPressure();
        }

        public double dischargePressure() {
            return lines.dischargePressure();
        }

        public double suctionTemperature() {
            return lines.suctionTemperature().getAsDouble();
        }

        public double suctionLoss() {
            return valves.suctionLoss();
        }

        /** In the chamber while the suction valve is open, Pa. */
        public double low() {
            return suctionPressure() * (1 - valves.suctionLoss());
        }

        public double high() {
            return dischargePressure() * (1 + valves.dischargeLoss());
        }

        public boolean valvesOpen() {
            return low() * Math.pow(volume.greatest() / volume.least(), smallerExponent()) >= high();
        }

        public double volumeAt(double crankAngle) {
            return volume.at(linkage.travel(crankAngle, rotation));
        }

        /** dV/dφ, from the slope of the travel in closed form, m³. */
        public double volumeRate(double crankAngle) {
            double theta = linkage.headEndAngle() + rotation.sign() * crankAngle;
            double sinRod = linkage.sinRodAngle(theta);
            double tanRod = sinRod / Math.sqrt(1 - sinRod * sinRod);
            double slope = linkage.crankRadius() * (Math.sin(theta) + Math.cos(theta) * tanRod) * rotation.sign();
            return volume.side() == Side.HEAD ? volume.area() * slope : -volume.area() * slope;
        }

        public boolean grows(double crankAngle) {
            return volumeRate(crankAngle) > 0;
        }

        /** Work that the piston does on the gas in a turn, J: the four legs one by one. */
        public double closedFormWork() {
            if (!valvesOpen()) {
                return 0;
            }
            double nc = compressionExponent();
            double ne = expansionExponent();
            double opensDischarge = volume.greatest() * Math.pow(low() / high(), 1 / nc);
            double opensSuction = volume.least() * Math.pow(high() / low(), 1 / ne);
            double compression = (high() * opensDischarge - low() * volume.greatest()) / (nc - 1);
            double discharge = high() * (opensDischarge - volume.least());
            double expansion = -(high() * volume.least() - low() * opensSuction) / (ne - 1);
            double suction = -low() * (volume.greatest() - opensSuction);
            return compression + discharge + expansion + suction;
        }

        /** Angles between which pressure and volume are smooth, from 0 to a turn. */
        public double[] breaks(PressureCurve curve) {
            DoubleStream events = curve.events().stream().mapToDouble(ValveEvent::crankAngle);
            DoubleStream ends = DoubleStream.of(0, linkage.crankEndDeadCentre(rotation), 2 * Math.PI);
            return DoubleStream.concat(events, ends).sorted().toArray();
        }

        public IdealCycle onTheOtherSide() {
            Side other = volume.side() == Side.HEAD ? Side.CRANK : Side.HEAD;
            ChamberVolume mirrored = new ChamberVolume(other, volume.area(), volume.stroke(), volume.clearance());
            return new IdealCycle(linkage, rotation, mirrored, valves, lines, state, flowAllowance);
        }

        public IdealCycle withDischarge(double pressure) {
            LineConditions raised = new LineConditions(suctionPressure(), pressure, lines.suctionTemperature());
            return new IdealCycle(linkage, rotation, volume, valves, raised, state, flowAllowance);
        }

        public IdealCycle heldOpen() {
            return new IdealCycle(linkage, rotation, volume, valves, lines, ChamberState.HELD_OPEN, flowAllowance);
        }
    }
}
