package binspan.study.region;

/**
 * An edge of a cell: the part of a line of the grid between two neighbouring crossings.
 *
 * @param row whether it runs along the first axis
 * @param line index of its line, across the second axis for a row
 * @param step index of the lower one of the lines between which it lies
 */
record GridEdge(boolean row, int line, int step) {
    /** The lower edge of a cell. */
    static GridEdge bottom(int i, int j) {
        return new GridEdge(true, j, i);
    }

    /** The upper edge of a cell. */
    static GridEdge top(int i, int j) {
        return new GridEdge(true, j + 1, i);
    }

    /** The left edge of a cell. */
    static GridEdge left(int i, int j) {
        return new GridEdge(false, i, j);
    }

    /** The right edge of a cell. */
    static GridEdge right(int i, int j) {
        return new GridEdge(false, i + 1, j);
    }
}
