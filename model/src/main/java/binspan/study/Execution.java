package binspan.study;

import java.util.concurrent.CancellationException;

/**
 * How a study runs; its results do not depend on it.
 *
 * @param threads number of threads, 1 or more
 * @param progress hears how far it has come and can stop it
 * @param from share of the whole at which this part begins
 * @param to share at which it ends
 */
public record Execution(int threads, Progress progress, double from, double to) {
    /** One thread, nobody listening. */
    public static final Execution SINGLE = new Execution(1, Progress.NONE, 0.0, 1.0);

    /** All processors. */
    public static Execution parallel(Progress progress) {
        return new Execution(Runtime.getRuntime().availableProcessors(), progress, 0.0, 1.0);
    }

    /** A part of this run, its progress counted within the given shares of the whole. */
    public Execution part(double first, double last) {
        double width = to - from;
        return new Execution(threads, progress, from + first * width, from + last * width);
    }

    /** The same without reports, for a piece of work whose length nobody knows; it still stops when asked. */
    public Execution silent() {
        return new Execution(threads, progress, Double.NaN, Double.NaN);
    }

    /** The same on one thread and without reports, for a piece of work inside a parallel one; it still stops when asked. */
    public Execution inside() {
        return new Execution(1, progress, Double.NaN, Double.NaN);
    }

    /**
     * Reports progress and stops if asked to.
     *
     * @param share of this part, 0 to 1
     * @throws CancellationException if the study shall stop
     */
    public void reached(double share) {
        stopIfCancelled();
        if (from <= to) {
            progress.reached(from + share * (to - from));
        }
    }

    /**
     * Stops if asked to.
     *
     * @throws CancellationException if the study shall stop
     */
    public void stopIfCancelled() {
        if (progress.cancelled()) {
            throw new CancellationException("study cancelled");
        }
    }
}
