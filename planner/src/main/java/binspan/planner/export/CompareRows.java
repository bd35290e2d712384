package binspan.planner.export;

import binspan.planner.table.StudyRows;
import binspan.planner.table.Table;
import binspan.study.FigureColumn;
import binspan.study.FigureColumns;
import binspan.study.comparison.Comparison;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** A comparison as a table: a row for each link, best first; a cell is empty where a link has no such parameter or figure. */
final class CompareRows {
    private CompareRows() {}

    static Table of(List<Comparison.Entry> entries) {
        Set<String> parameters = new LinkedHashSet<>();
        Set<String> figures = new LinkedHashSet<>();
        List<Map<String, Double>> cells = new ArrayList<>();
        for (Comparison.Entry entry : entries) {
            Map<String, Double> values = new LinkedHashMap<>();
            entry.free().forEach(axis -> parameters.add(axis.parameter().path()));
            for (int i = 0; i < entry.free().size(); i++) {
                values.put(
                        entry.free().get(i).parameter().path(), entry.values().get(i));
            }
            for (FigureColumn column : FigureColumns.all(entry.prediction().scenario())) {
                figures.add(column.name());
                values.put(column.name(), column.of(entry.prediction(), entry.finite()));
            }
            cells.add(values);
        }
        List<String> numbers = new ArrayList<>(parameters);
        numbers.addAll(figures);
        List<String> header = new ArrayList<>(numbers);
        header.addAll(List.of("rank", "option", "setting", "reachKm", "tightest", StudyRows.MEETS));
        return new Table(header, writer -> {
            for (int i = 0; i < entries.size(); i++) {
                Comparison.Entry entry = entries.get(i);
                for (String name : numbers) {
                    writer.number(cells.get(i).getOrDefault(name, Double.NaN));
                }
                writer.number(i + 1.0);
                writer.text(entry.option().name());
                writer.text(entry.setting().meaning());
                writer.number(entry.reachKm().orElse(Double.NaN));
                writer.text(entry.tightest() == null ? "" : entry.tightest().fieldName());
                writer.flag(entry.meets());
                writer.endRow();
            }
        });
    }
}
