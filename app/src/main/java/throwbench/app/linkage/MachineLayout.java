package throwbench.app.linkage;

import java.util.ArrayList;
import java.util.List;
import throwbench.app.linkage.parts.ThrowAxes;
import throwbench.app.linkage.parts.ThrowLayout;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Throw;

/**
 * Every throw of a machine laid out, seen along the shaft: their places along it play no part.
 *
 * @param throwsInOrder one for each throw of the machine
 * @param directions γ of each, rad
 */
public record MachineLayout(List<ThrowLayout> throwsInOrder, List<Double> directions) {

    /** Directions nearer than this are one, rad. */
    private static final double SAME = 1e-6;

    public MachineLayout {
        throwsInOrder = List.copyOf(throwsInOrder);
        directions = List.copyOf(directions);
    }

    public static MachineLayout of(Machine machine) {
        List<ThrowLayout> layouts = new ArrayList<>();
        List<Double> directions = new ArrayList<>();
        for (Throw t : machine.throwsInOrder()) {
            layouts.add(ThrowLayout.of(machine, t));
            directions.add(t.place().axisDirection());
        }
        return new MachineLayout(layouts, directions);
    }

    public int size() {
        return throwsInOrder.size();
    }

    public ThrowLayout of(int throwIndex) {
        return throwsInOrder.get(throwIndex);
    }

    /** The axes of a throw in points. */
    public ThrowAxes axes(int throwIndex, Framing framing) {
        return ThrowAxes.of(framing.originX(), framing.originY(), framing.scale(), directions.get(throwIndex));
    }

    /** Whether two throws stand one behind the other, on the same line of stroke. */
    public boolean coincide(int a, int b) {
        double turn = Math.IEEEremainder(directions.get(a) - directions.get(b), 2 * Math.PI);
        return Math.abs(turn) < SAME
                && of(a).linkage().guideOffset() == of(b).linkage().guideOffset();
    }
}
