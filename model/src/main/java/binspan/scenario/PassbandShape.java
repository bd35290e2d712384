package binspan.scenario;

/** Shape of a filter passband in optical power. */
public enum PassbandShape implements Choice {
    /** Gaussian of the stated full width at half maximum. */
    GAUSSIAN("gaussian"),
    /** Rectangle of the stated full width. */
    FLAT_TOP("flat-top");

    private final String text;

    PassbandShape(String text) {
        this.text = text;
    }

    @Override
    public String text() {
        return text;
    }
}
