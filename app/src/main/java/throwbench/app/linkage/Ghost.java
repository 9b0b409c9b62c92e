package throwbench.app.linkage;

import throwbench.app.bench.Shown;
import throwbench.app.linkage.parts.ConnectingRodPainter;
import throwbench.app.linkage.parts.CrankPainter;
import throwbench.app.linkage.parts.CrossheadPainter;
import throwbench.app.linkage.parts.CylinderPainter;
import throwbench.app.linkage.parts.Look;
import throwbench.app.linkage.parts.PistonPainter;
import throwbench.app.linkage.parts.Pose;
import throwbench.app.linkage.parts.ThrowAxes;
import throwbench.app.linkage.parts.ThrowLayout;
import throwbench.app.linkage.parts.ThrowPen;
import throwbench.solver.revolution.Instant;

/** The held design's throw in outline, at the same scale and crank angle as the present one. */
final class Ghost {

    private final ThrowLayout layout;
    private final double direction;
    private final int throwIndex;
    private final Instant instant;
    private final Pose pose;

    Ghost(Shown held) {
        throwIndex = held.throwIndex();
        layout = ThrowLayout.of(held.machine(), held.shownThrow());
        direction = held.shownThrow().place().axisDirection();
        instant = new Instant(held.running(), throwIndex);
        pose = new Pose(layout.linkage());
    }

    ThrowLayout layout() {
        return layout;
    }

    ThrowAxes axes(Framing framing) {
        return ThrowAxes.of(framing.originX(), framing.originY(), framing.scale(), direction);
    }

    void paintStill(ThrowPen p, Look look) {
        CrossheadPainter.paintGuide(p, layout, look);
        CylinderPainter.paint(p, layout, look);
    }

    void paintMoving(ThrowPen p, double crankAngle, Look look) {
        pose.take(instant.turnTo(crankAngle), throwIndex);
        CrankPainter.paint(p, layout, pose, look);
        CrossheadPainter.paint(p, layout, pose, look);
        PistonPainter.paint(p, layout, pose, look);
        ConnectingRodPainter.paint(p, layout, pose, look);
    }
}
