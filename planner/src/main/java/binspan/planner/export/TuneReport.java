package binspan.planner.export;

import binspan.planner.picture.TunePicture;
import binspan.planner.report.MissWords;
import binspan.planner.report.TuneSummary;
import binspan.planner.table.Column;
import binspan.planner.table.StudyRows;
import binspan.planner.table.TableJson;
import binspan.study.FigureColumns;
import binspan.study.StudyTable;
import binspan.study.tuning.Tuning;
import binspan.study.tuning.TuningTable;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** A tuning as a report; its table has two rows: the settings as written and the best ones. */
public final class TuneReport {
    private TuneReport() {}

    /**
     * What a tuning has to show.
     *
     * @param tuning the study
     * @param outcome a feasible outcome
     */
    public static StudyReport of(Tuning tuning, Tuning.Outcome outcome) {
        StudyTable table = TuningTable.of(tuning, outcome, FigureColumns.all(tuning.scenario()));
        return new StudyReport(
                description(tuning, outcome),
                StudyRows.of(table, table.columns(), List.of(new Column("settings", TuningTable.SETTINGS::get))),
                style -> TuneSummary.text(tuning, outcome, style),
                Optional.of(() -> TunePicture.of(tuning, outcome)));
    }

    /** Why there is nothing to show: no settings are feasible, and how near they come. */
    public static String infeasible(Tuning tuning, Tuning.Outcome outcome) {
        return MissWords.nowhere(
                "no settings of the free parameters meet all requirements", tuning.margins(), outcome.prediction());
    }

    private static Map<String, Object> description(Tuning tuning, Tuning.Outcome outcome) {
        Map<String, Object> description = TableJson.head(tuning.scenario().name(), "tune");
        description.put("free", StudyDescription.ranges(tuning.free()));
        description.put("objective", tuning.objective().text());
        description.put("asWritten", tuning.objective().value(outcome.asWritten(), tuning.margins()));
        description.put("best", tuning.objective().value(outcome.prediction(), tuning.margins()));
        description.put("settings", StudyDescription.values(tuning.free(), outcome.values()));
        description.put("seed", tuning.seed());
        description.put("evaluations", outcome.evaluations());
        return StudyDescription.finite(description);
    }
}
