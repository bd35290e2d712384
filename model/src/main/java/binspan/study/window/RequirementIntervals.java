package binspan.study.window;

import binspan.prediction.Requirement;
import java.util.List;

/**
 * Where one requirement holds along a parameter.
 *
 * @param requirement which
 * @param required required figure
 * @param intervals the intervals, in rising order; an end that is not the end of the range is one at which the margin passes zero
 */
public record RequirementIntervals(Requirement requirement, double required, List<HeldInterval> intervals) {
    /** Copies the list. */
    public RequirementIntervals {
        intervals = List.copyOf(intervals);
    }

    /**
     * An interval in which one requirement holds.
     *
     * @param from lower end, in the parameter's unit
     * @param to upper end
     */
    public record HeldInterval(double from, double to) {}
}
