package binspan.study;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.Supplier;

/** Shares the items of a study among threads; results must be stored by item, so that they are the same on any number of threads. */
public final class Workers {
    /** Work on items; each thread has its own. */
    @FunctionalInterface
    public interface Work {
        /** Works on the items from the first to before the end. */
        void on(int first, int end);
    }

    private final int items;
    private final int portion;
    private final Execution execution;
    private final AtomicInteger next = new AtomicInteger();
    private final AtomicInteger done = new AtomicInteger();
    private final AtomicReference<RuntimeException> failure = new AtomicReference<>();

    private Workers(int items, int portion, Execution execution) {
        this.items = items;
        this.portion = portion;
        this.execution = execution;
    }

    /**
     * Works on all items.
     *
     * @param items their number
     * @param portion how many a thread takes at once, 1 or more
     * @param execution threads, progress, cancellation
     * @param work makes the work of one thread
     * @throws CancellationException if the study shall stop
     */
    public static void run(int items, int portion, Execution execution, Supplier<? extends Work> work) {
        Workers workers = new Workers(items, portion, execution);
        int threads = Math.min(execution.threads(), (items + portion - 1) / portion);
        if (threads <= 1) {
            workers.take(work.get());
        } else {
            workers.spread(threads, work);
        }
        if (workers.failure.get() != null) {
            throw workers.failure.get();
        }
    }

    private void spread(int threads, Supplier<? extends Work> work) {
        ExecutorService pool = Executors.newFixedThreadPool(threads, Workers::background);
        try {
            List<Future<?>> futures = new ArrayList<>();
            for (int i = 0; i < threads; i++) {
                futures.add(pool.submit(() -> take(work.get())));
            }
            for (Future<?> future : futures) {
                future.get();
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            failure.compareAndSet(null, new CancellationException("study interrupted"));
            next.set(items);
        } catch (ExecutionException e) {
            failure.compareAndSet(null, new IllegalStateException("study", e.getCause()));
        } finally {
            pool.shutdown();
        }
    }

    /** Threads that do not keep the program alive. */
    private static Thread background(Runnable runnable) {
        Thread thread = new Thread(runnable, "study");
        thread.setDaemon(true);
        return thread;
    }

    private void take(Work work) {
        try {
            for (int first = next.getAndAdd(portion); first < items; first = next.getAndAdd(portion)) {
                int end = Math.min(items, first + portion);
                work.on(first, end);
                execution.reached((double) done.addAndGet(end - first) / items);
            }
        } catch (RuntimeException e) {
            next.set(items);
            failure.compareAndSet(null, e);
        }
    }
}
