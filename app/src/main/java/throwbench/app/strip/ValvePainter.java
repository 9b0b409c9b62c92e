package throwbench.app.strip;

import java.util.ArrayList;
import java.util.List;
import throwbench.app.drawing.Palette;
import throwbench.app.drawing.Pen;
import throwbench.app.drawing.ShortNames;
import throwbench.app.drawing.TextFit;
import throwbench.solver.chamber.ChamberState;
import throwbench.solver.chamber.ValveEvent;
import throwbench.solver.machine.Chamber;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.revolution.RunningThrow;

/**
 * When the valves of each chamber stand open, one row a chamber: a dimension line from opening to shutting with the valve's
 * name in it; and a mark at every opening and shutting on the chamber's pressure trace.
 */
final class ValvePainter {

    private static final double SIZE = 11;

    private final double[] px = new double[3];
    private final double[] py = new double[3];

    /** A stretch over which a valve is open; to may lie beyond 2π. */
    record Open(ValveEvent.Valve valve, double from, double to) {}

    /** The open stretches of one chamber: each opening with the next shutting of the same valve. */
    static List<Open> open(List<ValveEvent> events) {
        List<Open> stretches = new ArrayList<>();
        for (ValveEvent opening : events) {
            if (opening.opens()) {
                events.stream()
                        .filter(e -> !e.opens() && e.valve() == opening.valve())
                        .mapToDouble(e -> Angles.wrap(e.crankAngle() - opening.crankAngle()))
                        .min()
                        .ifPresent(length -> stretches.add(
                                new Open(opening.valve(), opening.crankAngle(), opening.crankAngle() + length)));
            }
        }
        return stretches;
    }

    void paint(Pen pen, StripPlot plot, Palette palette) {
        StripLayout layout = plot.layout();
        RunningThrow running =
                plot.shown().running().throwsInOrder().get(plot.shown().throwIndex());
        List<String> shortNames =
                ShortNames.of(running.chambers().stream().map(Chamber::name).toList());
        for (int c = 0; c < layout.valveRows().size(); c++) {
            row(pen, plot, running, c, shortNames, palette);
        }
        for (StripEvent event : plot.events().all()) {
            if (event.kind().ofValve()) {
                mark(pen, plot, event, palette);
            }
        }
    }

    private static void row(
            Pen pen, StripPlot plot, RunningThrow running, int c, List<String> shortNames, Palette palette) {
        StripLayout layout = plot.layout();
        double y = layout.valveRows().get(c).middle();
        Chamber chamber = running.chambers().get(c);
        pen.font(SIZE, false);
        pen.fill(palette.ground().soft());
        pen.text(
                TextFit.name(pen, "valves " + chamber.name(), "valves " + shortNames.get(c), layout.left() - 24),
                10,
                y + 4,
                Pen.Align.LEFT);
        List<Open> stretches = open(running.curves().get(c).events());
        for (Open open : stretches) {
            piece(pen, layout, y, open, Math.max(0, open.from()), Math.min(Angles.TURN, open.to()), palette);
            if (open.to() > Angles.TURN) {
                piece(pen, layout, y, open, 0, open.to() - Angles.TURN, palette);
            }
        }
        if (stretches.isEmpty()) {
            ChamberState state =
                    plot.shown().running().dutyPoint().condition(chamber.name()).state();
            String words = state == ChamberState.WORKING
                    ? "no valve opens"
                    : state.text().replace('-', ' ');
            pen.fill(palette.ground().surface(), 0.85);
            pen.rect(layout.left() + 6, y - 6, pen.width(words) + 4, 13, 2, true, false);
            pen.fill(palette.ground().soft());
            pen.text(words, layout.left() + 8, y + 4, Pen.Align.LEFT);
        }
    }

    /** One piece of a dimension line: end ticks only where the valve really opens or shuts. */
    private static void piece(
            Pen pen, StripLayout layout, double y, Open open, double from, double to, Palette palette) {
        double left = layout.x(from);
        double right = layout.x(to);
        pen.font(SIZE, false);
        String name = open.valve().text();
        double width = pen.width(name) + 10;
        boolean named = right - left > width + 16;
        double middle = (left + right) / 2;
        pen.stroke(palette.loads().gas(), 1.6);
        if (named) {
            pen.line(left, y, middle - width / 2, y);
            pen.line(middle + width / 2, y, right, y);
            pen.fill(palette.loads().gas());
            pen.text(name, middle, y + 4, Pen.Align.CENTRE);
        } else {
            pen.line(left, y, right, y);
        }
        if (from == Angles.wrap(open.from())) {
            pen.line(left, y - 5, left, y + 5);
        }
        if (to != Angles.TURN || open.to() == Angles.TURN) {
            pen.line(right, y - 5, right, y + 5);
        }
    }

    /** On the pressure trace: a triangle that points up where a valve opens, down where it shuts. */
    private void mark(Pen pen, StripPlot plot, StripEvent event, Palette palette) {
        for (int l = 0; l < plot.lanes().size(); l++) {
            if (plot.lanes().get(l).kind() == Lane.Kind.PRESSURE) {
                double x = plot.layout().x(event.angle());
                double[] trace = plot.y(l, event.chamber());
                int station = (int) Math.rint(event.angle() / Angles.TURN * (plot.points() - 1));
                double y = trace[station];
                double tip = event.kind() == StripEvent.Kind.VALVE_OPENS ? -4.5 : 4.5;
                px[0] = x;
                py[0] = y + tip;
                px[1] = x - 4;
                py[1] = y - tip * 0.7;
                px[2] = x + 4;
                py[2] = py[1];
                pen.fill(palette.ground().surface());
                pen.stroke(palette.loads().gas(), 1.4);
                pen.polygon(px, py, 3, true, true);
            }
        }
    }
}
