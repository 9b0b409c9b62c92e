package throwbench.app.bench;

import java.util.concurrent.Executor;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;

/**
 * Hands values to another thread, at most one waiting at a time: a newer one takes the place of one that has not been taken
 * yet. The window's edits go to the worker through one of these, the worker's results come back through another.
 */
final class NewestWins<T> {

    private final AtomicReference<@Nullable T> waiting = new AtomicReference<>();
    private final Executor taker;
    private final Consumer<T> take;

    NewestWins(Executor taker, Consumer<T> take) {
        this.taker = taker;
        this.take = take;
    }

    void offer(T value) {
        if (waiting.getAndSet(value) == null) {
            taker.execute(() -> {
                T newest = waiting.getAndSet(null);
                if (newest != null) {
                    take.accept(newest);
                }
            });
        }
    }
}
