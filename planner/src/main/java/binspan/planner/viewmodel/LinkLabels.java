package binspan.planner.viewmodel;

import binspan.planner.viewmodel.LinkLayout.Column;
import java.util.ArrayList;
import java.util.List;

/**
 * Where the words over the drawn link stand: in a wide column name and detail above one another; in a run of narrow
 * ones the names alone, in two rows by turns, so that each reaches over its neighbours' halves.
 *
 * @param places one for each column
 */
public record LinkLabels(List<Place> places) {
    private static final double WIDE_EM = 4.6;
    private static final double REACH = 0.5;

    /** Copies the list. */
    public LinkLabels {
        places = List.copyOf(places);
    }

    /**
     * A place for words.
     *
     * @param row 0 for the upper row, 1 for the lower; 0 also where both are used
     * @param both whether name and detail are shown, else the name alone
     * @param x left edge, px
     * @param width width, px
     */
    public record Place(int row, boolean both, double x, double width) {}

    /**
     * Places words over a layout.
     *
     * @param layout the layout
     * @param em size of ordinary text, px
     */
    public static LinkLabels of(LinkLayout layout, double em) {
        List<Column> columns = layout.columns();
        List<Place> places = new ArrayList<>();
        int run = 0;
        for (int i = 0; i < columns.size(); i++) {
            Column column = columns.get(i);
            if (wide(column, em)) {
                places.add(new Place(0, true, column.x(), column.width()));
                run = 0;
                continue;
            }
            double left = reach(columns, i - 1, em);
            double right = reach(columns, i + 1, em);
            places.add(new Place(run % 2, false, column.x() - left, left + column.width() + right));
            run++;
        }
        return new LinkLabels(places);
    }

    private static double reach(List<Column> columns, int neighbour, double em) {
        boolean there = neighbour >= 0 && neighbour < columns.size();
        return there && !wide(columns.get(neighbour), em)
                ? REACH * columns.get(neighbour).width()
                : 0.0;
    }

    private static boolean wide(Column column, double em) {
        return column.width() >= WIDE_EM * em;
    }
}
