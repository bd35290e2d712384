package binspan.planner.plot;

/**
 * A map of one quantity over two others.
 *
 * @param title of this map alone, empty if the picture's says it
 * @param x horizontal axis
 * @param y vertical axis
 * @param heat what the colours show; its lattice spans the axes where they state no ends
 * @param overlays what lies over the colours
 */
public record HeatMap(String title, Axis x, Axis y, HeatLayer heat, Overlays overlays) implements Panel {
    @Override
    public PanelChart chart(PlotTheme theme, Room room) {
        return new HeatMapChart(this, theme, room).build();
    }

    @Override
    public Room least() {
        return HeatMapChart.LEAST;
    }

    @Override
    public double fullHeight(double width) {
        return HeatMapChart.FULL_HEIGHT;
    }
}
