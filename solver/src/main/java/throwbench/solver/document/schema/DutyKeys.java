package throwbench.solver.document.schema;

import static throwbench.solver.document.schema.Key.choice;
import static throwbench.solver.document.schema.Key.map;
import static throwbench.solver.document.schema.Key.object;
import static throwbench.solver.document.schema.Key.pair;
import static throwbench.solver.document.schema.Key.quantity;

import java.util.Arrays;
import java.util.List;
import throwbench.solver.chamber.ChamberState;
import throwbench.solver.document.quantity.Dimension;

/** The keys of duty points, load steps, ranges and bookmarks. */
final class DutyKeys {

    /** Stands for a pressure that is found from balance. */
    static final String BALANCED = "balanced";

    private static final Range ABOVE_ZERO = Range.above(0);

    private DutyKeys() {}

    static Key point() {
        return object(
                "",
                "One set of operating conditions.",
                Key.of(Kind.NAME, "name", "Name of the duty point.")
                        .declares(NameSpace.DUTY_POINT)
                        .required(),
                quantity("speed", Dimension.ROTATION_SPEED, "Mean speed of the shaft at this duty point.")
                        .in(ABOVE_ZERO)
                        .otherwiseSaid("the drive's speed"),
                map("stages", "Line conditions by stage.", stageConditions())
                        .refersTo(NameSpace.STAGE)
                        .required(),
                chambers());
    }

    static Key loadStep() {
        return object(
                "",
                "A named set of chamber states.",
                Key.of(Kind.NAME, "name", "Name of the load step.")
                        .declares(NameSpace.LOAD_STEP)
                        .required(),
                chambers());
    }

    private static Key stageConditions() {
        return object(
                "",
                "Line conditions of the stage.",
                pressure("suctionPressure", "Pressure in the suction line.")
                        .orWord(List.of(BALANCED))
                        .required(),
                quantity(
                                "suctionTemperature",
                                Dimension.TEMPERATURE,
                                "Temperature in the suction line; behind a cooler, of what leaves it.")
                        .in(ABOVE_ZERO),
                pressure("dischargePressure", "Pressure in the discharge line.")
                        .orWord(List.of(BALANCED))
                        .required());
    }

    private static Key chambers() {
        List<String> states =
                Arrays.stream(ChamberState.values()).map(ChamberState::text).toList();
        Key condition = object(
                "",
                "How the chamber works at this duty point.",
                choice("state", states, "How its valves work.").otherwise(ChamberState.WORKING.text()),
                quantity("leakArea", Dimension.AREA, "Effective area of the failed valve's leak.")
                        .in(ABOVE_ZERO),
                Key.of(Kind.CLEARANCE, "addedClearance", "Clearance of open pockets, beside the chamber's own.")
                        .in(Range.from(0))
                        .otherwise("0"));
        return map("chambers", "Chambers that do not simply work, by name.", condition)
                .refersTo(NameSpace.CHAMBER);
    }

    static Key ranges() {
        Key stage = object(
                "",
                "Ranges of the stage.",
                pair("suctionPressure", Dimension.GAS_PRESSURE, "Least and greatest suction pressure."),
                pair("suctionTemperature", Dimension.TEMPERATURE, "Least and greatest suction temperature."),
                pair("dischargePressure", Dimension.GAS_PRESSURE, "Least and greatest discharge pressure."),
                pressure("reliefPressure", "Setting of the relief valve, judged at every suction corner."));
        return object(
                "ranges",
                "The box of duty variables whose corners are judged.",
                pair("speed", Dimension.ROTATION_SPEED, "Least and greatest speed."),
                map("stages", "Ranges by stage.", stage).refersTo(NameSpace.STAGE));
    }

    static Key bookmark() {
        return object(
                "",
                "A noted crank angle.",
                Key.of(Kind.REFERENCE, "throw", "The throw whose crank angle it is.")
                        .refersTo(NameSpace.THROW)
                        .required(),
                quantity("angle", Dimension.ANGLE, "The crank angle.").required(),
                Key.of(Kind.TEXT, "note", "What is to be seen there.").otherwise(""));
    }

    private static Key pressure(String name, String meaning) {
        return quantity(name, Dimension.GAS_PRESSURE, meaning).in(ABOVE_ZERO);
    }
}
