package throwbench.solver.document.result;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import throwbench.solver.map.Axis;
import throwbench.solver.map.DutyMap;
import throwbench.solver.map.Outcome;

/** A complete duty map as CSV, one row a cell, across running fastest; a cell without a value says why. */
public final class DutyMapCsv implements Written {

    private final DutyMap map;

    public DutyMapCsv(DutyMap map) {
        this.map = map;
    }

    @Override
    public void writeTo(OutputStream out) throws IOException {
        StringBuilder text = new StringBuilder("across,up,value,reason\n");
        for (int row = 0; row < map.up().points(); row++) {
            for (int column = 0; column < map.across().points(); column++) {
                append(column, row, text);
            }
            out.write(text.toString().getBytes(StandardCharsets.UTF_8));
            text.setLength(0);
        }
    }

    private void append(int column, int row, StringBuilder text) {
        Outcome cell = map.at(column, row)
                .orElseThrow(() -> new IllegalStateException("cell " + column + ", " + row + " is not known"));
        text.append(place(map.across(), column))
                .append(',')
                .append(place(map.up(), row))
                .append(',');
        cell.value().ifPresent(text::append);
        text.append(',');
        Csv.quote(cell.reason(), text);
        text.append('\n');
    }

    private static double place(Axis axis, int at) {
        return axis.variable().inTables(axis.at(at)) + 0.0;
    }
}
