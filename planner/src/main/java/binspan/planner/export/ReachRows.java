package binspan.planner.export;

import binspan.planner.table.RowWriter;
import binspan.planner.table.StudyRows;
import binspan.planner.table.Table;
import binspan.scenario.Parameter;
import binspan.study.StudyTable;
import binspan.study.tuning.Reach;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;

/** A study of the reach as one table: the lengths as written, then the same re-tuned, told apart by the column {@code settings}. */
final class ReachRows {
    private ReachRows() {}

    static Table of(Reach reach, Reach.Outcome outcome) {
        StudyTable widest = outcome.retuned() == null ? outcome.asWritten() : outcome.retuned();
        List<String> header = new ArrayList<>(widest.paths());
        widest.columns().forEach(column -> header.add(column.name()));
        header.add("settings");
        header.add(StudyRows.MEETS);
        return new Table(header, writer -> {
            rows(reach, outcome.asWritten(), "as written", writer);
            if (outcome.retuned() != null) {
                rows(reach, outcome.retuned(), "re-tuned", writer);
            }
        });
    }

    private static void rows(Reach reach, StudyTable table, String settings, RowWriter writer) throws IOException {
        for (int row = 0; row < table.rows(); row++) {
            writer.number(table.varied(0, row));
            for (int i = 0; i < reach.free().size(); i++) {
                Parameter parameter = reach.free().get(i).parameter();
                boolean tuned = table.paths().size() > 1;
                writer.number(
                        tuned
                                ? table.varied(i + 1, row)
                                : parameter.value(reach.scenario()).orElse(Double.NaN));
            }
            for (int column = 0; column < table.columns().size(); column++) {
                writer.number(table.figure(column, row));
            }
            writer.text(settings);
            writer.flag(table.meets(row));
            writer.endRow();
        }
    }
}
