package throwbench.solver.document.check;

import throwbench.solver.fluid.GasTable;

/** The names that a mixture's gases may have. */
@FunctionalInterface
public interface GasNames {

    /** Any name that is not blank. */
    GasNames ANY = name -> !name.isBlank();

    /** The gases of the built-in table. */
    GasNames TABLE = name -> GasTable.find(name).isPresent();

    /** Whether there is a gas of this name. */
    boolean knows(String name);
}
