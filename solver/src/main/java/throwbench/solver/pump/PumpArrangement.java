package throwbench.solver.pump;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import throwbench.solver.chamber.ChamberState;
import throwbench.solver.chamber.Side;
import throwbench.solver.machine.Chamber;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.RunningThrow;

/**
 * The arrangements of plungers and pistons for which handbooks give the constant C of the acceleration head.
 *
 * <p>Source: Hydraulic Institute standards and GPSA Engineering Data Book, section on pumps; from memory. The figures are
 * those of a rigid column at l/r = 5.
 */
public enum PumpArrangement {
    SIMPLEX_SINGLE_ACTING(1, false, false, 360, 0.400),
    SIMPLEX_DOUBLE_ACTING(1, true, true, 360, 0.200),
    DUPLEX_SINGLE_ACTING(2, false, false, 180, 0.200),
    DUPLEX_DOUBLE_ACTING(2, true, true, 90, 0.115),
    TRIPLEX(3, false, true, 120, 0.066),
    QUINTUPLEX(5, false, true, 72, 0.040),
    SEPTUPLEX(7, false, true, 360.0 / 7, 0.028),
    NONUPLEX(9, false, true, 40, 0.022);

    /** What makes two lengths, areas or angles the same, relative or in rad. */
    private static final double ALIKE = 1e-6;

    private final int throwCount;
    private final boolean onlyDouble;
    private final boolean mayBeDouble;
    private final double spacing;
    private final double constant;

    PumpArrangement(int throwCount, boolean onlyDouble, boolean mayBeDouble, double spacingDeg, double constant) {
        this.throwCount = throwCount;
        this.onlyDouble = onlyDouble;
        this.mayBeDouble = mayBeDouble;
        this.spacing = Math.toRadians(spacingDeg);
        this.constant = constant;
    }

    /** C, 1. */
    public double constant() {
        return constant;
    }

    /**
     * C of a stage; empty where the handbooks have none for it: another number of throws, unequal cranks or plungers, other
     * crank angles, a chamber that does not work.
     */
    public static OptionalDouble constantOf(RunningMachine running, String stage) {
        List<Integer> driven = new ArrayList<>();
        for (int i = 0; i < running.throwsInOrder().size(); i++) {
            if (!areas(running, i, stage).isEmpty()) {
                driven.add(i);
            }
        }
        for (PumpArrangement arrangement : values()) {
            if (arrangement.fits(running, stage, driven)) {
                return OptionalDouble.of(arrangement.constant);
            }
        }
        return OptionalDouble.empty();
    }

    private boolean fits(RunningMachine running, String stage, List<Integer> driven) {
        if (driven.size() != throwCount) {
            return false;
        }
        int first = driven.get(0);
        boolean doubleActing = areas(running, first, stage).size() == 2;
        if (doubleActing ? !mayBeDouble : onlyDouble) {
            return false;
        }
        for (int index : driven) {
            if (!alike(running, first, index, stage)) {
                return false;
            }
        }
        return spaced(running, driven);
    }

    /** Whether a throw has the geometry of another and one working chamber, or one at either side, on this stage. */
    private static boolean alike(RunningMachine running, int first, int other, String stage) {
        List<Double> areas = areas(running, first, stage);
        List<Double> others = areas(running, other, stage);
        boolean oneASide = areas.size() == 1 || (areas.size() == 2 && areas.get(0) < 0 && areas.get(1) > 0);
        Linkage a = running.throwsInOrder().get(first).body().linkage();
        Linkage b = running.throwsInOrder().get(other).body().linkage();
        boolean same = areas.size() == others.size()
                && alike(a.crankRadius(), b.crankRadius(), a.crankRadius())
                && alike(a.rodLength(), b.rodLength(), a.rodLength())
                && alike(a.guideOffset(), b.guideOffset(), a.crankRadius());
        for (int i = 0; same && i < areas.size(); i++) {
            same = alike(areas.get(i), others.get(i), areas.get(i));
        }
        return oneASide && same && works(running, running.throwsInOrder().get(other), stage);
    }

    private static boolean alike(double a, double b, double scale) {
        return Math.abs(a - b) <= ALIKE * Math.abs(scale);
    }

    private static boolean works(RunningMachine running, RunningThrow t, String stage) {
        for (int c = 0; c < t.chambers().size(); c++) {
            Chamber chamber = t.chambers().get(c);
            boolean working = running.dutyPoint().condition(chamber.name()).state() == ChamberState.WORKING;
            // a suction and a discharge valve, each opening and shutting
            boolean pumps = working && t.curves().get(c).events().size() == 4;
            if (chamber.stage().filter(stage::equals).isPresent() && !pumps) {
                return false;
            }
        }
        return true;
    }

    /** Areas of a throw's chambers of this stage, m², negative on the crank side, least first. */
    private static List<Double> areas(RunningMachine running, int index, String stage) {
        return running.throwsInOrder().get(index).chambers().stream()
                .filter(chamber -> chamber.stage().filter(stage::equals).isPresent())
                .map(chamber -> chamber.side() == Side.HEAD ? chamber.area() : -chamber.area())
                .sorted()
                .toList();
    }

    /** Whether the throws follow one another at the arrangement's angle. */
    private boolean spaced(RunningMachine running, List<Integer> driven) {
        double[] phases = driven.stream()
                .mapToDouble(i -> Angles.wrap(running.angleBetween(driven.get(0), i) + ALIKE))
                .sorted()
                .toArray();
        // two cranks at 90° stand 270° apart the other way round
        boolean turnedRound = throwCount == 2 && Math.abs(phases[1] - phases[0] - (Angles.TURN - spacing)) <= ALIKE;
        boolean inStep = true;
        for (int k = 1; k < phases.length; k++) {
            inStep &= Math.abs(phases[k] - phases[k - 1] - spacing) <= ALIKE;
        }
        return inStep || turnedRound;
    }
}
