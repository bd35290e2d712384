package binspan.study;

import java.util.List;

/** A table with some of another's figures. */
public final class PickedTable {
    private PickedTable() {}

    /**
     * The same rows with chosen figures.
     *
     * @param table the table
     * @param columns positions of the figures to keep, in their new order
     */
    public static StudyTable of(StudyTable table, List<Integer> columns) {
        List<FigureColumn> figures = columns.stream().map(table.columns()::get).toList();
        StudyTable picked = new StudyTable(table.paths(), figures, table.rows());
        for (int row = 0; row < table.rows(); row++) {
            int start = picked.start(row);
            for (int i = 0; i < table.paths().size(); i++) {
                picked.numbers()[start + i] = table.varied(i, row);
            }
            for (int i = 0; i < columns.size(); i++) {
                picked.numbers()[start + table.paths().size() + i] = table.figure(columns.get(i), row);
            }
            picked.meets(row, table.meets(row));
        }
        return picked;
    }
}
