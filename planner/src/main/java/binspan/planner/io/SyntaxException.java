package binspan.planner.io;

/** The first place where a text is no JSON. */
final class SyntaxException extends Exception {
    private static final long serialVersionUID = 1L;

    private final transient Place place;

    SyntaxException(Place place, String message) {
        super(message);
        this.place = place;
    }

    /** The error as a finding about the whole file. */
    Finding finding() {
        return new Finding(place, "", getMessage());
    }
}
