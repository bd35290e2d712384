package binspan.scenario;

/** Which photon of the pair an arm carries. */
public enum Photon implements Choice {
    SIGNAL("signal"),
    IDLER("idler");

    private final String text;

    Photon(String text) {
        this.text = text;
    }

    @Override
    public String text() {
        return text;
    }
}
