package binspan.planner.table;

import binspan.study.Axis;
import binspan.study.FigureColumn;
import binspan.study.StudyTable;
import java.io.IOException;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Supplier;

/** The points of a study as a table: varied parameters, figures of merit, columns of the study's own, {@code meets}. */
public final class StudyRows {
    /** Name of the last column: whether all requirements are met. */
    public static final String MEETS = "meets";

    /** Stands before the name of a figure that is also the path of a varied parameter. */
    public static final String PREDICTED = "predicted.";

    private final StudyTable points;
    private final int[] shown;
    private final List<Column> own;

    private StudyRows(StudyTable points, int[] shown, List<Column> own) {
        this.points = points;
        this.shown = shown;
        this.own = own;
    }

    /**
     * The table of some points.
     *
     * @param points the points
     * @param figures which of their figures to show, in this order
     * @param own further columns, which stand before {@code meets}
     */
    public static Table of(StudyTable points, List<FigureColumn> figures, List<Column> own) {
        List<String> header = header(points.paths(), figures, own);
        int[] shown = figures.stream().mapToInt(points.columns()::indexOf).toArray();
        return new Table(header, new StudyRows(points, shown, List.copyOf(own))::write);
    }

    private static List<String> header(List<String> varied, List<FigureColumn> figures, List<Column> own) {
        List<String> header = new ArrayList<>(varied);
        Set<String> paths = new HashSet<>(varied);
        for (FigureColumn figure : figures) {
            header.add(paths.contains(figure.name()) ? PREDICTED + figure.name() : figure.name());
        }
        own.forEach(column -> header.add(column.name()));
        header.add(MEETS);
        return header;
    }

    /**
     * The table of some points that are computed only when it is written.
     *
     * @param axes varied parameters
     * @param figures all figures of the points
     * @param own further columns
     * @param points computes the points
     */
    public static Table later(
            List<Axis> axes, List<FigureColumn> figures, List<Column> own, Supplier<StudyTable> points) {
        List<String> paths = axes.stream().map(axis -> axis.parameter().path()).toList();
        return new Table(
                header(paths, figures, own),
                writer -> of(points.get(), figures, own).rows().to(writer));
    }

    private void write(RowWriter writer) throws IOException {
        for (int row = 0; row < points.rows(); row++) {
            for (int i = 0; i < points.paths().size(); i++) {
                writer.number(points.varied(i, row));
            }
            for (int column : shown) {
                writer.number(points.figure(column, row));
            }
            for (Column column : own) {
                writer.cell(column.cells().apply(row));
            }
            writer.flag(points.meets(row));
            writer.endRow();
        }
    }
}
