package throwbench.solver.document.schema;

import static throwbench.solver.document.schema.Key.choice;
import static throwbench.solver.document.schema.Key.list;
import static throwbench.solver.document.schema.Key.object;
import static throwbench.solver.document.schema.Key.quantity;
import static throwbench.solver.document.schema.Key.variant;
import static throwbench.solver.document.schema.Key.when;

import java.util.List;
import throwbench.solver.chamber.Side;
import throwbench.solver.document.quantity.Dimension;

/** The keys of a throw and of its chambers. */
final class ThrowKeys {

    private static final Range ABOVE_ZERO = Range.above(0);
    private static final Range NOT_NEGATIVE = Range.from(0);

    private ThrowKeys() {}

    static Key one() {
        return object(
                "",
                "One crank pin with its connecting rod, crosshead and chambers.",
                Key.of(Kind.NAME, "name", "Name of the throw.")
                        .declares(NameSpace.THROW)
                        .required(),
                quantity(
                                "crankPhase",
                                Dimension.ANGLE,
                                "Angle of the pin from the shaft's zero mark, counter-clockwise whatever the rotation.")
                        .otherwise("0 deg"),
                quantity(
                                "axisDirection",
                                Dimension.ANGLE,
                                "Direction of the line of stroke from crank to head end: 0 right, 90 deg up, 180 deg left.")
                        .otherwise("0 deg"),
                quantity("shaftPosition", Dimension.LENGTH, "Place of the throw along the shaft.")
                        .otherwise("0 mm"),
                length("crankRadius", "Crank centre to crank pin; half the stroke where nothing is offset.")
                        .required(),
                length("rodLength", "Connecting rod, centre to centre; it exceeds radius and offset together.")
                        .required(),
                quantity("guideOffset", Dimension.LENGTH, "Height of the line of stroke above the crank centre.")
                        .otherwise("0 mm"),
                masses(),
                connectingRod(),
                crank(),
                friction(),
                list("chambers", "The working volumes of the throw.", chamber())
                        .atLeast(1)
                        .required(),
                pistonRodPart(),
                crossheadPart(),
                bearingPart("crankPinPart", "crank pin"),
                bearingPart("mainBearingPart", "main bearing"),
                LimitKeys.ofThrow());
    }

    private static Key masses() {
        return object(
                        "masses",
                        "What moves along the line of stroke.",
                        quantity("piston", Dimension.MASS, "Piston with rings, or plunger.")
                                .in(NOT_NEGATIVE)
                                .required(),
                        quantity(
                                        "pistonRod",
                                        Dimension.MASS,
                                        "Piston rod with its nuts; 0 for a trunk piston or plunger.")
                                .in(NOT_NEGATIVE)
                                .otherwise("0 kg"),
                        quantity("crosshead", Dimension.MASS, "Crosshead with pin and shoes; 0 for a trunk piston.")
                                .in(NOT_NEGATIVE)
                                .otherwise("0 kg"))
                .required();
    }

    private static Key connectingRod() {
        return object(
                        "connectingRod",
                        "The connecting rod as one rigid body.",
                        quantity("mass", Dimension.MASS, "Mass of the connecting rod.")
                                .in(NOT_NEGATIVE)
                                .required(),
                        quantity(
                                        "massCentreFromCrankPin",
                                        Dimension.LENGTH,
                                        "Crank pin to mass centre, on the line of centres.")
                                .in(NOT_NEGATIVE)
                                .otherwiseSaid("a third of the length"),
                        quantity("inertia", Dimension.INERTIA, "Moment of inertia about the mass centre.")
                                .in(NOT_NEGATIVE)
                                .otherwiseSaid("that of two masses at the pins"))
                .required();
    }

    private static Key crank() {
        return object(
                "crank",
                "What turns with the crank of this throw.",
                quantity(
                                "unbalance",
                                Dimension.STATIC_MOMENT,
                                "Static moment of webs and pin on the pin's side, without any part of the rod.")
                        .otherwise("0 kg m"),
                quantity("counterweight", Dimension.STATIC_MOMENT, "Static moment opposite the pin.")
                        .otherwise("0 kg m"));
    }

    private static Key friction() {
        return object(
                "friction",
                "Friction of this throw.",
                quantity("packing", Dimension.FORCE, "Friction of packing and rings on piston and rod.")
                        .in(NOT_NEGATIVE)
                        .otherwise("0 N"),
                quantity("guideCoefficient", Dimension.NUMBER, "Coefficient of friction at the guide.")
                        .in(NOT_NEGATIVE)
                        .otherwise("0"));
    }

    private static Key chamber() {
        return object(
                "",
                "One working volume.",
                Key.of(Kind.NAME, "name", "Name of the chamber, unique in the machine.")
                        .declares(NameSpace.CHAMBER)
                        .required(),
                choice("side", List.of(Side.HEAD.text(), Side.CRANK.text()), "Side of the piston that it works on.")
                        .required(),
                Key.of(Kind.REFERENCE, "stage", "Stage whose lines it uses; a recorded pressure may go without.")
                        .refersTo(NameSpace.STAGE),
                length("bore", "Diameter of the cylinder, or of the plunger.").required(),
                quantity(
                                "innerDiameter",
                                Dimension.LENGTH,
                                "Diameter of what passes through: rod, tail rod, smaller piston.")
                        .in(NOT_NEGATIVE)
                        .otherwise("0 mm"),
                Key.of(
                                Kind.CLEARANCE,
                                "clearance",
                                "Volume left at the dead centre; a recorded pressure may go without.")
                        .in(ABOVE_ZERO),
                quantity("flowAllowance", Dimension.SHARE, "Share of the capacity lost to heating, leakage and slip.")
                        .in(NOT_NEGATIVE.below(1))
                        .otherwise("0"),
                cycle(),
                LimitKeys.ofChamber());
    }

    private static Key cycle() {
        return variant(
                        "cycle",
                        "The law by which the pressure follows the volume.",
                        "Ideal valves, flow through valves, liquid, or a recorded pressure.",
                        idealValves(),
                        flowValves(),
                        liquidValves(),
                        when(
                                "recorded",
                                Key.of(Kind.NAME, "file", "Table of the pressure, in the machine file's folder.")
                                        .required()))
                .required();
    }

    private static Key.Variant idealValves() {
        return when(
                "ideal-valves",
                quantity("suctionLoss", Dimension.SHARE, "Share of the absolute suction pressure lost in the valve.")
                        .in(NOT_NEGATIVE.below(1))
                        .otherwise("0"),
                quantity(
                                "dischargeLoss",
                                Dimension.SHARE,
                                "Share of the absolute discharge pressure lost in the valve.")
                        .in(NOT_NEGATIVE)
                        .otherwise("0"),
                quantity("compressionExponent", Dimension.NUMBER, "Exponent of volume while compressing.")
                        .in(Range.from(1))
                        .otherwiseSaid("the gas's isentropic exponent"),
                quantity("expansionExponent", Dimension.NUMBER, "Exponent of volume while re-expanding.")
                        .in(Range.from(1))
                        .otherwiseSaid("the gas's isentropic exponent"));
    }

    private static Key.Variant flowValves() {
        return when(
                "valve-flow",
                quantity("suctionFlowArea", Dimension.AREA, "Effective flow area of the suction valves.")
                        .in(ABOVE_ZERO)
                        .required(),
                quantity("dischargeFlowArea", Dimension.AREA, "Effective flow area of the discharge valves.")
                        .in(ABOVE_ZERO)
                        .required());
    }

    private static Key.Variant liquidValves() {
        return when(
                "liquid",
                quantity("suctionLoss", Dimension.PRESSURE_DIFFERENCE, "Pressure lost in the suction valve.")
                        .in(NOT_NEGATIVE)
                        .otherwise("0 bar"),
                quantity("dischargeLoss", Dimension.PRESSURE_DIFFERENCE, "Pressure lost in the discharge valve.")
                        .in(NOT_NEGATIVE)
                        .otherwise("0 bar"),
                choice(
                                "lossLaw",
                                List.of("constant", "speed-squared"),
                                "Whether the losses hold always, or at the mean piston speed and grow with its square.")
                        .otherwise("constant"),
                quantity("closingLag", Dimension.ANGLE, "Crank angle after the dead centre at which a valve shuts.")
                        .in(NOT_NEGATIVE)
                        .otherwise("0 deg"));
    }

    private static Key pistonRodPart() {
        return object(
                "pistonRodPart",
                "The piston rod as a stressed part.",
                length("diameter", "Diameter of the rod."),
                length("threadRootDiameter", "Root diameter of its weakest thread."),
                length("freeLength", "Length that can buckle."),
                stress("elasticModulus", "Modulus of elasticity of its steel."),
                stress("yieldStrength", "Yield strength of its steel."),
                stress("ultimateStrength", "Tensile strength of its steel."),
                stress("enduranceLimit", "Alternating stress that it bears for ever."),
                quantity(
                                "stressConcentration",
                                Dimension.NUMBER,
                                "Factor on the alternating stress at the thread root.")
                        .in(ABOVE_ZERO),
                quantity("preload", Dimension.FORCE, "Tension of the tightened joint.")
                        .in(NOT_NEGATIVE));
    }

    private static Key crossheadPart() {
        return object(
                "crossheadPart",
                "Crosshead pin and shoes.",
                length("pinDiameter", "Diameter of the crosshead pin."),
                length("pinLength", "Bearing length of the crosshead pin."),
                quantity("shoeArea", Dimension.AREA, "Bearing area of one shoe.")
                        .in(ABOVE_ZERO));
    }

    private static Key bearingPart(String name, String said) {
        return object(
                name,
                "Bearing of the " + said + ".",
                length("diameter", "Diameter of the " + said + "."),
                length("length", "Bearing length of the " + said + "."));
    }

    private static Key length(String name, String meaning) {
        return quantity(name, Dimension.LENGTH, meaning).in(ABOVE_ZERO);
    }

    private static Key stress(String name, String meaning) {
        return quantity(name, Dimension.STRESS, meaning).in(ABOVE_ZERO);
    }
}
