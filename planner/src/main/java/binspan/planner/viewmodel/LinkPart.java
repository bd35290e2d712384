package binspan.planner.viewmodel;

/** A part of the link that can be selected, drawn and edited. */
public sealed interface LinkPart {
    /** Name, common imbalance, windows, measuring times and key distillation. */
    record Plan() implements LinkPart {}

    /** What the link must reach. */
    record Promise() implements LinkPart {}

    /** Pump and brightness. */
    record Source() implements LinkPart {}

    /** The filter bands of both photons at the source. */
    record Bands() implements LinkPart {}

    /** The coupling from the source into an arm. */
    record Coupling(Site site) implements LinkPart {}

    /**
     * An element of an arm's path.
     *
     * @param site the arm
     * @param index its place from the source on, the first is 0
     */
    record Element(Site site, int index) implements LinkPart {}

    /** The loss set aside for later splices of an arm. */
    record Repair(Site site) implements LinkPart {}

    /** The interferometer of a site. */
    record Analyzer(Site site) implements LinkPart {}

    /** Clock, tagger and alignment of a site. */
    record Clock(Site site) implements LinkPart {}

    /**
     * A detector.
     *
     * @param site where
     * @param port output port, the first is 0
     */
    record Port(Site site, int port) implements LinkPart {}
}
