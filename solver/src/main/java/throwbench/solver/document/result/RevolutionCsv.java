package throwbench.solver.document.result;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import throwbench.solver.revolution.Revolution;

/** A revolution as CSV, one row a station, numbers in the fewest digits that read back exactly. */
public final class RevolutionCsv implements Written {

    /** Characters handed over at a time. */
    private static final int PIECE = 1 << 16;

    private final RevolutionTable table;

    public RevolutionCsv(Revolution revolution) {
        this.table = new RevolutionTable(revolution);
    }

    @Override
    public void writeTo(OutputStream out) throws IOException {
        StringBuilder text = new StringBuilder(PIECE + PIECE / 8);
        for (int c = 0; c < table.size(); c++) {
            separate(text, c);
            Csv.quote(table.name(c), text);
        }
        text.append('\n');
        for (int i = 0; i < table.stations(); i++) {
            for (int c = 0; c < table.size(); c++) {
                separate(text, c);
                text.append(table.at(c, i));
            }
            text.append('\n');
            if (text.length() >= PIECE) {
                flush(text, out);
            }
        }
        flush(text, out);
    }

    private static void separate(StringBuilder text, int column) {
        if (column > 0) {
            text.append(',');
        }
    }

    private static void flush(StringBuilder text, OutputStream out) throws IOException {
        out.write(text.toString().getBytes(StandardCharsets.UTF_8));
        text.setLength(0);
    }
}
