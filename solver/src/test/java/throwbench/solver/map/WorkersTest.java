package throwbench.solver.map;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.atomic.AtomicIntegerArray;
import org.junit.jupiter.api.Test;

class WorkersTest {

    @Test
    void everyPartIsRunOnce() {
        AtomicIntegerArray runs = new AtomicIntegerArray(500);

        assertTrue(Workers.each(500, 4, Watch.NONE, () -> runs::incrementAndGet));
        for (int i = 0; i < 500; i++) {
            assertEquals(1, runs.get(i));
        }
    }

    @Test
    void threadsWorkAtTheSameTime() {
        Set<Thread> threads = ConcurrentHashMap.newKeySet();
        CountDownLatch together = new CountDownLatch(3);
        Workers.each(3, 3, Watch.NONE, () -> part -> {
            threads.add(Thread.currentThread());
            together.countDown();
            while (together.getCount() > 0) {
                Thread.onSpinWait();
            }
        });

        assertEquals(3, threads.size());
    }

    @Test
    void aFailureComesToTheCaller() {
        IllegalStateException failure = assertThrows(
                IllegalStateException.class,
                () -> Workers.each(50, 2, Watch.NONE, () -> part -> {
                    if (part == 20) {
                        throw new IllegalStateException("part 20");
                    }
                }));

        assertTrue(String.valueOf(failure).contains("part 20"), failure::toString);
    }

    @Test
    void nothingIsDoneTwiceNorAfterTheEnd() {
        AtomicIntegerArray runs = new AtomicIntegerArray(10);
        Watch never = new Watch() {
            @Override
            public boolean cancelled() {
                return true;
            }
        };

        assertFalse(Workers.each(10, 2, never, () -> runs::incrementAndGet));
        assertEquals(0, runs.get(0));
        assertTrue(Workers.each(0, 2, never, () -> runs::incrementAndGet));
    }
}
