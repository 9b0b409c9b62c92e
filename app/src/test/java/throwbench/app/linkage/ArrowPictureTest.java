package throwbench.app.linkage;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.EnumSet;
import java.util.List;
import org.junit.jupiter.api.Nested;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import throwbench.app.bench.Shown;
import throwbench.app.drawing.Palette;
import throwbench.app.linkage.RecordingPen.Mark;
import throwbench.app.linkage.force.ForceKind;
import throwbench.app.linkage.parts.RodLine.Piston;
import throwbench.solver.machine.Machine;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Instant;

/**
 * Arrows against the solver's values. The marks that a pen was given are measured; where they should be is worked out here
 * from the linkage's own geometry and the framing, by another way than the painters'.
 */
class ArrowPictureTest {

    /** Half a pixel: what an eye does not see. */
    private static final double EXACT = 0.5;

    /** A drawn arrow, in points. */
    private record Arrow(double tailX, double tailY, double tipX, double tipY) {}

    /** Fails unless two arrows agree to half a pixel at both ends. */
    private static void assertArrow(Arrow wanted, Arrow found, String name) {
        assertEquals(wanted.tailX, found.tailX, EXACT, name + " tail x");
        assertEquals(wanted.tailY, found.tailY, EXACT, name + " tail y");
        assertEquals(wanted.tipX, found.tipX, EXACT, name + " tip x");
        assertEquals(wanted.tipY, found.tipY, EXACT, name + " tip y");
    }

    /** Draws one kind alone: its marks are then the only ones of its colour that stand after the machine. */
    private static Drawn alone(Machine machine, ForceKind kind, double degrees) {
        LinkageChoice choice = new LinkageChoice(EnumSet.of(kind), 1, false, 1, false);
        return Drawn.of(Machines.shown(machine, 0), choice, degrees, 1160, 500);
    }

    /** The arrows of a colour: each begins with a line and ends with a head whose first corner is the tip. */
    private static List<Arrow> arrows(Drawn drawn, int colour) {
        List<Mark> lines = drawn.moving().stream()
                .filter(m -> m.kind().equals("line") && m.stroke() == colour && m.strokeWidth() > 1.3)
                .toList();
        List<Mark> heads = drawn.moving().stream()
                .filter(m -> m.kind().equals("area") && m.size() == 3 && m.stroke() == colour)
                .toList();
        assertEquals(lines.size(), heads.size(), "a shaft and a head each");
        java.util.ArrayList<Arrow> arrows = new java.util.ArrayList<>();
        for (int i = 0; i < heads.size(); i++) {
            arrows.add(new Arrow(lines.get(i).x(0), lines.get(i).y(0), heads.get(i).x(0), heads.get(i).y(0)));
        }
        return arrows;
    }

    private static double px(Drawn d, double gamma, double x, double y) {
        Framing f = d.picture().framing();
        return f.originX() + f.scale() * (x * Math.cos(gamma) - y * Math.sin(gamma));
    }

    private static double py(Drawn d, double gamma, double x, double y) {
        Framing f = d.picture().framing();
        return f.originY() - f.scale() * (x * Math.sin(gamma) + y * Math.cos(gamma));
    }

    private static double wrist(Shown shown, double degrees) {
        Linkage linkage = shown.shownThrow().linkage();
        double theta = linkage.headEndAngle()
                + shown.machine().drive().rotation().sign() * Math.toRadians(degrees);
        return linkage.reach(theta);
    }

    @Nested
    class Identities {

        @ParameterizedTest
        @ValueSource(doubles = {12, 37.5, 90, 200, 300})
        void gasArrowsEndOnTheFacesAndAreAsLongAsPressureTimesArea(double degrees) {
            Drawn d = alone(Machines.booster(), ForceKind.GAS, degrees);
            Shown shown = d.picture().shown();
            List<Arrow> found = arrows(d, Palette.LIGHT.loads().gas());
            assertEquals(2, found.size());
            double perNewton = d.picture().forceScale().pointsPerNewton();
            Piston piston = MachineLayout.of(shown.machine()).of(0).line().pistons().get(0);
            double radius = 0.16;
            double headArea = Math.PI * radius * radius;
            double crankArea = headArea - Math.PI * 0.032 * 0.032;
            double wrist = wrist(shown, degrees);
            double headTip = px(d, 0, wrist + piston.headFace(), 0);
            double crankTip = px(d, 0, wrist + piston.crankFace(), 0);
            double headLength = d.instant().pressure(0, 0) * headArea * perNewton;
            double crankLength = d.instant().pressure(0, 1) * crankArea * perNewton;
            Arrow head = found.get(0);
            Arrow crank = found.get(1);
            assertArrow(new Arrow(headTip + headLength, head.tailY, headTip, head.tailY), head, "gas head");
            assertArrow(new Arrow(crankTip - crankLength, crank.tailY, crankTip, crank.tailY), crank, "gas crank");
            double inside = d.picture().framing().scale() * radius;
            assertTrue(Math.abs(head.tailY - d.picture().framing().originY()) < inside, "within the bore");
        }

        @ParameterizedTest
        @ValueSource(doubles = {10, 60, 135, 222, 290})
        void crankPinArrowStandsOnThePinAndPointsAlongTheForce(double degrees) {
            for (Machine machine : List.of(Machines.offset(), Machines.vertical())) {
                Drawn d = alone(machine, ForceKind.CRANK_PIN, degrees);
                Shown shown = d.picture().shown();
                Linkage linkage = shown.shownThrow().linkage();
                double gamma = shown.shownThrow().place().axisDirection();
                double theta = linkage.headEndAngle()
                        + machine.drive().rotation().sign() * Math.toRadians(degrees);
                double x = linkage.crankRadius() * Math.cos(theta);
                double y = linkage.crankRadius() * Math.sin(theta);
                double perNewton = d.picture().forceScale().pointsPerNewton();
                double inX = d.instant().at(Column.CRANK_PIN_X) * perNewton / d.picture().framing().scale();
                double inY = d.instant().at(Column.CRANK_PIN_Y) * perNewton / d.picture().framing().scale();
                Arrow wanted = new Arrow(
                        px(d, gamma, x, y), py(d, gamma, x, y), px(d, gamma, x + inX, y + inY), py(d, gamma, x + inX, y + inY));
                List<Arrow> found = arrows(d, Palette.LIGHT.loads().pin());
                assertEquals(1, found.size());
                assertArrow(wanted, found.get(0), machine.name() + " crank pin");
            }
        }

        @ParameterizedTest
        @ValueSource(doubles = {5, 150, 185, 340})
        void inertiaArrowPointsAwayFromTheCrankWhenItPullsTheRod(double degrees) {
            Drawn d = alone(Machines.booster(), ForceKind.INERTIA, degrees);
            Arrow found = arrows(d, Palette.LIGHT.loads().inertia()).get(0);
            double load = d.instant().at(Column.INERTIA_LOAD);
            double length = load * d.picture().forceScale().pointsPerNewton();
            assertEquals(length, found.tipX - found.tailX, EXACT, "length and sense along the rod");
            assertEquals(0, found.tipY - found.tailY, EXACT);
            double front = MachineLayout.of(d.picture().shown().machine()).of(0).gear().slider().front();
            double foot = px(d, 0, wrist(d.picture().shown(), degrees) + front, 0);
            assertEquals(foot, load > 0 ? found.tailX : found.tipX, EXACT, "its foot is the crosshead's front");
        }

        @ParameterizedTest
        @ValueSource(doubles = {40, 120, 215, 310})
        void guideArrowActsAtTheShoeThatCarriesIt(double degrees) {
            Drawn d = alone(Machines.booster(), ForceKind.GUIDE, degrees);
            double n = d.instant().at(Column.GUIDE_FORCE);
            double shoe = MachineLayout.of(d.picture().shown().machine())
                    .of(0)
                    .gear()
                    .slider()
                    .halfHeight();
            int colour = Palette.LIGHT.loads().guide();
            Mark head = d.moving().stream()
                    .filter(m -> m.kind().equals("area") && m.size() == 3 && m.stroke() == colour)
                    .findFirst()
                    .orElseThrow();
            Mark shaft = d.moving().stream()
                    .filter(m -> m.kind().equals("line") && m.stroke() == colour)
                    .findFirst()
                    .orElseThrow();
            double x = px(d, 0, wrist(d.picture().shown(), degrees), 0);
            // pushed up, the lower shoe carries it; y of the drawing runs down
            double tip = py(d, 0, 0, -Math.signum(n) * shoe);
            double tail = tip + n * d.picture().forceScale().pointsPerNewton();
            assertArrow(
                    new Arrow(x, tail, x, tip), new Arrow(shaft.x(0), shaft.y(0), head.x(0), head.y(0)), "guide");
        }

        @ParameterizedTest
        @ValueSource(doubles = {30, 100, 250})
        void connectingRodInertiaStandsAtItsMassCentre(double degrees) {
            Drawn d = alone(Machines.booster(), ForceKind.ROD_INERTIA, degrees);
            Linkage linkage = d.picture().shown().shownThrow().linkage();
            double theta = Math.toRadians(degrees);
            double share = 1.0 / 3;
            double pinX = linkage.crankRadius() * Math.cos(theta);
            double pinY = linkage.crankRadius() * Math.sin(theta);
            double x = pinX + share * (linkage.reach(theta) - pinX);
            double y = pinY * (1 - share);
            double perNewton = d.picture().forceScale().pointsPerNewton();
            Arrow found = arrows(d, Palette.LIGHT.loads().inertia()).get(0);
            double tailX = px(d, 0, x, y);
            double tailY = py(d, 0, x, y);
            Arrow wanted = new Arrow(
                    tailX,
                    tailY,
                    tailX + d.instant().rodInertiaX(0) * perNewton,
                    tailY - d.instant().rodInertiaY(0) * perNewton);
            assertArrow(wanted, found, "connecting rod inertia");
        }

        @ParameterizedTest
        @ValueSource(doubles = {20, 80, 170, 260})
        void torqueTurnsWithTheRotationWhenTheDriverMustDeliverIt(double degrees) {
            for (Machine machine : List.of(Machines.booster(), Machines.offset())) {
                Drawn d = alone(machine, ForceKind.TORQUE, degrees);
                int colour = Palette.LIGHT.loads().torque();
                Mark start = d.moving().stream()
                        .filter(m -> m.kind().equals("line") && m.stroke() == colour)
                        .findFirst()
                        .orElseThrow();
                Mark head = d.moving().stream()
                        .filter(m -> m.kind().equals("area") && m.fill() == colour && m.size() == 3)
                        .findFirst()
                        .orElseThrow();
                Framing f = d.picture().framing();
                double from = Math.atan2(f.originY() - mid(start, 1), mid(start, 0) - f.originX());
                double to = Math.atan2(f.originY() - head.y(0), head.x(0) - f.originX());
                double turned = Math.IEEEremainder(to - from, 2 * Math.PI);
                double torque = d.instant().at(Column.THROW_TORQUE);
                double wanted = machine.drive().rotation().sign()
                        * torque
                        * d.picture().forceScale().radPerNewtonMetre();
                assertEquals(wanted, turned, 1e-9, machine.name());
            }
        }

        private double mid(Mark line, int axis) {
            return (line.points()[axis] + line.points()[axis + 2]) / 2;
        }

        @Test
        void oneScaleHoldsForTheWholeRevolution() {
            Drawn d = Drawn.of(Machines.booster(), 0, 37.5, 1160, 500);
            double longest = 0;
            for (int degrees = 0; degrees < 360; degrees++) {
                d.instant().turnTo(Math.toRadians(degrees));
                longest = Math.max(longest, Math.abs(d.instant().chamberLoad(0, 0)));
            }
            // head-end gas load is this machine's greatest force; 1° apart its flat top is met exactly
            assertEquals(
                    d.picture().size().longestArrow(), longest * d.picture().forceScale().pointsPerNewton(), 1e-6);
        }

        @Test
        void scaleBarIsAsLongAsItsForceIsInArrows() {
            for (double height : new double[] {250, 480, 1080}) {
                Drawn d = Drawn.of(Machines.booster(), 0, 37.5, 2 * height, height);
                Mark label = d.still().stream()
                        .filter(m -> m.text().endsWith(" kN"))
                        .findFirst()
                        .orElseThrow();
                double newtons =
                        1000 * Double.parseDouble(label.text().replace(" kN", ""));
                Mark bar = d.still().get(d.still().indexOf(label) - 3);
                assertEquals(
                        newtons * d.picture().forceScale().pointsPerNewton(), bar.x(1) - bar.x(0), 1e-6, label.text());
                double lead = newtons / Math.pow(10, Math.floor(Math.log10(newtons) + 1e-9));
                assertTrue(List.of(1L, 2L, 5L).contains(Math.round(lead)), "1, 2 or 5: " + lead);
                assertEquals(Math.round(lead), lead, 1e-9);
            }
        }
    }

    @Nested
    class Refusals {

        @Test
        void anArrowMovedByThreePixelsFails() {
            Arrow right = new Arrow(100, 50, 180, 50);
            assertArrow(right, new Arrow(100.2, 50, 180, 49.9), "near enough");
            assertThrows(AssertionError.class, () -> assertArrow(right, new Arrow(103, 50, 183, 50), "moved"));
            assertThrows(AssertionError.class, () -> assertArrow(right, new Arrow(100, 50, 177, 50), "short"));
            assertThrows(AssertionError.class, () -> assertArrow(right, new Arrow(100, 53, 180, 53), "low"));
            assertThrows(AssertionError.class, () -> assertArrow(right, new Arrow(180, 50, 100, 50), "turned"));
        }
    }

    @Test
    void everyKindHasItsOwnDrawing() {
        Instant any = new Instant(Machines.shown(Machines.booster(), 0).running(), 0);
        assertEquals(0, any.crankAngle());
        java.util.Set<String> shapes = new java.util.HashSet<>();
        for (ForceKind kind : ForceKind.values()) {
            Drawn d = alone(Machines.booster(), kind, 75);
            Drawn none = Drawn.of(
                    Machines.shown(Machines.booster(), 0),
                    new LinkageChoice(EnumSet.noneOf(ForceKind.class), 1, false, 1, false),
                    75,
                    1160,
                    500);
            // what a kind adds to the bare machine, its letters and place left out
            List<String> added = d.moving().stream()
                    .skip(none.moving().size())
                    .filter(m -> !m.kind().equals("text"))
                    .map(m -> m.kind() + Math.round(10 * m.strokeWidth()) + (m.fill() == m.stroke()))
                    .toList();
            assertTrue(shapes.add(added.toString()), kind + " looks like another: " + added);
        }
    }
}
