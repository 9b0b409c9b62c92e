package throwbench.solver.document.attached;

import java.util.ArrayList;
import java.util.List;
import throwbench.solver.chamber.RecordedPressure;
import throwbench.solver.document.attached.AttachedFiles.Attached;
import throwbench.solver.document.quantity.NumberText;
import throwbench.solver.document.quantity.QuantityText;

/** A recorded pressure as comma-separated values: a row per crank angle, absolute pressures. */
final class RecordedTable {

    static final String HEADER = "crank_angle_deg,pressure_Pa";
    static final String WANTED = "a table that begins with " + HEADER;

    private static final int FEWEST_ROWS = 8;

    private final String file;
    private final String text;
    private final List<Double> angles = new ArrayList<>();
    private final List<Double> pressures = new ArrayList<>();
    private int line;

    private RecordedTable(String file, String text) {
        this.file = file;
        this.text = text;
    }

    /** Reads a table; the first thing that is wrong refuses it. */
    static Attached parse(String file, String text) {
        return new RecordedTable(file, text.startsWith("\ufeff") ? text.substring(1) : text).read();
    }

    private Attached read() {
        int at = 0;
        while (at < text.length()) {
            int end = text.indexOf('\n', at);
            String row = text.substring(at, end < 0 ? text.length() : end).strip();
            at = end < 0 ? text.length() : end + 1;
            line++;
            boolean blankEnd = row.isEmpty() && text.substring(at).isBlank();
            if (blankEnd) {
                break;
            }
            String wanted = line == 1 ? header(row) : row(row);
            if (!wanted.isEmpty()) {
                return Attached.refused("line " + line + " of " + file + ": " + QuantityText.quoted(row), wanted);
            }
        }
        if (angles.size() < FEWEST_ROWS) {
            String found = line == 0 ? "an empty file " + file : angles.size() + " rows in " + file;
            return Attached.refused(found, line == 0 ? WANTED : "at least " + FEWEST_ROWS);
        }
        return Attached.of(new RecordedPressure(file, angles, pressures));
    }

    private static String header(String row) {
        return row.equals(HEADER) ? "" : WANTED;
    }

    /** Takes a row; says what is wanted instead where it is none. */
    private String row(String row) {
        int comma = row.indexOf(',');
        String angle = comma < 0 ? "" : row.substring(0, comma).strip();
        String pressure = row.substring(comma + 1).strip();
        if (!NumberText.isNumber(angle) || !NumberText.isNumber(pressure)) {
            return "a crank angle and a pressure, as 37.5,820000";
        }
        double degrees = Double.parseDouble(angle);
        double pascal = Double.parseDouble(pressure);
        if (!(degrees >= 0 && degrees < 360)) {
            return "a crank angle from 0 to below 360";
        }
        double radians = Math.toRadians(degrees);
        if (!angles.isEmpty() && !(radians > angles.get(angles.size() - 1))) {
            return "a crank angle above that of the row before";
        }
        if (!(pascal > 0 && pascal <= Double.MAX_VALUE)) {
            return "an absolute pressure above 0";
        }
        angles.add(radians);
        pressures.add(pascal);
        return "";
    }
}
