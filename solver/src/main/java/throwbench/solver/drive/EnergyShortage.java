package throwbench.solver.drive;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import throwbench.solver.mechanism.Angles;

/** Says why a shaft does not go round: what a turn asks of its energy, and what it holds. */
final class EnergyShortage {

    private static final MathContext FOUR_DIGITS = new MathContext(4);

    private EnergyShortage() {}

    /**
     * The sentence.
     *
     * @param pieces of the turn, with the load last read
     */
    static String sentence(List<SpeedPiece> pieces, double rotatingInertia, double meanSpeed) {
        double taken = fluctuation(pieces);
        // a search that ran away leaves no load to read
        String load = Double.isFinite(taken)
                ? "the load takes up to " + rounded(taken) + " J from the shaft within a turn, and "
                : "";
        return "no speed is found that repeats: " + load + rounded(rotatingInertia) + " kg m2 hold "
                + rounded(rotatingInertia * meanSpeed * meanSpeed / 2)
                + " J at the mean speed; wanted more rotatingInertia";
    }

    /** The greatest energy less the least of a turn at constant torque, J. */
    private static double fluctuation(List<SpeedPiece> pieces) {
        double mean = 0;
        for (SpeedPiece piece : pieces) {
            mean += piece.work(Collocation.NODES - 1, 0) / -Angles.TURN;
        }
        double start = 0;
        double least = 0;
        double greatest = 0;
        for (SpeedPiece piece : pieces) {
            for (int i = 0; i < Collocation.NODES; i++) {
                double energy = start + piece.work(i, mean);
                least = Math.min(least, energy);
                greatest = Math.max(greatest, energy);
            }
            start += piece.work(Collocation.NODES - 1, mean);
        }
        return greatest - least;
    }

    private static String rounded(double value) {
        return new BigDecimal(value).round(FOUR_DIGITS).toPlainString();
    }
}
