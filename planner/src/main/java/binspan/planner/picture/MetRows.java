package binspan.planner.picture;

import binspan.planner.plot.Interval;
import binspan.study.StudyTable;
import java.util.ArrayList;
import java.util.List;

/** Stretches of a one-parameter table whose rows meet all requirements; they end half-way to the neighbours that do not. */
final class MetRows {
    private MetRows() {}

    static List<Interval> of(StudyTable table) {
        List<Interval> met = new ArrayList<>();
        int first = -1;
        for (int row = 0; row <= table.rows(); row++) {
            boolean meets = row < table.rows() && table.meets(row);
            if (meets && first < 0) {
                first = row;
            } else if (!meets && first >= 0) {
                met.add(new Interval(edge(table, first, first - 1), edge(table, row - 1, row)));
                first = -1;
            }
        }
        return met.stream()
                .filter(interval -> interval.upper() > interval.lower())
                .toList();
    }

    private static double edge(StudyTable table, int inside, int outside) {
        double value = table.varied(0, inside);
        return outside < 0 || outside >= table.rows() ? value : (value + table.varied(0, outside)) / 2.0;
    }
}
