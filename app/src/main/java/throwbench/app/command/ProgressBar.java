package throwbench.app.command;

import throwbench.solver.map.Watch;

/** How far a long study has come, in a line on standard error that goes when it is done; nothing where nobody sees it. */
final class ProgressBar implements Watch {

    private static final int WIDTH = 50;

    private final Terminal terminal;
    private int shown = -1;

    ProgressBar(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public void done(int parts, int total) {
        int percent = (int) (100L * parts / total);
        if (!terminal.isWatched() || percent == shown) {
            return;
        }
        shown = percent;
        int filled = WIDTH * percent / 100;
        terminal.overwrite(line(filled, percent));
        if (parts == total) {
            terminal.overwrite(" ".repeat(line(filled, percent).length()));
            terminal.overwrite("");
        }
    }

    private static String line(int filled, int percent) {
        return "[" + "#".repeat(filled) + " ".repeat(WIDTH - filled) + "] " + percent + " %";
    }
}
