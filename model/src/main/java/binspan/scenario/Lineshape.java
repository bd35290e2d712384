package binspan.scenario;

/** Shape of the pump laser line. */
public enum Lineshape implements Choice {
    /** |g1| = exp(-T/tc). */
    LORENTZIAN("lorentzian"),
    /** |g1| = exp(-(T/tc)^2). */
    GAUSSIAN("gaussian");

    private final String text;

    Lineshape(String text) {
        this.text = text;
    }

    @Override
    public String text() {
        return text;
    }
}
