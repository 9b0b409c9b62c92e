package throwbench.solver.finding;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extreme;
import throwbench.solver.revolution.Extremes;

/**
 * The peak of a load along the rod by sign, as a magnitude; 0 where the load never takes that sign.
 *
 * @param column gas load or rod load
 * @param inTension the peak in tension, or in compression
 */
public record PeakLoad(Column column, boolean inTension, LimitKey limitKey) implements Criterion {

    /** Largest pull of the combined rod load. */
    public static final PeakLoad ROD_TENSION = new PeakLoad(Column.ROD_LOAD, true, LimitKey.ROD_TENSION);

    /** Largest push of the combined rod load. */
    public static final PeakLoad ROD_COMPRESSION = new PeakLoad(Column.ROD_LOAD, false, LimitKey.ROD_COMPRESSION);

    /** Largest pull of the gas alone. */
    public static final PeakLoad GAS_TENSION = new PeakLoad(Column.GAS_LOAD, true, LimitKey.GAS_TENSION);

    /** Largest push of the gas alone. */
    public static final PeakLoad GAS_COMPRESSION = new PeakLoad(Column.GAS_LOAD, false, LimitKey.GAS_COMPRESSION);

    private boolean ofRod() {
        return column == Column.ROD_LOAD;
    }

    @Override
    public String id() {
        return (ofRod() ? "rod-load-" : "gas-load-") + (inTension ? "tension" : "compression");
    }

    @Override
    public String title() {
        return (ofRod() ? "rod load, " : "gas load, ") + (inTension ? "tension" : "compression");
    }

    @Override
    public String formula() {
        String load = ofRod() ? "gas load + inertia load at the crosshead pin" : "gas load";
        return (inTension ? "greatest " : "greatest −") + "(" + load + ") over the revolution";
    }

    @Override
    public String source() {
        return "the manufacturer's rating; definition of the load: API 618, 5th edition (2007), 6.6";
    }

    @Override
    public boolean limitIsGreatest() {
        return true;
    }

    @Override
    public String unit() {
        return "N";
    }

    @Override
    public OptionalDouble defaultLimit() {
        return OptionalDouble.empty();
    }

    @Override
    public List<Finding> judge(JudgedDuty duty) {
        List<Finding> findings = new ArrayList<>();
        for (int i = 0; i < duty.throwCount(); i++) {
            Extremes extremes = duty.extremes(i, column);
            Extreme peak = inTension ? extremes.greatest() : extremes.least();
            double value = Math.max(0, inTension ? peak.value() : -peak.value());
            OptionalDouble angle = value > 0 ? OptionalDouble.of(peak.crankAngle()) : OptionalDouble.empty();
            String note = value > 0 ? "" : "never in " + (inTension ? "tension" : "compression");
            findings.add(Finding.judged(this, duty.place(i), value, duty.limit(this, i), angle, note));
        }
        return findings;
    }
}
