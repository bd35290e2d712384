package binspan.scenario;

/** Shape of a parameter spread in a tolerance study. */
public enum SpreadShape implements Choice {
    /** Normal, the width is the standard deviation. */
    NORMAL("normal"),
    /** Uniform, the width is the half width. */
    UNIFORM("uniform"),
    /** Symmetric triangle, the width is the half width of its base. */
    TRIANGULAR("triangular");

    private final String text;

    SpreadShape(String text) {
        this.text = text;
    }

    @Override
    public String text() {
        return text;
    }
}
