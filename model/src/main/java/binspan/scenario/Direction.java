package binspan.scenario;

/** Direction of classical light in a fibre against the quantum light. */
public enum Direction implements Choice {
    /** With the photons, from the source to the analyzer. */
    FORWARD("forward"),
    /** Against the photons. */
    BACKWARD("backward");

    private final String text;

    Direction(String text) {
        this.text = text;
    }

    @Override
    public String text() {
        return text;
    }
}
