package throwbench.app.buildsheet;

import java.util.ArrayList;
import java.util.List;
import throwbench.app.bench.Shown;
import throwbench.solver.chamber.Cycle;
import throwbench.solver.chamber.IdealValves;
import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.Throw;

/** Which inputs the sheet shows for a state: the drive, the shown throw with its chambers, the shown duty point, limits. */
final class SheetContents {

    private SheetContents() {}

    static List<SheetGroup> of(Shown shown) {
        List<SheetGroup> groups = new ArrayList<>();
        groups.add(group("Drive", "drive.", "speed", "speed"));
        Throw t = shown.shownThrow();
        String path = "throws[" + shown.throwIndex() + "].";
        groups.add(group(
                "Throw " + t.name(),
                path,
                "crankRadius",
                "crank radius",
                "rodLength",
                "rod length",
                "guideOffset",
                "guide offset"));
        groups.add(group(
                "Masses of throw " + t.name(),
                path,
                "masses.piston",
                "piston",
                "masses.pistonRod",
                "piston rod",
                "masses.crosshead",
                "crosshead",
                "connectingRod.mass",
                "connecting rod",
                "crank.counterweight",
                "counterweight"));
        for (int i = 0; i < t.chambers().size(); i++) {
            groups.add(chamber(t.chambers().get(i), path + "chambers[" + i + "]."));
        }
        groups.add(duty(shown));
        groups.add(group(
                "Limits",
                "limits.",
                "rodTension",
                "rod tension",
                "rodCompression",
                "rod compression",
                "reversalDuration",
                "reversal span",
                "reversalRatio",
                "reversal share"));
        return groups;
    }

    private static SheetGroup chamber(Chamber chamber, String path) {
        List<SheetEntry> entries = new ArrayList<>();
        entries.add(new SheetEntry(path + "bore", "bore"));
        entries.add(new SheetEntry(path + "innerDiameter", "inner diameter"));
        entries.add(new SheetEntry(path + "clearance", "clearance"));
        Cycle cycle = chamber.cycle();
        if (cycle instanceof IdealValves) {
            entries.add(new SheetEntry(path + "cycle.suctionLoss", "suction loss"));
            entries.add(new SheetEntry(path + "cycle.dischargeLoss", "discharge loss"));
        }
        return new SheetGroup("Chamber " + chamber.name(), entries);
    }

    private static SheetGroup duty(Shown shown) {
        String path = "dutyPoints[" + shown.dutyIndex() + "].";
        List<SheetEntry> entries = new ArrayList<>();
        entries.add(new SheetEntry(path + "speed", "speed here"));
        List<String> stages = shown.shownThrow().chambers().stream()
                .flatMap(c -> c.stage().stream())
                .distinct()
                .toList();
        for (String stage : stages) {
            String of = stages.size() > 1 ? ", " + stage : "";
            String lines = path + "stages." + stage + ".";
            entries.add(new SheetEntry(lines + "suctionPressure", "suction" + of));
            entries.add(new SheetEntry(lines + "suctionTemperature", "suction temp." + of));
            entries.add(new SheetEntry(lines + "dischargePressure", "discharge" + of));
        }
        return new SheetGroup("Duty: " + shown.dutyName(), entries);
    }

    private static SheetGroup group(String title, String path, String... keysAndLabels) {
        List<SheetEntry> entries = new ArrayList<>();
        for (int i = 0; i < keysAndLabels.length; i += 2) {
            entries.add(new SheetEntry(path + keysAndLabels[i], keysAndLabels[i + 1]));
        }
        return new SheetGroup(title, entries);
    }
}
