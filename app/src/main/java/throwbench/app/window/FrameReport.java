package throwbench.app.window;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadInfo;
import java.lang.management.ThreadMXBean;
import javafx.animation.AnimationTimer;

/**
 * Measures frames for whoever asks with {@code -Dthrowbench.frames=600}: prints when the first came, how many came a second, how long the window's
 * thread worked on one, and the processor time of both drawing threads; then closes the window.
 */
final class FrameReport extends AnimationTimer {

    private static final int WARM_UP = 180;

    private final FrameTimes times;
    private final int frames;
    private final Runnable done;
    private final ThreadMXBean threads = ManagementFactory.getThreadMXBean();
    private int count;
    private long firstFrame;
    private long startWindow;
    private long startRender;

    private FrameReport(FrameTimes times, int frames, Runnable done) {
        this.times = times;
        this.frames = frames;
        this.done = done;
    }

    static void whenAsked(FrameTimes times, Runnable done) {
        int frames = Integer.getInteger("throwbench.frames", 0);
        if (frames > 0) {
            new FrameReport(times, frames, done).start();
        }
    }

    @Override
    public void handle(long now) {
        count++;
        if (count == 1) {
            firstFrame = ManagementFactory.getRuntimeMXBean().getUptime();
        }
        if (count == WARM_UP) {
            startWindow = cpu("JavaFX Application Thread");
            startRender = cpu("QuantumRenderer-0");
        }
        if (count == WARM_UP + frames) {
            stop();
            double window = (cpu("JavaFX Application Thread") - startWindow) / 1e6 / frames;
            double render = (cpu("QuantumRenderer-0") - startRender) / 1e6 / frames;
            System.out.printf(
                    "first frame after %d ms; frames/s %.1f, our work a frame: median %.2f ms, 99th percentile %.2f ms; processor time a frame:"
                            + " window thread %.2f ms, render thread %.2f ms%n",
                    firstFrame, times.perSecond(), times.workMillis(0.5), times.workMillis(0.99), window, render);
            done.run();
        }
    }

    private long cpu(String name) {
        for (ThreadInfo info : threads.getThreadInfo(threads.getAllThreadIds())) {
            if (info != null && info.getThreadName().equals(name)) {
                return threads.getThreadCpuTime(info.getThreadId());
            }
        }
        return 0;
    }
}
