package throwbench.solver.map;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.ForkJoinPool;
import java.util.concurrent.ForkJoinTask;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.IntConsumer;
import java.util.function.Supplier;

/** Runs the parts of a study on several threads. What a part computes must not depend on which thread takes it. */
public final class Workers {

    private final int count;
    private final Watch watch;
    private final AtomicInteger next = new AtomicInteger();
    private int done;
    private boolean failed;

    private Workers(int count, Watch watch) {
        this.count = count;
        this.watch = watch;
    }

    /** Number of threads that keep every core busy. */
    public static int cores() {
        return Runtime.getRuntime().availableProcessors();
    }

    /**
     * Runs parts 0 to count − 1, in this order as far as several threads have one.
     *
     * @param worker makes what one thread works with
     * @return whether all of them were run, and the watch did not end it
     */
    static boolean each(int count, int threads, Watch watch, Supplier<IntConsumer> worker) {
        Workers workers = new Workers(count, watch);
        ForkJoinPool pool = new ForkJoinPool(threads);
        try {
            List<ForkJoinTask<?>> tasks = new ArrayList<>();
            for (int i = 0; i < Math.min(threads, count); i++) {
                tasks.add(pool.submit(() -> workers.run(worker.get())));
            }
            tasks.forEach(ForkJoinTask::join);
        } finally {
            pool.shutdown();
        }
        return workers.done == count;
    }

    private void run(IntConsumer work) {
        boolean finished = false;
        try {
            for (int part = next.getAndIncrement(); part < count && goesOn(); part = next.getAndIncrement()) {
                work.accept(part);
                count();
            }
            finished = true;
        } finally {
            if (!finished) {
                fail();
            }
        }
    }

    private synchronized boolean goesOn() {
        return !failed && !watch.cancelled();
    }

    private synchronized void count() {
        done++;
        watch.done(done, count);
    }

    /** The other threads need not go on: the failure is thrown to who asked for the study. */
    private synchronized void fail() {
        failed = true;
    }
}
