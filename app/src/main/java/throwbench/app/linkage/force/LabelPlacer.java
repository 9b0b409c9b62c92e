package throwbench.app.linkage.force;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Finds a place for each label that it keeps for the whole revolution: inside the view, clear of every other label, near
 * what it names, and where the machine leaves most room.
 */
public final class LabelPlacer {

    /** A rectangle, points. */
    public record Box(double x, double y, double width, double height) {

        /** Whether two rectangles are nearer than a distance. */
        public boolean meets(Box o, double apart) {
            return x < o.x + o.width + apart
                    && o.x < x + width + apart
                    && y < o.y + o.height + apart
                    && o.y < y + height + apart;
        }

        public boolean within(Box o) {
            return x >= o.x && y >= o.y && x + width <= o.x + o.width && y + height <= o.y + o.height;
        }
    }

    /** A fully taken place costs as much as so many points of distance, at weight 1. */
    private static final double CROWD = 620;

    /** Distance of the places tried, points at weight 1. */
    private static final double STEP = 5;

    /** A label moves only to a place that is better by so many points. */
    private static final double STAY = 60;

    private final Occupancy occupancy;
    private final Box room;
    private final double apart;
    private final double step;
    private final List<Box> placed = new ArrayList<>();

    public LabelPlacer(Occupancy occupancy, Box room, double apart, double weight) {
        this.step = STEP * Math.max(1, weight);
        this.occupancy = occupancy;
        this.room = room;
        this.apart = apart;
    }

    /** Keeps a rectangle free of labels. */
    public void keepFree(Box box) {
        placed.add(box);
    }

    /**
     * Places a label of a size as near as can be to a point; empty where there is no room at all.
     *
     * @param before where it stood until now: it stays there unless another place is clearly better
     */
    public Optional<Box> place(double nearX, double nearY, double width, double height, Optional<Box> before) {
        Box best = null;
        double least = Double.POSITIVE_INFINITY;
        if (before.isPresent()) {
            Box old = new Box(before.get().x(), before.get().y(), width, height);
            if (old.within(room) && isFree(old.x(), old.y(), width, height)) {
                best = old;
                least = cost(old.x() + width / 2 - nearX, old.y() + height / 2 - nearY, width) - STAY;
                least += CROWD * occupancy.share(old.x() - 2, old.y() - 2, width + 4, height + 4);
            }
        }
        double startX = room.x();
        double startY = room.y();
        for (double y = startY; y + height <= room.y() + room.height(); y += step) {
            for (double x = startX; x + width <= room.x() + room.width(); x += step) {
                double dx = x + width / 2 - nearX;
                double dy = y + height / 2 - nearY;
                double cost = cost(dx, dy, width);
                if (cost < least) {
                    cost += CROWD * occupancy.share(x - 2, y - 2, width + 4, height + 4);
                    if (cost < least && isFree(x, y, width, height)) {
                        least = cost;
                        best = new Box(x, y, width, height);
                    }
                }
            }
        }
        if (best != null) {
            placed.add(best);
        }
        return Optional.ofNullable(best);
    }

    /** A label is wide: standing above or below is nearer than standing beside. */
    private static double cost(double dx, double dy, double width) {
        return Math.hypot(Math.max(0, Math.abs(dx) - width / 4), dy);
    }

    private boolean isFree(double x, double y, double width, double height) {
        for (int i = 0; i < placed.size(); i++) {
            Box o = placed.get(i);
            if (x < o.x() + o.width() + apart
                    && o.x() < x + width + apart
                    && y < o.y() + o.height() + apart
                    && o.y() < y + height + apart) {
                return false;
            }
        }
        return true;
    }
}
