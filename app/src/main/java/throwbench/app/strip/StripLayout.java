package throwbench.app.strip;

import java.util.ArrayList;
import java.util.List;
import throwbench.solver.mechanism.Angles;

/**
 * Where everything in the strip stands, y downwards: legend at the left, scales at the right, between them from top to bottom
 * the reversal band, the rows of named marks, the lanes, the valve rows and the degree axis.
 *
 * @param left x of 0°
 * @param right x of 360°
 * @param markRows rows of named marks under the band
 * @param lanes one a lane
 * @param valveRows one a chamber, or none where there is no room
 * @param axis the row of degrees
 */
record StripLayout(
        double width,
        double height,
        double left,
        double right,
        Row band,
        List<Row> markRows,
        List<Row> lanes,
        List<Row> valveRows,
        Row axis) {

    private static final double EDGE = 8;
    private static final double LANE_GAP = 7;
    private static final double TIGHT_GAP = 5;
    private static final double MARK_ROW = 15;
    private static final double VALVE_ROW = 16;

    /** A stretch of height across the strip. */
    record Row(double top, double bottom) {

        double height() {
            return bottom - top;
        }

        double middle() {
            return (top + bottom) / 2;
        }
    }

    static StripLayout of(double width, double height, List<Lane> lanes, int chambers) {
        double left = Math.rint(Math.max(146, Math.min(182, 0.19 * width)));
        double right = Math.max(left + 60, width - (width >= 700 ? 62 : 54));
        double bandHeight = height >= 400 ? 31 : height >= 230 ? 27 : 20;
        Row band = new Row(EDGE, EDGE + bandHeight);
        double y = band.bottom() + 2;
        List<Row> marks = new ArrayList<>();
        for (int i = 0; i < (height >= 330 ? 2 : height >= 230 ? 1 : 0); i++) {
            marks.add(new Row(y, y + MARK_ROW));
            y += MARK_ROW;
        }
        double axisHeight = height >= 260 ? 37 : 24;
        Row axis = new Row(height - axisHeight - 3, height - 3);
        double bottom = axis.top();
        List<Row> valves = new ArrayList<>();
        if (chambers > 0 && height >= 300 && chambers * VALVE_ROW <= 0.2 * height) {
            bottom -= chambers * VALVE_ROW + 3;
            for (int c = 0; c < chambers; c++) {
                valves.add(new Row(bottom + c * VALVE_ROW, bottom + (c + 1) * VALVE_ROW));
            }
        }
        return new StripLayout(
                width,
                height,
                left,
                right,
                band,
                List.copyOf(marks),
                stack(lanes, y + 3, bottom - 4, height >= 260 ? LANE_GAP : TIGHT_GAP),
                valves,
                axis);
    }

    /** Every lane gets what its legend needs, and of the rest a share by its weight. */
    private static List<Row> stack(List<Lane> lanes, double top, double bottom, double gap) {
        double weights = lanes.stream().mapToDouble(Lane::weight).sum();
        double room = Math.max(lanes.size() * 6.0, bottom - top - gap * (lanes.size() - 1));
        double needs = lanes.stream()
                .mapToDouble(l -> LegendPainter.need(l.traces().size()))
                .sum();
        double kept = Math.min(1, room / needs);
        List<Row> rows = new ArrayList<>();
        double y = top;
        for (Lane lane : lanes) {
            double share =
                    kept * LegendPainter.need(lane.traces().size()) + (room - kept * needs) * lane.weight() / weights;
            rows.add(new Row(y, y + share));
            y += share + gap;
        }
        return List.copyOf(rows);
    }

    /** x of a crank angle, rad. */
    double x(double angle) {
        return left + (right - left) * angle / Angles.TURN;
    }

    /** The crank angle (rad) at an x, outside [0, 2π] beyond the ends. */
    double angle(double x) {
        return (x - left) / (right - left) * Angles.TURN;
    }

    /** Top of the shaded stretch: under the band. */
    double plotTop() {
        return band.bottom();
    }

    /** Foot of the shaded stretch: on the axis. */
    double plotBottom() {
        return axis.top();
    }
}
