package throwbench.solver.document.result;

import java.io.IOException;
import java.io.OutputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import throwbench.solver.balance.Harmonic;
import throwbench.solver.chamber.ValveEvent;
import throwbench.solver.machine.Chamber;
import throwbench.solver.revolution.Column;
import throwbench.solver.revolution.Extreme;
import throwbench.solver.revolution.Extremes;
import throwbench.solver.revolution.MachineHarmonics;
import throwbench.solver.revolution.Reversal;
import throwbench.solver.revolution.Revolution;
import throwbench.solver.revolution.RunningThrow;
import throwbench.solver.revolution.SignChange;
import throwbench.solver.revolution.Summary;

/** A revolution and what it comes to as JSON. */
public final class RevolutionJson implements Written {

    private final Summary summary;
    private final RevolutionTable table;

    /** The revolution at the stations asked for, and the summary of the same throw. */
    public RevolutionJson(Revolution revolution, Summary summary) {
        this.summary = summary;
        this.table = new RevolutionTable(revolution);
    }

    @Override
    public void writeTo(OutputStream out) throws IOException {
        Json json = new Json();
        json.begin();
        json.text("machine", summary.running().machine().name());
        json.text("duty", summary.running().dutyPoint().name());
        json.text("throw", summary.shownThrow().name());
        json.whole("stations", table.stations());
        writeColumns(json);
        writeSummary(json);
        json.end();
        json.finish(out);
    }

    private void writeColumns(Json json) throws IOException {
        json.begin("columns");
        for (int c = 0; c < table.size(); c++) {
            json.beginList(table.name(c));
            for (int i = 0; i < table.stations(); i++) {
                json.numberItem(table.at(c, i));
            }
            json.endList();
        }
        json.end();
    }

    private void writeSummary(Json json) throws IOException {
        var linkage = summary.shownThrow().linkage();
        var rotation = summary.running().rotation();
        json.begin("summary");
        json.number("stroke_m", linkage.stroke());
        json.degrees("crankEndDeadCentre_deg", linkage.crankEndDeadCentre(rotation));
        json.number("timeRatio", linkage.timeRatio(rotation));
        writeExtremes(json);
        writeReversal(json);
        writeValveEvents(json);
        json.numbers("indicatedPower_W", summary.throwFlow().indicatedPower());
        json.optionalNumbers("capacity_kg_s", summary.throwFlow().capacity());
        json.optionalNumbers("inletVolume_m3_s", summary.throwFlow().inletVolume());
        json.number("meanThrowTorque_N_m", summary.meanThrowTorque());
        json.number("meanShaftTorque_N_m", summary.meanShaftTorque());
        json.number("speedFluctuation", summary.speedFluctuation());
        writeHarmonics(json);
        json.begin("machine");
        json.number("indicatedPower_W", summary.machineFlow().totalPower());
        json.optionalNumbers("capacity_kg_s", summary.machineFlow().capacity());
        json.optionalNumbers("inletVolume_m3_s", summary.machineFlow().inletVolume());
        json.end();
        json.beginList("notes");
        for (String note : notes()) {
            json.textItem(note);
        }
        json.endList();
        json.end();
    }

    private void writeExtremes(Json json) throws IOException {
        json.begin("extremes");
        for (Column column : Column.values()) {
            if (column == Column.GAS_LOAD) {
                List<Chamber> chambers = summary.shownThrow().chambers();
                for (int c = 0; c < chambers.size(); c++) {
                    Extremes pressures = summary.pressures().get(c);
                    String name = Column.pressureName(chambers.get(c).name());
                    writeExtremes(json, name, InFile.of(pressures.least()), InFile.of(pressures.greatest()));
                }
            }
            if (column == Column.CRANK_ANGLE) {
                double last = table.at(0, table.stations() - 1);
                writeExtremes(json, column.fileName(), new InFile(0, 0), new InFile(last, last));
            } else {
                Extremes found = summary.extremes(column);
                InFile least = new InFile(column.inFile(found.least().value()), degrees(found.least()));
                InFile greatest = new InFile(column.inFile(found.greatest().value()), degrees(found.greatest()));
                writeExtremes(json, column.fileName(), least, greatest);
            }
        }
        json.end();
    }

    /** An extreme as files have it, its angle in degrees. */
    private record InFile(double value, double degrees) {
        static InFile of(Extreme extreme) {
            return new InFile(extreme.value(), RevolutionJson.degrees(extreme));
        }
    }

    private static double degrees(Extreme extreme) {
        return Math.toDegrees(extreme.crankAngle());
    }

    private static void writeExtremes(Json json, String name, InFile least, InFile greatest) throws IOException {
        json.begin(name);
        json.number("min", least.value());
        json.number("minAt_deg", least.degrees());
        json.number("max", greatest.value());
        json.number("maxAt_deg", greatest.degrees());
        json.end();
    }

    private void writeReversal(Json json) throws IOException {
        Reversal reversal = summary.reversal();
        json.begin("reversal");
        json.beginList("signChanges_deg");
        for (SignChange change : reversal.signChanges()) {
            json.numberItem(Math.toDegrees(change.crankAngle()));
        }
        json.endList();
        json.degrees("tensionSpan_deg", reversal.longestSpan(true));
        json.degrees("compressionSpan_deg", reversal.longestSpan(false));
        json.number("tensionPeak_N", reversal.tension().map(Extreme::value).orElse(0.0));
        json.number(
                "compressionPeak_N", reversal.compression().map(Extreme::value).orElse(0.0));
        json.degrees("tensionPeakAt_deg", angle(reversal, true));
        json.degrees("compressionPeakAt_deg", angle(reversal, false));
        json.degrees("duration_deg", reversal.duration());
        json.number("ratio", reversal.ratio());
        json.end();
    }

    private static OptionalDouble angle(Reversal reversal, boolean inTension) {
        var peak = inTension ? reversal.tension() : reversal.compression();
        return peak.isPresent() ? OptionalDouble.of(peak.get().crankAngle()) : OptionalDouble.empty();
    }

    private void writeValveEvents(Json json) throws IOException {
        RunningThrow running =
                summary.running().throwsInOrder().get(summary.revolution().shownThrow());
        json.begin("valveEvents");
        for (int c = 0; c < running.chambers().size(); c++) {
            json.beginList(running.chambers().get(c).name());
            for (ValveEvent event : running.curves().get(c).events()) {
                json.begin();
                json.text("valve", event.valve().text());
                json.text("event", event.opens() ? "opens" : "closes");
                json.degrees("at_deg", event.crankAngle());
                json.end();
            }
            json.endList();
        }
        json.end();
    }

    private void writeHarmonics(Json json) throws IOException {
        MachineHarmonics harmonics = summary.harmonics();
        json.begin("harmonics");
        int shown = summary.revolution().shownThrow();
        writeHarmonics(json, Column.THROW_TORQUE, harmonics.throwTorques().get(shown));
        writeHarmonics(json, Column.SHAFT_TORQUE, harmonics.shaftTorque());
        writeHarmonics(json, Column.SHAKING_FORCE_X, harmonics.forceX());
        writeHarmonics(json, Column.SHAKING_FORCE_Y, harmonics.forceY());
        writeHarmonics(json, Column.SHAKING_COUPLE_X, harmonics.coupleX());
        writeHarmonics(json, Column.SHAKING_COUPLE_Y, harmonics.coupleY());
        json.end();
    }

    private static void writeHarmonics(Json json, Column column, List<Harmonic> orders) throws IOException {
        json.beginList(column.fileName());
        for (Harmonic harmonic : orders) {
            json.begin();
            json.whole("order", harmonic.order());
            json.number("cos", harmonic.cos());
            json.number("sin", harmonic.sin());
            json.number("amplitude", harmonic.amplitude());
            json.end();
        }
        json.endList();
    }

    /** The summary's own, and why a number of this file is null. */
    private List<String> notes() {
        List<String> notes = new ArrayList<>(summary.notes());
        if (summary.reversal().tension().isEmpty()) {
            notes.add("reversal: the rod load is never in tension; its peak there is 0 and has no angle");
        }
        if (summary.reversal().compression().isEmpty()) {
            notes.add("reversal: the rod load is never in compression; its peak there is 0 and has no angle");
        }
        summary.machineFlow().capacity().forEach((stage, mass) -> {
            if (mass.isEmpty()) {
                notes.add("stage " + stage + ": capacity by mass needs a suctionTemperature at the duty point");
            }
        });
        return notes;
    }
}
