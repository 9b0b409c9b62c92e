package throwbench.solver.document.check;

/** The names that a mixture's gases may have. */
@FunctionalInterface
public interface GasNames {

    /** Any name that is not blank. */
    GasNames ANY = name -> !name.isBlank();

    /** Whether there is a gas of this name. */
    boolean knows(String name);
}
