package throwbench.solver.mechanism;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import throwbench.solver.mechanism.TwoTermSeries.Quantity;
import throwbench.solver.mechanism.TwoTermSeries.Value;
import throwbench.solver.mechanism.TwoTermSeries.Worst;
import throwbench.solver.trial.AnyLinkage;

/** The short formulas and their errors for any linkage. */
class TwoTermSeriesPropertyTest {

    /**
     * 1 − sin²β/2 − cos β = (1 − cos β)²/2 exactly, and asin x − x lies between x³/6 and its value at |x|: bounds of both
     * errors that hold for every linkage.
     */
    @Property
    void errorsKeepTheirBounds(
            @ForAll(supplier = AnyLinkage.class) Linkage linkage,
            @ForAll Rotation rotation,
            @ForAll @IntRange(max = 9999) int some) {
        double angle = some * Angles.TURN / 10_000;
        TwoTermSeries series = new TwoTermSeries(linkage, rotation);
        Value travel = series.at(Quantity.TRAVEL, angle);
        Value rod = series.at(Quantity.ROD_ANGLE, angle);
        double l = linkage.rodLength();
        double left = 1 - Math.cos(rod.exact());
        assertEquals(-l * left * left / 2, travel.error(), 1e-13 * l);
        double sin = Math.abs(rod.series());
        assertTrue(Math.abs(rod.error()) >= sin * sin * sin / 6 - 1e-15, () -> "" + rod);
        assertEquals(Math.sin(rod.exact()), rod.series(), 1e-14);
    }

    /** Velocity and acceleration of the series are the slopes of its travel. */
    @Property
    void seriesAreEachOthersSlopes(
            @ForAll(supplier = AnyLinkage.class) Linkage linkage,
            @ForAll Rotation rotation,
            @ForAll @IntRange(max = 9999) int some) {
        double angle = some * Angles.TURN / 10_000;
        TwoTermSeries series = new TwoTermSeries(linkage, rotation);
        double h = 1e-3;
        double l = linkage.rodLength();
        assertEquals(
                slope(series, Quantity.TRAVEL, angle, h),
                series.at(Quantity.VELOCITY, angle).series(),
                1e-10 * l);
        assertEquals(
                slope(series, Quantity.VELOCITY, angle, h),
                series.at(Quantity.ACCELERATION, angle).series(),
                1e-10 * l);
    }

    /** Five-point difference; the error of four harmonics is below h⁴. */
    private static double slope(TwoTermSeries series, Quantity quantity, double angle, double h) {
        double near = series.at(quantity, angle + h).series()
                - series.at(quantity, angle - h).series();
        double far = series.at(quantity, angle + 2 * h).series()
                - series.at(quantity, angle - 2 * h).series();
        return (8 * near - far) / (12 * h);
    }

    @Property(tries = 100)
    void worstErrorIsNeverExceeded(
            @ForAll(supplier = AnyLinkage.class) Linkage linkage,
            @ForAll Rotation rotation,
            @ForAll Quantity quantity) {
        TwoTermSeries series = new TwoTermSeries(linkage, rotation);
        Worst worst = series.worst(quantity);
        double size = Math.abs(worst.value().error());
        assertEquals(size, Math.abs(series.at(quantity, worst.crankAngle()).error()), 1e-14);
        for (int i = 0; i < 2000; i++) {
            double error = Math.abs(series.at(quantity, Angles.TURN / 2000 * i).error());
            assertTrue(error <= size * (1 + 1e-9) + 1e-14, () -> error + " exceeds " + worst);
        }
    }
}
