package binspan.planner.viewmodel;

import binspan.planner.report.Figure;
import binspan.planner.report.FigureWords;
import binspan.planner.report.ParameterWords;
import binspan.planner.report.RequiredFigure;
import binspan.planner.report.RequirementWords;
import binspan.planner.table.RowWriter;
import binspan.planner.table.StudyRows;
import binspan.planner.table.Table;
import binspan.prediction.Requirement;
import binspan.prediction.ResultField;
import binspan.prediction.ResultFields;
import binspan.scenario.ParameterPaths;
import binspan.scenario.Scenario;
import binspan.study.FigureColumn;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * The first rows of a study's table for the screen.
 *
 * @param columns its columns
 * @param rows cells of each row: numbers, texts or truth values
 * @param total number of rows of the whole table
 */
public record TableLines(List<Column> columns, List<List<Object>> rows, int total) {
    /** Most rows that are shown. */
    public static final int MOST_ROWS = 10_000;

    private static final String OWN = "studies.column.";
    private static final String TIGHTEST = "tightest";

    /**
     * A column.
     *
     * @param name its name in files
     * @param title what it holds, with the unit
     * @param exact whether its numbers are shown as they are, not in three digits
     */
    public record Column(String name, String title, boolean exact) {
        /** A cell for a person. */
        public String text(Object cell) {
            if (cell instanceof Double number) {
                return !Double.isFinite(number) ? "" : exact ? Figure.stated(number, "") : Figure.bare(number);
            }
            if (cell instanceof Boolean met) {
                return Words.of(met ? "studies.yes" : "studies.no");
            }
            return name.equals(TIGHTEST) ? requirement((String) cell) : (String) cell;
        }

        private static String requirement(String field) {
            return Requirement.stateable().stream()
                    .filter(each -> each.fieldName().equals(field))
                    .map(RequirementWords::noun)
                    .findFirst()
                    .orElse(field);
        }
    }

    /** The lines of a table; computes what the table computes. */
    public static TableLines of(Table table, Scenario scenario) {
        List<Column> columns =
                table.header().stream().map(name -> column(name, scenario)).toList();
        Collector collector = new Collector();
        try {
            table.rows().to(collector);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        List<Integer> order = order(columns, scenario);
        return new TableLines(
                picked(columns, order),
                collector.rows.stream().map(row -> picked(row, order)).toList(),
                collector.total);
    }

    /** What tells the rows apart stands first, then what was varied, then what is required. */
    private static List<Integer> order(List<Column> columns, Scenario scenario) {
        List<String> required = RequiredFigure.of(scenario.require()).stream()
                .map(RequiredFigure::figure)
                .toList();
        List<Integer> order = new ArrayList<>();
        for (int i = 0; i < columns.size(); i++) {
            order.add(i);
        }
        order.sort(Comparator.comparingInt(i -> place(columns.get(i), required)));
        return order;
    }

    private static int place(Column column, List<String> required) {
        if (column.name().equals(StudyRows.MEETS)) {
            return 2;
        }
        if (Words.has(OWN + column.name())) {
            return 0;
        }
        return column.exact() ? 1 : required.contains(column.name()) ? 3 : 4;
    }

    private static <T> List<T> picked(List<T> all, List<Integer> order) {
        return order.stream().map(all::get).toList();
    }

    private static Column column(String name, Scenario scenario) {
        if (Words.has(OWN + name)) {
            return new Column(name, Words.of(OWN + name), name.equals("rank"));
        }
        String bare = name.startsWith(StudyRows.PREDICTED) ? name.substring(StudyRows.PREDICTED.length()) : name;
        Optional<FigureColumn> figure = figure(bare);
        if (figure.isPresent()) {
            return new Column(
                    name, titled(FigureWords.title(figure.get()), figure.get().unit()), false);
        }
        return new Column(name, titled(ParameterWords.title(name), unit(name, scenario)), true);
    }

    private static Optional<FigureColumn> figure(String name) {
        for (ResultField field : ResultFields.ALL) {
            for (int port = 0; port < (field.perPort() ? 2 : 1); port++) {
                FigureColumn column = new FigureColumn(field, port);
                if (column.name().equals(name)) {
                    return Optional.of(column);
                }
            }
        }
        return Optional.empty();
    }

    private static String unit(String path, Scenario scenario) {
        try {
            return ParameterPaths.find(scenario, path).unit();
        } catch (IllegalArgumentException e) {
            return "";
        }
    }

    private static String titled(String words, String unit) {
        return unit.isEmpty() ? words : words + " (" + unit + ")";
    }

    /** Keeps the first rows and counts the others. */
    private static final class Collector implements RowWriter {
        private final List<List<Object>> rows = new ArrayList<>();
        private List<Object> row = new ArrayList<>();
        private int total;

        @Override
        public void number(double value) {
            row.add(value);
        }

        @Override
        public void text(String value) {
            row.add(value);
        }

        @Override
        public void flag(boolean value) {
            row.add(value);
        }

        @Override
        public void endRow() {
            total++;
            if (total <= MOST_ROWS) {
                rows.add(row);
            }
            row = new ArrayList<>();
        }
    }
}
