package throwbench.app.linkage;

import java.util.ArrayList;
import java.util.List;
import throwbench.app.linkage.force.ArrowPlaces;
import throwbench.app.linkage.force.ArrowSet;
import throwbench.app.linkage.force.ForceKind;
import throwbench.app.linkage.force.ForcePeaks;
import throwbench.app.linkage.force.ForceScale;
import throwbench.app.linkage.force.LabelPlacer.Box;
import throwbench.app.linkage.force.Occupancy;
import throwbench.app.linkage.parts.GearShape;
import throwbench.app.linkage.parts.RodLine;
import throwbench.app.linkage.parts.ThrowAxes;
import throwbench.app.linkage.parts.ThrowLayout;
import throwbench.solver.mechanism.Linkage;

/** What of the view the machine and its arrows take over the revolution. */
final class Survey {

    private static final double PARTS = 1;
    private static final double ARROWS = 0.8;
    private static final double OTHERS = 0.3;

    private final Scene scene;
    private final ForcePeaks peaks;
    private final ForceScale scale;
    private final Occupancy occupancy;
    private final ThrowAxes axes;
    private final double w;
    private final double[] nearX;
    private final double[] nearY;
    private double left = Double.POSITIVE_INFINITY;
    private double top = Double.POSITIVE_INFINITY;
    private double right = Double.NEGATIVE_INFINITY;
    private double bottom = Double.NEGATIVE_INFINITY;

    Survey(Scene scene, ForcePeaks peaks, ForceScale scale, Occupancy occupancy) {
        this.scene = scene;
        this.peaks = peaks;
        this.scale = scale;
        this.occupancy = occupancy;
        this.axes = scene.axes();
        this.w = scene.weight();
        this.nearX = new double[peaks.arrows().size()];
        this.nearY = new double[peaks.arrows().size()];
    }

    void mark() {
        for (int i = 0; i < scene.layout().size(); i++) {
            if (scene.draws(i)) {
                parts(scene.layout().of(i), scene.layout().axes(i, scene.framing()), OTHERS);
            }
        }
        scene.ghost().ifPresent(g -> parts(g.layout(), g.axes(scene.framing()), OTHERS));
        parts(scene.own(), axes, PARTS);
        arrows();
        occupancy.sum();
    }

    private void parts(ThrowLayout layout, ThrowAxes at, double weight) {
        Linkage linkage = layout.linkage();
        GearShape gear = layout.gear();
        double sweep = gear.sweep(linkage.crankRadius());
        occupancy.disc(at.px(0, 0), at.py(0, 0), sweep * at.scale(), weight);
        double e = linkage.guideOffset();
        double rod = gear.rod().bigEye() + Math.abs(e);
        rect(at, 0, e - rod, linkage.leastReach(), e + rod, weight);
        GearShape.Slider slider = gear.slider();
        double half = slider.halfHeight() + slider.guide().bar();
        rect(
                at,
                linkage.leastReach() - slider.back(),
                e - half,
                linkage.greatestReach() + slider.front(),
                e + half,
                weight);
        ThrowLayout.Extent extent = layout.extent();
        rect(
                at,
                linkage.leastReach(),
                e - gear.rod().smallEye(),
                extent.greatestX(),
                e + gear.rod().smallEye(),
                weight);
        for (RodLine.Barrel b : layout.line().barrels()) {
            double outside = b.radius() + b.wall();
            rect(at, b.from() - b.wall(), e - outside, b.to() + b.wall(), e + outside, weight);
        }
        reach(at.px(extent.leastX(), extent.leastY()), at.py(extent.leastX(), extent.leastY()));
        reach(at.px(extent.greatestX(), extent.leastY()), at.py(extent.greatestX(), extent.leastY()));
        reach(at.px(extent.leastX(), extent.greatestY()), at.py(extent.leastX(), extent.greatestY()));
        reach(at.px(extent.greatestX(), extent.greatestY()), at.py(extent.greatestX(), extent.greatestY()));
    }

    private void rect(ThrowAxes at, double x1, double y1, double x2, double y2, double weight) {
        double x = at.px(x1, y1);
        double y = at.py(x1, y1);
        occupancy.area(x, y, at.px(x2, y1) - x, at.py(x2, y1) - y, at.px(x1, y2) - x, at.py(x1, y2) - y, weight);
    }

    private void arrows() {
        ArrowSet arrows = peaks.arrows();
        ArrowPlaces places = new ArrowPlaces(arrows.size());
        double[] lengths = new double[arrows.size()];
        for (int look = 0; look < ForcePeaks.LOOKS; look++) {
            places.take(peaks, look, axes, scale);
            for (int i = 0; i < arrows.size(); i++) {
                if (arrows.arrows().get(i).kind() == ForceKind.TORQUE) {
                    torque(i, look);
                } else {
                    arrow(places, i, lengths);
                }
            }
        }
        for (int i = 0; i < arrows.size(); i++) {
            if (arrows.arrows().get(i).kind() != ForceKind.TORQUE && lengths[i] > 0) {
                nearX[i] /= lengths[i];
                nearY[i] /= lengths[i];
            }
        }
    }

    /** A label stands near the middle of its arrow while the arrow is long. */
    private void arrow(ArrowPlaces places, int i, double[] lengths) {
        double x1 = places.tailX(i);
        double y1 = places.tailY(i);
        double x2 = places.tipX(i);
        double y2 = places.tipY(i);
        double length = 1 + Math.hypot(x2 - x1, y2 - y1);
        for (int side = -1; side <= 1; side++) {
            double across = side * 5 * w / length;
            double dx = across * (y2 - y1);
            double dy = -across * (x2 - x1);
            occupancy.line(x1 + dx, y1 + dy, x2 + dx, y2 + dy, ARROWS);
        }
        nearX[i] += length * (x1 + x2) / 2;
        nearY[i] += length * (y1 + y2) / 2;
        lengths[i] += length;
        reach(x1, y1);
        reach(x2, y2);
    }

    private void torque(int i, int look) {
        double most = Math.abs(peaks.forceX(look, i)) * scale.radPerNewtonMetre();
        double radius = arcRadius(scene);
        double direction = Math.atan2(axes.sin(), axes.cos()) + peaks.arrows().arcStart();
        for (int step = -8; step <= 8; step++) {
            double a = direction + most * step / 8;
            double x = axes.originX() + radius * Math.cos(a);
            double y = axes.originY() - radius * Math.sin(a);
            occupancy.line(x - 5 * w, y, x + 5 * w, y, ARROWS);
            occupancy.line(x, y - 5 * w, x, y + 5 * w, ARROWS);
            reach(x, y);
        }
        nearX[i] = axes.originX() + (radius + 16 * w) * Math.cos(direction);
        nearY[i] = axes.originY() - (radius + 16 * w) * Math.sin(direction);
    }

    /** Radius of the torque's arc, outside crank and big end, points. */
    static double arcRadius(Scene scene) {
        ThrowLayout own = scene.own();
        return own.gear().sweep(own.linkage().crankRadius()) * scene.framing().scale()
                + MovingPainter.ARC_OUT * scene.weight();
    }

    double nearX(int arrow) {
        return nearX[arrow];
    }

    double nearY(int arrow) {
        return nearY[arrow];
    }

    /** The dead-centre marks with their letters. */
    List<Box> deadCentreBoxes() {
        List<Box> boxes = new ArrayList<>();
        RodLine.Piston first = scene.own().line().pistons().get(0);
        RodLine.Barrel barrel = scene.own().line().barrels().get(0);
        double at = first.plunger() ? first.headFace() : RodLine.middle(first);
        int up = axes.upper();
        double y = scene.own().linkage().guideOffset() - up * (barrel.radius() + barrel.wall());
        Linkage linkage = scene.own().linkage();
        for (double x : new double[] {linkage.leastReach() + at, linkage.greatestReach() + at}) {
            double px = axes.px(x, y);
            double py = axes.py(x, y);
            double endX = px + up * axes.sin() * StillPainter.MARK * w;
            double endY = py + up * axes.cos() * StillPainter.MARK * w;
            double wide = 14 * w * (1 - Math.abs(axes.sin()));
            boxes.add(new Box(
                    Math.min(px, endX) - wide,
                    Math.min(py, endY) - 6 * w,
                    Math.abs(endX - px) + 2 * wide,
                    Math.abs(endY - py) + 12 * w));
        }
        return boxes;
    }

    void reach(Box box) {
        reach(box.x(), box.y());
        reach(box.x() + box.width(), box.y() + box.height());
    }

    private void reach(double x, double y) {
        left = Math.min(left, x);
        right = Math.max(right, x);
        top = Math.min(top, y);
        bottom = Math.max(bottom, y);
    }

    /** All that moves, with room for line widths and heads, within the view, on whole points. */
    Box movingBox() {
        double pad = 16 * w;
        double x1 = Math.floor(Math.max(0, left - pad));
        double y1 = Math.floor(Math.max(0, top - pad));
        double x2 = Math.ceil(Math.min(scene.size().width(), right + pad));
        double y2 = Math.ceil(Math.min(scene.size().height(), bottom + pad));
        return new Box(x1, y1, Math.max(1, x2 - x1), Math.max(1, y2 - y1));
    }
}
