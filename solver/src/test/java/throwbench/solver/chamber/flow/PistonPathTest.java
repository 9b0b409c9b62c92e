package throwbench.solver.chamber.flow;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import throwbench.solver.mechanism.Linkage;
import throwbench.solver.mechanism.Rotation;

class PistonPathTest {

    @ParameterizedTest
    @EnumSource(Rotation.class)
    void aThousandStepsLeadWhereTheLinkageStands(Rotation rotation) {
        Linkage linkage = new Linkage(0.075, 0.4, 0.031);
        PistonPath path = new PistonPath(linkage, rotation, 0.0014, -0.08);
        double angle = 0.4;
        path.standAt(angle);
        for (int i = 0; i < 1000; i++) {
            double step = PistonPath.LONGEST * (i % 7 + 1) / 7;
            path.look(step);
            angle += step;
            double volume = 0.0014 - 0.08 * linkage.travel(angle, rotation);
            assertEquals(volume, path.volume(), 1e-15, "at " + angle);
            double d = 1e-6;
            double slope =
                    -0.08 * (linkage.travel(angle + d, rotation) - linkage.travel(angle - d, rotation)) / (2 * d);
            assertEquals(slope, path.slope(), 1e-10, "at " + angle);
            path.advance();
        }
    }
}
