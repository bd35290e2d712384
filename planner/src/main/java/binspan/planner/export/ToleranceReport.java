package binspan.planner.export;

import binspan.planner.picture.TolerancePicture;
import binspan.planner.report.ToleranceSummary;
import binspan.planner.table.StudyRows;
import binspan.study.tolerance.ToleranceResult;
import java.util.List;
import java.util.Optional;

/** A tolerance study as a report; its table holds every build. */
public final class ToleranceReport {
    private ToleranceReport() {}

    /**
     * What a tolerance study has to show.
     *
     * @param result what it found
     */
    public static StudyReport of(ToleranceResult result) {
        return new StudyReport(
                ToleranceDescription.of(result),
                StudyRows.of(result.table(), result.study().columns(), List.of()),
                style -> ToleranceSummary.text(result, style),
                Optional.of(() -> TolerancePicture.of(result)));
    }
}
