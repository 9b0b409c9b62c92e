package throwbench.app.bench;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import org.junit.jupiter.api.Test;

class NewestWinsTest {

    private final Deque<Runnable> queue = new ArrayDeque<>();
    private final List<Integer> taken = new ArrayList<>();
    private final NewestWins<Integer> hand = new NewestWins<>(queue::add, taken::add);

    private void run() {
        while (!queue.isEmpty()) {
            queue.remove().run();
        }
    }

    @Test
    void onlyTheNewestOfSeveralIsTaken() {
        hand.offer(1);
        hand.offer(2);
        hand.offer(3);
        run();
        assertEquals(List.of(3), taken);
    }

    @Test
    void whatComesAfterATakingIsTakenToo() {
        hand.offer(1);
        run();
        hand.offer(2);
        run();
        assertEquals(List.of(1, 2), taken);
    }

    @Test
    void oneTaskIsEnoughForAnyNumberOffered() {
        for (int i = 0; i < 100; i++) {
            hand.offer(i);
        }
        assertEquals(1, queue.size());
    }
}
