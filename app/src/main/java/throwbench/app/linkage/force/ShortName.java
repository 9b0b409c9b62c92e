package throwbench.app.linkage.force;

/** Names from the machine file may be long; drawings have little room. */
public final class ShortName {

    private static final int LONGEST = 16;

    private ShortName() {}

    /** The name, or its beginning with an ellipsis. */
    public static String of(String name) {
        return name.length() <= LONGEST ? name : name.substring(0, LONGEST - 1).stripTrailing() + '…';
    }
}
