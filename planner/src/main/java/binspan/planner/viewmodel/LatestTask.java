package binspan.planner.viewmodel;

import binspan.study.Progress;
import java.util.concurrent.CancellationException;
import java.util.function.Consumer;
import java.util.function.Function;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;

/**
 * Work of which only the newest counts: while one is done, newer ones wait and replace each other. Quick work that is
 * being done when newer work is asked for still ends and shows its result, so that a drag is followed on the way; long
 * work is stopped and its result dropped. All methods are for the window's thread.
 */
public final class LatestTask {
    private final Background background;
    private final boolean quick;
    private final ReadOnlyBooleanWrapper running = new ReadOnlyBooleanWrapper(this, "running");
    private Job<?> current;
    private Job<?> waiting;

    private LatestTask(Background background, boolean quick) {
        this.background = background;
        this.quick = quick;
    }

    /** A place for work of some milliseconds. */
    public static LatestTask quick(Background background) {
        return new LatestTask(background, true);
    }

    /** A place for work of a second or more, which is stopped when newer work is asked for. */
    public static LatestTask lengthy(Background background) {
        return new LatestTask(background, false);
    }

    /**
     * Asks for work.
     *
     * @param work what to do; a study should pass the progress on, which tells it to stop when newer work waits
     * @param show takes the result on the window's thread
     */
    public <T> void run(Function<Progress, T> work, Consumer<T> show) {
        run(work, show, failure -> {
            throw failure;
        });
    }

    /**
     * Asks for work that may fail.
     *
     * @param work what to do
     * @param show takes the result on the window's thread
     * @param fail takes what the work threw, unless it was stopped
     */
    public <T> void run(Function<Progress, T> work, Consumer<T> show, Consumer<RuntimeException> fail) {
        Job<T> job = new Job<>(work, show, fail);
        if (current == null) {
            start(job);
        } else {
            if (!quick) {
                current.stop();
            }
            waiting = job;
        }
    }

    /** Stops what is running and forgets what waits. */
    public void cancel() {
        waiting = null;
        if (current != null) {
            current.stop();
        }
    }

    /** Whether work is being done. */
    public ReadOnlyBooleanProperty runningProperty() {
        return running.getReadOnlyProperty();
    }

    private void start(Job<?> job) {
        current = job;
        running.set(true);
        background.workers().execute(job);
    }

    private void ended() {
        Job<?> next = waiting;
        current = null;
        waiting = null;
        if (next == null) {
            running.set(false);
        } else {
            start(next);
        }
    }

    private final class Job<T> implements Runnable, Progress {
        private final Function<Progress, T> work;
        private final Consumer<T> show;
        private final Consumer<RuntimeException> fail;
        private volatile boolean stopped;

        Job(Function<Progress, T> work, Consumer<T> show, Consumer<RuntimeException> fail) {
            this.work = work;
            this.show = show;
            this.fail = fail;
        }

        void stop() {
            stopped = true;
        }

        @Override
        public void run() {
            try {
                T result = work.apply(this);
                background.window().execute(() -> finish(() -> show.accept(result)));
            } catch (CancellationException e) {
                background.window().execute(LatestTask.this::ended);
            } catch (RuntimeException e) {
                background.window().execute(() -> finish(() -> fail.accept(e)));
            } catch (Error e) {
                background
                        .window()
                        .execute(() -> finish(() -> {
                            throw e;
                        }));
            }
        }

        private void finish(Runnable shown) {
            boolean counts = !stopped;
            ended();
            if (counts) {
                shown.run();
            }
        }

        @Override
        public void reached(double share) {
            // nobody watches work that is over before one could
        }

        @Override
        public boolean cancelled() {
            return stopped;
        }
    }
}
