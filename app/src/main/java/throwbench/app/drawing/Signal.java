package throwbench.app.drawing;

import throwbench.solver.document.quantity.Dimension;
import throwbench.solver.document.quantity.UnitSystem;
import throwbench.solver.machine.Throw;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extremes;
import throwbench.solver.revolution.Instant;
import throwbench.solver.revolution.Revolution;
import throwbench.solver.revolution.Summary;

/** A quantity of the shown throw that follows the crank angle, and how it is named, coloured and written. */
public interface Signal {

    /** Its value at an instant, SI. */
    double at(Instant instant);

    /** Copies its values at the stations into the caller's array and returns it. */
    double[] read(Revolution revolution, double[] into);

    /** Its least and greatest value over the revolution. */
    Extremes extremes(Summary summary);

    /** Its name in words. */
    String title(Throw shown);

    /** How its numbers are written when the greatest magnitude shown is this (SI). */
    Readout readout(UnitSystem units, double peak);

    /** The colour of what it means. */
    int colour(Palette palette);

    /** How its numbers are written over this revolution: with the decimals that its own peak needs. */
    default Readout readout(UnitSystem units, Summary summary) {
        Extremes extremes = extremes(summary);
        return readout(
                units,
                Math.max(
                        Math.abs(extremes.least().value()),
                        Math.abs(extremes.greatest().value())));
    }

    /** A column of the revolution. */
    record OfColumn(Column column) implements Signal {

        @Override
        public double at(Instant instant) {
            return instant.at(column);
        }

        @Override
        public double[] read(Revolution revolution, double[] into) {
            return revolution.read(column, into);
        }

        @Override
        public Extremes extremes(Summary summary) {
            return summary.extremes(column);
        }

        @Override
        public String title(Throw shown) {
            return ColumnWords.title(column);
        }

        @Override
        public Readout readout(UnitSystem units, double peak) {
            return Readout.of(units, column.kind(), peak);
        }

        @Override
        public int colour(Palette palette) {
            return ColumnWords.colour(column, palette.loads());
        }
    }

    /** The absolute pressure in a chamber of the shown throw. */
    record OfPressure(int chamber) implements Signal {

        @Override
        public double at(Instant instant) {
            return instant.pressure(instant.shownThrow(), chamber);
        }

        @Override
        public double[] read(Revolution revolution, double[] into) {
            return revolution.readPressure(chamber, into);
        }

        @Override
        public Extremes extremes(Summary summary) {
            return summary.pressures().get(chamber);
        }

        @Override
        public String title(Throw shown) {
            return shown.chambers().get(chamber).name();
        }

        @Override
        public Readout readout(UnitSystem units, double peak) {
            return Readout.of(units, Dimension.GAS_PRESSURE, peak);
        }

        @Override
        public int colour(Palette palette) {
            return palette.loads().gas();
        }
    }
}
