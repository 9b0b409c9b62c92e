package throwbench.app.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.document.MachineFile;
import throwbench.solver.document.attached.AttachedFiles;
import throwbench.solver.finding.Judgement;
import throwbench.solver.machine.Machine;

class MapCommandTest {

    private static final String SPEED = "drive.speed=600 rpm..900 rpm:3";
    private static final String SUCTION = "dutyPoints[0].stages.first.suctionPressure=3 bar g..13 bar g:2";
    private static final double RPM = Math.PI / 30;

    @TempDir
    Path folder;

    private Run map(String... words) throws IOException {
        String[] all = new String[words.length + 2];
        all[0] = "map";
        all[1] = Run.machine(folder).toString();
        System.arraycopy(words, 0, all, 2, words.length);
        return Run.of(all);
    }

    private String file() {
        return folder.resolve("machine.json").toString();
    }

    private void assertRefused(String err, String... words) throws IOException {
        assertEquals(new Run(ExitCode.REFUSED, "", err), map(words));
    }

    /** Identity: each value against the file with the row's two numbers in it, judged as check does. */
    @Test
    void rowsHoldBothNumbersInSiAndTheValueOrTheReason() throws IOException {
        Run run = map("--across", SPEED, "--up", SUCTION, "--of", "rod-load-tension");
        List<String> lines = run.out().lines().toList();

        assertEquals(ExitCode.DONE, run.code());
        assertEquals("", run.err());
        assertEquals("across,up,value,reason", lines.get(0));
        assertEquals(7, lines.size());
        for (int i = 0; i < 3; i++) {
            double speed = (600 + 150 * i) * RPM;
            String[] cells = lines.get(1 + i).split(",", -1);
            assertEquals(speed, Double.parseDouble(cells[0]), 1e-12);
            assertEquals(401_325, Double.parseDouble(cells[1]), 1e-9);
            assertEquals(tension(speed), Double.parseDouble(cells[2]), 1e-6);
            assertEquals("", cells[3]);
            assertEquals(
                    cells[0]
                            + ",1401325.0,,\"dutyPoints[0].stages.first.dischargePressure: dischargePressure \"\"11.5 bar g\"\""
                            + " with suctionPressure \"\"1401325 Pa a\"\" and the losses of A head, wanted a discharge"
                            + " pressure above the suction pressure\"",
                    lines.get(4 + i));
        }
    }

    private double tension(double speed) {
        MachineDocument document = MachineFile.read(Path.of(file())).document().orElseThrow();
        Machine machine = document.withNumber(document.path("drive.speed"), speed)
                .withNumber(document.path("dutyPoints[0].stages.first.suctionPressure"), 401_325)
                .read(AttachedFiles.NONE)
                .machine()
                .orElseThrow();
        return Judgement.of(machine, machine.dutyPoints().subList(0, 1)).findings().stream()
                .filter(f -> f.criterion().id().equals("rod-load-tension"))
                .findFirst()
                .orElseThrow()
                .value()
                .getAsDouble();
    }

    @Test
    void dutyPointAndFileAreThoseAskedFor() throws IOException {
        Path out = folder.resolve("map.csv");
        String[] unloaded = {
            "--across", "dutyPoints[1].speed=600 rpm..700 rpm:2",
            "--up", "throws[0].masses.piston=30 kg..40 kg:2",
            "--of", "pressure_Pa[A crank].max",
            "--duty", "crank end unloaded"
        };
        String[] filed = Arrays.copyOf(unloaded, unloaded.length + 2);
        filed[unloaded.length] = "--out";
        filed[unloaded.length + 1] = out.toString();
        Run run = map(unloaded);

        // held open, the crank end rises above its suction pressure by the suction loss of 3 %
        double expected = (101_325 + 4.1e5) * 1.03;
        for (String row : run.out().lines().skip(1).toList()) {
            assertEquals(expected, Double.parseDouble(row.split(",", -1)[2]), 1e-6);
        }
        assertEquals(new Run(ExitCode.DONE, "", ""), map(filed));
        assertEquals(run.out(), Files.readString(out));
    }

    @Test
    void anglesAreInDegreesAlongBothAxes() throws IOException {
        Run run = map(
                "--across", "throws[0].crankPhase=0 deg..90 deg:2",
                "--up", "limits.reversalDuration=10 deg..20 deg:2",
                "--of", "rod-to-crank-ratio");

        assertEquals(
                List.of("0.0,10.0", "90.0,10.0", "0.0,20.0", "90.0,20.0"),
                run.out()
                        .lines()
                        .skip(1)
                        .map(row -> row.substring(0, row.indexOf(',', row.indexOf(',') + 1)))
                        .toList());
    }

    @Test
    void everyMissingOptionIsSaid() throws IOException {
        assertRefused("""
                throwbench: --across: is missing, KEY=FROM..TO:N is wanted
                throwbench: --up: is missing, KEY=FROM..TO:N is wanted
                throwbench: --of: is missing, RESULT is wanted
                """);
    }

    @Test
    void keysThatAreNoneAreToldWhatIsNear() throws IOException {
        assertRefused(
                file() + ": drive.sped: no such key in this file; perhaps drive.speed\n" + file()
                        + ": throws[0].name: holds a name, a number is wanted\n",
                "--across",
                "drive.sped=600 rpm..900 rpm:3",
                "--up",
                "throws[0].name=3 bar g..13 bar g:2",
                "--of",
                "reversal-duration");
        assertRefused(
                file() + ": zzz: no such key in this file\n",
                "--across",
                "zzz=600 rpm..900 rpm:3",
                "--up",
                SUCTION,
                "--of",
                "reversal-duration");
    }

    @Test
    void rangesThatAreNoneAreToldWhatIsWanted() throws IOException {
        assertRefused(
                "throwbench: --across: \"drive.speed\", KEY=FROM..TO:N is wanted, as drive.speed=600 rpm..1000 rpm:20\n"
                        + "throwbench: --up: \"drive.speed=600 rpm..900 rpm\", KEY=FROM..TO:N is wanted, as"
                        + " drive.speed=600 rpm..1000 rpm:20\n",
                "--across",
                "drive.speed",
                "--up",
                "drive.speed=600 rpm..900 rpm",
                "--of",
                "reversal-duration");
        assertRefused(
                "throwbench: --across: drive.speed: \"600 mm\", wanted a speed of rotation, as \"740 rpm\"\n"
                        + "throwbench: --up: dutyPoints[0].stages.first.suctionPressure: \"3 bar\" without a or g, wanted"
                        + " \"3 bar a\" if it is absolute, \"3 bar g\" if it is gauge\n",
                "--across",
                "drive.speed=600 mm..900 rpm:3",
                "--up",
                "dutyPoints[0].stages.first.suctionPressure=3 bar..4 bar g:3",
                "--of",
                "reversal-duration");
        assertRefused(
                """
                throwbench: --across: "1" points, a whole number from 2 to 2000 is wanted
                throwbench: --up: "x" points, a whole number from 2 to 2000 is wanted
                """,
                "--across",
                "drive.speed=600 rpm..900 rpm:1",
                "--up",
                "throws[0].rodLength=1 m..2 m:x",
                "--of",
                "reversal-duration");
        assertRefused(
                "throwbench: --across: drive.speed from and to the same value, two different ones are wanted\n",
                "--across",
                "drive.speed=600 rpm..10 Hz:3",
                "--up",
                SUCTION,
                "--of",
                "reversal-duration");
        assertRefused(
                "throwbench: --up: the same number as --across, another one is wanted\n",
                "--across",
                SPEED,
                "--up",
                SPEED,
                "--of",
                "reversal-duration");
    }

    @Test
    void aResultThatIsNoneIsToldWhichThereAre() throws IOException {
        Run run = map("--across", SPEED, "--up", SUCTION, "--of", "revrsal-duration.margin");
        List<String> lines = run.err().lines().toList();

        assertEquals(ExitCode.REFUSED, run.code());
        assertEquals(
                "throwbench: --of: no such result \"revrsal-duration.margin\"; perhaps reversal-duration.margin",
                lines.get(0));
        assertTrue(lines.get(1).startsWith("throwbench: --of: ID and ID.margin of gas-load-tension, "), lines.get(1));
        assertTrue(lines.get(2).startsWith("throwbench: --of: COLUMN.max and COLUMN.min of travel_m, "), lines.get(2));
        assertTrue(lines.get(2).contains(", pressure_Pa[A head], pressure_Pa[A crank], gas_load_N, "), lines.get(2));
    }

    @Test
    void aNumberWithoutABearingIsWarnedOf() throws IOException {
        Run run = map("--across", "dutyPoints[1].speed=600 rpm..900 rpm:2", "--up", SUCTION, "--of", "reversal-ratio");

        assertEquals(ExitCode.DONE, run.code());
        assertEquals(
                "throwbench: --across: dutyPoints[1].speed has no bearing on the duty point \"normal\"; all of its values"
                        + " give the same\n",
                run.err());
    }

    @Test
    void dutyPointAndThrowMustBeThere() throws IOException {
        assertRefused(
                file() + ": dutyPoints: no duty point \"norml\", the file has \"normal\", \"crank end unloaded\"\n"
                        + file() + ": throws: no throw \"Q\", the file has \"A\"\n",
                "--across",
                SPEED,
                "--up",
                SUCTION,
                "--of",
                "reversal-ratio",
                "--duty",
                "norml",
                "--throw",
                "Q");
    }
}
