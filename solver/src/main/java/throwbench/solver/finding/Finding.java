package throwbench.solver.finding;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * One judged quantity.
 *
 * @param where the duty point and the throw, stage or chamber it is about
 * @param value in the criterion's unit; empty where it could not be had
 * @param limit in the criterion's unit; empty where there is none
 * @param margin (limit − value)/|limit| for a greatest limit, (value − limit)/|limit| for a least one, the plain difference
 *     where the limit is 0; empty where not judged
 * @param angle crank angle of the throw at which it happens, rad
 * @param note what a reader must know besides; may be empty
 */
public record Finding(
        Criterion criterion,
        Place where,
        OptionalDouble value,
        OptionalDouble limit,
        OptionalDouble margin,
        OptionalDouble angle,
        Verdict verdict,
        String note) {

    /** What a finding is about; what does not apply is empty. */
    public record Place(String duty, Optional<String> stage, Optional<String> throwName, Optional<String> chamber) {

        /** A throw at a duty point. */
        public static Place ofThrow(String duty, String throwName) {
            return new Place(duty, Optional.empty(), Optional.of(throwName), Optional.empty());
        }

        /** The whole machine at a duty point. */
        public static Place ofMachine(String duty) {
            return new Place(duty, Optional.empty(), Optional.empty(), Optional.empty());
        }

        /** A stage at a duty point. */
        public static Place ofStage(String duty, String stage) {
            return new Place(duty, Optional.of(stage), Optional.empty(), Optional.empty());
        }
    }

    /** Holds a value against a limit; without a limit it is reported and not judged. A value met exactly is met. */
    public static Finding judged(
            Criterion criterion, Place where, double value, OptionalDouble limit, OptionalDouble angle, String note) {
        if (limit.isEmpty()) {
            return new Finding(
                    criterion,
                    where,
                    OptionalDouble.of(value),
                    limit,
                    OptionalDouble.empty(),
                    angle,
                    Verdict.NOT_JUDGED,
                    join(note, "no limit given"));
        }
        double allowed = limit.getAsDouble();
        double room = criterion.limitIsGreatest() ? allowed - value : value - allowed;
        double margin = allowed == 0 ? room : room / Math.abs(allowed);
        return new Finding(
                criterion,
                where,
                OptionalDouble.of(value),
                limit,
                OptionalDouble.of(margin),
                angle,
                room >= 0 ? Verdict.MET : Verdict.NOT_MET,
                allowed == 0 ? join(note, "margin is the difference, the limit being 0") : note);
    }

    /** Not judged, since the value is not known; the reason says what is missing. */
    public static Finding unknown(Criterion criterion, Place where, OptionalDouble limit, String reason) {
        OptionalDouble none = OptionalDouble.empty();
        return new Finding(criterion, where, none, limit, none, none, Verdict.NOT_JUDGED, reason);
    }

    private static String join(String note, String more) {
        return note.isEmpty() ? more : note + "; " + more;
    }
}
