package throwbench.app.drawing;

import throwbench.app.bench.Shown;
import throwbench.solver.revolution.Instant;

/**
 * A part of the window that draws. Taking a state or colours only marks what is stale; drawing happens once a frame, from
 * one instant of one state.
 */
public interface View {

    /** Takes the state that holds from now on. */
    void show(Shown shown);

    /** Takes the colours that hold from now on. */
    void wear(Palette palette);

    /** Draws what has changed since the last frame. The instant belongs to the state last taken. */
    void draw(Instant instant);
}
