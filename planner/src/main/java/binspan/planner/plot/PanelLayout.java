package binspan.planner.plot;

import java.util.ArrayList;
import java.util.List;

/** How a group of panels stands in a given room: as many columns as show the most panels, and the rows that fit, each at least as high as it needs. */
final class PanelLayout {
    private final List<Panel> panels;
    private final Room room;
    private final int columns;
    private final int shown;

    private PanelLayout(List<Panel> panels, Room room, int columns) {
        this.panels = panels;
        this.room = room;
        this.columns = columns;
        this.shown = fitting();
    }

    /** The layout of panels in at most so many columns. */
    static PanelLayout of(List<Panel> panels, int most, Room room) {
        PanelLayout best = new PanelLayout(panels, room, 1);
        for (int columns = 2; columns <= Math.min(most, panels.size()); columns++) {
            PanelLayout layout = new PanelLayout(panels, room, columns);
            if (layout.wideEnough() && layout.shown >= best.shown) {
                best = layout;
            }
        }
        return best;
    }

    int columns() {
        return columns;
    }

    /** The panels that have room. */
    List<Panel> shown() {
        return panels.subList(0, shown);
    }

    /** How many have none. */
    int hidden() {
        return panels.size() - shown;
    }

    private boolean wideEnough() {
        return panels.stream().allMatch(panel -> panel.least().width() <= room.width() / columns);
    }

    private int fitting() {
        double used = 0.0;
        int rows = 0;
        while (rows * columns < panels.size()) {
            used += leastHeight(rows);
            if (rows > 0 && used > room.height()) {
                break;
            }
            rows++;
        }
        return Math.min(panels.size(), rows * columns);
    }

    private List<Panel> row(int row) {
        return panels.subList(row * columns, Math.min(panels.size(), (row + 1) * columns));
    }

    private double leastHeight(int row) {
        return row(row).stream()
                .mapToDouble(panel -> panel.least().height())
                .max()
                .orElse(0.0);
    }

    private double fullHeight(int row) {
        double width = room.width() / columns;
        return row(row).stream()
                .mapToDouble(panel -> panel.fullHeight(width))
                .max()
                .orElse(0.0);
    }

    /** The height in which nothing is left out. */
    double fullHeight() {
        double sum = 0.0;
        for (int row = 0; row * columns < panels.size(); row++) {
            sum += fullHeight(row);
        }
        return sum;
    }

    /** The room of each panel that is shown: least heights first, then what is missing to full ones, then the rest in proportion. */
    List<Room> rooms() {
        int rows = (shown + columns - 1) / columns;
        double[] heights = new double[rows];
        double missing = 0.0;
        double full = 0.0;
        double left = room.height();
        for (int row = 0; row < rows; row++) {
            heights[row] = leastHeight(row);
            left -= heights[row];
            full += Math.max(heights[row], fullHeight(row));
            missing += Math.max(0.0, fullHeight(row) - heights[row]);
        }
        double filled = missing > 0.0 ? Math.max(0.0, Math.min(1.0, left / missing)) : 0.0;
        double stretch = left > missing ? room.height() / full : 1.0;
        List<Room> rooms = new ArrayList<>();
        for (int i = 0; i < shown; i++) {
            int row = i / columns;
            double height = heights[row] + filled * Math.max(0.0, fullHeight(row) - heights[row]);
            rooms.add(new Room(room.width() / columns, height * stretch));
        }
        return rooms;
    }
}
