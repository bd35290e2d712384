package binspan.worksheet;

import binspan.counting.ArmLight;
import binspan.counting.ClickStatistics;
import binspan.optics.PairCaptures;

/**
 * Section 6: detected pairs of one port pair in a pair of windows, by bin of birth and by path; only captured ones are
 * written.
 */
final class WorksheetBorn {
    private final WorksheetPage page;
    private final int a;
    private final int b;
    private final PairCaptures captures;

    WorksheetBorn(WorksheetPage page, int a, int b) {
        this.page = page;
        this.a = a;
        this.b = b;
        this.captures = page.captures().pairs(a, b);
    }

    /** Formula of the detected pairs averaged over the phase. */
    String mean(int slotA, int slotB) {
        return page.endless()
                ? endless(slotB - slotA)
                : "{b_E} (" + born(slotA, slotB) + ") + {b_L} (" + born(slotA - 1, slotB - 1) + ")";
    }

    /** Their number. */
    double value(int slotA, int slotB) {
        double modes = page.prediction().spectrum().schmidtNumber();
        if (page.endless()) {
            return ClickStatistics.bunched(page.value("mu"), modes) * endlessValue(slotB - slotA);
        }
        return ClickStatistics.bunched(page.value("mu_E"), modes) * bornValue(slotA, slotB)
                + ClickStatistics.bunched(page.value("mu_L"), modes) * bornValue(slotA - 1, slotB - 1);
    }

    /** Formula of their swing with the phase in the interfering windows. */
    String swing() {
        String ways = way(1, "A", a) + " " + way(1, "B", b) + " " + way(0, "A", a) + " " + way(0, "B", b);
        String sign = a == b ? "2 " : "-2 ";
        return page.endless()
                ? sign + "{b} " + apart(0) + " sqrt(" + ways + ") {gamma}"
                : sign + "{" + WorksheetCaptures.pair(page, a, b, 0, 0) + "} sqrt({b_E} {b_L} " + ways + ") {gamma}";
    }

    /** Pairs of a bin whose short path leads into slot 0 of the given counting. */
    private String born(int slotA, int slotB) {
        StringBuilder sum = new StringBuilder();
        for (int path = 0; path < 4; path++) {
            String capture = WorksheetCaptures.pair(page, a, b, path / 2 - slotA, path % 2 - slotB);
            if (page.has(capture)) {
                sum.append(sum.length() == 0 ? "" : " + ");
                sum.append(way(path / 2, "A", a)).append(' ').append(way(path % 2, "B", b));
                sum.append(" {").append(capture).append('}');
            }
        }
        return sum.length() == 0 ? "0" : sum.toString();
    }

    private double bornValue(int slotA, int slotB) {
        double sum = 0.0;
        for (int path = 0; path < 4; path++) {
            int offsetA = path / 2 - slotA;
            int offsetB = path % 2 - slotB;
            if (Math.max(Math.abs(offsetA), Math.abs(offsetB)) <= captures.reach()) {
                sum += share(path / 2, alice(), a) * share(path % 2, bob(), b) * captures.at(offsetA, offsetB);
            }
        }
        return sum;
    }

    private String endless(int apart) {
        String same = "(" + way(0, "A", a) + " " + way(0, "B", b) + " + " + way(1, "A", a) + " " + way(1, "B", b) + ")";
        String next = way(0, "A", a) + " " + way(1, "B", b);
        String previous = way(1, "A", a) + " " + way(0, "B", b);
        return "{b} (" + same + " " + apart(-apart) + " + " + next + " " + apart(1 - apart) + " + " + previous + " "
                + apart(-1 - apart) + ")";
    }

    private double endlessValue(int apart) {
        double same = alice().shortTo(a) * bob().shortTo(b) + alice().longTo(a) * bob().longTo(b);
        return same * captures.apart(-apart)
                + alice().shortTo(a) * bob().longTo(b) * captures.apart(1 - apart)
                + alice().longTo(a) * bob().shortTo(b) * captures.apart(-1 - apart);
    }

    /**
     * Captured pairs of a train whose photons lie off their windows by numbers of slots that differ by the given one.
     */
    private String apart(int difference) {
        StringBuilder sum = new StringBuilder();
        for (int offset = -captures.reach(); offset <= captures.reach(); offset++) {
            String capture = WorksheetCaptures.pair(page, a, b, offset, offset + difference);
            if (page.has(capture)) {
                sum.append(sum.length() == 0 ? "{" : " + {").append(capture).append('}');
            }
        }
        return sum.length() == 0 ? "x 0" : "(" + sum + ")";
    }

    private static String way(int isLong, String letter, int port) {
        return (isLong == 1 ? "{lo_" : "{sh_") + letter + (port + 1) + "}";
    }

    private static double share(int isLong, ArmLight arm, int port) {
        return isLong == 1 ? arm.longTo(port) : arm.shortTo(port);
    }

    private ArmLight alice() {
        return page.prediction().counts().alice();
    }

    private ArmLight bob() {
        return page.prediction().counts().bob();
    }
}
