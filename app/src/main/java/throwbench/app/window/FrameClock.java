package throwbench.app.window;

import java.util.List;
import javafx.animation.AnimationTimer;
import throwbench.app.bench.Bench;
import throwbench.app.bench.Shown;
import throwbench.app.drawing.View;
import throwbench.solver.revolution.Instant;

/**
 * The one clock of the window. Each frame it lets time pass, takes the newest state, turns one instant to the crank angle
 * and lets every view draw from it: all of them show the same machine at the same angle.
 */
final class FrameClock extends AnimationTimer {

    private static final double NANO = 1e-9;

    private final Bench bench;
    private final List<View> views;
    private final FrameTimes times = new FrameTimes();
    private Shown shown;
    private Instant instant;
    private boolean stale;
    private long last;

    FrameClock(Bench bench, List<View> views) {
        this.bench = bench;
        this.views = List.copyOf(views);
        this.shown = bench.shown().get();
        this.instant = new Instant(shown.running(), shown.throwIndex());
        bench.shown().addListener((o, before, now) -> stale = true);
        take(shown);
    }

    private void take(Shown newest) {
        stale = false;
        shown = newest;
        instant = new Instant(newest.running(), newest.throwIndex());
        for (View view : views) {
            view.show(newest);
        }
    }

    @Override
    public void handle(long now) {
        long start = System.nanoTime();
        double passed = last == 0 ? 0 : (now - last) * NANO;
        last = now;
        if (stale) {
            take(bench.shown().get());
        }
        bench.playhead().advance(passed, shown.running().meanSpeed());
        instant.turnTo(bench.playhead().crankAngle().get());
        for (View view : views) {
            view.draw(instant);
        }
        times.add(passed, System.nanoTime() - start);
    }

    /** How long frames took. */
    FrameTimes times() {
        return times;
    }
}
