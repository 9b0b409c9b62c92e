package throwbench.solver.document.schema;

/** What a name of the machine file names. Names are unique in their space. */
public enum NameSpace {
    THROW("throw"),
    CHAMBER("chamber"),
    STAGE("stage"),
    FLUID("fluid"),
    DUTY_POINT("duty point"),
    LOAD_STEP("load step"),
    /** A gas of the built-in table: the only names that the file does not declare. */
    GAS("gas of the built-in table");

    private final String said;

    NameSpace(String said) {
        this.said = said;
    }

    /** For sentences, without an article. */
    public String said() {
        return said;
    }
}
