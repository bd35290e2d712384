package binspan.planner.plot;

import java.util.List;

/**
 * Horizontal bars in the order given, in one or more panels side by side.
 *
 * @param title of these bars alone, empty if the picture's says it
 * @param labels from top to bottom, up to about forty
 * @param panels from left to right
 */
public record RankedBars(String title, List<String> labels, List<BarPanel> panels) implements Panel {
    /** Copies the lists; each panel has as many bars as there are labels. */
    public RankedBars {
        labels = List.copyOf(labels);
        panels = List.copyOf(panels);
        for (BarPanel panel : panels) {
            if (panel.bars().size() != labels.size()) {
                throw new IllegalArgumentException(
                        panel.value().name() + ": " + panel.bars().size() + " bars for " + labels.size() + " labels");
            }
        }
    }

    @Override
    public PanelChart chart(PlotTheme theme, Room room) {
        return new RankedBarsChart(this, theme, room).build();
    }

    @Override
    public Room least() {
        return new Room(RankedBarsChart.LEAST_WIDTH, RankedBarsChart.leastHeight(this));
    }

    @Override
    public double fullHeight(double width) {
        return least().height();
    }
}
