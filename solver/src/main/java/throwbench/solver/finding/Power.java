package throwbench.solver.finding;

import java.util.Locale;
import throwbench.solver.machine.LimitKey;

/** What the machine absorbs, W. No default limit; reported without one. */
public final class Power implements MachineCriterion {

    /** Work of the gas or liquid in all chambers, by their pressure–volume diagrams. */
    public static final Power INDICATED = new Power(Statement.atMost(LimitKey.INDICATED_POWER, "W", "indicated power")
            .is("−∮ p dV of every chamber × turns a second")
            .from("what the driver gives; definition: P. K. Nag, Basic and Applied Thermodynamics (2006), ch. 19"));

    /** Indicated power over the mechanical efficiency. */
    public static final Power SHAFT = new Power(Statement.atMost(LimitKey.SHAFT_POWER, "W", "shaft power")
            .is("indicated power / mechanical efficiency")
            .from("what the driver gives; the mechanical efficiency is that of the machine file"));

    private final Statement statement;

    private Power(Statement statement) {
        this.statement = statement;
    }

    @Override
    public Statement statement() {
        return statement;
    }

    @Override
    public Found find(JudgedDuty duty) {
        double indicated = duty.means().flow().totalPower();
        if (limitKey() == LimitKey.INDICATED_POWER) {
            return Found.of(indicated);
        }
        double efficiency = duty.running().machine().drive().mechanicalEfficiency();
        return Found.of(indicated / efficiency)
                .noting(String.format(Locale.ROOT, "mechanical efficiency %.4g %%", 100 * efficiency));
    }
}
