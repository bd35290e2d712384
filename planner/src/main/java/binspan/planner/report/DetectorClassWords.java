package binspan.planner.report;

import binspan.scenario.Gate;
import binspan.scenario.Range;

/** What the catalogue of detector classes says about its numbers. */
public final class DetectorClassWords {
    /** Where the planning values come from. */
    public static final String PLANNED = "Planning values inside the published ones named with each class.";

    private DetectorClassWords() {}

    /** Gating in words: "gated with 2e-5 dark clicks per gate of 1 ns". */
    public static String gating(Gate gate) {
        return "gated with " + Range.plain(gate.darkProbability()) + " dark clicks per gate of "
                + Range.plain(gate.widthNs()) + " ns";
    }
}
