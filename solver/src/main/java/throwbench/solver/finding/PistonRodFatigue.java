package throwbench.solver.finding;

import java.util.Locale;
import java.util.Optional;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.machine.PistonRodPart;
import throwbench.solver.revolution.Extremes;

/**
 * Use of the piston rod's fatigue strength at the thread root by the modified Goodman line: K_t σ_a/σ_e + σ_m/σ_u, 1; at 1 it is
 * used up. σ_a is half the swing of the load at the rod's crosshead end over the root's area, σ_m its mean. A mean in compression
 * counts as 0. With a {@code preload} that no tension overcomes the joint is taken as rigid: the root then carries the preload and no
 * swing; a preload that is overcome is given no credit. Default limit 1.
 */
public final class PistonRodFatigue implements ThrowCriterion {

    private static final Statement STATEMENT = Statement.atMost(LimitKey.PISTON_ROD_FATIGUE, "1", "piston rod fatigue")
            .is(
                    "stress concentration × stress amplitude / endurance limit + mean stress / ultimate strength, at the thread"
                            + " root; a compressive mean counts as 0")
            .from("modified Goodman line: T. H. Wentzell, Machine Design (2007), ex. 5.3, p. 97")
            .usually(1);

    @Override
    public Statement statement() {
        return STATEMENT;
    }

    @Override
    public Found find(JudgedDuty duty, int throwIndex) {
        PistonRodPart part = PistonRod.part(duty.described(throwIndex));
        Optional<String> missing = PistonRod.needs()
                .value("threadRootDiameter", part.threadRootDiameter())
                .value("ultimateStrength", part.ultimateStrength())
                .value("enduranceLimit", part.enduranceLimit())
                .value("stressConcentration", part.stressConcentration())
                .missing();
        if (missing.isPresent()) {
            return Found.none(missing.get());
        }
        Extremes load = PistonRod.load(duty, throwIndex);
        double area = PistonRod.area(part.threadRootDiameter().orElseThrow());
        double tension = load.greatest().value();
        double preload = part.preload().orElse(0);
        boolean clamped = preload > 0 && preload >= tension;
        double amplitude = clamped ? 0 : (tension - load.least().value()) / 2 / area;
        double mean =
                clamped ? preload / area : Math.max(0, (tension + load.least().value()) / 2 / area);
        double use = goodman(
                part.stressConcentration().orElseThrow() * amplitude,
                mean,
                part.enduranceLimit().orElseThrow(),
                part.ultimateStrength().orElseThrow());
        return Found.at(load.greatest(), use).noting(note(amplitude, mean, preload, tension));
    }

    /**
     * The share of its fatigue strength that a part uses, σ_a/σ_e + σ_m/σ_u.
     *
     * @param amplitude σ_a with its concentration, Pa, ≥ 0
     * @param mean σ_m, Pa, ≥ 0
     * @param enduranceLimit σ_e, Pa, above 0
     * @param ultimateStrength σ_u, Pa, above 0
     */
    static double goodman(double amplitude, double mean, double enduranceLimit, double ultimateStrength) {
        return amplitude / enduranceLimit + mean / ultimateStrength;
    }

    private static String note(double amplitude, double mean, double preload, double tension) {
        String stresses = String.format(Locale.ROOT, "amplitude %.4g MPa, mean %.4g MPa", amplitude / 1e6, mean / 1e6);
        if (preload == 0) {
            return stresses + "; no credit for preload, pistonRodPart.preload being missing";
        }
        return preload >= tension
                ? stresses + "; the preload is not overcome, the joint is taken as rigid"
                : stresses + "; the tension overcomes the preload, which is given no credit";
    }
}
