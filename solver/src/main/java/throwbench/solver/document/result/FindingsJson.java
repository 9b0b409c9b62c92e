package throwbench.solver.document.result;

import java.io.IOException;
import java.io.OutputStream;
import java.util.List;
import throwbench.solver.finding.Finding;

/** Findings of a machine as JSON, in the order given. */
public record FindingsJson(String machineName, List<Finding> findings) implements Written {

    public FindingsJson {
        findings = List.copyOf(findings);
    }

    @Override
    public void writeTo(OutputStream out) throws IOException {
        Json json = new Json();
        json.begin();
        json.text("machine", machineName);
        json.beginList("findings");
        for (Finding finding : findings) {
            write(finding, json);
        }
        json.endList();
        json.end();
        json.finish(out);
    }

    private static void write(Finding finding, Json json) throws IOException {
        json.begin();
        json.text("id", finding.criterion().id());
        json.text("duty", finding.where().duty());
        json.text("stage", finding.where().stage());
        json.text("throw", finding.where().throwName());
        json.text("chamber", finding.where().chamber());
        json.number("value", finding.value());
        json.text("unit", finding.criterion().unit());
        json.number("limit", finding.limit());
        json.number("margin", finding.margin());
        json.degrees("angle_deg", finding.angle());
        json.text("verdict", finding.verdict().text());
        json.text("source", finding.criterion().source());
        json.text("note", finding.note());
        json.end();
    }
}
