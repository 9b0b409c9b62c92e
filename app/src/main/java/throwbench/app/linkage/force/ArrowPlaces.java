package throwbench.app.linkage.force;

import throwbench.app.linkage.parts.ThrowAxes;

/** Tail and tip of every arrow in points of the drawing, for the place an {@link ArrowSet} last took. */
public final class ArrowPlaces {

    private final double[] tailX;
    private final double[] tailY;
    private final double[] tipX;
    private final double[] tipY;

    public ArrowPlaces(int size) {
        tailX = new double[size];
        tailY = new double[size];
        tipX = new double[size];
        tipY = new double[size];
    }

    /** Takes the arrows of an instant. A torque's tail and tip both stand at the crank centre. */
    public void take(ArrowSet a, ThrowAxes axes, ForceScale scale) {
        for (int i = 0; i < a.size(); i++) {
            boolean torque = a.arrows().get(i).kind() == ForceKind.TORQUE;
            double perNewton = torque ? 0 : scale.pointsPerNewton();
            set(
                    i,
                    axes,
                    a.footX[i],
                    a.footY[i],
                    a.besideY[i],
                    a.forceX[i] * perNewton,
                    a.forceY[i] * perNewton,
                    a.endsAtFoot[i]);
        }
    }

    /** Takes the arrows of one of the angles that the revolution was looked at. */
    public void take(ForcePeaks p, int look, ThrowAxes axes, ForceScale scale) {
        for (int i = 0; i < tailX.length; i++) {
            boolean torque = p.arrows().arrows().get(i).kind() == ForceKind.TORQUE;
            double perNewton = torque ? 0 : scale.pointsPerNewton();
            set(
                    i,
                    axes,
                    p.footX[look][i],
                    p.footY[look][i],
                    p.arrows().besideY[i],
                    p.forceX[look][i] * perNewton,
                    p.forceY[look][i] * perNewton,
                    p.endsAtFoot[look][i]);
        }
    }

    private void set(
            int i, ThrowAxes axes, double x, double y, double beside, double alongX, double alongY, boolean endsThere) {
        // offsets in points along the throw's axes, y of the drawing downwards
        double footX = axes.px(x, y) - axes.sin() * beside;
        double footY = axes.py(x, y) - axes.cos() * beside;
        double dx = axes.cos() * alongX - axes.sin() * alongY;
        double dy = -(axes.sin() * alongX + axes.cos() * alongY);
        tailX[i] = endsThere ? footX - dx : footX;
        tailY[i] = endsThere ? footY - dy : footY;
        tipX[i] = endsThere ? footX : footX + dx;
        tipY[i] = endsThere ? footY : footY + dy;
    }

    public int size() {
        return tailX.length;
    }

    public double tailX(int i) {
        return tailX[i];
    }

    public double tailY(int i) {
        return tailY[i];
    }

    public double tipX(int i) {
        return tipX[i];
    }

    public double tipY(int i) {
        return tipY[i];
    }

    /** Distance of a point from an arrow, points. */
    public double distance(int i, double x, double y) {
        double dx = tipX[i] - tailX[i];
        double dy = tipY[i] - tailY[i];
        double square = dx * dx + dy * dy;
        double along = square == 0 ? 0 : ((x - tailX[i]) * dx + (y - tailY[i]) * dy) / square;
        double within = Math.max(0, Math.min(1, along));
        return Math.hypot(x - tailX[i] - within * dx, y - tailY[i] - within * dy);
    }
}
