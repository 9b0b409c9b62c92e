package throwbench.solver.machine;

import java.util.List;
import throwbench.solver.load.ConnectingRod;
import throwbench.solver.load.Crank;
import throwbench.solver.load.Friction;
import throwbench.solver.load.ReciprocatingMasses;
import throwbench.solver.mechanism.Linkage;

/**
 * One crank pin with its connecting rod, crosshead (or trunk piston) and chambers.
 *
 * @param place where it sits on the shaft
 * @param parts dimensions that some findings need
 */
public record Throw(
        String name,
        ShaftPlace place,
        Linkage linkage,
        ReciprocatingMasses masses,
        ConnectingRod connectingRod,
        Crank crank,
        Friction friction,
        List<Chamber> chambers,
        Parts parts,
        Limits limits) {

    public Throw {
        chambers = List.copyOf(chambers);
    }
}
