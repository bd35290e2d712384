package binspan.planner.report;

/** The fit of the slots in words. */
final class SlotWords {
    /** Where it ends. */
    static final String UNFIT =
            "The slots no longer fit: the window is wider than the separation, or three separations and"
                    + " a window are longer than the pump cycle.";

    /** The same within a sentence. */
    static final String END = "the slots no longer fit (window wider than the separation, or three separations and a"
            + " window longer than the pump cycle)";

    private SlotWords() {}
}
