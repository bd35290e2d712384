package binspan.planner.export;

import binspan.planner.picture.RoutesPicture;
import binspan.planner.report.RoutesSummary;
import binspan.planner.table.RouteLedger;
import binspan.planner.table.RowWriter;
import binspan.planner.table.StudyRows;
import binspan.planner.table.Table;
import binspan.planner.table.TableJson;
import binspan.study.comparison.RouteSurvey;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** A survey of routes as a report; its table has a row for each route, best first, read from the ledger's file as it is written. */
public final class RoutesReport {
    private RoutesReport() {}

    /**
     * What a survey has to show, as long as its ledger is open.
     *
     * @param survey the study
     * @param ledger the judged routes
     * @param bad number of rows that could not be read
     */
    public static StudyReport of(RouteSurvey survey, RouteLedger ledger, int bad) {
        Map<String, Object> description = TableJson.head(survey.template().name(), "routes");
        description.put("tuned", survey.tuned());
        description.put("routes", ledger.count());
        description.put("routesMet", ledger.met());
        description.put("badRows", bad);
        return new StudyReport(
                description,
                table(ledger),
                style -> unchecked(() -> RoutesSummary.text(survey.template(), ledger, bad, style)),
                Optional.of(
                        () -> unchecked(() -> RoutesPicture.of(survey.template().name(), ledger))));
    }

    /** Work on the ledger's file. */
    @FunctionalInterface
    private interface FromFile<T> {
        T get() throws IOException;
    }

    private static <T> T unchecked(FromFile<T> work) {
        try {
            return work.get();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static Table table(RouteLedger ledger) {
        List<String> header = new ArrayList<>();
        ledger.parameters().forEach(parameter -> header.add(parameter.path()));
        ledger.columns().forEach(column -> header.add(column.name()));
        header.addAll(List.of("rank", "name", "line", "leastMargin", "tightest", "reason", StudyRows.MEETS));
        int figures = ledger.columns().size();
        return new Table(
                header,
                writer -> ledger.ranked((rank, entry) -> {
                    row(rank, entry, figures, writer);
                    return true;
                }));
    }

    private static void row(int rank, RouteLedger.Entry entry, int figures, RowWriter writer) throws IOException {
        for (double setting : entry.settings()) {
            writer.number(setting);
        }
        for (int i = 0; i < figures; i++) {
            writer.number(
                    entry.figures().isEmpty() ? Double.NaN : entry.figures().get(i));
        }
        writer.number(rank);
        writer.text(entry.name());
        writer.number((double) entry.line());
        writer.number(entry.leastMargin());
        writer.text(entry.tightest());
        writer.text(entry.reason());
        writer.flag(entry.meets());
        writer.endRow();
    }
}
