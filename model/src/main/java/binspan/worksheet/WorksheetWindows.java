package binspan.worksheet;

import binspan.counting.ArmLight;
import binspan.counting.LinkCounts;
import java.util.ArrayList;
import java.util.List;

/**
 * Section 6: coincidences of windows other than the interfering ones. Where all ports are alike only ports (1,1) are
 * written out.
 */
final class WorksheetWindows {
    private final WorksheetPage page;
    private final LinkCounts counts;

    private WorksheetWindows(WorksheetPage page) {
        this.page = page;
        this.counts = page.prediction().counts();
    }

    /**
     * States the coincidences of a pair of windows and gives the sum of all port pairs, ready to stand in a formula.
     */
    static String sum(WorksheetPage page, int slotA, int slotB) {
        WorksheetWindows windows = new WorksheetWindows(page);
        int pairs = windows.counts.central().portsA() * windows.counts.central().portsB();
        if (windows.alike()) {
            return (pairs == 1 ? "" : pairs + " x ") + windows.rate(0, 0, slotA, slotB);
        }
        List<String> rates = new ArrayList<>();
        for (int i = 0; i < pairs; i++) {
            int b = i % windows.counts.central().portsB();
            rates.add(windows.rate(i / windows.counts.central().portsB(), b, slotA, slotB));
        }
        return String.join(" + ", rates);
    }

    private String rate(int a, int b, int slotA, int slotB) {
        String suffix = "(" + slotA + "," + slotB + ")";
        boolean endless = page.endless();
        WorksheetClicks clicks = new WorksheetClicks(a, b, endless ? 0 : slotA, endless ? 0 : slotB, suffix);
        WorksheetBorn born = new WorksheetBorn(page, a, b);
        double pairs = born.value(slotA, slotB);
        String pairSymbol = "c" + clicks.at();
        String words =
                WorksheetCounts.ports(a, b) + "%s, " + (endless ? "bob's window " + slots(slotB) : "slots " + suffix);
        page.line(pairSymbol, words.replace("%s", "detected pairs"), born.mean(slotA, slotB), pairs, "");
        clicks.state(page);
        String rate = clicks.rate(page, "{" + pairSymbol + "}");
        page.line("R" + clicks.at(), words.replace("%s", "coincidences"), rate, clicks.value(page, pairs), "1/s");
        return "{R" + clicks.at() + "}";
    }

    private static String slots(int difference) {
        return difference > 0 ? "one slot later" : "one slot earlier";
    }

    private boolean alike() {
        return alike(counts.alice(), page.sides().get(0))
                && alike(counts.bob(), page.sides().get(1));
    }

    private static boolean alike(ArmLight light, WorksheetSide side) {
        return light.ports() == 1
                || (light.shortTo(0) == light.shortTo(1)
                        && light.longTo(0) == light.longTo(1)
                        && side.loads().get(0).equals(side.loads().get(1))
                        && WorksheetCaptures.like(side, 1) == 0);
    }
}
