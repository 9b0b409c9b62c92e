package throwbench.solver.document.check;

import java.util.OptionalDouble;
import throwbench.solver.document.quantity.NumberText;
import throwbench.solver.mechanism.Linkage;

/** A throw's lengths fit together, and its guide does not lock. */
final class ThrowRules {

    private ThrowRules() {}

    static void judge(Fields one) {
        OptionalDouble r = one.number("crankRadius");
        OptionalDouble l = one.number("rodLength");
        OptionalDouble e = one.number("guideOffset");
        massCentre(one.object("connectingRod"), one, l);
        if (r.isEmpty() || l.isEmpty() || e.isEmpty()) {
            return;
        }
        if (!Linkage.turns(r.getAsDouble(), l.getAsDouble(), e.getAsDouble())) {
            String lengths = one.said("crankRadius") + ", " + one.said("rodLength") + ", " + one.said("guideOffset");
            one.fault(
                    "rodLength", "does not turn: " + lengths, "a rodLength above crankRadius and guideOffset together");
            return;
        }
        guide(one.object("friction"), new Linkage(r.getAsDouble(), l.getAsDouble(), e.getAsDouble()));
    }

    private static void massCentre(Fields rod, Fields one, OptionalDouble rodLength) {
        if (!rod.isThere() || !rod.has("massCentreFromCrankPin") || rodLength.isEmpty()) {
            return;
        }
        OptionalDouble b = rod.number("massCentreFromCrankPin");
        if (b.isPresent() && b.getAsDouble() > rodLength.getAsDouble()) {
            String found = rod.said("massCentreFromCrankPin") + " with " + one.said("rodLength");
            rod.fault("massCentreFromCrankPin", found, "a mass centre on the rod, from 0 to rodLength");
        }
    }

    /** μ |tan β| < 1 all round, so that friction and guide force have one solution. */
    private static void guide(Fields friction, Linkage linkage) {
        OptionalDouble coefficient = friction.number("guideCoefficient");
        if (!friction.isThere() || coefficient.isEmpty()) {
            return;
        }
        double sinBeta = linkage.greatestSinRodAngle();
        double tanBeta = sinBeta / Math.sqrt((1 - sinBeta) * (1 + sinBeta));
        boolean free = coefficient.getAsDouble() * tanBeta < 1;
        if (!free) {
            String most = NumberText.write(1 / tanBeta, 4);
            friction.fault(
                    "guideCoefficient",
                    friction.said("guideCoefficient") + ", with which the guide locks",
                    "less than " + most + " at this throw's greatest rod angle");
        }
    }
}
