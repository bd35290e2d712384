package binspan.planner.cli;

import binspan.planner.report.MissWords;
import binspan.study.Axis;
import binspan.study.window.PointVerdict;
import java.util.List;

/** Says that nothing meets the requirements, and how near it comes. */
final class NoFeasiblePoint {
    private NoFeasiblePoint() {}

    /**
     * At a point of some axes that fails by the least.
     *
     * @param what what was searched
     * @param axes varied parameters
     * @param nearest that point
     */
    static UsageException of(String what, List<Axis> axes, PointVerdict nearest) {
        return UsageException.of(what + "; nearest at " + MissWords.at(axes, nearest));
    }
}
