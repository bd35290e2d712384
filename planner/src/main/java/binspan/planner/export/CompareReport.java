package binspan.planner.export;

import binspan.planner.picture.ComparisonPicture;
import binspan.planner.report.ComparisonSummary;
import binspan.planner.table.TableJson;
import binspan.study.comparison.Comparison;
import binspan.study.tuning.Objective;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** A comparison as a report; its table has a row for each link, best first. */
public final class CompareReport {
    private CompareReport() {}

    /**
     * What a comparison has to show.
     *
     * @param title name of the scenario, or what was compared
     * @param objective what the links were tuned and ranked for
     * @param entries the links, best first; at least one
     */
    public static StudyReport of(String title, Objective objective, List<Comparison.Entry> entries) {
        return new StudyReport(
                description(title, objective, entries),
                CompareRows.of(entries),
                style -> ComparisonSummary.text(title, entries, style),
                Optional.of(() -> ComparisonPicture.of(title, entries)));
    }

    private static Map<String, Object> description(String title, Objective objective, List<Comparison.Entry> entries) {
        Map<String, Object> description = TableJson.head(title, "compare");
        description.put("objective", objective.text());
        List<Map<String, Object>> links = new ArrayList<>();
        for (Comparison.Entry entry : entries) {
            Map<String, Object> link = new LinkedHashMap<>();
            link.put("option", entry.option().name());
            link.put("setting", entry.setting().meaning());
            link.put("tuned", StudyDescription.values(entry.free(), entry.values()));
            link.put("meets", entry.meets());
            links.add(link);
        }
        description.put("ranking", links);
        return description;
    }
}
