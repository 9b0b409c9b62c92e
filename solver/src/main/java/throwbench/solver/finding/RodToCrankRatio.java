package throwbench.solver.finding;

import throwbench.solver.machine.LimitKey;
import throwbench.solver.mechanism.Linkage;

/**
 * Length of the connecting rod over the crank radius, l/r: the shorter the rod, the greater the guide force and the forces of
 * second order. No default limit; 4 to 6 is common practice, no source.
 */
public final class RodToCrankRatio implements ThrowCriterion {

    private static final Statement STATEMENT = Statement.atLeast(LimitKey.ROD_TO_CRANK_RATIO, "1", "rod to crank ratio")
            .is("connecting rod length / crank radius")
            .from("the designer's figure; 4 to 6 is common practice, no source");

    @Override
    public Statement statement() {
        return STATEMENT;
    }

    @Override
    public Found find(JudgedDuty duty, int throwIndex) {
        Linkage linkage = duty.described(throwIndex).linkage();
        return Found.of(linkage.rodLength() / linkage.crankRadius());
    }
}
