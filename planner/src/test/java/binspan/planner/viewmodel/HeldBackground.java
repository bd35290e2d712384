package binspan.planner.viewmodel;

import java.util.ArrayDeque;
import java.util.Deque;

/** A background whose work waits until a test lets it go on. */
public final class HeldBackground {
    private final Deque<Runnable> work = new ArrayDeque<>();
    private final Deque<Runnable> results = new ArrayDeque<>();
    private final Background background = new Background(work::add, results::add);

    /** For the model under test. */
    public Background background() {
        return background;
    }

    /** Pieces of work that have been started and not yet done. */
    int started() {
        return work.size();
    }

    /** Does one piece of work; whether there was one. */
    boolean doWork() {
        return run(work.poll());
    }

    /** Shows one result; whether there was one. */
    boolean showResult() {
        return run(results.poll());
    }

    /** Goes on until nothing is left. */
    public void finish() {
        while (doWork() || showResult()) {
            // one after another
        }
    }

    private static boolean run(Runnable task) {
        if (task == null) {
            return false;
        }
        task.run();
        return true;
    }
}
