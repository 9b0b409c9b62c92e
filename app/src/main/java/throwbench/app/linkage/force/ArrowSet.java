package throwbench.app.linkage.force;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import throwbench.app.linkage.parts.GearShape;
import throwbench.app.linkage.parts.Pose;
import throwbench.app.linkage.parts.RodLine;
import throwbench.app.linkage.parts.ThrowAxes;
import throwbench.app.linkage.parts.ThrowLayout;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.Throw;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Instant;

/**
 * The arrows of one throw at an instant. An arrow's foot stands at a place in m, moved by some points so that it keeps
 * clear of what it acts on; the force itself is in N along the throw's axes. A pushing arrow along the rod ends at its foot,
 * every other one begins there.
 */
public final class ArrowSet {

    /** Torque is shown as an arc about the crank centre that begins here, rad from the throw's x to its upper side. */
    private static final double ARC_START = Math.toRadians(128);

    /** Where a gas arrow stands between what passes through the chamber (0) and its wall (1). */
    private static final double GAS_LANE = 0.65;

    /** Points between what an arrow acts on and an arrow that runs beside it, at weight 1. */
    private static final double BESIDE = 13;

    /** One arrow: its kind, its name, and for a gas arrow its chamber (else −1). */
    public record Arrow(ForceKind kind, String name, int chamber) {}

    private final ThrowLayout layout;
    private final int throwIndex;
    private final double massCentre;
    private final int upper;
    private final List<Arrow> arrows = new ArrayList<>();
    private final double[] lane;
    private final int[] piston;
    final double[] footX;
    final double[] footY;
    final double[] besideY;
    final double[] forceX;
    final double[] forceY;
    final boolean[] endsAtFoot;

    public ArrowSet(Throw t, int throwIndex, ThrowLayout layout, Set<ForceKind> kinds, double weight) {
        this.layout = layout;
        this.throwIndex = throwIndex;
        this.upper = ThrowAxes.upper(t.place().axisDirection());
        this.massCentre = t.connectingRod().massCentre(t.linkage().rodLength());
        for (ForceKind kind : ForceKind.values()) {
            if (kinds.contains(kind)) {
                add(t, kind);
            }
        }
        int n = arrows.size();
        lane = new double[n];
        piston = new int[n];
        footX = new double[n];
        footY = new double[n];
        besideY = new double[n];
        forceX = new double[n];
        forceY = new double[n];
        endsAtFoot = new boolean[n];
        for (int i = 0; i < n; i++) {
            lay(t, i, weight);
        }
    }

    private void add(Throw t, ForceKind kind) {
        if (kind != ForceKind.GAS) {
            arrows.add(new Arrow(kind, kind.label(), -1));
            return;
        }
        for (int c = 0; c < t.chambers().size(); c++) {
            String name = ShortName.of(t.chambers().get(c).name());
            arrows.add(new Arrow(kind, t.chambers().size() == 1 ? kind.label() : kind.label() + ' ' + name, c));
        }
    }

    private void lay(Throw t, int i, double weight) {
        Arrow arrow = arrows.get(i);
        GearShape.Slider slider = layout.gear().slider();
        double outside = slider.halfHeight() + slider.guide().bar();
        if (slider.trunk()) {
            outside = Math.max(
                    outside,
                    layout.line().barrels().get(0).radius()
                            + layout.line().barrels().get(0).wall());
        }
        switch (arrow.kind()) {
            case INERTIA -> {
                lane[i] = upper * outside;
                besideY[i] = upper * BESIDE * weight;
            }
            case ROD -> {
                lane[i] = -upper * outside;
                besideY[i] = -upper * BESIDE * weight;
            }
            case GAS -> layGas(t.chambers().get(arrow.chamber()), i);
            default -> {}
        }
    }

    private void layGas(Chamber chamber, int i) {
        List<RodLine.Piston> pistons = layout.line().pistons();
        for (int k = 0; k < pistons.size(); k++) {
            RodLine.Piston p = pistons.get(k);
            int c = arrows.get(i).chamber();
            if (p.crankChamber().filter(x -> x == c).isPresent()
                    || p.headChamber().filter(x -> x == c).isPresent()) {
                piston[i] = k;
                double free = chamber.innerDiameter() > 0 ? chamber.innerDiameter() / 2 : 0;
                lane[i] = p.plunger() ? 0 : -upper * (free + GAS_LANE * (chamber.bore() / 2 - free));
            }
        }
    }

    /** Where the torque's arc begins, rad counter-clockwise from the throw's x. */
    public double arcStart() {
        return upper * ARC_START;
    }

    public List<Arrow> arrows() {
        return arrows;
    }

    public int size() {
        return arrows.size();
    }

    /** The force of an arrow as it was last placed, N or N·m: along the rod tension positive, a vector's magnitude. */
    public double value(int i) {
        return switch (arrows.get(i).kind()) {
            case CROSSHEAD_PIN, CRANK_PIN, ROD_INERTIA -> Math.hypot(forceX[i], forceY[i]);
            case GUIDE -> forceY[i];
            default -> forceX[i];
        };
    }

    /** Points along the throw's y that an arrow stands beside its foot. */
    public double beside(int i) {
        return besideY[i];
    }

    /** Takes the places and forces of an instant. */
    public void place(Instant instant, Pose pose) {
        for (int i = 0; i < arrows.size(); i++) {
            Arrow arrow = arrows.get(i);
            footX[i] = pose.wristX();
            footY[i] = pose.wristY() + lane[i];
            forceY[i] = 0;
            endsAtFoot[i] = false;
            switch (arrow.kind()) {
                case GAS -> gas(instant, pose, i);
                case INERTIA -> alongRod(instant, Column.INERTIA_LOAD, i);
                case ROD -> alongRod(instant, Column.ROD_LOAD, i);
                case ROD_INERTIA -> {
                    footX[i] = pose.pinX() + massCentre * pose.cosRod();
                    footY[i] = pose.pinY() + massCentre * pose.sinRod();
                    forceX[i] = instant.rodInertiaX(throwIndex);
                    forceY[i] = instant.rodInertiaY(throwIndex);
                }
                case CROSSHEAD_PIN -> vector(instant, Column.CROSSHEAD_PIN_X, Column.CROSSHEAD_PIN_Y, i);
                case CRANK_PIN -> {
                    footX[i] = pose.pinX();
                    footY[i] = pose.pinY();
                    vector(instant, Column.CRANK_PIN_X, Column.CRANK_PIN_Y, i);
                }
                case GUIDE -> guide(instant, pose, i);
                case TORQUE -> {
                    footX[i] = 0;
                    footY[i] = 0;
                    forceX[i] = instant.at(throwIndex, Column.THROW_TORQUE);
                }
            }
        }
    }

    private void gas(Instant instant, Pose pose, int i) {
        RodLine.Piston p = layout.line().pistons().get(piston[i]);
        double load = instant.chamberLoad(throwIndex, arrows.get(i).chamber());
        forceX[i] = load;
        footX[i] = pose.wristX() + (load < 0 ? p.headFace() : p.crankFace());
        endsAtFoot[i] = true;
    }

    private void alongRod(Instant instant, Column column, int i) {
        forceX[i] = instant.at(throwIndex, column);
        footX[i] += layout.gear().slider().trunk() ? 0 : layout.gear().slider().front();
        endsAtFoot[i] = forceX[i] < 0;
    }

    private void vector(Instant instant, Column x, Column y, int i) {
        forceX[i] = instant.at(throwIndex, x);
        forceY[i] = instant.at(throwIndex, y);
    }

    /** The guide pushes with the shoe's face: from below when it pushes along +y. */
    private void guide(Instant instant, Pose pose, int i) {
        double n = instant.at(throwIndex, Column.GUIDE_FORCE);
        forceX[i] = 0;
        forceY[i] = n;
        footY[i] = pose.wristY() - Math.signum(n) * layout.gear().slider().halfHeight();
        endsAtFoot[i] = true;
    }
}
