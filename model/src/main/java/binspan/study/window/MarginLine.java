package binspan.study.window;

/** The margins along one axis, the shares along all others held. */
public final class MarginLine {
    private final MarginFunction function;
    private final double[] place;
    private final int axis;

    /**
     * A line.
     *
     * @param through a place on it
     * @param axis position of the axis along which it runs
     */
    public MarginLine(MarginFunction function, double[] through, int axis) {
        this.function = function;
        this.place = through.clone();
        this.axis = axis;
    }

    /** Number of requirements. */
    int requirements() {
        return function.requirements();
    }

    /** All margins at a share of the way. */
    public double[] at(double share) {
        place[axis] = share;
        return function.at(place);
    }

    /** The margin of one requirement at a share of the way. */
    double one(int requirement, double share) {
        place[axis] = share;
        return function.one(requirement, place);
    }
}
