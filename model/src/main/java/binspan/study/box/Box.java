package binspan.study.box;

/**
 * An axis-parallel box; places are shares of the way along each axis.
 *
 * @param low lower faces
 * @param high upper faces
 */
@SuppressWarnings("ArrayRecordComponent") // for the searches of this package, which neither change nor compare boxes
record Box(double[] low, double[] high) {
    /** The middle of the box, as a relative place along one axis. */
    static final double MIDDLE = 0.5;

    /** Number of axes. */
    int axes() {
        return low.length;
    }

    /** The width along an axis. */
    double width(int axis) {
        return high[axis] - low[axis];
    }

    /** The place at relative coordinates: 0 is the lower face, 1 the upper one, each met exactly. */
    double[] at(double[] relative) {
        double[] place = new double[low.length];
        for (int j = 0; j < place.length; j++) {
            place[j] = relative[j] == 1.0 ? high[j] : low[j] + relative[j] * width(j);
        }
        return place;
    }

    /** The relative coordinates of a place. */
    double[] relative(double[] place) {
        double[] relative = new double[low.length];
        for (int j = 0; j < relative.length; j++) {
            relative[j] = width(j) > 0.0 ? (place[j] - low[j]) / width(j) : MIDDLE;
        }
        return relative;
    }

    /** Whether a place lies inside, the faces not counted. */
    boolean contains(double[] place) {
        for (int j = 0; j < low.length; j++) {
            if (!(place[j] > low[j] && place[j] < high[j])) {
                return false;
            }
        }
        return true;
    }

    /** How far the box stays inside the ranges of the axes; negative where it leaves one. */
    double room() {
        double room = 1.0;
        for (int j = 0; j < low.length; j++) {
            room = Math.min(room, Math.min(low[j], 1.0 - high[j]));
        }
        return room;
    }
}
