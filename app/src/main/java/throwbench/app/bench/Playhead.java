package throwbench.app.bench;

import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyDoubleProperty;
import javafx.beans.property.ReadOnlyDoubleWrapper;
import throwbench.solver.mechanism.Angles;

/**
 * The crank angle that everything shows, and its running. The angle keeps its phase whatever else changes: speed, duty
 * point and shown speed only change how fast it grows from where it is.
 */
public final class Playhead {

    /** A pause of the frame clock longer than this (a hidden window, a busy machine) does not make the crank jump. */
    private static final double LONGEST_FRAME = 0.1;

    private final ReadOnlyDoubleWrapper crankAngle = new ReadOnlyDoubleWrapper(this, "crankAngle");
    private final ReadOnlyBooleanWrapper playing = new ReadOnlyBooleanWrapper(this, "playing");
    private final ReadOnlyDoubleWrapper shownSpeed = new ReadOnlyDoubleWrapper(this, "shownSpeed", 1.0 / 60);

    /** φ of the shown throw, rad, in [0, 2π). */
    public ReadOnlyDoubleProperty crankAngle() {
        return crankAngle.getReadOnlyProperty();
    }

    /** Whether the crank runs. */
    public ReadOnlyBooleanProperty playing() {
        return playing.getReadOnlyProperty();
    }

    /** Share of the real speed at which it is shown, in [1/1000, 1]. */
    public ReadOnlyDoubleProperty shownSpeed() {
        return shownSpeed.getReadOnlyProperty();
    }

    /** Turns the crank to an angle (rad, any number of turns). */
    public void turnTo(double angle) {
        crankAngle.set(Angles.wrap(angle));
    }

    /** Turns the crank by an angle, rad. */
    public void turnBy(double angle) {
        turnTo(crankAngle.get() + angle);
    }

    public void setPlaying(boolean run) {
        playing.set(run);
    }

    /** Sets the share of the real speed, taken into [1/1000, 1]. */
    public void setShownSpeed(double share) {
        shownSpeed.set(Math.max(0.001, Math.min(1, share)));
    }

    /**
     * Lets time pass.
     *
     * @param seconds since the last frame
     * @param speed of the shaft, rad/s
     */
    public void advance(double seconds, double speed) {
        if (playing.get()) {
            turnBy(Math.min(seconds, LONGEST_FRAME) * speed * shownSpeed.get());
        }
    }
}
