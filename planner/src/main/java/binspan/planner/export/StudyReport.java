package binspan.planner.export;

import binspan.planner.plot.Picture;
import binspan.planner.report.TextStyle;
import binspan.planner.table.Table;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.Supplier;

/**
 * What a study has to show; each part is made only where it is wanted.
 *
 * @param description head of the JSON, see {@link binspan.planner.table.TableJson#head}
 * @param table rows of CSV and JSON
 * @param summary text for a terminal
 * @param picture describes the picture, if the study has one
 */
public record StudyReport(
        Map<String, Object> description,
        Table table,
        Function<TextStyle, String> summary,
        Optional<Supplier<Picture>> picture) {}
