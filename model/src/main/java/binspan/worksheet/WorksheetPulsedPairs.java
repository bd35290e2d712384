package binspan.worksheet;

import binspan.counting.LinkCounts;
import binspan.counting.PulsedPortPair;

/**
 * Section 6: detected pairs in the interfering windows and the coincidence rate that threshold detectors make of them.
 */
final class WorksheetPulsedPairs {
    private final WorksheetPage page;

    private WorksheetPulsedPairs(WorksheetPage page) {
        this.page = page;
    }

    static void write(WorksheetPage page) {
        WorksheetPulsedPairs pairs = new WorksheetPulsedPairs(page);
        LinkCounts counts = page.prediction().counts();
        for (int a = 0; a < counts.central().portsA(); a++) {
            for (int b = 0; b < counts.central().portsB(); b++) {
                pairs.pair(a, b, (PulsedPortPair) counts.central().of(a, b));
            }
        }
    }

    private void pair(int a, int b, PulsedPortPair pair) {
        cycles(a, b, pair);
        String at = WorksheetCounts.pair(a, b);
        String ports = WorksheetCounts.ports(a, b);
        int slot = page.endless() ? 0 : 1;
        WorksheetBorn born = new WorksheetBorn(page, a, b);
        page.line("c" + at, ports + "detected pairs, mean over the phase", born.mean(slot, slot), pair.base(), "");
        page.line("k" + at, ports + "their swing with the phase", born.swing(), pair.amplitude(), "");
        interfering(page, a, b).state(page);
    }

    /** The interfering windows of a port pair. */
    static WorksheetClicks interfering(WorksheetPage page, int a, int b) {
        int slot = page.endless() ? 0 : 1;
        return new WorksheetClicks(a, b, slot, slot, "");
    }

    private void cycles(int a, int b, PulsedPortPair pair) {
        LinkCounts counts = page.prediction().counts();
        double share = Math.min(
                counts.loadsA().get(a).gateShare(), counts.loadsB().get(b).gateShare());
        double reach = counts.alice().into(a) * counts.bob().into(b);
        String gated = gated(a, b);
        double common = share * page.value("f") * page.value("mu") * reach;
        WorksheetCounts.ready(page, a, b, common, "{f} {mu} " + WorksheetCounts.into(a, b) + gated);
        String at = WorksheetCounts.pair(a, b);
        String meaning = WorksheetCounts.ports(a, b) + "cycles that find both detectors ready";
        page.line("f" + at, meaning, "{f} {jl" + at + "}" + gated, pair.cyclesPerSecond(), "1/s");
    }

    /** Share of the cycles that have gates on both sides, both gating the same slots. */
    private String gated(int a, int b) {
        String first = "gs_A" + (a + 1);
        String second = "gs_B" + (b + 1);
        if (page.has(first) && page.has(second)) {
            return " min({" + first + "}, {" + second + "})";
        }
        return page.has(first) ? " {" + first + "}" : page.has(second) ? " {" + second + "}" : "";
    }
}
