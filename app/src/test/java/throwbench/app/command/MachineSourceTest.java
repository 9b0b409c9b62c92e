package throwbench.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;
import throwbench.app.Samples;
import throwbench.solver.revolution.Refusal;

class MachineSourceTest {

    private final ByteArrayOutputStream err = new ByteArrayOutputStream();
    private final MachineSource source = MachineSource.of(
                    "m.json", Samples.read(Samples.DEFAULT), new Terminal(new ByteArrayOutputStream(), err))
            .orElseThrow();

    @Test
    void whatIsNotPossibleIsTheMachinesFault() {
        assertEquals(ExitCode.REFUSED, source.refuse(List.of(new Refusal("drive.rotatingInertia", "it would stop"))));
        assertEquals("m.json: drive.rotatingInertia: it would stop\n", err.toString(StandardCharsets.UTF_8));
    }

    @Test
    void aSolverThatDoesNotGetThereIsTheProgramsFailure() {
        Refusal lost = new Refusal("throws[0].chambers[1].cycle", "chamber \"A crank\": not periodic", true);
        assertEquals(ExitCode.FAILED, source.refuse(List.of(new Refusal("drive", "else"), lost)));
    }
}
