package binspan.scenario;

import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;

/** Finds the known names that a misspelt one most likely meant. */
public final class Nearest {
    private static final int SHOWN = 3;

    private Nearest() {}

    /**
     * Names close to a misspelt one, best first.
     *
     * @param found the misspelt name
     * @param known the names that exist
     * @return at most three names that differ by no more than a third of their letters
     */
    public static List<String> to(String found, Collection<String> known) {
        String lower = found.toLowerCase(Locale.ROOT);
        return known.stream()
                .filter(name -> distance(lower, name.toLowerCase(Locale.ROOT)) <= Math.max(1, name.length() / 3))
                .sorted(Comparator.comparingInt((String name) -> distance(lower, name.toLowerCase(Locale.ROOT)))
                        .thenComparing(Comparator.naturalOrder()))
                .limit(SHOWN)
                .toList();
    }

    /** Number of letters to insert, delete or exchange (Levenshtein distance). */
    static int distance(String a, String b) {
        int[] row = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            row[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            int diagonal = row[0];
            row[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                int exchanged = diagonal + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                diagonal = row[j];
                row[j] = Math.min(exchanged, 1 + Math.min(row[j], row[j - 1]));
            }
        }
        return row[b.length()];
    }
}
