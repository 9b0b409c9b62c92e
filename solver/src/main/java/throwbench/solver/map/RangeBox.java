package throwbench.solver.map;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeMap;
import throwbench.solver.document.KeyPath;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.machine.Ranges;

/** The box of duty variables that the machine's ranges span, as numbers of one duty point. */
final class RangeBox {

    private final List<Side> sides = new ArrayList<>();
    private final List<Setting> fixed = new ArrayList<>();

    private record Side(Variable variable, Ranges.Range range) {}

    private RangeBox() {}

    static RangeBox of(Subject subject) {
        RangeBox box = new RangeBox();
        Ranges ranges = subject.machine().ranges();
        KeyPath duty = subject.dutyPath();
        box.add(duty.key("speed"), Dimension.ROTATION_SPEED, ranges.speed());
        new TreeMap<>(ranges.stages()).forEach((name, range) -> {
            KeyPath stage = duty.key("stages").key(name);
            box.add(stage.key("suctionPressure"), Dimension.GAS_PRESSURE, range.suctionPressure());
            box.add(stage.key("suctionTemperature"), Dimension.TEMPERATURE, range.suctionTemperature());
            box.add(stage.key("dischargePressure"), Dimension.GAS_PRESSURE, range.dischargePressure());
        });
        return box;
    }

    /** A range of one value is no side of the box: the value holds everywhere in it. */
    private void add(KeyPath path, Dimension dimension, Optional<Ranges.Range> range) {
        if (range.isEmpty()) {
            return;
        }
        Variable variable = new Variable(path, dimension);
        if (range.get().least() < range.get().greatest()) {
            sides.add(new Side(variable, range.get()));
        } else {
            fixed.add(new Setting(variable, range.get().least()));
        }
    }

    /** Number of sides. */
    int size() {
        return sides.size();
    }

    /** @param place in shares of each side, 0 to 1 */
    List<Setting> settings(List<Double> place) {
        List<Setting> settings = new ArrayList<>(fixed);
        for (int d = 0; d < sides.size(); d++) {
            Ranges.Range range = sides.get(d).range();
            double share = place.get(d);
            double value = share == 1 ? range.greatest() : range.least() + share * (range.greatest() - range.least());
            settings.add(new Setting(sides.get(d).variable(), value));
        }
        return settings;
    }
}
