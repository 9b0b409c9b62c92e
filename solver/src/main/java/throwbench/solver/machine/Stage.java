package throwbench.solver.machine;

import java.util.Optional;

/**
 * Chambers that share suction and discharge lines.
 *
 * @param fluid name of the fluid
 * @param follows the stage whose discharge line feeds this one
 * @param suctionLine the suction line of a pump, where suction head is asked for
 */
public record Stage(
        String name, String fluid, Optional<String> follows, Optional<SuctionLine> suctionLine, Limits limits) {}
