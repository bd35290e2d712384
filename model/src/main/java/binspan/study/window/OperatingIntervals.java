package binspan.study.window;

import binspan.study.Axis;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * The operating windows of one parameter.
 *
 * @param axis the parameter and its range
 * @param windows every interval in which all requirements hold, in rising order; none where nothing holds
 * @param requirements for each requirement the intervals in which it holds
 * @param curves margins over the range
 * @param nearest where no window is found: the point at which the least margin is largest
 */
public record OperatingIntervals(
        Axis axis,
        List<OperatingInterval> windows,
        List<RequirementIntervals> requirements,
        MarginCurves curves,
        Optional<PointVerdict> nearest) {
    /** Copies the lists. */
    public OperatingIntervals {
        windows = List.copyOf(windows);
        requirements = List.copyOf(requirements);
    }

    /** The window whose best point has the most room, if there is one. */
    public Optional<OperatingInterval> roomiest() {
        return windows.stream()
                .max(Comparator.comparingDouble(window -> window.best().leastMargin()));
    }
}
