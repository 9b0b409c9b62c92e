package throwbench.solver.finding;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import throwbench.solver.chamber.PressureCurve;
import throwbench.solver.fluid.Fluid;
import throwbench.solver.fluid.GasMixture;
import throwbench.solver.fluid.PerfectGas;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.LimitKey;
import throwbench.solver.machine.StageConditions;
import throwbench.solver.revolution.RunningThrow;

/**
 * How hot a chamber's gas is when it is discharged, K: T_s (p_d/p_s)^((n_c − 1)/n_c) with ideal valves, the mean by mass with flow
 * through valves. Default limit 150 °C, 135 °C for a gas of at most 12 g/mol (API 618, 5th edition, figures from memory).
 * Chambers of liquid are passed over.
 */
public final class DischargeTemperature implements StatedCriterion {

    /** 135 °C, K. */
    static final double LIGHT_GAS_LIMIT = 408.15;

    /** Up to this molar mass a gas counts as rich in hydrogen, kg/mol. */
    static final double LIGHT_GAS = 0.012;

    private static final Statement STATEMENT = Statement.atMost(
                    LimitKey.DISCHARGE_TEMPERATURE, "K", "discharge temperature")
            .is(
                    "suction temperature × (discharge pressure / suction pressure)^((n − 1)/n); with flow through valves the"
                            + " mean by mass of what leaves")
            .from("API 618, 5th edition (2007), greatest predicted discharge temperature; figures from memory")
            .usually(423.15);

    @Override
    public Statement statement() {
        return STATEMENT;
    }

    @Override
    public List<Finding> judge(JudgedDuty duty) {
        List<Finding> findings = new ArrayList<>();
        for (RunningThrow t : duty.running().throwsInOrder()) {
            for (int c = 0; c < t.chambers().size(); c++) {
                Chamber chamber = t.chambers().get(c);
                Optional<Fluid> fluid = chamber.stage().map(duty.running().machine()::fluidOf);
                if (fluid.map(Fluid::isGas).orElse(true)) {
                    Finding.Place place = new Finding.Place(
                            duty.name(),
                            chamber.stage(),
                            Optional.of(t.described().name()),
                            Optional.of(chamber.name()));
                    findings.add(duty.held(
                            this, place, find(duty, chamber, t.curves().get(c), fluid)));
                }
            }
        }
        return findings;
    }

    private static Found find(JudgedDuty duty, Chamber chamber, PressureCurve curve, Optional<Fluid> fluid) {
        boolean light = fluid.map(DischargeTemperature::molarMass)
                .filter(mass -> mass <= LIGHT_GAS)
                .isPresent();
        OptionalDouble usual = light ? OptionalDouble.of(LIGHT_GAS_LIMIT) : OptionalDouble.empty();
        OptionalDouble temperature = curve.dischargeTemperature();
        Found found = temperature.isPresent()
                ? Found.of(temperature.getAsDouble()).noting(light ? "a gas of at most 12 g/mol" : "")
                : Found.none(reason(duty, chamber, curve));
        return found.usually(usual);
    }

    private static double molarMass(Fluid fluid) {
        if (fluid instanceof GasMixture mixture) {
            return mixture.molarMass();
        }
        return fluid instanceof PerfectGas gas ? gas.molarMass() : Double.POSITIVE_INFINITY;
    }

    private static String reason(JudgedDuty duty, Chamber chamber, PressureCurve curve) {
        if (!curve.flowKnown()) {
            return "the pressure is recorded, so what is discharged is not known";
        }
        String stage = chamber.stage().orElse("");
        StageConditions lines = duty.running().dutyPoint().stages().get(stage);
        boolean cold = lines != null && lines.suctionTemperature().isEmpty();
        return cold ? "stages." + stage + ".suctionTemperature is missing at the duty point" : "nothing is discharged";
    }
}
