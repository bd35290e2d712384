package binspan.planner.viewmodel;

import java.util.concurrent.Executor;
import java.util.concurrent.Executors;

/**
 * Where work is done that the window must not wait for.
 *
 * @param workers run the work
 * @param window runs what shows its result, on the window's thread
 */
public record Background(Executor workers, Executor window) {
    /** Everything at once on the calling thread: for tests. */
    public static final Background NONE = new Background(Runnable::run, Runnable::run);

    /** Threads of its own that do not keep the program alive. */
    public static Background of(Executor window) {
        return new Background(
                Executors.newCachedThreadPool(work -> {
                    Thread thread = new Thread(work, "background");
                    thread.setDaemon(true);
                    return thread;
                }),
                window);
    }
}
