package throwbench.solver.document.result;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import throwbench.solver.balance.Harmonic;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.document.attached.AttachedFiles;
import throwbench.solver.document.json.JsonText;
import throwbench.solver.document.json.Node;
import throwbench.solver.machine.Machine;
import throwbench.solver.revolution.MachineHarmonics;
import throwbench.solver.revolution.Revolution;
import throwbench.solver.revolution.RunningMachine;
import throwbench.solver.revolution.Summary;

/** A file with a motor and a balanced stage, from its text to the JSON of its revolution. */
class MotorDrivenJsonTest {

    private static RunningMachine running() throws IOException {
        String name = "two-stage-motor.json";
        try (InputStream in = Objects.requireNonNull(MotorDrivenJsonTest.class.getResourceAsStream(name), name)) {
            String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
            Machine machine =
                    MachineDocument.read(text, AttachedFiles.NONE).machine().orElseThrow();
            return RunningMachine.settle(machine, machine.dutyPoints().get(0)).get();
        }
    }

    private static Node written(Summary summary) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        new RevolutionJson(Revolution.solve(summary.running(), 0, 8), summary).writeTo(out);
        String text = out.toString(StandardCharsets.UTF_8);
        return at(JsonText.parse(text).root().orElseThrow(), "summary");
    }

    private static Node at(Node node, String key) {
        return Objects.requireNonNull(node.member(key), key);
    }

    private static double number(Node node, String key) {
        return Double.parseDouble(at(node, key).text());
    }

    @Test
    void harmonicsStandInOrderUnderTheNamesOfTheirColumns() throws IOException {
        Summary summary = Summary.of(running(), 0, Optional.empty());
        Node harmonics = at(written(summary), "harmonics");
        MachineHarmonics found = summary.harmonics();
        same(found.throwTorques().get(0), at(harmonics, "throw_torque_N_m"), 24);
        same(found.shaftTorque(), at(harmonics, "shaft_torque_N_m"), 24);
        same(found.forceX(), at(harmonics, "shaking_force_x_N"), 12);
        same(found.forceY(), at(harmonics, "shaking_force_y_N"), 12);
        same(found.coupleX(), at(harmonics, "shaking_couple_x_N_m"), 12);
        same(found.coupleY(), at(harmonics, "shaking_couple_y_N_m"), 12);
    }

    private static void same(List<Harmonic> found, Node written, int orders) {
        assertEquals(orders, written.members().size());
        for (int i = 0; i < orders; i++) {
            Node order = written.members().get(i);
            assertEquals(i + 1, number(order, "order"));
            assertEquals(found.get(i).cos(), number(order, "cos"));
            assertEquals(found.get(i).sin(), number(order, "sin"));
            assertEquals(Math.hypot(number(order, "cos"), number(order, "sin")), number(order, "amplitude"), 1e-9);
        }
    }

    @Test
    void fluctuationIsThatOfTheColumnsExtremes() throws IOException {
        Summary summary = Summary.of(running(), 0, Optional.empty());
        Node written = written(summary);
        Node speed = at(at(written, "extremes"), "shaft_speed_rad_s");
        double swing = (number(speed, "max") - number(speed, "min")) / (600 * Math.PI / 30);
        assertEquals(swing, number(written, "speedFluctuation"), 1e-9);
    }

    @Test
    void bothStagesPassTheSameAndTheNoteNamesThePressure() throws IOException {
        Summary summary = Summary.of(running(), 0, Optional.empty());
        Node written = written(summary);
        Node capacity = at(at(written, "machine"), "capacity_kg_s");
        assertEquals(number(capacity, "low"), number(capacity, "high"), 1e-9 * number(capacity, "low"));
        double between = Objects.requireNonNull(
                        summary.running().dutyPoint().stages().get("high"))
                .suctionPressure()
                .orElseThrow();
        String note = at(written, "notes").members().get(0).text();
        assertTrue(note.matches("stage high: the balanced suction pressure is [0-9]+ Pa absolute"), note);
        assertEquals(between, Double.parseDouble(note.replaceAll("[^0-9]", "")), 1);
    }
}
