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
    private static final double HEAD_HEIGHT = 30.0;

    /** Copies the panels. */
    public PanelGroup {
        panels = List.copyOf(panels);
        if (columns < 1 || panels.isEmpty()) {
            throw new IllegalArgumentException("a group has at least one column and one panel");
        }
    }

    @Override
    public PanelChart chart(PlotTheme theme, Room room) {
        return PanelGrid.of(this, theme, room);
    }

    @Override
    public Room least() {
        Room first = panels.get(0).least();
        return new Room(first.width(), first.height() + headHeight());
    }

    @Override
    public double fullHeight(double width) {
        Room room = new Room(width, Double.POSITIVE_INFINITY);
        return PanelLayout.of(panels, columns, room).fullHeight() + headHeight();
    }

    /** Height of the title. */
    double headHeight() {
        return title.isEmpty() ? 0.0 : HEAD_HEIGHT;
    }
}
