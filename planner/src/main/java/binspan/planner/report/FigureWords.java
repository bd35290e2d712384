package binspan.planner.report;

import binspan.study.FigureColumn;
import java.util.Map;

/** Figures of merit in words, and whether their spans usually cover decades. */
public final class FigureWords {
    private static final Map<String, String> WORDS = Map.ofEntries(
            Map.entry("source.cyclesPerSecond", "pump cycles"),
            Map.entry("source.schmidtNumber", "Schmidt number"),
            Map.entry("source.apparentMeanPairs", "apparent mean pairs"),
            Map.entry("lossDb", "loss"),
            Map.entry("fibreLossDb", "fibre loss"),
            Map.entry("dispersionPsPerNm", "dispersion"),
            Map.entry("arrivalRmsPs", "arrival rms"),
            Map.entry("delayErrorPs", "delay error"),
            Map.entry("singlesPerSecond", "singles"),
            Map.entry("liveFraction", "live fraction"),
            Map.entry("backgroundPerSecond", "background"),
            Map.entry("coincidencesPerSingle", "coincidences per single"),
            Map.entry("partnerPassProbability", "partner-pass probability"),
            Map.entry("unheraldedG2", "unheralded g2"),
            Map.entry("heraldedG2", "heralded g2"),
            Map.entry("coincidence.fringeMaxPerSecond", "coincidences, fringe maximum"),
            Map.entry("coincidence.fringeMinPerSecond", "coincidences, fringe minimum"),
            Map.entry("coincidence.accidentalPerSecond", "accidentals"),
            Map.entry("coincidence.allPortsPerSecond", "coincidences, all ports"),
            Map.entry("coincidence.sidePerSecond", "side-peak coincidences"),
            Map.entry("coincidence.car", "coincidences/accidentals"),
            Map.entry("coincidence.correlationRmsPs", "correlation rms"),
            Map.entry("visibility.raw", "raw visibility"),
            Map.entry("visibility.net", "net visibility"),
            Map.entry("visibility.sigma", "error of the visibility"),
            Map.entry("visibility.countsPerPoint", "counts per fringe point"),
            Map.entry("bell.chsh", "CHSH S"),
            Map.entry("bell.sigma", "error of S"),
            Map.entry("bell.secondsToThreeSigma", "time to S > 2 by 3 sigma"),
            Map.entry("bell.secondsToFiveSigma", "time to S > 2 by 5 sigma"),
            Map.entry("qber.phase", "phase-basis error rate"),
            Map.entry("qber.time", "time-basis error rate"),
            Map.entry("key.siftedPhaseBps", "sifted phase bits"),
            Map.entry("key.siftedTimeBps", "sifted time bits"),
            Map.entry("key.asymptoticBps", "secret key rate"),
            Map.entry("key.finiteBits", "finite key"),
            Map.entry("key.finiteBps", "finite key rate"),
            Map.entry("key.secondsToFirstKey", "time to the first key"),
            Map.entry("key.repeaterlessBoundBps", "repeaterless bound"));

    private FigureWords() {}

    /** A short name; arms and ports are named: "singles, alice port 1". */
    public static String name(FigureColumn column) {
        String name = column.field().name();
        String known = WORDS.get(name);
        if (known != null) {
            return known;
        }
        int dot = name.indexOf('.');
        String words = WORDS.getOrDefault(name.substring(dot + 1), name);
        String port = column.field().perPort() ? " port " + (column.port() + 1) : "";
        return words + ", " + name.substring(0, dot) + port;
    }

    /** The same with a capital letter, for axis titles. */
    public static String title(FigureColumn column) {
        String name = name(column);
        return Character.toUpperCase(name.charAt(0)) + name.substring(1);
    }

    /** Whether a figure is a rate, a count, a time or a ratio that runs over decades. */
    public static boolean spansDecades(FigureColumn column) {
        String name = column.field().name();
        return name.startsWith("key.")
                || name.contains("PerSecond")
                || name.contains("secondsTo")
                || name.endsWith(".car")
                || name.endsWith("countsPerPoint")
                || name.endsWith(".sigma");
    }
}
