package throwbench.app.linkage.force;

import throwbench.app.linkage.parts.Pose;
import throwbench.app.linkage.parts.ThrowLayout;
import throwbench.solver.chamber.ChamberVolume;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extremes;
import throwbench.solver.revolution.Instant;
import throwbench.solver.revolution.Summary;

/**
 * The arrows over a whole revolution: the greatest magnitude of each, and where it reaches at equally spaced angles. What
 * framing, force scale and labels rest on.
 */
public final class ForcePeaks {

    /** Angles looked at; between them an arrow moves by less than its label keeps clear. */
    public static final int LOOKS = 48;

    private final ArrowSet arrows;
    private final double[] peaks;
    final double[][] footX = new double[LOOKS][];
    final double[][] footY = new double[LOOKS][];
    final double[][] forceX = new double[LOOKS][];
    final double[][] forceY = new double[LOOKS][];
    final boolean[][] endsAtFoot = new boolean[LOOKS][];

    private ForcePeaks(ArrowSet arrows) {
        this.arrows = arrows;
        this.peaks = new double[arrows.size()];
    }

    /** Looks at the shown throw's revolution. */
    public static ForcePeaks of(Summary summary, ArrowSet arrows, ThrowLayout layout) {
        ForcePeaks peaks = new ForcePeaks(arrows);
        int shown = summary.revolution().shownThrow();
        Instant instant = new Instant(summary.running(), shown);
        Pose pose = new Pose(layout.linkage());
        for (int k = 0; k < LOOKS; k++) {
            instant.turnTo(Angles.TURN * k / LOOKS);
            arrows.place(instant, pose.take(instant, shown));
            peaks.footX[k] = arrows.footX.clone();
            peaks.footY[k] = arrows.footY.clone();
            peaks.forceX[k] = arrows.forceX.clone();
            peaks.forceY[k] = arrows.forceY.clone();
            peaks.endsAtFoot[k] = arrows.endsAtFoot.clone();
            for (int i = 0; i < arrows.size(); i++) {
                peaks.peaks[i] = Math.max(peaks.peaks[i], Math.abs(arrows.value(i)));
            }
        }
        for (int i = 0; i < arrows.size(); i++) {
            peaks.peaks[i] = Math.max(
                    peaks.peaks[i], fromSummary(summary, shown, arrows.arrows().get(i)));
        }
        return peaks;
    }

    /** Exact extremes where the summary has them; for vectors the stations' greatest magnitude. */
    private static double fromSummary(Summary summary, int shown, ArrowSet.Arrow arrow) {
        if (arrow.kind() == ForceKind.GAS) {
            ChamberVolume volume =
                    summary.running().throwsInOrder().get(shown).volumes().get(arrow.chamber());
            return volume.area()
                    * summary.pressures().get(arrow.chamber()).greatest().value();
        }
        if (arrow.kind().columns().size() == 2) {
            return greatestVector(
                    summary,
                    arrow.kind().columns().get(0),
                    arrow.kind().columns().get(1));
        }
        if (arrow.kind() == ForceKind.ROD_INERTIA) {
            return 0;
        }
        Extremes extremes = summary.extremes().get(arrow.kind().columns().get(0));
        return extremes == null
                ? 0
                : Math.max(
                        Math.abs(extremes.least().value()),
                        Math.abs(extremes.greatest().value()));
    }

    private static double greatestVector(Summary summary, Column x, Column y) {
        double most = 0;
        for (int s = 0; s < summary.revolution().count(); s++) {
            most = Math.max(
                    most,
                    Math.hypot(
                            summary.revolution().at(x, s), summary.revolution().at(y, s)));
        }
        return most;
    }

    public ArrowSet arrows() {
        return arrows;
    }

    /** Greatest magnitude of an arrow over the revolution, N or N·m. */
    public double of(int arrow) {
        return peaks[arrow];
    }

    /** Foot of an arrow at one of the angles looked at, in throw axes, m. */
    public double footX(int look, int arrow) {
        return footX[look][arrow];
    }

    /** Its y, m. */
    public double footY(int look, int arrow) {
        return footY[look][arrow];
    }

    /** From an arrow's tail to its tip at one of the angles looked at, N along the throw's x (a torque: N·m). */
    public double forceX(int look, int arrow) {
        return forceX[look][arrow];
    }

    /** Along y, N. */
    public double forceY(int look, int arrow) {
        return forceY[look][arrow];
    }

    /** Whether its tip, and not its tail, stands at its foot. */
    public boolean endsAtFoot(int look, int arrow) {
        return endsAtFoot[look][arrow];
    }

    /** The greatest force of all arrows, N; 0 where there is none. */
    public double greatestForce() {
        double most = 0;
        for (int i = 0; i < peaks.length; i++) {
            if (arrows.arrows().get(i).kind() != ForceKind.TORQUE) {
                most = Math.max(most, peaks[i]);
            }
        }
        return most;
    }

    /** The greatest torque, N·m; 0 where it is not shown. */
    public double greatestTorque() {
        double most = 0;
        for (int i = 0; i < peaks.length; i++) {
            if (arrows.arrows().get(i).kind() == ForceKind.TORQUE) {
                most = Math.max(most, peaks[i]);
            }
        }
        return most;
    }
}
