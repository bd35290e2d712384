package binspan.planner.export;

import binspan.planner.picture.ReachPicture;
import binspan.planner.report.ReachSummary;
import binspan.planner.table.TableJson;
import binspan.study.tuning.Reach;
import binspan.study.tuning.SourcePosition;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** A study of the reach as a report; its table holds the lengths as written, then the same re-tuned. */
public final class ReachReport {
    private ReachReport() {}

    /**
     * What a study of the reach has to show.
     *
     * @param reach the study
     * @param outcome what it found
     */
    public static StudyReport of(Reach reach, Reach.Outcome outcome) {
        return new StudyReport(
                description(reach, outcome),
                ReachRows.of(reach, outcome),
                style -> ReachSummary.text(reach, outcome, style),
                Optional.of(() -> ReachPicture.of(reach, outcome)));
    }

    private static Map<String, Object> description(Reach reach, Reach.Outcome outcome) {
        Map<String, Object> description = TableJson.head(reach.scenario().name(), "reach");
        description.put("sourceShareOfAlice", SourcePosition.of(reach.scenario()));
        description.put("free", StudyDescription.ranges(reach.free()));
        description.put("objective", reach.objective().text());
        List<Map<String, Object>> limits = new ArrayList<>();
        for (Reach.Limit limit : outcome.limits()) {
            Map<String, Object> entry = new LinkedHashMap<>();
            entry.put("name", limit.goal().requirement().fieldName());
            entry.put("required", limit.goal().required());
            entry.put("stated", limit.goal().stated());
            lengths(limit, entry);
            limits.add(entry);
        }
        description.put("limits", limits);
        if (outcome.all() != null) {
            Map<String, Object> all = new LinkedHashMap<>();
            lengths(outcome.all(), all);
            description.put("all", all);
        }
        return StudyDescription.finite(description);
    }

    private static void lengths(Reach.Limit limit, Map<String, Object> entry) {
        put(entry, "asWrittenKm", limit.asWrittenKm());
        put(entry, "retunedKm", limit.retunedKm());
    }

    private static void put(Map<String, Object> entry, String name, OptionalDouble km) {
        if (km.isPresent()) {
            entry.put(name, km.getAsDouble());
        }
    }
}
