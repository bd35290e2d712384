package binspan.planner.view;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.logging.Handler;
import java.util.logging.LogRecord;
import java.util.logging.Logger;

/** Hears what nobody catches, on all threads, and what is wrong with style sheets. */
final class Complaints extends Handler {
    /** Kept, or the handler would go with it. */
    private static final Logger SHEETS = Logger.getLogger("javafx.css");

    private final List<String> all = Collections.synchronizedList(new ArrayList<>());
    private final Thread.UncaughtExceptionHandler before = Thread.getDefaultUncaughtExceptionHandler();

    /** Listens from now on. */
    Complaints() {
        Thread.setDefaultUncaughtExceptionHandler(
                (thread, thrown) -> all.add(thread.getName() + ": " + thrown + " at " + where(thrown)));
        SHEETS.addHandler(this);
    }

    private static String where(Throwable thrown) {
        return List.of(thrown.getStackTrace()).stream()
                .filter(each -> each.getClassName().startsWith("binspan"))
                .map(StackTraceElement::toString)
                .findFirst()
                .orElse("nowhere of ours");
    }

    /** What was heard. */
    List<String> all() {
        return List.copyOf(all);
    }

    @Override
    public void publish(LogRecord heard) {
        all.add("style sheets: " + heard.getMessage());
    }

    @Override
    public void flush() {
        // nothing is held back
    }

    /** Listens no more. */
    @Override
    public void close() {
        SHEETS.removeHandler(this);
        Thread.setDefaultUncaughtExceptionHandler(before);
    }
}
