package binspan.worksheet;

import binspan.counting.LinkCounts;

/**
 * Section 6: coincidences of the outer slots, which make the time basis of a pulse pair, and those one separation
 * apart.
 */
final class WorksheetTimeBasis {
    private static final int[][] SLOTS = {{0, 0}, {2, 2}, {0, 2}, {2, 0}};
    private static final String[] MEANINGS = {
        "both early", "both late", "alice early, bob late: an error", "alice late, bob early: an error"
    };

    private WorksheetTimeBasis() {}

    static void write(WorksheetPage page) {
        LinkCounts counts = page.prediction().counts();
        for (int which = 0; which < SLOTS.length; which++) {
            int slotA = SLOTS[which][0];
            int slotB = SLOTS[which][1];
            String meaning = "slots (" + slotA + "," + slotB + "), all ports, " + MEANINGS[which];
            String sum = WorksheetWindows.sum(page, slotA, slotB);
            page.line(
                    "C_" + slotA + slotB,
                    meaning,
                    sum,
                    counts.timeBasis().get(which).sum(0.0),
                    "1/s");
        }
    }

    /** States the windows one separation apart and gives the sum of their coincidences, ready to stand in a formula. */
    static String aside(WorksheetPage page) {
        if (page.endless()) {
            return WorksheetWindows.sum(page, 0, 1) + " + " + WorksheetWindows.sum(page, 0, -1);
        }
        return WorksheetWindows.sum(page, 1, 2) + " + " + WorksheetWindows.sum(page, 0, 1) + " + "
                + WorksheetWindows.sum(page, 1, 0) + " + " + WorksheetWindows.sum(page, 2, 1);
    }
}
