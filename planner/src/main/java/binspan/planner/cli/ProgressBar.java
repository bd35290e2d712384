package binspan.planner.cli;

import binspan.planner.report.ProgressLine;
import binspan.planner.report.TextStyle;
import binspan.study.Execution;
import binspan.study.Progress;
import java.io.PrintStream;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.Function;
import java.util.function.LongSupplier;

/** Shows on a terminal how far a study has come, once it takes longer than a second; drawn at most ten times a second and removed at the end. */
final class ProgressBar implements Progress, AutoCloseable {
    private static final long PATIENCE = 1_000_000_000L;
    private static final long PAUSE = 100_000_000L;
    private static final double NANO = 1e-9;

    private final PrintStream err;
    private final TextStyle style;
    private final LongSupplier nanos;
    private final boolean shown;
    private final long start;
    private final AtomicLong next;
    private double furthest;
    private int width;
    private boolean closed;

    /**
     * A bar.
     *
     * @param err where it is drawn
     * @param style characters
     * @param nanos clock
     * @param shown whether there is a terminal to show it
     */
    ProgressBar(PrintStream err, TextStyle style, LongSupplier nanos, boolean shown) {
        this.err = err;
        this.style = style;
        this.nanos = nanos;
        this.shown = shown;
        this.start = nanos.getAsLong();
        this.next = new AtomicLong(start + PATIENCE);
    }

    /**
     * Runs a study on all processors while a bar shows how far it has come.
     *
     * @param console whose terminal shows it
     * @param study the study, for example {@code sweep::run}
     */
    static <T> T during(Console console, Function<Execution, T> study) {
        TextStyle style = TextStyle.ofStandardOutput(false);
        boolean shown = console.showsProgress();
        try (ProgressBar bar = new ProgressBar(console.err(), style, System::nanoTime, shown)) {
            if (shown) {
                // A program that is stopped (Ctrl-C) removes the bar too.
                Runtime.getRuntime().addShutdownHook(new Thread(bar::close, "progress"));
            }
            return study.apply(Execution.parallel(bar));
        }
    }

    @Override
    public void reached(double share) {
        if (!shown) {
            return;
        }
        long due = next.get();
        long now = nanos.getAsLong();
        if (now - due >= 0 && next.compareAndSet(due, now + PAUSE)) {
            draw(share, (now - start) * NANO);
        }
    }

    @Override
    public boolean cancelled() {
        return false;
    }

    private synchronized void draw(double share, double seconds) {
        if (closed) {
            return;
        }
        furthest = Math.max(furthest, share);
        String line = ProgressLine.of(furthest, seconds, style);
        err.print("\r" + line + " ".repeat(Math.max(0, width - line.length())));
        err.flush();
        width = line.length();
    }

    @Override
    public synchronized void close() {
        if (width > 0 && !closed) {
            err.print("\r" + " ".repeat(width) + "\r");
            err.flush();
        }
        closed = true;
    }
}
