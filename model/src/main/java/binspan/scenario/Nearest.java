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

    /** Number of letters to insert, delete or exchange, or of neighbours to swap (optimal string alignment). */
    static int distance(String a, String b) {
        int[] before = new int[b.length() + 1];
        int[] above = new int[b.length() + 1];
        int[] row = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            row[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            int[] free = before;
            before = above;
            above = row;
            row = free;
            row[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                boolean same = a.charAt(i - 1) == b.charAt(j - 1);
                row[j] = Math.min(above[j - 1] + (same ? 0 : 1), 1 + Math.min(above[j], row[j - 1]));
                if (swapped(a, i, b, j)) {
                    row[j] = Math.min(row[j], before[j - 2] + 1);
                }
            }
        }
        return row[b.length()];
    }

    private static boolean swapped(String a, int i, String b, int j) {
        return i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
    }
}
