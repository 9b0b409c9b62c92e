package throwbench.app.findings;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.quantity.PressureMark;
import throwbench.solver.document.quantity.UnitSystem;
import throwbench.solver.finding.Finding;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.DutyPoint;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.StageConditions;
import throwbench.solver.machine.Throw;

/** What a finding was computed from, a line each, in the units shown. */
final class FindingInputs {

    private final Machine machine;
    private final UnitSystem units;

    FindingInputs(Machine machine, UnitSystem units) {
        this.machine = machine;
        this.units = units;
    }

    List<String> of(Finding finding) {
        List<String> lines = new ArrayList<>();
        Optional<DutyPoint> duty = machine.dutyPoints().stream()
                .filter(d -> d.name().equals(finding.where().duty()))
                .findFirst();
        duty.ifPresent(d -> lines.add("speed " + show(d.speed(), Dimension.ROTATION_SPEED)));
        finding.where()
                .throwName()
                .flatMap(name -> machine.throwsInOrder().stream()
                        .filter(t -> t.name().equals(name))
                        .findFirst())
                .ifPresent(t -> {
                    addThrow(t, lines);
                    duty.ifPresent(d -> addChambers(t, d, lines));
                });
        return lines;
    }

    private void addThrow(Throw t, List<String> lines) {
        String linkage = "crank radius " + show(t.linkage().crankRadius(), Dimension.LENGTH) + ", rod length "
                + show(t.linkage().rodLength(), Dimension.LENGTH);
        if (t.linkage().guideOffset() != 0) {
            linkage += ", guide offset " + show(t.linkage().guideOffset(), Dimension.LENGTH);
        }
        lines.add(linkage);
        lines.add("piston and rod " + show(t.masses().pistonAndRod(), Dimension.MASS) + ", crosshead "
                + show(t.masses().crosshead(), Dimension.MASS));
    }

    private void addChambers(Throw t, DutyPoint duty, List<String> lines) {
        for (Chamber chamber : t.chambers()) {
            lines.add(chamber.name() + ": bore " + show(chamber.bore(), Dimension.LENGTH)
                    + chamber.stage()
                            .map(duty.stages()::get)
                            .map(this::pressures)
                            .orElse("")
                    + ", " + duty.condition(chamber.name()).state().text().replace('-', ' '));
        }
    }

    private String pressures(StageConditions stage) {
        return ", " + pressure(stage.suctionPressure()) + " to " + pressure(stage.dischargePressure());
    }

    private String pressure(OptionalDouble pressure) {
        return pressure.isPresent()
                ? units.show(pressure.getAsDouble(), Dimension.GAS_PRESSURE, PressureMark.ABSOLUTE, 0, 4)
                : "balanced";
    }

    private String show(double si, Dimension dimension) {
        return units.show(si, dimension, PressureMark.NONE, 0, 4);
    }
}
