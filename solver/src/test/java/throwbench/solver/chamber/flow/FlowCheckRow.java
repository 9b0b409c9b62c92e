package throwbench.solver.chamber.flow;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;

/** A row of valve-flow-check-values.csv: a value of the flow through an orifice with its source. */
record FlowCheckRow(
        String id,
        String quantity,
        double k,
        String pressureRatio,
        String published,
        double exact,
        String tolerance,
        String source,
        String status) {

    static List<FlowCheckRow> all() throws IOException {
        try (InputStream in =
                Objects.requireNonNull(FlowCheckRow.class.getResourceAsStream("valve-flow-check-values.csv"))) {
            String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
            return text.lines()
                    .skip(1)
                    .map(line -> line.split(";", -1))
                    .map(c -> new FlowCheckRow(
                            c[0],
                            c[1],
                            Double.parseDouble(c[2]),
                            c[3],
                            c[5],
                            Double.parseDouble(c[6]),
                            c[7],
                            c[8],
                            c[9]))
                    .toList();
        }
    }

    /** What a failure shows: where the number comes from. */
    String told() {
        return id + ", " + quantity + "; " + source + " (" + status + ")";
    }
}
