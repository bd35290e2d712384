package binspan.planner.viewmodel;

import java.util.List;
import java.util.stream.Collectors;

/**
 * Figures that belong together.
 *
 * @param title what they are about
 * @param rows the figures
 */
public record FigureGroup(String title, List<FigureRow> rows) {
    public FigureGroup {
        rows = List.copyOf(rows);
    }

    /** The group for somebody who hears it. */
    public String spoken() {
        return title + ": " + rows.stream().map(FigureRow::spoken).collect(Collectors.joining("; "));
    }
}
