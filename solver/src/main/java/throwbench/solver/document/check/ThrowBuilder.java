package throwbench.solver.document.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import throwbench.solver.chamber.Clearance;
import throwbench.solver.chamber.Cycle;
import throwbench.solver.chamber.FlowValves;
import throwbench.solver.chamber.IdealValves;
import throwbench.solver.chamber.LiquidValves;
import throwbench.solver.chamber.Side;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.load.ConnectingRod;
import throwbench.solver.load.Crank;
import throwbench.solver.load.Friction;
import throwbench.solver.load.ReciprocatingMasses;
import throwbench.solver.machine.BearingPart;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.CrossheadPart;
import throwbench.solver.machine.Parts;
import throwbench.solver.machine.PistonRodPart;
import throwbench.solver.machine.ShaftPlace;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Linkage;

/** Makes a throw of a file without faults. */
final class ThrowBuilder {

    private ThrowBuilder() {}

    static Throw build(Fields one) {
        Fields masses = one.object("masses");
        Fields rod = one.object("connectingRod");
        List<Chamber> chambers = new ArrayList<>();
        one.items("chambers").forEach(chamber -> chambers.add(chamber(chamber)));
        return new Throw(
                one.text("name"),
                new ShaftPlace(one.value("crankPhase"), one.value("axisDirection"), one.value("shaftPosition")),
                new Linkage(one.value("crankRadius"), one.value("rodLength"), one.value("guideOffset")),
                new ReciprocatingMasses(masses.value("piston"), masses.value("pistonRod"), masses.value("crosshead")),
                new ConnectingRod(rod.value("mass"), rod.number("massCentreFromCrankPin"), rod.number("inertia")),
                new Crank(
                        one.object("crank").value("unbalance"),
                        one.object("crank").value("counterweight")),
                new Friction(
                        one.object("friction").value("packing"),
                        one.object("friction").value("guideCoefficient")),
                chambers,
                parts(one),
                MachineBuilder.limits(one.object("limits")));
    }

    private static Chamber chamber(Fields chamber) {
        return new Chamber(
                chamber.text("name"),
                Side.HEAD.text().equals(chamber.text("side")) ? Side.HEAD : Side.CRANK,
                chamber.given("stage"),
                chamber.value("bore"),
                chamber.value("innerDiameter"),
                clearance(chamber, "clearance"),
                cycle(chamber.object("cycle")),
                chamber.value("flowAllowance"),
                MachineBuilder.limits(chamber.object("limits")));
    }

    /** A share or a volume, as it is written; none where nothing is. */
    static Clearance clearance(Fields fields, String name) {
        return fields.quantity(name)
                .map(q -> new Clearance(q.value(), Dimension.SHARE.holds(q.unit())))
                .orElse(Clearance.NONE);
    }

    private static Cycle cycle(Fields cycle) {
        return switch (cycle.kind()) {
            case "ideal-valves" ->
                new IdealValves(
                        cycle.value("suctionLoss"),
                        cycle.value("dischargeLoss"),
                        cycle.number("compressionExponent"),
                        cycle.number("expansionExponent"));
            case "valve-flow" -> new FlowValves(cycle.value("suctionFlowArea"), cycle.value("dischargeFlowArea"));
            case "liquid" ->
                new LiquidValves(
                        cycle.value("suctionLoss"),
                        cycle.value("dischargeLoss"),
                        cycle.text("lossLaw").equals("speed-squared"),
                        cycle.value("closingLag"));
            default -> cycle.checked().recording(cycle.node()).orElseThrow();
        };
    }

    private static Parts parts(Fields one) {
        Fields rod = one.object("pistonRodPart");
        Fields crosshead = one.object("crossheadPart");
        return new Parts(
                rod.isThere() ? Optional.of(pistonRod(rod)) : Optional.empty(),
                crosshead.isThere() ? Optional.of(crosshead(crosshead)) : Optional.empty(),
                bearing(one.object("crankPinPart")),
                bearing(one.object("mainBearingPart")));
    }

    private static PistonRodPart pistonRod(Fields rod) {
        return new PistonRodPart(
                rod.number("diameter"),
                rod.number("threadRootDiameter"),
                rod.number("freeLength"),
                rod.number("elasticModulus"),
                rod.number("yieldStrength"),
                rod.number("ultimateStrength"),
                rod.number("enduranceLimit"),
                rod.number("stressConcentration"),
                rod.number("preload"));
    }

    private static CrossheadPart crosshead(Fields crosshead) {
        return new CrossheadPart(
                crosshead.number("pinDiameter"), crosshead.number("pinLength"), crosshead.number("shoeArea"));
    }

    private static Optional<BearingPart> bearing(Fields bearing) {
        return bearing.isThere()
                ? Optional.of(new BearingPart(bearing.number("diameter"), bearing.number("length")))
                : Optional.empty();
    }
}
