package binspan.planner.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.study.Progress;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.concurrent.locks.LockSupport;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The promises of {@link LatestTask} on real threads, under random schedules. */
@Timeout(60)
class LatestTaskThreadsTest {
    private static final int REQUESTS = 200;

    private final ExecutorService window = Executors.newSingleThreadExecutor();
    private final ExecutorService workers = Executors.newCachedThreadPool();
    private final Background background = new Background(workers, window);
    private final AtomicInteger working = new AtomicInteger();
    private final AtomicInteger most = new AtomicInteger();
    private final List<Integer> shown = Collections.synchronizedList(new ArrayList<>());

    @AfterEach
    void end() throws InterruptedException {
        workers.shutdown();
        window.shutdown();
        assertThat(workers.awaitTermination(10, TimeUnit.SECONDS)).isTrue();
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void quickWorkIsShownInOrderAndEndsWithTheNewest(long seed) throws Exception {
        drive(LatestTask.quick(background), seed, 0.0);
        assertThat(shown).isSorted().doesNotHaveDuplicates().endsWith(REQUESTS - 1);
        assertThat(most).hasValue(1);
    }

    @ParameterizedTest
    @ValueSource(longs = {11, 12, 13, 14, 15, 16, 17, 18})
    void lengthyWorkIsShownInOrderAndEndsWithTheNewest(long seed) throws Exception {
        drive(LatestTask.lengthy(background), seed, 0.0);
        assertThat(shown).isSorted().doesNotHaveDuplicates().endsWith(REQUESTS - 1);
        assertThat(most).hasValue(1);
    }

    @ParameterizedTest
    @ValueSource(longs = {21, 22, 23, 24, 25, 26})
    void cancellingInBetweenKeepsOrderAndNothingOlderThanACancelIsShownAfterIt(long seed) throws Exception {
        LatestTask task = seed % 2 == 0 ? LatestTask.quick(background) : LatestTask.lengthy(background);
        drive(task, seed, 0.2);
        assertThat(shown.stream().filter(each -> each >= 0).toList())
                .isSorted()
                .doesNotHaveDuplicates()
                .endsWith(REQUESTS - 1);
        int cancelled = -1;
        for (int each : List.copyOf(shown)) {
            if (each < 0) {
                cancelled = -each;
            } else {
                assertThat(each).isGreaterThan(cancelled);
            }
        }
        assertThat(most).hasValue(1);
    }

    /** Requests at random moments; a cancel after request i leaves the mark -i. */
    private void drive(LatestTask task, long seed, double cancels) throws Exception {
        Random random = new Random(seed);
        for (int i = 0; i < REQUESTS; i++) {
            int request = i;
            long workNanos = random.nextInt(400_000);
            onWindow(() -> ask(task, request, workNanos)).get();
            if (request > 0 && request < REQUESTS - 1 && random.nextDouble() < cancels) {
                onWindow(() -> {
                            task.cancel();
                            shown.add(-request);
                        })
                        .get();
            }
            LockSupport.parkNanos(random.nextInt(300_000));
        }
        while (running(task)) {
            LockSupport.parkNanos(1_000_000);
        }
    }

    private void ask(LatestTask task, int request, long workNanos) {
        task.run(progress -> work(progress, request, workNanos), shown::add);
    }

    /** Every fourth gives up when it is told to, every seventh fails, which must not hold the others up. */
    private int work(Progress progress, int request, long workNanos) {
        most.accumulateAndGet(working.incrementAndGet(), Math::max);
        try {
            LockSupport.parkNanos(workNanos);
            if ((request % 4 == 0 && progress.cancelled()) || (request % 7 == 3 && request < REQUESTS - 1)) {
                throw new CancellationException();
            }
            return request;
        } finally {
            working.decrementAndGet();
        }
    }

    private Future<?> onWindow(Runnable code) {
        return window.submit(code);
    }

    private boolean running(LatestTask task) throws InterruptedException, ExecutionException {
        return window.submit(() -> task.runningProperty().get()).get();
    }
}
