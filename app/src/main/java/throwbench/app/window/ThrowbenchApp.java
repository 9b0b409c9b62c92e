package throwbench.app.window;

import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import javafx.application.Application;
import javafx.application.Platform;
import javafx.stage.Stage;
import org.jspecify.annotations.Nullable;
import throwbench.app.Samples;
import throwbench.app.bench.Bench;
import throwbench.app.bench.Opened;
import throwbench.app.bench.Status;
import throwbench.app.drawing.Fonts;
import throwbench.solver.document.Fault;

/** The JavaFX application: solves the first machine while the toolkit starts, then shows it running. */
public final class ThrowbenchApp extends Application {

    private final ExecutorService worker = Executors.newSingleThreadExecutor(task -> {
        Thread thread = new Thread(task, "solver");
        thread.setDaemon(true);
        return thread;
    });
    private Status firstWord = Status.QUIET;
    private @Nullable Bench bench;

    @Override
    public void init() {
        List<String> files = getParameters().getUnnamed();
        Opened opened = files.isEmpty() ? sample() : read(Path.of(files.get(0)));
        bench = new Bench(opened, worker, Platform::runLater);
        bench.say(firstWord);
    }

    /** The machine of a file; where it has faults, all of them on standard error, the first in the window, and the sample. */
    private Opened read(Path path) {
        Opened.Outcome outcome = Opened.read(path);
        for (Fault fault : outcome.faults()) {
            System.err.println(path + ": " + fault.line());
        }
        if (outcome.opened().isEmpty()) {
            firstWord = Status.trouble(
                    path + ": " + outcome.faults().get(0).line() + " – showing the sample machine instead");
        }
        return outcome.opened().orElseGet(ThrowbenchApp::sample);
    }

    private static Opened sample() {
        return Opened.of(Samples.read(Samples.DEFAULT))
                .opened()
                .orElseThrow(() -> new IllegalStateException("the sample " + Samples.DEFAULT + " has faults"));
    }

    @Override
    public void start(Stage stage) {
        Bench opened = Objects.requireNonNull(bench);
        Fonts.load();
        BenchWindow window = new BenchWindow(stage, opened, new RealDialogs(stage));
        Thread.currentThread().setUncaughtExceptionHandler((thread, failure) -> window.failed(failure));
        window.show();
        opened.playhead().setPlaying(true);
    }

    @Override
    public void stop() {
        worker.shutdownNow();
    }
}
