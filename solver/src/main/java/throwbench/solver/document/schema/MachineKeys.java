package throwbench.solver.document.schema;

import static throwbench.solver.document.schema.Key.choice;
import static throwbench.solver.document.schema.Key.list;
import static throwbench.solver.document.schema.Key.map;
import static throwbench.solver.document.schema.Key.object;
import static throwbench.solver.document.schema.Key.quantity;
import static throwbench.solver.document.schema.Key.variant;
import static throwbench.solver.document.schema.Key.when;

import java.util.List;
import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.mechanism.Rotation;

/** The keys of the machine as a whole: site, drive, fluids and stages. */
final class MachineKeys {

    private static final Range ABOVE_ZERO = Range.above(0);
    private static final Range NOT_NEGATIVE = Range.from(0);

    private MachineKeys() {}

    static Key root() {
        return object(
                "",
                "A machine.",
                Key.of(Kind.VERSION, "throwbench", "Version of this form of file.")
                        .required(),
                Key.of(Kind.NAME, "name", "Name of the machine.").required(),
                Key.of(Kind.TEXT, "notes", "Anything worth knowing about the machine.")
                        .otherwise(""),
                site(),
                drive(),
                map("fluids", "What the chambers hold, by name.", fluid())
                        .declares(NameSpace.FLUID)
                        .required(),
                map("stages", "Chambers that share suction and discharge lines, by name.", stage())
                        .declares(NameSpace.STAGE)
                        .required(),
                list(
                                "throws",
                                "The throws along the shaft; the first one's crank angle is the machine's.",
                                ThrowKeys.one())
                        .atLeast(1)
                        .required(),
                list("dutyPoints", "Operating conditions; the first is shown at the start.", DutyKeys.point())
                        .atLeast(1)
                        .required(),
                LimitKeys.ofMachine(),
                list("loadSteps", "Chamber states that are judged at every corner of the ranges.", DutyKeys.loadStep()),
                DutyKeys.ranges(),
                list("bookmarks", "Noted crank angles.", DutyKeys.bookmark()));
    }

    private static Key site() {
        return object(
                "site",
                "Where the machine stands.",
                quantity(
                                "ambientPressure",
                                Dimension.GAS_PRESSURE,
                                "Pressure of the surrounding air, from which gauge pressures count; always absolute.")
                        .in(ABOVE_ZERO)
                        .otherwise("101.325 kPa a"),
                quantity(
                                "framePressure",
                                Dimension.GAS_PRESSURE,
                                "Pressure in the frame, acting on what of the pistons no chamber covers.")
                        .in(ABOVE_ZERO)
                        .otherwiseSaid("the ambient pressure"),
                Key.of(Kind.FLAG, "gravity", "Whether the weights of the moving parts count.")
                        .otherwise("false"));
    }

    private static Key drive() {
        return object(
                        "drive",
                        "What turns the shaft.",
                        quantity("speed", Dimension.ROTATION_SPEED, "Mean speed of the shaft.")
                                .in(ABOVE_ZERO)
                                .required(),
                        choice(
                                        "rotation",
                                        List.of(Rotation.COUNTER_CLOCKWISE.text(), Rotation.CLOCKWISE.text()),
                                        "Sense of rotation, seen from the end that shaft positions are measured from.")
                                .otherwise(Rotation.COUNTER_CLOCKWISE.text()),
                        quantity(
                                        "rotatingInertia",
                                        Dimension.INERTIA,
                                        "Moment of inertia of all that turns with the shaft, connecting rods left out.")
                                .in(NOT_NEGATIVE),
                        driver(),
                        quantity("mechanicalEfficiency", Dimension.SHARE, "Indicated power over shaft power.")
                                .in(ABOVE_ZERO.upTo(1))
                                .otherwise("1"))
                .required();
    }

    private static Key driver() {
        return variant(
                        "driver",
                        "How the driver holds the speed over the revolution.",
                        "The driver's law of torque.",
                        when("constant-speed"),
                        when("constant-torque"),
                        when(
                                "slip",
                                quantity("ratedTorque", Dimension.TORQUE, "Torque at the rated slip.")
                                        .in(ABOVE_ZERO)
                                        .required(),
                                quantity(
                                                "ratedSlip",
                                                Dimension.SHARE,
                                                "Share of the synchronous speed lost at the rated torque.")
                                        .in(ABOVE_ZERO.below(1))
                                        .required()))
                .otherwiseSaid("constant-speed");
    }

    private static Key fluid() {
        return variant("", "A gas, a mixture of gases or a liquid.", "Gas or liquid.", gas(), liquid());
    }

    private static Key.Variant gas() {
        Key fraction =
                quantity("", Dimension.SHARE, "Mole fraction of this gas.").required();
        return when(
                "gas",
                quantity("molarMass", Dimension.MOLAR_MASS, "Mass of one mole of the gas.")
                        .in(ABOVE_ZERO),
                quantity("isentropicExponent", Dimension.NUMBER, "Ratio of the heat capacities.")
                        .in(Range.above(1)),
                map("mixture", "Mole fractions of gases of the built-in table, summing to 1.", fraction)
                        .refersTo(NameSpace.GAS),
                choice(
                                "model",
                                List.of("perfect", "real"),
                                "Whether a mixture's capacity and exponents follow the real gas.")
                        .otherwise("perfect"));
    }

    private static Key.Variant liquid() {
        return when(
                "liquid",
                quantity("density", Dimension.DENSITY, "Mass per volume of the liquid.")
                        .in(ABOVE_ZERO)
                        .required(),
                quantity("bulkModulus", Dimension.STRESS, "Resistance of the liquid to compression.")
                        .in(ABOVE_ZERO)
                        .required(),
                quantity("vapourPressure", Dimension.GAS_PRESSURE, "Pressure at which the liquid boils.")
                        .in(ABOVE_ZERO)
                        .required());
    }

    private static Key stage() {
        return object(
                "",
                "Chambers that share suction and discharge lines.",
                Key.of(Kind.REFERENCE, "fluid", "The fluid that its chambers hold.")
                        .refersTo(NameSpace.FLUID)
                        .required(),
                Key.of(Kind.REFERENCE, "follows", "The stage whose discharge line feeds this one.")
                        .refersTo(NameSpace.STAGE),
                suctionLine(),
                LimitKeys.ofStage());
    }

    private static Key suctionLine() {
        return object(
                "suctionLine",
                "The suction line of a pump, for its suction head.",
                quantity("length", Dimension.HEAD, "Length of the suction line.")
                        .in(ABOVE_ZERO),
                quantity("bore", Dimension.LENGTH, "Inner diameter of the suction line.")
                        .in(ABOVE_ZERO),
                quantity("staticHead", Dimension.HEAD, "Height of the liquid's surface above the pump.")
                        .otherwise("0 m"),
                quantity("frictionLoss", Dimension.HEAD, "Head lost to friction at mean flow.")
                        .in(NOT_NEGATIVE)
                        .otherwise("0 m"),
                quantity("sourcePressure", Dimension.GAS_PRESSURE, "Pressure on the liquid's surface at the source.")
                        .in(ABOVE_ZERO)
                        .otherwiseSaid("the stage's suction pressure"),
                quantity("liquidFactor", Dimension.NUMBER, "Factor of the liquid in the acceleration head.")
                        .in(ABOVE_ZERO));
    }
}
