package binspan.planner.viewmodel;

import binspan.planner.export.StudyReport;
import binspan.scenario.Scenario;
import binspan.study.Execution;
import binspan.study.Progress;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.Function;
import java.util.function.LongSupplier;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyDoubleProperty;
import javafx.beans.property.ReadOnlyDoubleWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;

/**
 * One place where a study runs, on all processors, while the window stays alive: its state, how far it has come and
 * the last result. A result stays until the next one; cancelling and failing keep it. All methods are for the window's
 * thread.
 *
 * @param <F> what a study found, beside its report
 */
public final class StudyRun<F> {
    private static final long PAUSE = 50_000_000L;
    private static final double NANO = 1e-9;

    private final Design design;
    private final Background background;
    private final LongSupplier nanos;
    private final ReadOnlyObjectWrapper<State> state = new ReadOnlyObjectWrapper<>(this, "state", State.IDLE);
    private final ReadOnlyDoubleWrapper progress = new ReadOnlyDoubleWrapper(this, "progress", 0.0);
    private final ReadOnlyDoubleWrapper elapsed = new ReadOnlyDoubleWrapper(this, "elapsed", 0.0);
    private final ReadOnlyStringWrapper failure = new ReadOnlyStringWrapper(this, "failure", "");
    private final ReadOnlyObjectWrapper<Result<F>> result = new ReadOnlyObjectWrapper<>(this, "result");
    private final ReadOnlyBooleanWrapper stale = new ReadOnlyBooleanWrapper(this, "stale", false);
    private Scenario made;
    private Job current;

    /** How a study stands. */
    public enum State {
        IDLE,
        RUNNING,
        DONE,
        CANCELLED,
        FAILED
    }

    /**
     * What a study leaves.
     *
     * @param report what it has to show
     * @param found what it found
     */
    public record Result<F>(StudyReport report, F found) {}

    /** A place without a result yet. */
    public StudyRun(Design design, Background background) {
        this(design, background, System::nanoTime);
    }

    StudyRun(Design design, Background background, LongSupplier nanos) {
        this.design = design;
        this.background = background;
        this.nanos = nanos;
        design.scenarioProperty().addListener((source, before, after) -> compare());
    }

    /**
     * Starts a study; one that is still running is cancelled.
     *
     * @param work the study; an {@link IllegalArgumentException} says what it cannot do
     * @param of the scenario that it is made of
     */
    public void start(Function<Execution, Result<F>> work, Scenario of) {
        cancel();
        failure.set("");
        progress.set(0.0);
        elapsed.set(0.0);
        current = new Job(work, of);
        state.set(State.RUNNING);
        background.workers().execute(current);
    }

    /** Stops a running study; its threads end at the next point that they would begin. */
    public void cancel() {
        if (current != null) {
            current.stopped = true;
            end(State.CANCELLED);
        }
    }

    /** Renews the elapsed time, to be called now and then while a study runs. */
    public void beat() {
        if (current != null) {
            elapsed.set((nanos.getAsLong() - current.start) * NANO);
        }
    }

    private void end(State how) {
        beat();
        current = null;
        state.set(how);
    }

    private void finished(Job job, Result<F> found) {
        if (job == current) {
            made = job.of;
            progress.set(1.0);
            result.set(found);
            compare();
            end(State.DONE);
        }
    }

    private void failed(Job job, String words) {
        if (job == current) {
            failure.set(words);
            end(State.FAILED);
        }
    }

    private void compare() {
        stale.set(made != null && !made.equals(design.scenario()));
    }

    /** How it stands. */
    public ReadOnlyObjectProperty<State> stateProperty() {
        return state.getReadOnlyProperty();
    }

    /** Share of the running study that is done, 0 to 1; never falls while it runs. */
    public ReadOnlyDoubleProperty progressProperty() {
        return progress.getReadOnlyProperty();
    }

    /** Seconds since the start, or that the last study took. */
    public ReadOnlyDoubleProperty elapsedProperty() {
        return elapsed.getReadOnlyProperty();
    }

    /** Why the last study failed, empty if it did not. */
    public ReadOnlyStringProperty failureProperty() {
        return failure.getReadOnlyProperty();
    }

    /** The last result, null before the first. */
    public ReadOnlyObjectProperty<Result<F>> resultProperty() {
        return result.getReadOnlyProperty();
    }

    /** Whether there is a result and the link is no longer the one it was made of. */
    public ReadOnlyBooleanProperty staleProperty() {
        return stale.getReadOnlyProperty();
    }

    private final class Job implements Runnable, Progress {
        private final Function<Execution, Result<F>> work;
        private final Scenario of;
        private final long start = nanos.getAsLong();
        private final AtomicLong due = new AtomicLong(start);
        private volatile boolean stopped;

        Job(Function<Execution, Result<F>> work, Scenario of) {
            this.work = work;
            this.of = of;
        }

        @Override
        public void run() {
            try {
                Result<F> found = work.apply(Execution.parallel(this));
                background.window().execute(() -> finished(this, found));
            } catch (CancellationException e) {
                // whoever cancelled it has said so already
            } catch (IllegalArgumentException e) {
                background.window().execute(() -> failed(this, e.getMessage()));
            } catch (RuntimeException | Error e) {
                background.window().execute(() -> failed(this, Words.of("studies.failed", e.toString())));
            }
        }

        @Override
        public void reached(double share) {
            long now = nanos.getAsLong();
            long next = due.get();
            if (now - next >= 0 && due.compareAndSet(next, now + PAUSE)) {
                background.window().execute(() -> show(share));
            }
        }

        private void show(double share) {
            if (this == current) {
                progress.set(Math.max(progress.get(), Math.min(1.0, share)));
                beat();
            }
        }

        @Override
        public boolean cancelled() {
            return stopped;
        }
    }
}
