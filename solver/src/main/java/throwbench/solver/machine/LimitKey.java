package throwbench.solver.machine;

/** Every limit a machine file may set, in the order of the findings they judge. */
public enum LimitKey {
    GAS_TENSION("gasTension"),
    GAS_COMPRESSION("gasCompression"),
    ROD_TENSION("rodTension"),
    ROD_COMPRESSION("rodCompression"),
    REVERSAL_DURATION("reversalDuration"),
    REVERSAL_RATIO("reversalRatio"),
    DISCHARGE_TEMPERATURE("dischargeTemperature"),
    MEAN_PISTON_SPEED("meanPistonSpeed"),
    ROD_TO_CRANK_RATIO("rodToCrankRatio"),
    CROSSHEAD_PIN_PRESSURE("crossheadPinPressure"),
    CRANK_PIN_PRESSURE("crankPinPressure"),
    MAIN_BEARING_PRESSURE("mainBearingPressure"),
    GUIDE_PRESSURE("guidePressure"),
    PISTON_ROD_STRESS("pistonRodStress"),
    PISTON_ROD_FATIGUE("pistonRodFatigue"),
    PISTON_ROD_BUCKLING("pistonRodBuckling"),
    SPEED_FLUCTUATION("speedFluctuation"),
    PEAK_TO_MEAN_TORQUE("peakToMeanTorque"),
    SUCTION_HEAD("suctionHead"),
    FLOW_VARIATION("flowVariation"),
    CAPACITY("capacity"),
    STAGE_FLOW_MISMATCH("stageFlowMismatch"),
    INDICATED_POWER("indicatedPower"),
    SHAFT_POWER("shaftPower"),
    SHAKING_FORCE_PRIMARY("shakingForcePrimary"),
    SHAKING_FORCE_SECONDARY("shakingForceSecondary"),
    SHAKING_COUPLE_PRIMARY("shakingCouplePrimary"),
    SHAKING_COUPLE_SECONDARY("shakingCoupleSecondary");

    private final String text;

    LimitKey(String text) {
        this.text = text;
    }

    /** The key of the machine file. */
    public String text() {
        return text;
    }
}
