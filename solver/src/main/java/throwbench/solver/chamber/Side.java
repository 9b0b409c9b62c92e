package throwbench.solver.chamber;

/** The side of a piston that a chamber works on. */
public enum Side {
    /** Away from the crankshaft: smallest at head-end dead centre; its pressure pushes the rod into compression. */
    HEAD("head"),
    /** Towards the crankshaft: smallest at crank-end dead centre; its pressure pulls the rod into tension. */
    CRANK("crank");

    private final String text;

    Side(String text) {
        this.text = text;
    }

    /** The word of the machine file. */
    public String text() {
        return text;
    }
}
