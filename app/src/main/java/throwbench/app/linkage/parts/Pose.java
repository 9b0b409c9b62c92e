package throwbench.app.linkage.parts;

import throwbench.solver.mechanism.Linkage;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Instant;

/** Where the links of one throw stand, in throw axes, m. Turned from instant to instant by its one owner. */
public final class Pose {

    private final Linkage linkage;
    private double cosPin;
    private double sinPin;
    private double wrist;
    private double cosRod;
    private double sinRod;

    public Pose(Linkage linkage) {
        this.linkage = linkage;
        wrist = linkage.greatestReach();
    }

    /** Takes the place of a throw at an instant. */
    public Pose take(Instant instant, int throwIndex) {
        cosPin = instant.cosPin(throwIndex);
        sinPin = instant.sinPin(throwIndex);
        wrist = linkage.greatestReach() - instant.at(throwIndex, Column.TRAVEL);
        cosRod = (wrist - pinX()) / linkage.rodLength();
        sinRod = (linkage.guideOffset() - pinY()) / linkage.rodLength();
        return this;
    }

    /** cos θ of the crank. */
    public double cosPin() {
        return cosPin;
    }

    /** sin θ of the crank. */
    public double sinPin() {
        return sinPin;
    }

    /** x of the crank pin. */
    public double pinX() {
        return linkage.crankRadius() * cosPin;
    }

    /** y of the crank pin. */
    public double pinY() {
        return linkage.crankRadius() * sinPin;
    }

    /** x of the crosshead pin. */
    public double wristX() {
        return wrist;
    }

    /** y of the crosshead pin: the line of stroke. */
    public double wristY() {
        return linkage.guideOffset();
    }

    /** Cosine of the direction from crank pin to crosshead pin. */
    public double cosRod() {
        return cosRod;
    }

    /** Sine of the direction from crank pin to crosshead pin (−sin β). */
    public double sinRod() {
        return sinRod;
    }
}
