package binspan.study;

import java.util.List;

/** A table of points: the varied parameters, the figures of merit there and whether all requirements are met. */
public final class StudyTable {
    private final List<String> paths;
    private final List<FigureColumn> columns;
    private final int width;
    private final int[] places;
    private final double[] numbers;
    private final boolean[] meets;

    /** An empty table, to be filled row by row. */
    public StudyTable(List<String> paths, List<FigureColumn> columns, int rows) {
        this(paths, columns, rows, null);
    }

    /**
     * An empty table whose rows are kept in another order than they are shown.
     *
     * @param places place at which each row is kept; null where that is its number
     */
    public StudyTable(List<String> paths, List<FigureColumn> columns, int rows, int[] places) {
        this.paths = List.copyOf(paths);
        this.columns = List.copyOf(columns);
        this.width = paths.size() + columns.size();
        this.places = places;
        this.numbers = new double[rows * width];
        this.meets = new boolean[rows];
    }

    /** Scenario paths of the varied parameters, in the order given. */
    public List<String> paths() {
        return paths;
    }

    /** Figures of merit. */
    public List<FigureColumn> columns() {
        return columns;
    }

    /** Number of rows. */
    public int rows() {
        return meets.length;
    }

    /** The value of a varied parameter in a row. */
    public double varied(int parameter, int row) {
        return numbers[place(row) * width + parameter];
    }

    /** A figure of merit in a row; NaN or infinite where it does not apply. */
    public double figure(int column, int row) {
        return numbers[place(row) * width + paths.size() + column];
    }

    /** Whether a row meets all requirements. */
    public boolean meets(int row) {
        return meets[place(row)];
    }

    /** All values of a varied parameter. */
    public double[] variedOf(int parameter) {
        double[] values = new double[rows()];
        for (int row = 0; row < values.length; row++) {
            values[row] = varied(parameter, row);
        }
        return values;
    }

    /** All values of a figure. */
    public double[] figuresOf(int column) {
        double[] values = new double[rows()];
        for (int row = 0; row < values.length; row++) {
            values[row] = figure(column, row);
        }
        return values;
    }

    /** Position of a figure by its name, -1 if it is not in the table. */
    public int indexOf(String name) {
        for (int i = 0; i < columns.size(); i++) {
            if (columns.get(i).name().equals(name)) {
                return i;
            }
        }
        return -1;
    }

    /** Number of rows that meet all requirements. */
    public int met() {
        int met = 0;
        for (boolean each : meets) {
            met += each ? 1 : 0;
        }
        return met;
    }

    private int place(int row) {
        return places == null ? row : places[row];
    }

    /** The numbers of all rows, each row's parameters before its figures, in the order of their places. */
    public double[] numbers() {
        return numbers;
    }

    /** Where the numbers of a place begin. */
    public int start(int place) {
        return place * width;
    }

    /** Says whether a place meets all requirements. */
    public void meets(int place, boolean value) {
        meets[place] = value;
    }
}
