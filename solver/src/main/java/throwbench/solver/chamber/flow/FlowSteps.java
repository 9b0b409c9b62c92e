package throwbench.solver.chamber.flow;

import java.util.Arrays;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Sweep;

/** Pressure over a stretch of crank angle, as cubic pieces through the ends of integration steps. Immutable. */
public final class FlowSteps {

    /** Steps grow slowly: over this many of them the pressure has one scale, and their own small joints don't matter. */
    private static final int JOINED = 8;

    private final double[] angle;
    private final double[] pressure;
    private final double[] slope;

    private FlowSteps(double[] angle, double[] pressure, double[] slope) {
        this.angle = angle;
        this.pressure = pressure;
        this.slope = slope;
    }

    /** Crank angles of step ends, rad, not wrapped: close enough together that the pressure between two is smooth. */
    public DoubleStream joints() {
        return IntStream.iterate(0, i -> i < angle.length, i -> i + JOINED).mapToDouble(i -> angle[i]);
    }

    /** Overwrites the pressure at the stations that lie on the stretch. */
    public void fill(Sweep sweep, double[] into) {
        int stations = sweep.count();
        double step = Angles.TURN / stations;
        double start = sweep.crankAngle()[0];
        long first = (long) Math.ceil((angle[0] - start) / step);
        long last = (long) Math.floor((angle[angle.length - 1] - start) / step);
        if (last < first) {
            return;
        }
        int piece = search(start + first * step);
        int station = (int) Math.floorMod(first, (long) stations);
        for (long i = first; i <= last; i++) {
            double at = start + i * step;
            while (piece < angle.length - 2 && angle[piece + 1] < at) {
                piece++;
            }
            into[station] = cubic(piece, at);
            station = station + 1 == stations ? 0 : station + 1;
        }
    }

    private int search(double at) {
        int found = Arrays.binarySearch(angle, at);
        int piece = found >= 0 ? found : -found - 2;
        return Math.max(0, Math.min(angle.length - 2, piece));
    }

    private double cubic(int i, double at) {
        double h = angle[i + 1] - angle[i];
        double t = (at - angle[i]) / h;
        double chord = pressure[i + 1] - pressure[i];
        double left = h * slope[i] - chord;
        double right = chord - h * slope[i + 1];
        return pressure[i] + t * (chord + (1 - t) * ((1 - t) * left + t * right));
    }

    /** Collects steps. */
    public static final class Log {

        private double[] angle = new double[128];
        private double[] pressure = new double[128];
        private double[] slope = new double[128];
        private int count;

        void clear() {
            count = 0;
        }

        /** A step's end: crank angle (rad, rising), pressure and its slope by crank angle in any one unit. */
        void add(double crankAngle, double pressureThere, double slopeThere) {
            if (count == angle.length) {
                angle = Arrays.copyOf(angle, 2 * count);
                pressure = Arrays.copyOf(pressure, 2 * count);
                slope = Arrays.copyOf(slope, 2 * count);
            }
            angle[count] = crankAngle;
            pressure[count] = pressureThere;
            slope[count] = slopeThere;
            count++;
        }

        public int count() {
            return count;
        }

        public double angle(int i) {
            return angle[i];
        }

        public double pressure(int i) {
            return pressure[i];
        }

        /** What was collected, pressures multiplied by a unit (Pa). */
        public FlowSteps steps(double unit) {
            double[] p = new double[count];
            double[] s = new double[count];
            for (int i = 0; i < count; i++) {
                p[i] = unit * pressure[i];
                s[i] = unit * slope[i];
            }
            return new FlowSteps(Arrays.copyOf(angle, count), p, s);
        }
    }
}
