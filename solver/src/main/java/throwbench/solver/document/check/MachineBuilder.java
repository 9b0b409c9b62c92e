package throwbench.solver.document.check;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.document.json.Node;
import throwbench.solver.fluid.Fluid;
import throwbench.solver.fluid.GasMixture;
import throwbench.solver.fluid.Liquid;
import throwbench.solver.fluid.PerfectGas;
import throwbench.solver.machine.Bookmark;
import throwbench.solver.machine.Drive;
import throwbench.solver.machine.Driver;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.machine.Limits;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Site;
import throwbench.solver.machine.Stage;
import throwbench.solver.machine.SuctionLine;
import throwbench.solver.machine.Throw;
import throwbench.solver.mechanism.Rotation;

/** Makes the machine of a file without faults. */
public final class MachineBuilder {

    private MachineBuilder() {}

    /** The machine; the file must have no flaw. */
    public static Machine build(Checked checked) {
        Fields file = Fields.root(checked);
        Drive drive = drive(file.object("drive"));
        DutyBuilder duty = new DutyBuilder(drive.speed());
        Map<String, Fluid> fluids = new LinkedHashMap<>();
        file.items("fluids").forEach(fluid -> fluids.put(fluid.name(), fluid(fluid)));
        List<Stage> stages = new ArrayList<>();
        file.items("stages").forEach(stage -> stages.add(stage(stage)));
        List<Throw> all = new ArrayList<>();
        file.items("throws").forEach(one -> all.add(ThrowBuilder.build(one)));
        List<Bookmark> bookmarks = new ArrayList<>();
        file.items("bookmarks").forEach(mark -> bookmarks.add(bookmark(mark)));
        return new Machine(
                file.text("name"),
                file.text("notes"),
                site(file.object("site"), checked.ambientPressure()),
                drive,
                fluids,
                stages,
                all,
                duty.points(file.items("dutyPoints")),
                limits(file.object("limits")),
                duty.loadSteps(file.items("loadSteps")),
                DutyBuilder.ranges(file.object("ranges")),
                bookmarks);
    }

    private static Site site(Fields site, double ambient) {
        return new Site(ambient, site.number("framePressure").orElse(ambient), site.flag("gravity"));
    }

    private static Drive drive(Fields drive) {
        return new Drive(
                drive.value("speed"),
                Rotation.CLOCKWISE.text().equals(drive.text("rotation"))
                        ? Rotation.CLOCKWISE
                        : Rotation.COUNTER_CLOCKWISE,
                drive.number("rotatingInertia"),
                driver(drive.object("driver")),
                drive.value("mechanicalEfficiency"));
    }

    private static Driver driver(Fields driver) {
        return switch (driver.kind()) {
            case "constant-torque" -> new Driver.ConstantTorque();
            case "slip" -> new Driver.Slip(driver.value("ratedTorque"), driver.value("ratedSlip"));
            default -> new Driver.ConstantSpeed();
        };
    }

    private static Fluid fluid(Fields fluid) {
        if (fluid.kind().equals("liquid")) {
            return new Liquid(fluid.value("density"), fluid.value("bulkModulus"), fluid.value("vapourPressure"));
        }
        if (!fluid.has("mixture")) {
            return new PerfectGas(fluid.value("molarMass"), fluid.value("isentropicExponent"));
        }
        Map<String, Double> fractions = new LinkedHashMap<>();
        for (Node part : fluid.values("mixture")) {
            fractions.put(
                    part.name(), fluid.checked().quantity(part).orElseThrow().value());
        }
        return new GasMixture(fractions, fluid.text("model").equals("real"));
    }

    private static Stage stage(Fields stage) {
        Fields line = stage.object("suctionLine");
        return new Stage(
                stage.name(),
                stage.text("fluid"),
                stage.given("follows"),
                line.isThere() ? Optional.of(suctionLine(line)) : Optional.empty(),
                limits(stage.object("limits")));
    }

    private static SuctionLine suctionLine(Fields line) {
        return new SuctionLine(
                line.number("length"),
                line.number("bore"),
                line.value("staticHead"),
                line.value("frictionLoss"),
                line.number("sourcePressure"),
                line.number("liquidFactor"));
    }

    private static Bookmark bookmark(Fields mark) {
        return new Bookmark(mark.text("throw"), mark.value("angle"), mark.text("note"));
    }

    static Limits limits(Fields limits) {
        if (!limits.isThere()) {
            return Limits.NONE;
        }
        Map<LimitKey, Double> values = new EnumMap<>(LimitKey.class);
        for (LimitKey key : LimitKey.values()) {
            OptionalDouble value = limits.has(key.text()) ? limits.number(key.text()) : OptionalDouble.empty();
            value.ifPresent(limit -> values.put(key, limit));
        }
        return new Limits(values);
    }
}
