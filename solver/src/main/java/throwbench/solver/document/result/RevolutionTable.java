package throwbench.solver.document.result;

import java.util.ArrayList;
import java.util.List;
import throwbench.solver.machine.Chamber;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Revolution;

/** The columns of a revolution as files have them: named, in their order, angles in degrees. */
final class RevolutionTable {

    private final List<String> names = new ArrayList<>();
    private final List<double[]> values = new ArrayList<>();

    RevolutionTable(Revolution revolution) {
        for (Column column : Column.values()) {
            if (column == Column.GAS_LOAD) {
                addPressures(revolution);
            }
            add(column.fileName(), read(revolution, column));
        }
    }

    private void addPressures(Revolution revolution) {
        List<Chamber> chambers = revolution
                .running()
                .throwsInOrder()
                .get(revolution.shownThrow())
                .chambers();
        for (int c = 0; c < chambers.size(); c++) {
            String name = Column.pressureName(chambers.get(c).name());
            add(name, revolution.readPressure(c, new double[revolution.count()]));
        }
    }

    private static double[] read(Revolution revolution, Column column) {
        double[] values = revolution.read(column, new double[revolution.count()]);
        for (int i = 0; i < values.length; i++) {
            // 360° i/N from the whole numbers: the angle in radians would not come back as 0.5
            values[i] = column == Column.CRANK_ANGLE ? 360.0 * i / values.length : column.inFile(values[i]);
        }
        return values;
    }

    private void add(String name, double[] column) {
        for (int i = 0; i < column.length; i++) {
            column[i] = finite(column[i], name);
        }
        names.add(name);
        values.add(column);
    }

    /**
     * A number as a file may hold it: negative zero, which some readers stumble over, becomes zero.
     *
     * @throws IllegalStateException for what is no number
     */
    static double finite(double value, String name) {
        if (!Double.isFinite(value)) {
            throw new IllegalStateException(name + " came out as " + value);
        }
        return value + 0.0;
    }

    int size() {
        return names.size();
    }

    int stations() {
        return values.get(0).length;
    }

    String name(int column) {
        return names.get(column);
    }

    double at(int column, int station) {
        return values.get(column)[station];
    }
}
