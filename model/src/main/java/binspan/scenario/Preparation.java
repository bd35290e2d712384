package binspan.scenario;

/** How the two pump pulses of a pulse pair are made. */
public enum Preparation implements Choice {
    /** One pulse split by an unbalanced interferometer. */
    INTERFEROMETER("interferometer"),
    /** Two pulses carved from a continuous laser. */
    MODULATOR("modulator");

    private final String text;

    Preparation(String text) {
        this.text = text;
    }

    @Override
    public String text() {
        return text;
    }
}
