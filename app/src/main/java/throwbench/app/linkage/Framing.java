package throwbench.app.linkage;

import java.util.Optional;
import throwbench.app.linkage.force.ArrowSet;
import throwbench.app.linkage.force.ForceKind;
import throwbench.app.linkage.force.ForcePeaks;
import throwbench.app.linkage.force.ForceScale;
import throwbench.app.linkage.force.LabelPlacer.Box;
import throwbench.app.linkage.parts.ThrowAxes;
import throwbench.app.linkage.parts.ThrowLayout;

/**
 * How the machine stands in the view.
 *
 * @param scale points a metre
 * @param originX crank centre, points
 * @param originY crank centre, points
 */
public record Framing(double scale, double originX, double originY) {

    /** Zoomed about a point that stays where it is. */
    public Framing zoomed(double factor, double x, double y) {
        return new Framing(scale * factor, x + (originX - x) * factor, y + (originY - y) * factor);
    }

    public Framing moved(double dx, double dy) {
        return new Framing(scale, originX + dx, originY + dy);
    }

    /**
     * Finds the framing of a whole machine.
     *
     * @param alone whether the other throws are left out
     */
    record Fit(MachineLayout layout, int shown, boolean alone, PictureSize size) {

        /** A framing stays while it is at least so large as a share of the largest one, and everything is inside. */
        private static final double LARGE_ENOUGH = 0.93;

        /** How far into the border it may reach then, points at weight 1. */
        private static final double SLACK = 6;

        /**
         * The largest framing in which the machine at every angle, its arrows and its dead-centre marks stay inside the
         * room, in its middle.
         *
         * @param before the framing that held until now: it stays where it still serves
         */
        Framing of(ForcePeaks peaks, ForceScale scale, Optional<Framing> before) {
            double weight = size.weight();
            Reach reach = new Reach();
            for (int i = 0; i < layout.size(); i++) {
                if (i == shown || !alone) {
                    reach.direction(layout.directions().get(i));
                    ThrowLayout.Extent e = layout.of(i).extent();
                    double mark = i == shown ? StillPainter.MARK * weight : 0;
                    boolean below = ThrowAxes.upper(layout.directions().get(i)) > 0;
                    reach.add(e.leastX(), e.leastY(), 0, 0);
                    reach.add(e.greatestX(), e.leastY(), 0, below ? -mark : 0);
                    reach.add(e.leastX(), e.greatestY(), 0, 0);
                    reach.add(e.greatestX(), e.greatestY(), 0, below ? 0 : mark);
                }
            }
            reach.direction(layout.directions().get(shown));
            arrows(reach, layout.of(shown), peaks, scale, weight);
            Box room = size.room();
            double k = Math.min(reach.scale(true, room.width()), reach.scale(false, room.height()));
            if (before.isPresent() && before.get().scale() > LARGE_ENOUGH * k && reach.inside(before.get(), room, SLACK * weight)) {
                return before.get();
            }
            double midX = room.x() + room.width() / 2 - reach.middle(true, k);
            double midY = room.y() + room.height() / 2 + reach.middle(false, k);
            return new Framing(k, midX, midY);
        }
    }

    private static void arrows(Reach reach, ThrowLayout layout, ForcePeaks peaks, ForceScale scale, double weight) {
        ArrowSet arrows = peaks.arrows();
        double sweep = layout.gear().sweep(layout.linkage().crankRadius());
        for (int look = 0; look < ForcePeaks.LOOKS; look++) {
            for (int i = 0; i < arrows.size(); i++) {
                double x = peaks.footX(look, i);
                double y = peaks.footY(look, i);
                double beside = arrows.beside(i);
                if (arrows.arrows().get(i).kind() == ForceKind.TORQUE) {
                    double most = Math.abs(peaks.forceX(look, i)) * scale.radPerNewtonMetre();
                    for (int side = -1; side <= 1; side++) {
                        double at = arrows.arcStart() + side * most;
                        double out = (MovingPainter.ARC_OUT + 8) * weight;
                        reach.add(sweep * Math.cos(at), sweep * Math.sin(at), out * Math.cos(at), out * Math.sin(at));
                    }
                    continue;
                }
                double dx = peaks.forceX(look, i) * scale.pointsPerNewton();
                double dy = peaks.forceY(look, i) * scale.pointsPerNewton();
                int sense = peaks.endsAtFoot(look, i) ? -1 : 1;
                reach.add(x, y, sense * dx, beside + sense * dy);
            }
        }
    }

    /** Points that must stay inside: a place in m and an offset in points, both along machine axes. */
    private static final class Reach {

        private double[] x = new double[512];
        private double[] y = new double[512];
        private double[] offsetX = new double[512];
        private double[] offsetY = new double[512];
        private int n;
        private double cos;
        private double sin;

        void direction(double gamma) {
            cos = Math.cos(gamma);
            sin = Math.sin(gamma);
        }

        void add(double u, double v, double du, double dv) {
            if (n == x.length) {
                x = java.util.Arrays.copyOf(x, 2 * n);
                y = java.util.Arrays.copyOf(y, 2 * n);
                offsetX = java.util.Arrays.copyOf(offsetX, 2 * n);
                offsetY = java.util.Arrays.copyOf(offsetY, 2 * n);
            }
            x[n] = cos * u - sin * v;
            y[n] = sin * u + cos * v;
            offsetX[n] = cos * du - sin * dv;
            offsetY[n] = sin * du + cos * dv;
            n++;
        }

        /** The greatest scale at which the reach along one axis is no more than so many points. */
        double scale(boolean alongX, double points) {
            double least = 0;
            double most = 1e6;
            for (int i = 0; i < 48; i++) {
                double k = least == 0 ? most / 64 : (least + most) / 2;
                if (end(alongX, k, 1) + end(alongX, k, -1) <= points) {
                    least = k;
                } else {
                    most = k;
                }
            }
            return Math.max(least, 1);
        }

        boolean inside(Framing f, Box room, double slack) {
            double k = f.scale();
            return f.originX() + end(true, k, 1) <= room.x() + room.width() + slack
                    && f.originX() - end(true, k, -1) >= room.x() - slack
                    && f.originY() + end(false, k, -1) <= room.y() + room.height() + slack
                    && f.originY() - end(false, k, 1) >= room.y() - slack;
        }

        double middle(boolean alongX, double k) {
            return (end(alongX, k, 1) - end(alongX, k, -1)) / 2;
        }

        private double end(boolean alongX, double k, int sense) {
            double[] at = alongX ? x : y;
            double[] offset = alongX ? offsetX : offsetY;
            double end = Double.NEGATIVE_INFINITY;
            for (int i = 0; i < n; i++) {
                end = Math.max(end, sense * (k * at[i] + offset[i]));
            }
            return end;
        }
    }
}
