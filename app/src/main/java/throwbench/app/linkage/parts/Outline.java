package throwbench.app.linkage.parts;

/** The closed outline of a rigid part in axes of its own, m. Made once; where it stands is said when it is drawn. */
public final class Outline {

    final double[] x;
    final double[] y;

    private Outline(double[] x, double[] y) {
        this.x = x;
        this.y = y;
    }

    int size() {
        return x.length;
    }

    /** Collects points in order. */
    static final class Builder {

        private double[] x = new double[64];
        private double[] y = new double[64];
        private int n;

        Builder to(double atX, double atY) {
            if (n == x.length) {
                x = java.util.Arrays.copyOf(x, 2 * n);
                y = java.util.Arrays.copyOf(y, 2 * n);
            }
            x[n] = atX;
            y[n] = atY;
            n++;
            return this;
        }

        /** A part of a circle, both ends included; angles in rad, either sense. */
        Builder arc(double centreX, double centreY, double radius, double from, double to) {
            int steps = Math.max(2, (int) Math.ceil(Math.abs(to - from) / Math.toRadians(7)));
            for (int i = 0; i <= steps; i++) {
                double a = from + (to - from) * i / steps;
                to(centreX + radius * Math.cos(a), centreY + radius * Math.sin(a));
            }
            return this;
        }

        /** Closes an outline that is symmetrical about its x axis: what stands so far is the upper half. */
        Outline mirrored() {
            for (int i = n - 1; i >= 0; i--) {
                if (y[i] != 0) {
                    to(x[i], -y[i]);
                }
            }
            return closed();
        }

        Outline closed() {
            return new Outline(java.util.Arrays.copyOf(x, n), java.util.Arrays.copyOf(y, n));
        }
    }
}
