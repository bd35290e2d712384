package binspan.worksheet;

import binspan.counting.ContinuousPortPair;
import binspan.counting.LinkCounts;
import java.util.ArrayList;
import java.util.List;

/** Section 7: coincidences of each port pair from the captured peaks of t_A - t_B. */
final class WorksheetContinuousPairs {
    private final WorksheetPage page;
    private final int a;
    private final int b;
    private final String at;
    private final String ports;

    private WorksheetContinuousPairs(WorksheetPage page, int a, int b) {
        this.page = page;
        this.a = a;
        this.b = b;
        this.at = WorksheetCounts.pair(a, b);
        this.ports = WorksheetCounts.ports(a, b);
    }

    static void write(WorksheetPage page) {
        LinkCounts counts = page.prediction().counts();
        for (int a = 0; a < counts.central().portsA(); a++) {
            for (int b = 0; b < counts.central().portsB(); b++) {
                WorksheetPeaks.write(page, a, b);
                WorksheetContinuousPairs pairs = new WorksheetContinuousPairs(page, a, b);
                pairs.live();
                pairs.rates((ContinuousPortPair) counts.central().of(a, b));
            }
        }
    }

    /** Rate of a port pair at a phase whose cosine stands on a line. */
    static String rate(int a, int b, String cosine) {
        String at = WorksheetCounts.pair(a, b);
        return "{c" + at + "} + {k" + at + "} x {" + cosine + "} + {acc" + at + "}";
    }

    /** States the windows one separation apart and gives the sum of their coincidences, ready to stand in a formula. */
    static String aside(WorksheetPage page) {
        List<String> rates = new ArrayList<>();
        for (int a = 0; a < page.prediction().counts().central().portsA(); a++) {
            for (int b = 0; b < page.prediction().counts().central().portsB(); b++) {
                WorksheetContinuousPairs pairs = new WorksheetContinuousPairs(page, a, b);
                rates.add(pairs.aside("A", "-A", "0", "-A-B"));
                rates.add(pairs.aside("B", "B", "A+B", "0"));
            }
        }
        return String.join(" + ", rates);
    }

    private void live() {
        LinkCounts counts = page.prediction().counts();
        double common = page.value("R") * counts.alice().into(a) * counts.bob().into(b);
        WorksheetCounts.ready(page, a, b, common, "{R} " + WorksheetCounts.into(a, b));
    }

    private void rates(ContinuousPortPair pair) {
        String ready = "{R} {jl" + at + "} ";
        String peaks = peaks("0", "A", "-B");
        page.line("c" + at, ports + "true pairs, mean over the phase", ready + peaks, pair.basePerSecond(), "1/s");
        String swing =
                (a == b ? "2 " : "-2 ") + ready + captured("0") + " sqrt(" + shorts() + " " + longs() + ") {gamma}";
        page.line("k" + at, ports + "their swing with the phase", swing, pair.amplitudePerSecond(), "1/s");
        String chance = "{S_A" + (a + 1) + "} {S_B" + (b + 1) + "} {w}";
        page.line("acc" + at, ports + "accidental coincidences", chance, pair.accidentalPerSecond(), "1/s");
    }

    /** Captured pairs by path from the captures of equal paths, of alice's long path and of bob's long path. */
    private String peaks(String same, String aliceLong, String bobLong) {
        return "(" + captured(same) + " (" + shorts() + " + " + longs() + ") + " + captured(aliceLong) + " " + longA()
                + " " + shortB() + " + " + captured(bobLong) + " " + shortA() + " " + longB() + ")";
    }

    private String aside(String peak, String same, String aliceLong, String bobLong) {
        double equal = page.value("sh_A" + (a + 1)) * page.value("sh_B" + (b + 1))
                + page.value("lo_A" + (a + 1)) * page.value("lo_B" + (b + 1));
        double first = page.value("lo_A" + (a + 1)) * page.value("sh_B" + (b + 1));
        double second = page.value("sh_A" + (a + 1)) * page.value("lo_B" + (b + 1));
        double pairs = value(same) * equal + value(aliceLong) * first + value(bobLong) * second;
        double rate = page.value("R") * page.value("jl" + at) * pairs + page.value("acc" + at);
        String formula = "{R} {jl" + at + "} " + peaks(same, aliceLong, bobLong) + " + {acc" + at + "}";
        String meaning =
                ports + "coincidences about the peak of " + (peak.equals("A") ? "alice" : "bob") + "'s long path";
        page.line("R" + at + "(" + peak + ")", meaning, formula, rate, "1/s");
        return "{R" + at + "(" + peak + ")}";
    }

    private double value(String peak) {
        return page.value("C" + at + "(" + peak + ")");
    }

    private String captured(String peak) {
        return "{C" + at + "(" + peak + ")}";
    }

    private String shorts() {
        return shortA() + " " + shortB();
    }

    private String longs() {
        return longA() + " " + longB();
    }

    private String shortA() {
        return "{sh_A" + (a + 1) + "}";
    }

    private String shortB() {
        return "{sh_B" + (b + 1) + "}";
    }

    private String longA() {
        return "{lo_A" + (a + 1) + "}";
    }

    private String longB() {
        return "{lo_B" + (b + 1) + "}";
    }
}
