package binspan.planner.viewmodel;

import java.util.ArrayDeque;
import java.util.Deque;

/** A background whose work is done when the test says so. */
final class HeldWork {
    private final Deque<Runnable> work = new ArrayDeque<>();

    /** The background. */
    Background background() {
        return new Background(work::add, Runnable::run);
    }

    /** How many pieces of work wait. */
    int waiting() {
        return work.size();
    }

    /** Takes the oldest piece out, to be done later. */
    Runnable take() {
        return work.remove();
    }

    /** Does all of it, and what it asks for. */
    void finish() {
        while (!work.isEmpty()) {
            work.remove().run();
        }
    }
}
