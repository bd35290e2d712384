package binspan.planner.plot;

/**
 * Room on a page, in points.
 *
 * @param width from left to right; infinite where a picture may take what suits it
 * @param height from top to bottom; infinite likewise
 */
public record Room(double width, double height) {
    /** As much as a picture likes. */
    public static final Room FREE = new Room(Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY);

    /** Whether a picture has to make do with it. */
    boolean given() {
        return Double.isFinite(width);
    }

    /** Its width as a whole number of points, or what suits a picture that is free. */
    int wide(int suits) {
        return given() ? Math.max(1, (int) width) : suits;
    }

    /** Its height likewise. */
    int high(int suits) {
        return given() ? Math.max(1, (int) height) : suits;
    }

    /** How many parts of a least height stand above each other, at least one. */
    int rows(double least) {
        return Math.max(1, (int) Math.min(Integer.MAX_VALUE, height / least));
    }

    /** How many parts of a least width stand side by side, at least one. */
    int columns(double least) {
        return Math.max(1, (int) Math.min(Integer.MAX_VALUE, width / least));
    }
}
