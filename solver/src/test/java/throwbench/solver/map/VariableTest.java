package throwbench.solver.map;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import throwbench.solver.document.quantity.Dimension;

class VariableTest {

    private final Subject subject = Boosters.subject();

    private Choice<Variable> find(String path) {
        return Variable.find(subject.document(), subject.machine(), path);
    }

    @Test
    void aNumberIsFoundWithItsDimensionWrittenOrNot() {
        assertEquals(
                Dimension.ROTATION_SPEED,
                find("drive.speed").chosen().orElseThrow().dimension());
        assertEquals(
                Dimension.ROTATION_SPEED,
                find("dutyPoints[0].speed").chosen().orElseThrow().dimension());
        assertEquals(
                Dimension.LENGTH,
                find("throws[0].guideOffset").chosen().orElseThrow().dimension());
        assertEquals(
                Dimension.FORCE,
                find("throws[1].friction.packing").chosen().orElseThrow().dimension());
        assertEquals(
                Dimension.SHARE,
                find("throws[0].chambers[0].clearance").chosen().orElseThrow().dimension());
        assertEquals(
                Dimension.VOLUME,
                find("throws[0].chambers[1].clearance").chosen().orElseThrow().dimension());
        assertEquals(
                Dimension.SHARE,
                find("dutyPoints[0].chambers.B head.addedClearance")
                        .chosen()
                        .orElseThrow()
                        .dimension());
    }

    @Test
    void whatIsNotThereIsNoKey() {
        for (String path : List.of(
                "",
                "drive.sped",
                "throws[2].crankRadius",
                "throws[0].chambers[2].bore",
                "fluids.air.molarMass",
                "dutyPoints[0].stages.second.suctionPressure",
                "dutyPoints[0].chambers.C head.addedClearance",
                "loadSteps[0].chambers.A head.addedClearance")) {
            assertEquals("no such key in this file", find(path).fault(), path);
        }
    }

    @Test
    void whatIsNoNumberSaysWhatItIs() {
        assertEquals("holds a name, a number is wanted", find("throws[0].name").fault());
        assertEquals("holds an object { … }, a number is wanted", find("drive").fault());
        assertEquals("holds a word, a number is wanted", find("drive.rotation").fault());
        assertEquals(
                "holds a list [ … ], a number is wanted",
                find("throws[0].chambers").fault());
    }

    @Test
    void everyPathOfferedIsFound() {
        List<String> paths = Variable.paths(subject.document());

        assertTrue(paths.contains("throws[0].guideOffset"), paths::toString);
        assertTrue(paths.contains("limits.capacity"), paths::toString);
        for (String path : paths) {
            assertTrue(find(path).chosen().isPresent(), path);
        }
    }

    @Test
    void anglesStandInDegreesInTables() {
        assertEquals(180, find("throws[1].crankPhase").chosen().orElseThrow().inTables(Math.PI));
        assertEquals(2.5, find("drive.speed").chosen().orElseThrow().inTables(2.5));
    }
}
