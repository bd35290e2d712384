package binspan.planner.plot;

import java.util.List;
import java.util.Optional;

/**
 * One of several panels above a common horizontal axis.
 *
 * @param y vertical axis
 * @param series up to eight lines
 * @param requirement required value of y
 */
public record CurvePanel(Axis y, List<Series> series, Optional<RequirementLine> requirement) {
    /** Copies the series. */
    public CurvePanel {
        series = List.copyOf(series);
    }
}
