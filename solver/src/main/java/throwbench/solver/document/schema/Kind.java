package throwbench.solver.document.schema;

/** What may stand at a key. */
public enum Kind {
    /** An object with the key's children. */
    OBJECT("an object { … }"),
    /** An object whose {@code kind} says which children it has. */
    VARIANT("an object { … } with its kind"),
    /** A list; the key's item describes each element. */
    LIST("a list [ … ]"),
    /** An object whose member names are the user's; the key's item describes each member. */
    MAP("an object { … } by name"),
    /** A list of exactly two quantities, the lesser first. */
    PAIR("a list [ … ] of two values"),
    /** A quantity of the key's dimension, or one of the key's words in its place. */
    QUANTITY("a quantity"),
    /** A share of area times stroke, or a volume. */
    CLEARANCE("a share of the swept volume, as \"14 %\", or a volume, as \"1.2 L\""),
    /** Any text. */
    TEXT("a text"),
    /** A text that is not blank and that other keys may refer to. */
    NAME("a name"),
    /** The name of something declared elsewhere. */
    REFERENCE("a name"),
    /** One of the key's words. */
    CHOICE("a word"),
    /** true or false. */
    FLAG("true or false"),
    /** The version of the file's form. */
    VERSION("1, the version of this form of file");

    private final String said;

    Kind(String said) {
        this.said = said;
    }

    /** For sentences, with its article. */
    public String said() {
        return said;
    }

    /** Whether other keys stand inside it. */
    public boolean isNest() {
        return this == OBJECT || this == VARIANT || this == LIST || this == MAP || this == PAIR;
    }
}
