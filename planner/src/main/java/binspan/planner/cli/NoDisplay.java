package binspan.planner.cli;

import java.util.Locale;
import java.util.Map;

/** Tells in one line why no window can be opened, and what to do. */
final class NoDisplay {
    private static final String REMEDY =
            "run it in a desktop session, or use the other commands, which need no display";
    private static final String LIBRARIES = "install the libraries of GTK 3 and of the X test extension (Debian:"
            + " libgtk-3-0 libxtst6), or use the other commands, which need no display";

    private NoDisplay() {}

    /**
     * Refuses to begin where a window certainly cannot be opened.
     *
     * @param system name of the operating system
     * @param environment environment variables
     */
    static void refuse(String system, Map<String, String> environment) throws UsageException {
        boolean chosen = System.getProperty("glass.platform") != null;
        boolean linux = system.toLowerCase(Locale.ROOT).contains("linux");
        if (linux && !chosen && environment.getOrDefault("DISPLAY", "").isBlank()) {
            throw UsageException.of("no display to open a window on (DISPLAY is not set); " + REMEDY);
        }
    }

    /** What a failed start of the window means; other failures are passed on. */
    static UsageException because(Throwable failure) {
        for (Throwable cause = failure; cause != null; cause = cause.getCause()) {
            String words = String.valueOf(cause.getMessage());
            if (cause instanceof UnsatisfiedLinkError || words.contains("GTK")) {
                return UsageException.of("no window can be opened: a library of the desktop is missing; " + LIBRARIES);
            }
            if (cause instanceof UnsupportedOperationException && words.contains("DISPLAY")) {
                return UsageException.of("no display to open a window on (DISPLAY leads to none); " + REMEDY);
            }
        }
        if (failure instanceof Error error) {
            throw error;
        }
        throw (RuntimeException) failure;
    }
}
