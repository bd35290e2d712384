package binspan.planner.plot;

import java.util.List;

/**
 * Curves over one horizontal axis in one to about eight panels above each other.
 *
 * @param title of these curves alone, empty if the picture's says it
 * @param x common horizontal axis
 * @param panels from top to bottom
 * @param met stretches of the horizontal axis where all requirements are met
 * @param marks up to three labelled values of the horizontal axis
 */
public record Curves(String title, Axis x, List<CurvePanel> panels, List<Interval> met, List<Mark> marks)
        implements Panel {
    /** Copies the lists. */
    public Curves {
        panels = List.copyOf(panels);
        met = List.copyOf(met);
        marks = List.copyOf(marks);
    }

    @Override
    public PanelChart chart(PlotTheme theme, Room room) {
        return new CurvesChart(this, theme, room).build();
    }

    @Override
    public Room least() {
        return CurvesChart.LEAST;
    }

    @Override
    public double fullHeight(double width) {
        return CurvesChart.fullHeight(panels.size());
    }
}
