package binspan.study.tuning;

import binspan.prediction.LinkPrediction;
import binspan.study.FigureColumn;
import binspan.study.FigureReader;
import binspan.study.StudyTable;
import java.util.List;

/** The outcome of a tuning as a table of two rows. */
public final class TuningTable {
    /** What the rows are. */
    public static final List<String> SETTINGS = List.of("as written", "tuned");

    private TuningTable() {}

    /**
     * The settings as written and the best ones, with their figures of merit.
     *
     * @param tuning description
     * @param outcome what was found
     * @param columns figures of merit
     */
    public static StudyTable of(Tuning tuning, Tuning.Outcome outcome, List<FigureColumn> columns) {
        List<String> paths =
                tuning.free().stream().map(axis -> axis.parameter().path()).toList();
        StudyTable table = new StudyTable(paths, columns, SETTINGS.size());
        List<Double> written = tuning.free().stream()
                .map(axis -> axis.parameter().value(tuning.scenario()).orElse(Double.NaN))
                .toList();
        fill(table, 0, tuning, written, outcome.asWritten());
        fill(table, 1, tuning, outcome.values(), outcome.prediction());
        return table;
    }

    private static void fill(StudyTable table, int row, Tuning tuning, List<Double> values, LinkPrediction prediction) {
        int start = table.start(row);
        for (int i = 0; i < values.size(); i++) {
            table.numbers()[start + i] = values.get(i);
        }
        new FigureReader(table.columns()).read(prediction, table.numbers(), start + values.size());
        table.meets(row, tuning.margins().met(prediction));
    }
}
