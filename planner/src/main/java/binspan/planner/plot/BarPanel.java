package binspan.planner.plot;

import java.util.List;
import java.util.Optional;

/**
 * One of several columns of bars that share their labels.
 *
 * @param value horizontal axis; a linear one includes zero unless it states its ends
 * @param bars one for each label
 * @param requirement required value
 */
public record BarPanel(Axis value, List<Bar> bars, Optional<RequirementLine> requirement) {
    /** Copies the bars. */
    public BarPanel {
        bars = List.copyOf(bars);
    }
}
