package binspan.study.window;

import binspan.study.window.IntervalSearch.Interval;
import java.util.ArrayList;
import java.util.List;

/**
 * Where all requirements hold along a line, and which of them ends it.
 *
 * @param from lower end, as a share of the line
 * @param fromBy index of the requirement that fails below, {@link #RANGE} at the start of the line
 * @param to upper end
 * @param toBy index of the requirement that fails above, {@link #RANGE} at the end of the line
 */
record CommonInterval(double from, int fromBy, double to, int toBy) {
    /** Stands for the end of the line. */
    static final int RANGE = -1;

    /** What the intervals of all requirements have in common. */
    static List<CommonInterval> of(List<List<Interval>> each) {
        List<CommonInterval> common = List.of(new CommonInterval(0.0, RANGE, 1.0, RANGE));
        for (int i = 0; i < each.size(); i++) {
            common = with(common, each.get(i), i);
        }
        return common;
    }

    private static List<CommonInterval> with(List<CommonInterval> common, List<Interval> held, int requirement) {
        List<CommonInterval> cut = new ArrayList<>();
        for (CommonInterval present : common) {
            for (Interval interval : held) {
                if (Math.max(present.from, interval.from()) <= Math.min(present.to, interval.to())) {
                    cut.add(present.within(interval, requirement));
                }
            }
        }
        return cut;
    }

    private CommonInterval within(Interval interval, int requirement) {
        boolean later = interval.from() > from;
        boolean sooner = interval.to() < to;
        return new CommonInterval(
                later ? interval.from() : from,
                later ? requirement : fromBy,
                sooner ? interval.to() : to,
                sooner ? requirement : toBy);
    }
}
