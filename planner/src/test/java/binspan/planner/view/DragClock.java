package binspan.planner.view;

import java.util.Arrays;
import java.util.Locale;

/**
 * Times from each step of a drag to what is shown next. What is shown may still be of the step before when a newer one
 * has just begun: such a step counts up to the showing after that, so that no step seems answered before it was.
 */
final class DragClock {
    private static final double MILLI = 1e-6;

    private final long[] changed;
    private final long[] shown;
    private int asked;
    private int started;
    private int done;

    DragClock(int steps) {
        changed = new long[steps];
        shown = new long[steps];
    }

    /** A step is about to be made. */
    void changed(int step) {
        changed[step] = System.nanoTime();
        if (started == done) {
            started = step + 1;
        }
        asked = step + 1;
    }

    /** Something new is shown: the answer to the work that was under way; what was asked meanwhile comes next. */
    void shown() {
        long now = System.nanoTime();
        for (; done < started; done++) {
            shown[done] = now;
        }
        started = asked;
    }

    /** Median, 95 % and longest in ms, from a step on; in words where nothing was to be shown. */
    String text(int from) {
        double[] times = new double[Math.max(0, done - from)];
        for (int i = 0; i < times.length; i++) {
            times[i] = (shown[from + i] - changed[from + i]) * MILLI;
        }
        if (times.length < changed.length / 4) {
            return "stays as it is   ";
        }
        Arrays.sort(times);
        return String.format(
                Locale.ROOT,
                "%5.1f %5.1f %5.1f",
                times[times.length / 2],
                times[(int) Math.ceil(times.length * 0.95) - 1],
                times[times.length - 1]);
    }
}
