package throwbench.app.bench;

/**
 * What the status line says.
 *
 * @param trouble whether something went wrong and the user should look
 */
public record Status(String text, boolean trouble) {

    public static final Status QUIET = new Status("", false);

    public static Status said(String text) {
        return new Status(text, false);
    }

    public static Status trouble(String text) {
        return new Status(text, true);
    }
}
