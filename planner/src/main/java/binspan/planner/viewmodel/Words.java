package binspan.planner.viewmodel;

import java.text.MessageFormat;
import java.util.Locale;
import java.util.ResourceBundle;

/** All words of the window: one resource bundle. */
public final class Words {
    private static final ResourceBundle BUNDLE = ResourceBundle.getBundle("binspan.planner.view.words", Locale.ROOT);

    private Words() {}

    /**
     * A text.
     *
     * @param key its name in the bundle
     * @param inserts texts for {0}, {1} and so on
     */
    public static String of(String key, Object... inserts) {
        return new MessageFormat(BUNDLE.getString(key), Locale.ROOT).format(inserts);
    }

    /** Whether the bundle has a text of a name. */
    public static boolean has(String key) {
        return BUNDLE.containsKey(key);
    }
}
