package throwbench.app.linkage;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import throwbench.app.bench.Shown;
import throwbench.app.drawing.Palette;
import throwbench.app.drawing.Pen;
import throwbench.app.drawing.Readout;
import throwbench.app.linkage.force.ArrowSet;
import throwbench.app.linkage.force.ForcePeaks;
import throwbench.app.linkage.force.ForceScale;
import throwbench.app.linkage.force.LabelPlacer.Box;
import throwbench.app.linkage.parts.ThrowLayout;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Instant;

/**
 * The linkage of one state in a rectangle of points, by a pen: what stands still, what moves, and the headline. Everything
 * that holds for the whole revolution (framing, force scale, places of labels) is settled when it is made; drawing an
 * instant only reads it.
 */
public final class LinkagePicture {

    private final Shown shown;
    private final PictureSize size;
    private final Framing framing;
    private final ForcePeaks peaks;
    private final ForceScale forceScale;
    private final StillPainter still;
    private final MovingPainter moving;
    private final Headline headline;
    private final Box movingBox;

    /**
     * How a picture follows on another.
     *
     * @param framing where the machine stands; empty: the whole machine in the middle
     * @param before the picture that held until now: what can stay where it is stays there
     * @param held a design drawn as a ghost under the present one
     * @param taken a rectangle that something else covers: no label goes there
     */
    record Standing(
            Optional<Framing> framing, Optional<LinkagePicture> before, Optional<Shown> held, Optional<Box> taken) {

        static final Standing ALONE =
                new Standing(Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty());
    }

    /**
     * Settles a picture of the whole machine.
     *
     * @param pen measures texts
     */
    public LinkagePicture(Shown shown, Palette palette, LinkageChoice choice, double width, double height, Pen pen) {
        this(shown, palette, choice, PictureSize.of(width, height, choice.typeScale()), pen, Standing.ALONE);
    }

    LinkagePicture(Shown shown, Palette palette, LinkageChoice choice, PictureSize size, Pen pen, Standing standing) {
        this.shown = shown;
        this.size = size;
        MachineLayout layout = MachineLayout.of(shown.machine());
        ThrowLayout own = layout.of(shown.throwIndex());
        ArrowSet arrows = new ArrowSet(shown.shownThrow(), shown.throwIndex(), own, choice.kinds(), size.weight());
        this.peaks = ForcePeaks.of(shown.summary(), arrows, own);
        Readout force = Readout.of(shown.units(), Column.Kind.FORCE, peaks.greatestForce());
        this.forceScale = ForceScale.of(peaks, size.longestArrow(), choice.arrowFactor(), force);
        Optional<LinkagePicture> before = standing.before().filter(b -> b.size.equals(size));
        this.framing = standing.framing()
                .orElseGet(() -> new Framing.Fit(layout, shown.throwIndex(), choice.alone(), size)
                        .of(peaks, forceScale, before.map(LinkagePicture::framing)));
        Optional<Ghost> ghost = standing.held().map(Ghost::new);
        Scene scene = new Scene(shown, layout, this.framing, palette, choice, size, ghost);
        this.still = new StillPainter(scene, forceScale, force, pen);
        this.headline = new Headline(scene, pen, still.legendBox().x() - 10 * size.weight());
        List<Box> taken = new ArrayList<>(List.of(headline.box(), still.legendBox(), still.footBox()));
        standing.taken().ifPresent(taken::add);
        LabelPlan plan = LabelPlan.of(scene, peaks, forceScale, pen, taken, before.map(b -> b.moving.plan()));
        this.moving = new MovingPainter(scene, peaks, forceScale, plan, pen);
        this.movingBox = plan.movingBox();
    }

    public Shown shown() {
        return shown;
    }

    public Framing framing() {
        return framing;
    }

    public PictureSize size() {
        return size;
    }

    public ForceScale forceScale() {
        return forceScale;
    }

    /** The part of the rectangle in which anything moves. */
    public Box movingBox() {
        return movingBox;
    }

    /** Where the headline stands. */
    public Box headlineBox() {
        return headline.box();
    }

    /** Draws what stands still, on an empty ground. */
    public void paintStill(Pen pen) {
        still.paint(pen);
    }

    /** Draws what moves, over what stands still. */
    public void paintMoving(Pen pen, Instant instant) {
        moving.paint(pen, instant);
    }

    /** Draws crank angle and rod load as text. */
    public void paintHeadline(Pen pen, Instant instant) {
        headline.paint(pen, instant);
    }

    /** What was last drawn, for the pointer. */
    MovingPainter moving() {
        return moving;
    }

    /** The headline as a sentence, for those who hear it. */
    public String spoken(Instant instant) {
        return headline.spoken(instant);
    }
}
