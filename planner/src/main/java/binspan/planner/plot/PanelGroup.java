package binspan.planner.plot;

import java.util.List;

/**
 * Panels in rows and columns. Groups may stand in groups.
 *
 * @param title common title, empty if the picture's says it
 * @param columns how many stand side by side
 * @param panels row by row
 */
public record PanelGroup(String title, int columns, List<Panel> panels) implements Panel {
    /** Copies the panels. */
    public PanelGroup {
        panels = List.copyOf(panels);
        if (columns < 1 || panels.isEmpty()) {
            throw new IllegalArgumentException("a group has at least one column and one panel");
        }
    }

    @Override
    public PanelChart chart(PlotTheme theme) {
        return PanelGrid.of(this, theme);
    }
}
