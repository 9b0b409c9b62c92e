package throwbench.app.linkage;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import throwbench.app.bench.Shown;
import throwbench.app.drawing.Palette;
import throwbench.app.linkage.RecordingPen.Mark;
import throwbench.app.linkage.force.ForceKind;
import throwbench.app.linkage.force.LabelPlacer.Box;
import throwbench.app.linkage.parts.RodLoadPainter;
import throwbench.solver.machine.Machine;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.SignChange;

class LinkagePictureTest {

    private static final double[][] SIZES = {{400, 250}, {700, 600}, {1160, 500}, {3840, 2160}};

    private static final LinkageChoice ALL = new LinkageChoice(EnumSet.allOf(ForceKind.class), 1, false, 1, true);

    private static LinkagePicture picture(Machine machine, LinkageChoice choice, double[] size) {
        return new LinkagePicture(
                Machines.shown(machine, 0), Palette.LIGHT, choice, size[0], size[1], new RecordingPen());
    }

    @Test
    void nothingLeavesTheViewAtAnyAngle() {
        for (Machine machine : Machines.all()) {
            for (double[] size : SIZES) {
                LinkagePicture picture = picture(machine, ALL, size);
                for (int degrees = 0; degrees < 360; degrees += 5) {
                    Drawn d = Drawn.at(picture, degrees);
                    String where = machine.name() + " " + size[0] + "x" + size[1] + " at " + degrees + "°";
                    Box view = new Box(0, 0, size[0], size[1]);
                    assertInside(d.still(), view, where);
                    assertInside(d.moving(), view, where);
                    // the moving layer is cropped to its box: what stood outside would be cut off
                    assertInside(d.moving(), picture.movingBox(), where);
                    assertInside(d.headline(), picture.headlineBox(), where);
                }
            }
        }
    }

    private static void assertInside(List<Mark> marks, Box box, String where) {
        for (Mark m : marks) {
            boolean inside = m.least(0) >= box.x()
                    && m.least(1) >= box.y()
                    && m.greatest(0) <= box.x() + box.width()
                    && m.greatest(1) <= box.y() + box.height();
            if (!inside) {
                assertEquals(
                        "inside " + box,
                        m.kind() + " " + m.text() + " " + m.least(0) + ", " + m.least(1) + " … " + m.greatest(0) + ", "
                                + m.greatest(1),
                        where);
            }
        }
    }

    @Test
    void textsNeverMeetAtAnyAngle() {
        for (Machine machine : Machines.all()) {
            for (double[] size : SIZES) {
                LinkagePicture picture = picture(machine, ALL, size);
                for (int degrees = 0; degrees < 360; degrees += 5) {
                    Drawn d = Drawn.at(picture, degrees);
                    List<Mark> texts = new ArrayList<>();
                    for (List<Mark> layer : List.of(d.still(), d.moving(), d.headline())) {
                        layer.stream().filter(m -> m.kind().equals("text")).forEach(texts::add);
                    }
                    assertApart(texts, machine.name() + " " + size[0] + "x" + size[1] + " at " + degrees + "°");
                }
            }
        }
    }

    private static void assertApart(List<Mark> texts, String where) {
        for (int i = 0; i < texts.size(); i++) {
            for (int k = 0; k < i; k++) {
                Mark a = texts.get(i);
                Mark b = texts.get(k);
                boolean apart = a.greatest(0) <= b.least(0)
                        || b.greatest(0) <= a.least(0)
                        || a.greatest(1) <= b.least(1)
                        || b.greatest(1) <= a.least(1);
                assertTrue(apart, where + ": \"" + a.text() + "\" meets \"" + b.text() + "\"");
            }
        }
    }

    @Test
    void labelsKeepTheirPlaceOverTheRevolution() {
        LinkagePicture picture = picture(Machines.booster(), LinkageChoice.usual(), SIZES[2]);
        List<String> names = ForceKind.usual().stream()
                .filter(k -> k != ForceKind.GAS)
                .map(ForceKind::label)
                .toList();
        for (String name : names) {
            Mark first = named(Drawn.at(picture, 0), name);
            for (int degrees = 5; degrees < 360; degrees += 5) {
                Mark now = named(Drawn.at(picture, degrees), name);
                assertEquals(first.x(0), now.x(0), name);
                assertEquals(first.y(0), now.y(0), name);
            }
        }
    }

    private static Mark named(Drawn d, String text) {
        return d.moving().stream()
                .filter(m -> m.text().equals(text))
                .findFirst()
                .orElseThrow(() -> new AssertionError("no label \"" + text + "\""));
    }

    @Test
    void everyArrowIsLabelledInAnOrdinaryView() {
        for (Machine machine : Machines.all()) {
            Drawn d = Drawn.of(machine, 0, 40, 1160, 500);
            for (ForceKind kind : ForceKind.usual()) {
                assertTrue(
                        d.moving().stream().anyMatch(m -> m.text().startsWith(kind.label())),
                        machine.name() + ": " + kind);
            }
        }
    }

    @Test
    void headsPointApartInTensionAndTogetherInCompression() {
        for (Machine machine : List.of(Machines.booster(), Machines.vertical(), Machines.triplex())) {
            LinkagePicture picture = picture(machine, LinkageChoice.usual(), SIZES[2]);
            int seen = 0;
            for (int degrees = 0; degrees < 360; degrees += 5) {
                Drawn d = Drawn.at(picture, degrees);
                double load = d.instant().at(Column.ROD_LOAD);
                double peak = Headline.greatest(picture.shown().summary().reversal());
                if (Math.abs(load) < RodLoadPainter.NEUTRAL * peak) {
                    continue;
                }
                seen |= load > 0 ? 1 : 2;
                assertHeads(d, load > 0, machine.name() + " at " + degrees + "°");
                int hue = load > 0
                        ? Palette.LIGHT.loads().tension()
                        : Palette.LIGHT.loads().compression();
                assertTrue(d.moving().stream().anyMatch(m -> m.fill() == hue && m.size() == 4), "its colour");
            }
            // the trunk piston's light parts never pull
            assertEquals(machine.name().equals("vertical") ? 2 : 3, seen, machine.name());
        }
    }

    /** The heads on the rod in order along it: the first of each pair points back along the rod, or forth. */
    private static void assertHeads(Drawn d, boolean tension, String where) {
        List<Mark> heads = d.moving().stream()
                .filter(m -> m.kind().equals("area")
                        && m.size() == 3
                        && m.fill() == Palette.LIGHT.ground().onAccent())
                .toList();
        assertTrue(heads.size() >= 2 && heads.size() % 2 == 0, where);
        double alongX = heads.get(heads.size() - 1).x(0) - heads.get(0).x(0);
        double alongY = heads.get(heads.size() - 1).y(0) - heads.get(0).y(0);
        List<Mark> inOrder = heads.stream()
                .sorted(Comparator.comparingDouble(m -> middle(m, 0) * alongX + middle(m, 1) * alongY))
                .toList();
        for (int i = 0; i < inOrder.size(); i++) {
            Mark m = inOrder.get(i);
            double points = (m.x(0) - middle(m, 0)) * alongX + (m.y(0) - middle(m, 1)) * alongY;
            boolean forth = points > 0;
            assertEquals(i % 2 == 0 ? !tension : tension, forth, where + " head " + i);
        }
    }

    private static double middle(Mark m, int axis) {
        return (m.points().get(axis) + m.points().get(axis + 2) + m.points().get(axis + 4)) / 3;
    }

    @Test
    void headlineSaysAngleSenseAndLoad() {
        Drawn d = Drawn.of(Machines.booster(), 0, 37.5, 1160, 500);
        String said = d.headline().stream().map(Mark::text).reduce("", (a, b) -> a + " " + b);
        // 37.1 kN: own run, guards the wording; the value itself is the solver's business
        double load = d.instant().at(Column.ROD_LOAD) / 1000;
        assertEquals(" φ 37.5 ° rod in tension " + Math.round(load * 10) / 10.0 + " kN", said);
        assertEquals(
                "Crank angle 37.5 degrees, rod in tension, " + Math.round(load * 10) / 10.0 + " kN",
                d.picture().spoken(d.instant()));
    }

    @Test
    void aRingOpensAfterASignChangeAndNotBefore() {
        LinkagePicture picture = picture(Machines.booster(), LinkageChoice.usual(), SIZES[2]);
        List<SignChange> changes = picture.shown().summary().reversal().signChanges();
        assertEquals(2, changes.size());
        for (SignChange change : changes) {
            double at = Math.toDegrees(change.crankAngle());
            assertFalse(ring(picture, at - 0.5).isPresent(), "before");
            Mark early = ring(picture, at + 1).orElseThrow();
            Mark late = ring(picture, at + 20).orElseThrow();
            assertTrue(late.radius() > early.radius(), "it opens");
            assertFalse(ring(picture, at + Math.toDegrees(RodLoad.EVENT) + 0.5).isPresent(), "and is over");
        }
    }

    /** A circle about the crosshead pin, wider than any part of the connecting rod there. */
    private static Optional<Mark> ring(LinkagePicture picture, double degrees) {
        Drawn d = Drawn.at(picture, degrees);
        Framing f = picture.framing();
        MachineLayout layout = MachineLayout.of(picture.shown().machine());
        double least = layout.of(0).gear().rod().smallEye() * f.scale() * 1.13;
        Linkage linkage = layout.of(0).linkage();
        double x = f.originX() + f.scale() * linkage.reach(Math.toRadians(degrees));
        return d.moving().stream()
                .filter(m -> m.kind().equals("circle")
                        && Math.abs(m.x(0) - x) < 0.5
                        && Math.abs(m.y(0) - f.originY()) < 0.5
                        && m.radius() > least)
                .findFirst();
    }

    @Test
    void theRodIsDrawnToScaleAtEveryAngle() {
        for (Machine machine : Machines.all()) {
            Shown shown = Machines.shown(machine, 0);
            double l = shown.shownThrow().linkage().rodLength();
            LinkagePicture picture = picture(machine, LinkageChoice.usual(), SIZES[2]);
            double pin = MachineLayout.of(machine).of(0).gear().crank().pin()
                    * picture.framing().scale();
            double wrist = MachineLayout.of(machine).of(0).gear().rod().wristPin()
                    * picture.framing().scale();
            for (int degrees = 0; degrees < 360; degrees += 5) {
                Drawn d = Drawn.at(picture, degrees);
                Mark big = disc(d, pin);
                Mark small = disc(d, wrist);
                double apart = Math.hypot(big.x(0) - small.x(0), big.y(0) - small.y(0));
                assertEquals(l * picture.framing().scale(), apart, 1e-6, machine.name() + " at " + degrees + "°");
            }
        }
    }

    private static Mark disc(Drawn d, double radius) {
        return d.moving().stream()
                .filter(m -> m.kind().equals("disc") && Math.abs(m.radius() - radius) < 1e-9)
                .findFirst()
                .orElseThrow();
    }

    @Test
    void theMachineIsAsLargeAsTheRoomAllows() {
        for (Machine machine : Machines.all()) {
            LinkagePicture picture = picture(machine, LinkageChoice.usual(), SIZES[2]);
            double least = Double.POSITIVE_INFINITY;
            Box room = picture.size().room();
            for (int degrees = 0; degrees < 360; degrees += 5) {
                Drawn d = Drawn.at(picture, degrees);
                for (List<Mark> layer : List.of(d.still(), d.moving())) {
                    for (Mark m : layer) {
                        if (m.kind().equals("area")
                                || m.kind().equals("outline")
                                || m.kind().equals("line")) {
                            least = Math.min(least, m.least(0) - room.x());
                            least = Math.min(least, m.least(1) - room.y());
                        }
                    }
                }
            }
            assertTrue(least < 12, machine.name() + " leaves " + least + " points");
        }
    }

    @Test
    void aLongerFactorLengthensEveryArrowAlike() {
        LinkageChoice twice = new LinkageChoice(ForceKind.usual(), 2, false, 1, false);
        double one = picture(Machines.booster(), LinkageChoice.usual(), SIZES[2])
                .forceScale()
                .pointsPerNewton();
        assertEquals(
                2 * one,
                picture(Machines.booster(), twice, SIZES[2]).forceScale().pointsPerNewton(),
                1e-12);
    }

    @Test
    void otherThrowsAreLeftOutOnDemand() {
        LinkageChoice alone = new LinkageChoice(ForceKind.usual(), 1, true, 1, false);
        int all = Drawn.of(Machines.opposed(), 0, 30, 1160, 500).moving().size();
        Drawn one = Drawn.of(Machines.shown(Machines.opposed(), 0), alone, 30, 1160, 500);
        Drawn single = Drawn.of(Machines.booster(), 0, 30, 1160, 500);
        assertEquals(single.moving().size(), one.moving().size());
        assertTrue(all > one.moving().size());
        assertEquals(single.picture().framing().scale(), one.picture().framing().scale(), 1e-9);
    }

    @Test
    void aSmallChangeLeavesFramingAndLabelsWhereTheyStood() {
        Shown shown = Machines.shown(Machines.booster(), 0);
        PictureSize size = PictureSize.of(1160, 500, 1);
        RecordingPen pen = new RecordingPen();
        LinkagePicture first = new LinkagePicture(
                shown, Palette.LIGHT, LinkageChoice.usual(), size, pen, LinkagePicture.Standing.ALONE);
        LinkagePicture next = new LinkagePicture(
                Machines.shown(Machines.booster(1.02), 0),
                Palette.LIGHT,
                LinkageChoice.usual(),
                size,
                pen,
                new LinkagePicture.Standing(Optional.empty(), Optional.of(first), Optional.empty(), Optional.empty()));
        assertEquals(first.framing(), next.framing());
        for (int i = 0; i < first.moving().plan().arrows().size(); i++) {
            Box before = first.moving().plan().arrows().get(i).orElseThrow().box();
            Box after = next.moving().plan().arrows().get(i).orElseThrow().box();
            assertEquals(before.x(), after.x(), 1e-9);
            assertEquals(before.y(), after.y(), 1e-9);
        }
    }
}
