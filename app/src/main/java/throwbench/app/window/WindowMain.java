package throwbench.app.window;

/** Stands in until the window's branch brings its own. */
public final class WindowMain {

    private WindowMain() {}

    public static void launch(String... args) {
        throw new UnsupportedOperationException("the window comes with another branch");
    }
}
