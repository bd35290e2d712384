package binspan.planner.io;

/**
 * A place in a file.
 *
 * @param line line, the first is 1
 * @param column column in characters, the first is 1
 */
record Place(int line, int column) implements Comparable<Place> {
    static final Place START = new Place(1, 1);

    @Override
    public int compareTo(Place other) {
        return line == other.line ? Integer.compare(column, other.column) : Integer.compare(line, other.line);
    }

    @Override
    public String toString() {
        return line + ":" + column;
    }
}
