package binspan.planner.plot;

import java.util.Locale;

/** Tells a system without fonts, which the platform reports as errors of several kinds. */
final class MissingFonts {
    static final String REMEDY = "install a font package, for example fonts-dejavu-core, and fontconfig with it";

    private MissingFonts() {}

    /** Whether an error, or what caused it, speaks of fonts. */
    static boolean isCause(Throwable error) {
        for (Throwable cause = error; cause != null; cause = cause.getCause()) {
            String message = String.valueOf(cause.getMessage()).toLowerCase(Locale.ROOT);
            if (message.contains("font") || message.contains("freetype")) {
                return true;
            }
        }
        return false;
    }
}
